// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/readout.h"

#include <QSizeF>

namespace planewright {

/// What heading and caption of the element speak of.
struct ElementCaption {
  const Study& study;
  const Readout& readout;
  bool compact = false;
  QSizeF size;
  const Translate& translate;
};

/// "Element" and, to the right, whether handles snap.
void addHeading(Picture& picture, const ElementCaption& caption, bool snapping);

/// "normal at 30.0°  ·  cut at −60.0°  ·  on σ1" (of the line while it is dragged) and below it the unit, in
/// a narrow panel the stresses, and before anything was typed how to begin.
void addCaption(Picture& picture, const ElementCaption& caption, bool ofLine);

} // namespace planewright

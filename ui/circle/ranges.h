// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/envelope.h"
#include "ui/circle/round.h"

namespace planewright {

/// What the stresses on the reading plane range over: a bar on each axis in pixels, from the least to the
/// greatest value of all judged combinations and cut at the plot, and where the shown state stands on it.
struct RangeBars {
  Envelope envelope;
  QPointF normalFrom;
  QPointF normalTo;
  QPointF normalAt;
  QPointF shearFrom;
  QPointF shearTo;
  QPointF shearAt;
};

/// None where fewer than two combinations are judged. The bar of the shear stands at the side of the plot
/// where its axis is not in view.
std::optional<RangeBars> rangeBarsOf(const Stage& stage);

/// The bars, each with a tick at the shown state while that is in view.
Picture rangesLayer(const Stage& stage);

/// What the bar at this pixel says; empty beside the bars.
Text rangeWords(const Stage& stage, QPointF pixel);

} // namespace planewright

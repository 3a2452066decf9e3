// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/readout.h"
#include "core/words/problem.h"

namespace planewright {

/// Which parts a figure has; the conventions always stand.
struct FigureParts {
  bool title = true;
  bool givenElement = true;
  bool turnedElement = true;
  bool circle = true;
  bool planes = true;
  bool operator==(const FigureParts&) const = default;
};

/// How a figure is asked for.
struct FigureOrder {
  double width = 160;    ///< mm, 90 to 400
  double textPoints = 8; ///< size of the text, 7 to 10
  bool mono = false;     ///< changes colours only; kept here so that an order says the whole figure
  FigureParts parts;
  Text caption;          ///< under the figure; may be empty
  std::string studyName; ///< the file's name; may be empty
  Translate translate;
};

/// The labelled figure of the shown state of `readout`, or a Problem when width or text are out of range.
/// Labels never overlap, never leave the frame, never stand on a stroke without an opaque ground.
Result<Picture> figureOf(const Study& study, const Readout& readout, const FigureOrder& order);

} // namespace planewright

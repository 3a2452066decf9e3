// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/arrangement.h"
#include "core/figure/look.h"
#include "core/figure/picture.h"
#include "core/study/readout.h"
#include "core/words/decimal_sign.h"
#include "core/words/problem.h"

namespace planewright {

/// Which parts a figure has; the conventions always stand.
struct FigureParts {
  bool title = true; ///< the point with its note, or the study's subject, and the combination
  bool givenElement = true;
  bool turnedElement = true;
  bool circle = true;
  bool planes = true;
  bool combination = true;
  bool version = true;     ///< of the program, in the last row
  bool check = true;       ///< what the checks of the point come to, where it has any
  bool utilisation = true; ///< over the angle of the governing check
  bool operator==(const FigureParts&) const = default;
};

/// How a figure is asked for.
struct FigureOrder {
  double width = 160;    ///< mm, 90 to 400
  double textPoints = 8; ///< size of the text, 7 to 10; indices are 0.7 of it
  bool mono = false;     ///< changes colours only; kept here so that an order says the whole figure
  FigureParts parts;
  Arrangement arrangement = Arrangement::byWidth;
  FigureBlocks blocks = usualBlocks;
  Text caption;          ///< under the figure; may be empty
  std::string studyName; ///< the file's name; may be empty
  DecimalSign decimal = DecimalSign::point;
  Translate translate;
};
inline constexpr double leastFigureWidth = 90;
inline constexpr double greatestFigureWidth = 400;
inline constexpr double leastFigureText = 7;
inline constexpr double greatestFigureText = 10;

/// The colours of the figure: mono, or the light set on white.
Palette paletteOf(const FigureOrder& order);

/// The labelled figure of the shown state of `readout`, or a Problem when width or text are out of range, the
/// width does not hold elements and circle beside one another or the labels find no room. Labels never
/// overlap, never leave the frame, never stand on a stroke without an opaque ground. Below leastWidthBeside
/// table and conventions are set a point smaller, yet never below 7 pt.
Result<Picture> figureOf(const Study& study, const Readout& readout, const FigureOrder& order);

} // namespace planewright

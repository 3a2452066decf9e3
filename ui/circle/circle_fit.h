// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"
#include "ui/chart/equal_scale.h"

namespace planewright {

/// Which circles the axes are fitted to.
/// `withLimit`: the shown circle and the circle of the load that would bring its worst plane to the limit.
enum class Fit { thisCircle, allCombinations, withLimit };

/// Sizes of the drawing in pixels.
namespace circle_size {
inline constexpr double text = 12;
inline constexpr double stem = 16;        ///< from the x mark to the middle of its ear
inline constexpr double labelGap = 30;    ///< from the circle to a column of labels, beyond the ear
inline constexpr double overhang = 12;    ///< of the labels beyond the right edge of the plot
inline constexpr double leftOverhang = 4; ///< and beyond the left edge, short of the tick labels
} // namespace circle_size

/// Pixels that the columns of labels keep free at the two sides of the circle.
struct LabelRoom {
  double left = 0;
  double right = 0;
};

/// Room for the labels of the shown state, however its reading plane turns, so that the scale does not
/// breathe; less where the circle would not reach its least diameter: long labels then go short.
LabelRoom labelRoom(const Study& study, const Readout& readout, double plotWidth, double leastDiameter);

/// The diameter that the circle of one state reaches in a panel of this size, as far as the height lets it.
double leastDiameter(const QSizeF& panel);

/// The scale for a plot inside a panel: first the room for labels, then the circle as large as it goes. The
/// origin is kept when that costs less than half of the circle's size.
EqualScale fittedCircle(const Study& study, const Readout& readout, Fit fit, const QRectF& plot,
                        const QSizeF& panel);

/// The states that are drawn behind the shown one: the judged ones.
std::vector<const StateReading*> othersOf(const Readout& readout);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/labels.h"
#include "core/figure/marks.h"
#include "core/figure/setting.h"

namespace planewright {

/// Round steps for an axis: 1, 2 or 5 times a power of ten.
struct Steps {
  double step = 1;
  int decimals = 0; ///< that write every multiple of the step
};
/// The least such step of at least `least`, which is positive.
Steps roundSteps(double least);
/// A multiple of the step in words; zero is "0".
std::string tickWords(double value, const Steps& steps);

/// Where a circle lies on the sheet: one scale for both axes.
struct CircleFit {
  Box frame;         ///< of the plot
  Vec centre;        ///< of the circle
  double mean = 0;   ///< sigma_n at the centre, N/mm2
  double scale = 1;  ///< mm for 1 N/mm2
  double radius = 0; ///< drawn; 0 for a degenerate state
  bool down = true;  ///< tau_nt is drawn positive downwards
  Steps across;      ///< of the sigma axis, in the study's unit
  Steps upright;     ///< of the tau axis; wide numbers can make those of the sigma axis larger
  LabelColumns columns;

  Vec at(const Traction& traction) const;
  /// The angle on the drawing, counter-clockwise from its right end, by which the point of a plane moves when
  /// the plane turns by `turn`: twice that, in the other sense when tau_nt is drawn upwards.
  double drawnTurn(Angle turn) const { return (down ? 2 : -2) * turn.degrees(); }
  /// x of the tau axis; it may lie outside the frame.
  double zeroAcross() const { return at({0, 0}).x; }
  bool showsZero() const;
};

/// Fits the circle of the shown state into an area, between the columns of its labels: their widths come
/// first, yet the circle keeps at least `leastDiameter`. The origin is shown where that costs less than a
/// third of the circle's size. In `wishes` only the side of a mark counts: x is its distance from the centre.
CircleFit circleFitOf(const Setting& setting, const std::vector<LabelWish>& wishes, const Box& area,
                      double leastDiameter);

} // namespace planewright

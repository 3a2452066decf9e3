// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/failure_line.h"
#include "core/figure/metrics.h"

#include <functional>

namespace planewright {

/// Where the strengths of planes are drawn: window and figure alike.
struct FailureFrame {
  std::function<Vec(const Traction&)> at; ///< a place of the circle's plot on the sheet
  Box plot;                               ///< nothing leaves it
  double unit = 1;                        ///< of the drawing for a pixel of the window
};

/// Failure lines of both signs with hatch on their failing side, the plane that touches first as a triangle
/// and the margin of the checked plane as a line with two heads.
Picture failureDrawing(const FailureFrame& frame, const std::vector<FailureLine>& lines);

} // namespace planewright

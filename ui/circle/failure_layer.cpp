// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/failure_layer.h"

#include "core/figure/failure_drawing.h"
#include "core/table/table.h"
#include "ui/circle/circle_fit.h"
#include "ui/look/look.h"

#include <algorithm>
#include <cmath>

namespace planewright {

Picture failureLayer(const Stage& stage) {
  const QRectF range = stage.scale.range();
  const double widest = std::max(std::abs(range.left()), std::abs(range.right()));
  // Further than anything in the plot.
  const double reach = stressUnitOf(stage.study).toBase(2 * widest);
  const QRectF plot = stage.scale.plot();
  const FailureFrame frame{[&stage](const Traction& at) { return vecOf(stage.pixelOf(at)); },
                           {plot.left(), plot.top(), plot.right(), plot.bottom()},
                           1};
  return failureDrawing(frame, failureLinesOf(stage.readout, reach));
}

} // namespace planewright

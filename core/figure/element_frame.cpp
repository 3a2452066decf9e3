// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_frame.h"

namespace planewright {

Vec ElementFrame::in(Angle direction, double along, double left) const {
  const CosSin d = cosSin(axes + direction);
  return centre + outer * Vec{along * d.cos - left * d.sin, -along * d.sin - left * d.cos};
}

} // namespace planewright

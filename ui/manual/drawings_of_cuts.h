// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// A piece of a body with a line in it, cut across the line or along it: where the cut's normal stands.
Picture cutByLine(bool crosses);
/// A slope of 1 in 10 and its angle.
Picture slopeOfOneInTen();
/// Three gauges of a rosette and their angles from +x.
Picture gaugesOfRosette();

} // namespace planewright

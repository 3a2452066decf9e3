// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"

namespace planewright {

/// The true slope of a grain seen at `a` and `b` on two faces at right angles: tan = sqrt(tan^2 a + tan^2 b).
/// Of the size of a slope: signs are lost. Common practice; the combination: USDA Wood Handbook.
Angle slopeOfFaces(Angle a, Angle b);

} // namespace planewright

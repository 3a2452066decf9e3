// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/slope_of_faces.h"

#include <cmath>

namespace planewright {

Angle slopeOfFaces(Angle a, Angle b) {
  const CosSin first = cosSin(a);
  const CosSin second = cosSin(b);
  return Angle::fromRadians(std::atan2(std::hypot(first.sin * second.cos, second.sin * first.cos),
                                       std::abs(first.cos * second.cos)));
}

} // namespace planewright

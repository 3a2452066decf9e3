// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/free_edge.h"

#include "core/stress/circle.h"

#include <algorithm>
#include <cmath>

namespace planewright {

double FreeEdge::share() const {
  return scale == 0 ? 0 : std::hypot(traction.sn, traction.tnt) / scale;
}

FreeEdge freeEdgeOf(const PlaneStress& stress, LineAngle edge) {
  const Circle circle = circleOf(stress);
  return {tractionOn(stress, following(edge)), std::max(std::abs(circle.s1), std::abs(circle.s2))};
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/free_edge.h"

#include <algorithm>
#include <cmath>

namespace planewright {

double FreeEdge::share() const {
  return scale == 0 ? 0 : std::hypot(traction.sn, traction.tnt) / scale;
}

FreeEdge freeEdgeOf(const PlaneStress& stress, LineAngle edge) {
  const double mean = (stress.sx + stress.sy) / 2;
  const double radius = std::hypot((stress.sx - stress.sy) / 2, stress.txy);
  return {tractionOn(stress, following(edge)), std::max(std::abs(mean + radius), std::abs(mean - radius))};
}

} // namespace planewright

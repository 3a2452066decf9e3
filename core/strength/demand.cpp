// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/demand.h"

#include <algorithm>
#include <cmath>

namespace planewright {

double bendingShareOf(double sx, double axial, double bending) {
  const double sense = sx < 0 ? -1 : 1;
  const double bends = std::max(sense * bending, 0.0);
  if (sx == 0 || bends == 0)
    return 0;
  const double pulls = std::max(sense * axial, 0.0) + std::max(sense * (sx - axial - bending), 0.0);
  return bends / (bends + pulls);
}

double bendingShareAlong(const Demand& demand) {
  const PlaneStress& s = demand.stress;
  const double all = std::abs(s.sx) + std::abs(s.sy) + 2 * std::abs(s.txy);
  return all == 0 ? 0 : demand.bendingShare * (std::abs(s.sx) / all);
}

bool mixesBending(const Demand& demand, bool pulls) {
  return demand.bendingShare != 0 && pulls == (demand.stress.sx >= 0);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/band.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double tieShare = 1e-12;

/// The same direction, unfolded to within half a turn of the nominal one.
Angle nearTo(Angle nominal, Angle direction) {
  return nominal + folded(direction - nominal);
}

std::vector<Angle> candidatesIn(const Judge& judge, const Band& band) {
  std::vector<Angle> candidates = {band.nominal, band.from(), band.to()};
  for (const Branch& branch : judge.branches())
    for (const Angle turning : turningPointsOf(branch, judge.state())) {
      const Angle angle = nearTo(band.nominal, turning);
      if (angle >= band.from() && angle <= band.to())
        candidates.push_back(angle);
    }
  return candidates;
}

} // namespace

Band bandOf(Angle nominal, Angle tolerance) {
  return {folded(nominal), std::min(tolerance, Angle::fromDegrees(90))};
}

WorstInBand worstIn(const Judge& judge, const Band& band) {
  std::vector<Angle> candidates = candidatesIn(judge, band);
  std::ranges::sort(candidates, [&](Angle a, Angle b) {
    const double toA = std::abs((a - band.nominal).degrees());
    const double toB = std::abs((b - band.nominal).degrees());
    return toA != toB ? toA < toB : a < b;
  });
  std::vector<double> utilisations;
  utilisations.reserve(candidates.size());
  for (const Angle angle : candidates)
    utilisations.push_back(judge.utilisation(angle));
  const double greatest = *std::ranges::max_element(utilisations);
  const auto worst = std::ranges::find_if(utilisations, [&](double utilisation) {
    return utilisation >= greatest - tieShare * std::abs(greatest) || utilisation == greatest;
  });
  const Angle angle = candidates[static_cast<std::size_t>(worst - utilisations.begin())];
  return {judge.at(angle), angle};
}

bool pullsAcross(const TurningState& state, const Band& band) {
  std::vector<Angle> candidates = {band.nominal, band.from(), band.to()};
  std::vector<Angle> turning;
  state.directionsOf(-state.circle.radius, turning);
  for (const Angle one : turning)
    candidates.push_back(nearTo(band.nominal, one));
  return std::ranges::any_of(candidates, [&](Angle angle) {
    return angle >= band.from() && angle <= band.to() && state.at(angle).across > 0;
  });
}

} // namespace planewright

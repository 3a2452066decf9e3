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

using DirectionsOfBranch = std::vector<Angle> (*)(const Branch&, const TurningState&);

/// The nominal direction, the ends and those of the branches inside, the nearest to the nominal one first.
std::vector<Angle> candidatesIn(const Judge& judge, const Band& band, DirectionsOfBranch directionsOf) {
  std::vector<Angle> candidates = {band.nominal, band.from(), band.to()};
  for (const Branch& branch : judge.branches())
    for (const Angle direction : directionsOf(branch, judge.state())) {
      const Angle angle = nearTo(band.nominal, direction);
      if (angle >= band.from() && angle <= band.to())
        candidates.push_back(angle);
    }
  std::ranges::sort(candidates, [&](Angle a, Angle b) {
    const double toA = std::abs((a - band.nominal).degrees());
    const double toB = std::abs((b - band.nominal).degrees());
    return toA != toB ? toA < toB : a < b;
  });
  return candidates;
}

std::optional<FirstInBand> firstIn(const Judge& judge, const Band& band, const WorstInBand& worst) {
  const bool isProportional = std::ranges::none_of(
      judge.branches(), [](const Branch& branch) { return std::holds_alternative<Mobilised>(branch); });
  std::optional<FirstInBand> first;
  if (worst.judgement.multiplier)
    first = {*worst.judgement.multiplier, worst.angle};
  if (isProportional)
    return first;
  for (const Angle angle : candidatesIn(judge, band, firstTouchesOf))
    if (const std::optional<double> multiplier = judge.at(angle).multiplier;
        multiplier && (!first || *multiplier < first->multiplier * (1 - tieShare)))
      first = {*multiplier, angle};
  return first;
}

} // namespace

Band bandOf(Angle nominal, Angle tolerance) {
  return {folded(nominal), std::min(tolerance, Angle::fromDegrees(90))};
}

WorstInBand worstIn(const Judge& judge, const Band& band) {
  const std::vector<Angle> candidates = candidatesIn(judge, band, turningPointsOf);
  std::vector<double> utilisations;
  utilisations.reserve(candidates.size());
  for (const Angle angle : candidates)
    utilisations.push_back(judge.utilisation(angle));
  const double greatest = *std::ranges::max_element(utilisations);
  const auto worst = std::ranges::find_if(utilisations, [&](double utilisation) {
    return utilisation >= greatest - tieShare * std::abs(greatest) || utilisation == greatest;
  });
  const Angle angle = candidates[static_cast<std::size_t>(worst - utilisations.begin())];
  WorstInBand found{judge.at(angle), angle, std::nullopt};
  found.first = firstIn(judge, band, found);
  return found;
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

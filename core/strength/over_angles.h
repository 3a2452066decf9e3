// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/judge.h"

#include <span>

namespace planewright {

/// The judges of all combinations that one check looks at; all of one criterion. Angles are those of the
/// line, or of the plane's normal.
using Judges = std::span<const Judge>;

/// The greatest utilisation of all combinations in a direction.
double greatestUtilisation(Judges judges, Angle direction);

/// Directions in which no combination exceeds the limit, `from` folded and `to` at most a half turn beyond
/// it.
struct Within {
  Angle from;
  Angle to;
  bool operator==(const Within&) const = default;
};
/// All of them, from the least `from` on; the half turn [-90, 90] where every direction is within. Ends are
/// where the utilisation crosses the limit, to the last digits of a double; what is narrower than coinciding
/// directions are apart is left out.
std::vector<Within> withinLimit(Judges judges);

/// The greatest tolerance that keeps every direction round the nominal one within the limit: none where the
/// nominal one is not, 90 deg where all are.
std::optional<Angle> allowedTolerance(std::span<const Within> within, Angle nominal);

/// The direction with the least utilisation over all combinations, to 1e-9 deg: numeric, since it has no
/// closed form for several combinations.
struct BestDirection {
  Angle angle;
  double utilisation = 0;
  bool operator==(const BestDirection&) const = default;
};
BestDirection bestDirection(Judges judges);

/// Change of the greatest utilisation per degree of the direction; at a corner that of the steeper side.
/// Differences over 1e-3 deg: good to about 1e-7 of the utilisation, and 0 where it is no more than that.
/// None where there is no finite one.
std::optional<double> slopePerDegree(Judges judges, Angle direction);

} // namespace planewright

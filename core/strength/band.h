// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/judge.h"

namespace planewright {

/// The directions that a nominal one may have: [nominal - tolerance, nominal + tolerance], unfolded, nominal
/// folded; from a tolerance of 90 deg on the half turn round the nominal.
struct Band {
  Angle nominal;
  Angle tolerance;
  Angle from() const { return nominal - tolerance; }
  Angle to() const { return nominal + tolerance; }
  bool operator==(const Band&) const = default;
};
Band bandOf(Angle nominal, Angle tolerance);

/// The worst of a band, exact: the greatest utilisation among its ends, the nominal direction and the turning
/// points of the criterion inside it. `angle` is unfolded, inside the band; of utilisations within 1e-12 of
/// each other the one nearest to the nominal direction counts, then the smaller angle.
///
/// Where the utilisation is not proportional to the loads, as on a Coulomb plane, the direction that growing
/// loads bring to its limit first may be another: `first` has the least multiplier of the band, exact, and
/// its direction; none where no multiple of the loads brings any direction to its limit.
struct FirstInBand {
  double multiplier = 0;
  Angle angle;
  bool operator==(const FirstInBand&) const = default;
};
struct WorstInBand {
  Judgement judgement;
  Angle angle;
  std::optional<FirstInBand> first = std::nullopt;
};
WorstInBand worstIn(const Judge& judge, const Band& band);

/// Whether any direction of the band has tension across the line.
bool pullsAcross(const TurningState& state, const Band& band);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/band.h"
#include "core/study/study.h"

namespace planewright {

/// Where the factor of a strength comes from.
enum class FactorOrigin {
  none,     ///< neither durations nor a partial factor are given: 1
  given,    ///< typed as it is
  quotient, ///< duration factor over partial factor
};

/// What strengths of a material are multiplied by in one combination.
struct StrengthFactor {
  double value = 1;
  FactorOrigin origin = FactorOrigin::none;
  std::optional<Duration> duration; ///< the shortest of the combination, where durations count
  double durationFactor = 1;
  double partialFactor = 1;
  std::optional<double> betaW; ///< of a weld: its criterion divides f_u by this and by partialFactor
  bool operator==(const StrengthFactor&) const = default;
};

/// A check of a point with its texts evaluated; the same for all combinations.
struct CheckSetup {
  std::string id;
  std::string material;
  Criterion criterion = Criterion::sumOfSquares;
  std::string line;         ///< empty without one
  std::string plane;        ///< empty without one
  std::optional<Band> band; ///< of the line's angle or the plane's normal; none without either
  Parameters parameters;
  Strengths strengths; ///< as given, before any factor
  StrengthBasis basis = StrengthBasis::characteristic;
  std::vector<Text> cautions;
  bool operator==(const CheckSetup&) const = default;
};

/// What one check says of one combination. Without a problem `nominal` is the judgement at the nominal
/// direction and `worst` that at the worst of the band; both are the same for a criterion that knows no
/// direction.
struct CheckReading {
  StrengthFactor factor;
  bool hasFactor = true;          ///< false: the factors of the material do not give one for this combination
  std::optional<Problem> problem; ///< why the combination could not be judged
  Judgement nominal;
  Judgement worst;
  std::optional<Angle> worstAngle; ///< unfolded, inside the band
  /// The direction of the band that loads growing together bring to its limit first, with their multiplier;
  /// that of `worst` where the utilisation is proportional to the loads. None where no multiple does.
  std::optional<FirstInBand> first;
  std::optional<double> leastMultiplier() const {
    return first ? std::optional(first->multiplier) : std::nullopt;
  }
  Text pairing;               ///< how the basis of loads and strengths do not match; empty where they do
  std::vector<Text> cautions; ///< of this combination alone
  bool exceeds() const { return !problem && exceedsLimit(worst.utilisation); }
  bool operator==(const CheckReading&) const = default;
};

} // namespace planewright

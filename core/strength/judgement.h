// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"

namespace planewright {

/// What a state at its limit would do.
enum class Mode {
  tensionAlong,
  compressionAlong,
  tensionAcross,
  compressionAcross,
  shear,
  interaction, ///< no single ratio exceeds 0.9 of the utilisation
  tensionAtAngle,
  compressionAtAngle,
  yield,
  tension,
  compression,
  slip,
  separation,
  throat,
  normal
};
template <>
const std::vector<Named<Mode>>& namesOf<Mode>();

/// How a state stands against strengths.
struct Judgement {
  /// Demand over capacity; infinite where no finite number exists, as for tension across a plane that takes
  /// none.
  double utilisation = 0;
  /// The multiplier on all actions that brings the point to its limit; none where no multiple does.
  std::optional<double> multiplier = std::nullopt;
  std::optional<Mode> mode = std::nullopt; ///< none where the utilisation is 0
  bool unstressed = false;                 ///< all stresses of the state are 0
  bool operator==(const Judgement&) const = default;
};

/// A utilisation may exceed 1 by this much for the rounding of its inputs.
inline constexpr double exceedingFrom = 1 + 1e-9;
/// What every verdict, angle within the limit and sentence goes by; what is no number exceeds.
inline bool exceedsLimit(double utilisation) {
  return !(utilisation <= exceedingFrom);
}

} // namespace planewright

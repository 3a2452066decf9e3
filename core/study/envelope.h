// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// A stress and the state of the Readout that gives it.
struct Extreme {
  double stress = 0;
  std::size_t state = 0;
  bool operator==(const Extreme&) const = default;
};

/// What one plane carries over all states that are judged; of equals the first.
struct Envelope {
  Extreme leastNormal;
  Extreme greatestNormal;
  Extreme leastTnt;      ///< tnt with its sign
  Extreme greatestTnt;   ///< tnt with its sign
  Extreme greatestShear; ///< |tnt|
  bool operator==(const Envelope&) const = default;
};

/// None where fewer than two states are judged, which have no range.
std::optional<Envelope> envelopeOn(const Readout& readout, NormalAngle normal);

/// How many of the states are judged.
std::size_t judgedStates(const Readout& readout);

} // namespace planewright

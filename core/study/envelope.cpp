// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/envelope.h"

#include <algorithm>
#include <cmath>

namespace planewright {

std::size_t judgedStates(const Readout& readout) {
  return static_cast<std::size_t>(std::ranges::count(readout.states, true, &StateReading::judged));
}

std::optional<Envelope> envelopeOn(const Readout& readout, NormalAngle normal) {
  if (judgedStates(readout) < 2)
    return std::nullopt;
  std::optional<Envelope> envelope;
  for (std::size_t i = 0; i < readout.states.size(); ++i) {
    if (!readout.states[i].judged)
      continue;
    const Traction traction = tractionOn(readout.states[i].stress, normal);
    const double shear = std::abs(traction.tnt);
    if (!envelope)
      envelope = {{traction.sn, i}, {traction.sn, i}, {traction.tnt, i}, {traction.tnt, i}, {shear, i}};
    if (traction.sn < envelope->leastNormal.stress)
      envelope->leastNormal = {traction.sn, i};
    if (traction.sn > envelope->greatestNormal.stress)
      envelope->greatestNormal = {traction.sn, i};
    if (traction.tnt < envelope->leastTnt.stress)
      envelope->leastTnt = {traction.tnt, i};
    if (traction.tnt > envelope->greatestTnt.stress)
      envelope->greatestTnt = {traction.tnt, i};
    if (shear > envelope->greatestShear.stress)
      envelope->greatestShear = {shear, i};
  }
  return envelope;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/governing.h"

#include "core/study/envelope.h"

namespace planewright {

namespace {

Governing governing(const Readout& readout, std::size_t state, double stress) {
  return {readout.point, state, readout.states[state].combination, stress};
}

} // namespace

std::optional<GoverningStates> governingOf(const Readout& readout) {
  std::optional<GoverningStates> worst;
  for (std::size_t i = 0; i < readout.states.size(); ++i) {
    const StateReading& state = readout.states[i];
    if (!state.judged)
      continue;
    if (!worst)
      worst = {governing(readout, i, state.circle.s1), governing(readout, i, state.circle.radius)};
    if (state.circle.s1 > worst->principal.stress)
      worst->principal = governing(readout, i, state.circle.s1);
    if (state.circle.radius > worst->shear.stress)
      worst->shear = governing(readout, i, state.circle.radius);
  }
  return worst;
}

std::optional<GoverningStates> governingOf(const std::vector<Readout>& points) {
  std::optional<GoverningStates> worst;
  for (const Readout& readout : points) {
    const std::optional<GoverningStates> here = governingOf(readout);
    if (!worst)
      worst = here;
    if (!here)
      continue;
    if (here->principal.stress > worst->principal.stress)
      worst->principal = here->principal;
    if (here->shear.stress > worst->shear.stress)
      worst->shear = here->shear;
  }
  return worst;
}

Governs governs(const Readout& readout, const StateReading& state) {
  const std::optional<GoverningStates> worst = governingOf(readout);
  if (!worst || !state.judged || judgedStates(readout) < 2)
    return {};
  return {state.circle.s1 == worst->principal.stress, state.circle.radius == worst->shear.stress};
}

} // namespace planewright

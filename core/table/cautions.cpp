// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/cautions.h"

#include <algorithm>

namespace planewright {

std::vector<Text> cautionsOf(const StateReading& state) {
  std::vector<Text> cautions;
  for (const std::string& id : state.missing)
    cautions.push_back(PW_TEXT("Readout", "No stresses are given for case %1: it counts as 0.").with(id));
  return cautions;
}

std::vector<Text> cautionsOf(const Readout& readout) {
  std::vector<Text> cautions;
  for (const StateReading& state : readout.states)
    for (const Text& caution : cautionsOf(state))
      if (std::ranges::find(cautions, caution) == cautions.end())
        cautions.push_back(caution);
  return cautions;
}

} // namespace planewright

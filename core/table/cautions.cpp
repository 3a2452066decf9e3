// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/cautions.h"

#include <algorithm>

namespace planewright {

namespace {

void addNew(std::vector<Text>& cautions, const std::vector<Text>& more) {
  for (const Text& caution : more)
    if (std::ranges::find(cautions, caution) == cautions.end())
      cautions.push_back(caution);
}

} // namespace

std::vector<Text> cautionsOf(const Readout& readout, const StateReading& state) {
  std::vector<Text> cautions;
  for (const std::string& id : missingCases(readout, state))
    cautions.push_back(PW_TEXT("Readout", "No stresses are given for case %1: it counts as 0.").with(id));
  for (const ActingCase& acting : state.acting)
    addNew(cautions, readout.cases[acting.index].cautions);
  return cautions;
}

std::vector<Text> cautionsOf(const Readout& readout) {
  std::vector<Text> cautions;
  for (const StateReading& state : readout.states)
    addNew(cautions, cautionsOf(readout, state));
  return cautions;
}

} // namespace planewright

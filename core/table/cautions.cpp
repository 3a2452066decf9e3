// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/cautions.h"

#include "core/study/envelope.h"
#include "core/table/few_names.h"

#include <algorithm>

namespace planewright {

namespace {

void addNew(std::vector<Text>& cautions, const std::vector<Text>& more) {
  for (const Text& caution : more)
    if (std::ranges::find(cautions, caution) == cautions.end())
      cautions.push_back(caution);
}

/// A case is easily left out when combinations are written by hand.
std::vector<Text> ofUnusedCases(const Readout& readout) {
  std::vector<bool> isUsed(readout.cases.size());
  for (const StateReading& state : readout.states)
    if (state.judged)
      for (const ActingCase& acting : state.acting)
        isUsed[acting.index] = true;
  std::vector<Text> cautions;
  for (std::size_t i = 0; i < readout.cases.size(); ++i) {
    const CaseReading& one = readout.cases[i];
    if (!isUsed[i] && one.isListed && (one.scale != 0 || one.sz != 0))
      cautions.push_back(
          PW_TEXT("Readout", "Case %1 has stresses here, but no combination has it.").with(one.id));
  }
  return cautions;
}

std::vector<Text> ofState(const Readout& readout, const StateReading& state) {
  std::vector<Text> cautions;
  if (!state.factors.empty())
    cautions.push_back(misnamed(state.combination, state.factors));
  for (const std::string& id : missingCases(readout, state))
    cautions.push_back(PW_TEXT("Readout", "No stresses are given for case %1: it counts as 0.").with(id));
  for (const ActingCase& acting : state.acting)
    addNew(cautions, readout.cases[acting.index].cautions);
  return cautions;
}

} // namespace

Text misnamed(const std::string& name, const std::string& factors) {
  return PW_TEXT("Readout", "The name “%1” says other factors than the combination has: %2.")
      .with(name)
      .with(factors);
}

std::vector<Text> cautionsOf(const Readout& readout, const StateReading& state) {
  std::vector<Text> cautions = ofState(readout, state);
  addNew(cautions, ofUnusedCases(readout));
  return cautions;
}

std::vector<Text> cautionsOf(const Readout& readout) {
  std::vector<Text> cautions;
  for (const StateReading& state : readout.states)
    if (state.judged)
      addNew(cautions, ofState(readout, state));
  addNew(cautions, ofUnusedCases(readout));
  return cautions;
}

std::vector<Text> cautionsOfEnvelope(const Readout& readout) {
  if (judgedStates(readout) < 2)
    return {};
  std::vector<std::string> names;
  for (const StateReading& state : readout.states) {
    if (!state.judged || state.acting.empty() || missingCases(readout, state).size() < state.acting.size())
      continue;
    names.push_back(state.combination);
  }
  if (names.empty())
    return {};
  return {PW_TEXT("Readout", "Least and greatest values count 0 for %1: none of its cases is listed here.")
              .with(fewOf(names))};
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/stress_form.h"

#include "core/quantity/format.h"
#include "core/study/place.h"

#include <algorithm>
#include <cmath>

namespace planewright {

Unit stressUnitOf(const Study& study) {
  return entryKindOf(study, Spot::sx).unit;
}

std::string StressForm::shown(double stress) const {
  return shownNumber(inUnit(stress), decimals);
}

namespace {

// A radius lost in cancellation shows no digits that mean nothing.
double largestIn(const StateReading& state) {
  return std::max({std::abs(state.circle.s1), std::abs(state.circle.s2), std::abs(state.sz)});
}

StressForm formFor(const Study& study, double largest) {
  const Unit unit = stressUnitOf(study);
  const int significant = 3 + static_cast<int>(study.convention.digits);
  return {unit, decimalsFor(unit.fromBase(largest), significant)};
}

} // namespace

StressForm stressFormOf(const Study& study, const StateReading& state) {
  return formFor(study, largestIn(state));
}

StressForm stressFormOf(const Study& study, const Readout& readout) {
  double largest = 0;
  for (const StateReading& state : readout.states)
    if (state.judged)
      largest = std::max(largest, largestIn(state));
  return formFor(study, largest);
}

std::string shownStress(const Study& study, const StateReading& state, double stress) {
  return stressFormOf(study, state).shown(stress);
}

double inStressUnit(const Study& study, double stress) {
  return stressUnitOf(study).fromBase(stress);
}

} // namespace planewright

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

// A radius lost in cancellation shows no digits that mean nothing.
StressForm stressFormOf(const Study& study, const StateReading& state) {
  const Circle& circle = state.circle;
  const double largest = std::max({std::abs(circle.s1), std::abs(circle.s2), std::abs(state.sz)});
  const Unit unit = stressUnitOf(study);
  return {unit, decimalsFor(unit.fromBase(largest))};
}

std::string shownStress(const Study& study, const StateReading& state, double stress) {
  return stressFormOf(study, state).shown(stress);
}

double inStressUnit(const Study& study, double stress) {
  return stressUnitOf(study).fromBase(stress);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/line_criteria.h"
#include "core/strength/written_parts.h"

#include <cmath>

namespace planewright {

namespace {

const Formula first = Formula::symbol(stress_symbol::greatest);
const Formula second = Formula::symbol(stress_symbol::middle);
const Formula third = Formula::symbol(stress_symbol::least);
const Formula atFailure = Formula::symbol("r_{f}");

void addVonMises(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const Formula squares = power(first - second, 2) + power(second - third, 2) + power(third - first, 2);
  const Formula equivalent =
      steps.add({PW_TEXT("Working", "equivalent stress"), "σ_{v}", root(squares / 2),
                 misesOf(principalsOf(strengths.demand())), dimension::stress, rowOf(at.criterion).source});
  addUtilisationStep(at, steps, equivalent / strengths.of(StrengthKey::tension));
}

void addMohrCoulomb(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const double resistance =
      radiusAtFailure(strengths.valueOf(StrengthKey::cohesion), strengths.valueOf(StrengthKey::friction),
                      principalsOf(strengths.demand()));
  const Formula cohesion = strengths.of(StrengthKey::cohesion);
  const Formula friction = strengths.of(StrengthKey::friction);
  steps.add({PW_TEXT("Working", "radius of the circle at the line of failure"), "r_{f}",
             cohesion * cosine(friction) - (first + third) / 2 * sine(friction), resistance,
             dimension::stress, rowOf(at.criterion).source});
  if (resistance > 0)
    addUtilisationStep(at, steps, (first - third) / 2 / atFailure);
}

} // namespace

void addPrincipalUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  using enum StrengthKey;
  switch (at.criterion) {
  case Criterion::tresca:
    return addUtilisationStep(at, steps, (first - third) / strengths.of(tension));
  case Criterion::rankine: {
    const Formula pulls = first / strengths.of(tension);
    return addUtilisationStep(at, steps, greatest({pulls, -third / strengths.of(compression)}));
  }
  case Criterion::mohrCoulomb:
    return addMohrCoulomb(at, steps, strengths);
  default:
    return addVonMises(at, steps, strengths);
  }
}

void addMohrCoulombMultiplier(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const Formula cohesion = strengths.of(StrengthKey::cohesion);
  const Formula friction = strengths.of(StrengthKey::friction);
  addMultiplierStep(
      at, steps, cohesion * cosine(friction) / ((first - third) / 2 + (first + third) / 2 * sine(friction)));
}

} // namespace planewright

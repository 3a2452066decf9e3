// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/written_parts.h"

#include <cmath>

namespace planewright {

namespace {

const Formula normal = Formula::symbol(stress_symbol::normal);
const Formula shear = Formula::symbol(stress_symbol::planeShear);
const Formula resists = Formula::symbol("τ_{R}");

/// Friction and cohesion against the shear: positive only where a ratio makes sense.
double addResistance(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const auto& plane = std::get<Mobilised>(at.judge.branches().front());
  const double resistance = resistanceOf(plane, at.judge.state(), at.direction);
  const Formula cohesion = strengths.of(StrengthKey::cohesion);
  const Formula friction = strengths.of(StrengthKey::friction);
  steps.add({PW_TEXT("Working", "shear that the plane resists"), "τ_{R}",
             cohesion - normal * tangent(friction), resistance, dimension::stress,
             rowOf(at.criterion).source});
  return resistance;
}

void addCoulomb(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const double resistance = addResistance(at, steps, strengths);
  if (!(resistance > 0) || !std::isfinite(at.judgement.utilisation))
    return;
  const Formula slip = absolute(shear) / resists;
  if (at.judge.state().at(at.direction).along <= 0)
    return addUtilisationStep(at, steps, slip);
  addUtilisationStep(at, steps, greatest({slip, normal / strengths.of(StrengthKey::cutoff)}));
}

void addThroat(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const double fu = strengths.valueOf(StrengthKey::fu);
  const double gamma = strengths.valueOf(StrengthKey::gammaM2);
  const Text& source = rowOf(at.criterion).source;
  const Formula ofFu = strengths.of(StrengthKey::fu);
  const Formula ofBeta = strengths.of(StrengthKey::betaW);
  const Formula ofGamma = strengths.of(StrengthKey::gammaM2);
  const Formula combined =
      steps.addStrength({PW_TEXT("Working", "limit of the combined stress in the throat"), "f_{eq,d}",
                         ofFu / (ofBeta * ofGamma), fu / (strengths.valueOf(StrengthKey::betaW) * gamma),
                         dimension::stress, source});
  const Formula across =
      steps.addStrength({PW_TEXT("Working", "limit of the normal stress on the throat"), "f_{n,d}",
                         0.9 * ofFu / ofGamma, 0.9 * fu / gamma, dimension::stress, source});
  addUtilisationStep(
      at, steps,
      greatest({root(power(normal, 2) + 3 * power(shear, 2)) / combined, absolute(normal) / across}));
}

void addBond(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const Formula slides = shear / strengths.of(StrengthKey::shear);
  if (at.judge.state().at(at.direction).along < 0)
    return addUtilisationStep(at, steps, absolute(shear) / strengths.of(StrengthKey::shear));
  addUtilisationStep(at, steps, hypotenuse(normal / strengths.of(StrengthKey::tension), slides));
}

} // namespace

void addPlaneUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  if (at.criterion == Criterion::coulomb)
    return addCoulomb(at, steps, strengths);
  return at.criterion == Criterion::throat ? addThroat(at, steps, strengths) : addBond(at, steps, strengths);
}

void addCoulombMultiplier(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const TurningState& state = at.judge.state();
  const Formula slips = strengths.of(StrengthKey::cohesion) /
                        (absolute(shear) + normal * tangent(strengths.of(StrengthKey::friction)));
  const bool canSlip = multiplierOf(at.judge.branches()[0], state, at.direction).has_value();
  const bool canPart = multiplierOf(at.judge.branches()[1], state, at.direction).has_value();
  if (!canPart)
    return addMultiplierStep(at, steps, slips);
  const Formula parts = strengths.of(StrengthKey::cutoff) / normal;
  addMultiplierStep(at, steps, canSlip ? least({slips, parts}) : parts);
}

} // namespace planewright

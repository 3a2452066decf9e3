// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/line_criteria.h"
#include "core/strength/written_parts.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

const Formula stress = Formula::symbol(stress_symbol::uniaxial);
const Formula alpha = Formula::symbol(stress_symbol::toLine);

/// The strength at an angle, as the program's own utilisation of a stress of 1 MPa has it.
double strengthAtAngle(const WrittenCriterion& at) {
  PowerOfAngle unit = std::get<PowerOfAngle>(at.judge.branches().front());
  unit.size = 1;
  return 1 / utilisationOf(unit, at.judge.state(), at.direction);
}

std::string symbolAtAngle(const WrittenStrengths& strengths, bool pulls) {
  if (strengths.kind() != MaterialKind::timber)
    return strengths.derived(pulls ? "N_{t}" : "N_{c}");
  return strengths.derived(pulls ? "f_{t,α}" : "f_{c,α}");
}

void addAtAngle(const WrittenCriterion& at, CheckSteps& steps, const WrittenStrengths& strengths, bool pulls,
                const Formula& formula) {
  const Formula N =
      steps.add({PW_TEXT("Working", "strength at the angle α to the line"), symbolAtAngle(strengths, pulls),
                 formula, strengthAtAngle(at), dimension::stress, rowOf(at.criterion).source});
  addUtilisationStep(at, steps, absolute(stress) / N);
}

void addHankinson(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths, bool pulls) {
  const Formula P = strengths.along(pulls);
  const Formula Q = strengths.across(pulls);
  const auto& given = at.parameters.n;
  const Formula n = given ? steps.put("n", *given, dimension::none) : Formula(2);
  addAtAngle(at, steps, strengths, pulls, P * Q / (P * power(sine(alpha), n) + Q * power(cosine(alpha), n)));
}

void addCompressionAtAngle(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const Formula P = strengths.of(StrengthKey::alongCompression);
  const Formula Q = strengths.of(StrengthKey::acrossCompression);
  const Formula k = steps.put("k_{c,90}", at.parameters.kc90.value_or(1), dimension::none);
  addAtAngle(at, steps, strengths, false,
             P / (P / (k * Q) * power(sine(alpha), 2) + power(cosine(alpha), 2)));
}

/// Whether a state is so nearly uniaxial and so little across the grain that the form of the code, which
/// knows the stress along the grain alone, gives the digits of the sum of squares that it comes from.
bool hasFormOfCode(const Circle& circle, Angle toLine) {
  constexpr double uniaxial = 1e-9;
  constexpr double steepest = 45; // deg; tan grows without bound
  const auto [less, more] = std::minmax({std::abs(circle.s1), std::abs(circle.s2)});
  return less <= uniaxial * more && toLine.degrees() <= steepest;
}

void addTaperedEdge(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths, bool pulls,
                    Angle toLine) {
  const Formula X = strengths.of(StrengthKey::alongBending);
  const Formula Y = strengths.across(pulls);
  const Formula S = taperShearFactor(pulls) * strengths.of(StrengthKey::shear);
  const Formula s1 = Formula::symbol(stress_symbol::along);
  const Formula s2 = Formula::symbol(stress_symbol::across);
  const Formula t = Formula::symbol(stress_symbol::shear);
  if (!hasFormOfCode(at.judge.state().circle, toLine))
    return addUtilisationStep(at, steps, root(power(s1 / X, 2) + power(s2 / Y, 2) + power(t / S, 2)));
  const double tangentOf = cosSin(toLine).sin / cosSin(toLine).cos;
  const double f = strengths.valueOf(StrengthKey::alongBending);
  const double ratioS = f * tangentOf / (taperShearFactor(pulls) * strengths.valueOf(StrengthKey::shear));
  const double ratioY =
      f * tangentOf * tangentOf /
      strengths.valueOf(pulls ? StrengthKey::acrossTension : StrengthKey::acrossCompression);
  const Formula k =
      steps.add({PW_TEXT("Working", "factor of the tapered edge"), "k_{m,α}",
                 1 / root(1 + power(X / S * tangent(alpha), 2) + power(X / Y * power(tangent(alpha), 2), 2)),
                 1 / std::hypot(1, ratioS, ratioY), dimension::none, rowOf(at.criterion).source});
  addUtilisationStep(at, steps, absolute(s1) / (k * X));
}

} // namespace

void addUniaxialUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const Circle& circle = at.judge.state().circle;
  if (!circle.theta1) // nothing acts, so there is no angle
    return;
  const bool pulls = circle.mean >= 0;
  const NormalAngle axis = pulls ? *circle.theta1 : *circle.theta2();
  if (at.criterion == Criterion::hankinson)
    return addHankinson(at, steps, strengths, pulls);
  if (at.criterion == Criterion::compressionAtAngle)
    return addCompressionAtAngle(at, steps, strengths);
  addTaperedEdge(at, steps, strengths, pulls, apart(axis.value, at.direction));
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/written_parts.h"

#include <algorithm>

namespace planewright {

namespace {

const Formula s1 = Formula::symbol(stress_symbol::along);
const Formula s2 = Formula::symbol(stress_symbol::across);
const Formula t = Formula::symbol(stress_symbol::shear);

/// The strengths of the signs that act.
struct Acting {
  Formula X, Y, S;
  Formula squares() const { return power(s1 / X, 2) + power(s2 / Y, 2) + power(t / S, 2); }
  /// The squares with a product term over X1 X2, in the order of the published forms.
  Formula squaresLess(const Formula& product) const {
    return power(s1 / X, 2) - product + power(s2 / Y, 2) + power(t / S, 2);
  }
  std::vector<Formula> ratios() const { return {absolute(s1) / X, absolute(s2) / Y, absolute(t) / S}; }
};

Acting actingOn(const LineStress& s, WrittenStrengths& strengths) {
  const Formula X = strengths.along(s.along >= 0);
  const Formula Y = strengths.across(s.across >= 0);
  return {X, Y, strengths.of(StrengthKey::shear)};
}

/// Strengths of both signs, for forms with terms linear in the stresses.
struct BothSigns {
  Formula Xt, Xc, Yt, Yc, S;
  Formula linear() const { return (1 / Xt - 1 / Xc) * s1 + (1 / Yt - 1 / Yc) * s2; }
  /// The quadratic terms with the product of s1 and s2 given.
  Formula quadratic(const Formula& withProduct) const {
    return withProduct + power(s2, 2) / (Yt * Yc) + power(t / S, 2);
  }
};

BothSigns bothSigns(WrittenStrengths& strengths) {
  const Formula Xt = strengths.along(true);
  const Formula Xc = strengths.along(false);
  const Formula Yt = strengths.across(true);
  const Formula Yc = strengths.across(false);
  return {Xt, Xc, Yt, Yc, strengths.of(StrengthKey::shear)};
}

/// a, b and the root of u^2 = b u + a that loses no digits.
void addQuadratic(const WrittenCriterion& at, CheckSteps& steps, const Text& name, const Formula& quadratic,
                  const Formula& linear) {
  const LoadTerms terms =
      termsOf(std::get<SignedForm>(at.judge.branches().front()), at.judge.state().at(at.direction));
  const Text& source = rowOf(at.criterion).source;
  const Formula a = steps.add({name, "a", quadratic, std::max(terms.a, 0.0), dimension::none, source});
  const Formula b = steps.add(
      {PW_TEXT("Working", "terms linear in the stresses"), "b", linear, terms.b, dimension::none, source});
  const Formula spread = root(power(b, 2) + 4 * a);
  addUtilisationStep(at, steps, terms.b >= 0 ? (b + spread) / 2 : 2 * a / (spread - b));
}

void addHoffman(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const BothSigns f = bothSigns(strengths);
  const Formula along = power(s1, 2) / (f.Xt * f.Xc) - s1 * s2 / (f.Xt * f.Xc);
  addQuadratic(at, steps, PW_TEXT("Working", "terms quadratic in the stresses"), f.quadratic(along),
               f.linear());
}

Formula givenF12(const WrittenCriterion& at, CheckSteps& steps, const WrittenStrengths& strengths) {
  Formula given = steps.put("F_{12}", *at.parameters.F12, dimension::inverseSquareStress);
  if (!strengths.factor())
    return given;
  return steps.addStrength({PW_TEXT("Working", "product coefficient of the strengths times the factor"),
                            strengths.derived("F_{12}"), given / power(Formula::symbol("k"), 2),
                            *forStrengthsTimes(*strengths.factor(), at.parameters).F12,
                            dimension::inverseSquareStress, rowOf(at.criterion).source});
}

void addTsaiWu(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  const BothSigns f = bothSigns(strengths);
  const Formula square = power(s1, 2) / (f.Xt * f.Xc);
  const bool given = at.parameters.F12.has_value();
  const Formula along = given ? square + 2 * givenF12(at, steps, strengths) * s1 * s2
                              : square - s1 * s2 / root(f.Xt * f.Xc * f.Yt * f.Yc);
  addQuadratic(at, steps,
               given
                   ? PW_TEXT("Working", "terms quadratic in the stresses")
                   : PW_TEXT("Working", "terms quadratic in the stresses, with F_{12} = −√(F_{11} F_{22})/2"),
               f.quadratic(along), f.linear());
}

Formula signedForm(const WrittenCriterion& at, WrittenStrengths& strengths) {
  const LineStress s = at.judge.state().at(at.direction);
  const Acting f = actingOn(s, strengths);
  const std::vector<Formula> ratios = f.ratios();
  switch (at.criterion) {
  case Criterion::maximumStress:
    return greatest(ratios);
  case Criterion::linearSum:
    return ratios[0] + ratios[1] + ratios[2];
  case Criterion::norrisPlane:
    return root(f.squaresLess(s1 * s2 / (f.X * f.Y)));
  case Criterion::norrisThreePlane:
    return greatest({root(f.squaresLess(s1 * s2 / (f.X * f.Y))), ratios[0], ratios[1]});
  case Criterion::azziTsai:
    return root(f.squaresLess(s1 * s2 / power(f.X, 2)));
  case Criterion::azziTsaiTwoSign:
    return root(f.squaresLess(s1 * s2 / power(strengths.along(s.across >= 0), 2)));
  default:
    return root(f.squares());
  }
}

} // namespace

void addLineUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths) {
  if (at.criterion == Criterion::hoffman)
    return addHoffman(at, steps, strengths);
  if (at.criterion == Criterion::tsaiWu)
    return addTsaiWu(at, steps, strengths);
  addUtilisationStep(at, steps, signedForm(at, strengths));
}

} // namespace planewright

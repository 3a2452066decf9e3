// SPDX-License-Identifier: GPL-3.0-or-later
// Each criterion of the line's axes beside an evaluation of its published equation in long double: the load
// multiplier is found by halving, from the index alone.
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {
namespace {

using Real = long double;

struct Published {
  Criterion criterion;
  Real Xt, Xc, Yt, Yc, S;

  /// Left side of the published limit; 1 at the limit.
  Real index(Real s1, Real s2, Real t) const {
    const Real X = s1 >= 0 ? Xt : Xc;
    const Real Y = s2 >= 0 ? Yt : Yc;
    const Real squares = (s1 / X) * (s1 / X) + (s2 / Y) * (s2 / Y) + (t / S) * (t / S);
    switch (criterion) {
    case Criterion::maximumStress:
      return std::max({std::abs(s1) / X, std::abs(s2) / Y, std::abs(t) / S});
    case Criterion::sumOfSquares:
      return squares;
    case Criterion::norrisPlane:
      return squares - s1 * s2 / (X * Y);
    case Criterion::norrisThreePlane:
      return std::max({squares - s1 * s2 / (X * Y), std::abs(s1) / X, std::abs(s2) / Y});
    case Criterion::azziTsai:
      return squares - s1 * s2 / (X * X);
    case Criterion::azziTsaiTwoSign: {
      const Real X2 = s2 >= 0 ? Xt : Xc;
      return squares - s1 * s2 / (X2 * X2);
    }
    case Criterion::hoffman:
      return s1 * s1 / (Xt * Xc) - s1 * s2 / (Xt * Xc) + s2 * s2 / (Yt * Yc) + (1 / Xt - 1 / Xc) * s1 +
             (1 / Yt - 1 / Yc) * s2 + (t / S) * (t / S);
    case Criterion::tsaiWu: {
      const Real F11 = 1 / (Xt * Xc);
      const Real F22 = 1 / (Yt * Yc);
      return (1 / Xt - 1 / Xc) * s1 + (1 / Yt - 1 / Yc) * s2 + F11 * s1 * s1 + F22 * s2 * s2 +
             t * t / (S * S) + 2 * (-0.5L * std::sqrt(F11 * F22)) * s1 * s2;
    }
    default:
      return std::abs(s1) / X + std::abs(s2) / Y + std::abs(t) / S;
    }
  }

  Real multiplier(const LineStress& s) const {
    Real low = 0;
    Real high = 1;
    while (index(high * s.along, high * s.across, high * s.shear) < 1)
      high *= 2;
    for (int i = 0; i < 200; ++i) {
      const Real middle = (low + high) / 2;
      (index(middle * s.along, middle * s.across, middle * s.shear) < 1 ? low : high) = middle;
    }
    return (low + high) / 2;
  }
};

Published published(Criterion criterion, const Strengths& f) {
  using enum StrengthKey;
  return {criterion,         *f[alongTension],      *f[alongCompression],
          *f[acrossTension], *f[acrossCompression], *f[shear]};
}

RC_GTEST_PROP(LineCriteria, areTheirPublishedEquations, ()) {
  const Criterion criterion = *anyLineCriterion();
  const Strengths f = *anyLineStrengths();
  const PlaneStress stress = *anyStress();
  const Angle angle = *anyAngle();
  RC_PRE(scaleOf(stress) > 0);
  const auto judge = Judge::of(criterion, f, {}, demandOf(stress));
  RC_ASSERT(judge.has_value());
  const LineStress s = judge->state().at(angle);
  RC_PRE(s.along != 0 || s.across != 0 || s.shear != 0);
  const Judgement judgement = judge->at(angle);
  RC_ASSERT(judgement.multiplier.has_value());
  const auto expected = static_cast<double>(published(criterion, f).multiplier(s));
  RC_ASSERT(std::abs(*judgement.multiplier - expected) <= 1e-12 * expected);
  RC_ASSERT(std::abs(judgement.utilisation * *judgement.multiplier - 1) <= 1e-14);
}

/// Left side of the limit of a criterion of one stress s at an angle to the line, from the stresses in the
/// line's axes; 1 at the limit.
Real indexOfOneStress(Criterion criterion, const Strengths& f, const Parameters& parameters, Real s,
                      Real degrees) {
  using enum StrengthKey;
  const Real angle = degrees * std::acos(-1.0L) / 180;
  const Real sine = std::abs(std::sin(angle));
  const Real cosine = std::abs(std::cos(angle));
  const bool pulls = s >= 0;
  const Real across = pulls ? *f[acrossTension] : *f[acrossCompression];
  if (criterion == Criterion::taperedEdge) {
    const Real S = (pulls ? 0.75L : 1.5L) * *f[StrengthKey::shear];
    const Real sum = std::pow(s * cosine * cosine / *f[alongBending], 2) +
                     std::pow(s * sine * sine / across, 2) + std::pow(s * sine * cosine / S, 2);
    return std::sqrt(sum);
  }
  const bool isOfCode = criterion == Criterion::compressionAtAngle;
  const Real P = pulls ? *f[alongTension] : *f[alongCompression];
  const Real Q = isOfCode ? across * parameters.kc90.value_or(1) : across;
  const Real n = isOfCode ? 2 : parameters.n.value_or(2);
  const Real N = P * Q / (P * std::pow(sine, n) + Q * std::pow(cosine, n));
  return std::abs(s) / N;
}

RC_GTEST_PROP(UniaxialCriteria, areTheirPublishedEquations, ()) {
  const Criterion criterion =
      *rc::gen::element(Criterion::hankinson, Criterion::compressionAtAngle, Criterion::taperedEdge);
  const Strengths f = anyStrengthsFor(criterion);
  const double size = *anyComponent();
  RC_PRE(size != 0);
  const double s = criterion == Criterion::compressionAtAngle ? -std::abs(size) : size;
  // In the axes of its own stress, so that no rounding of a turn is in the way.
  const Parameters parameters{*rc::gen::element(1.5, 2.0, 3.0), {}, *rc::gen::element(1.0, 1.5), Angle()};
  const Angle angle = *anyAngle();
  const Judgement judgement = Judge::of(criterion, f, parameters, demandOf({s, 0, 0}))->at(angle);
  const auto expected = static_cast<double>(indexOfOneStress(criterion, f, parameters, s, angle.degrees()));
  RC_ASSERT(std::abs(judgement.utilisation - expected) <= 1e-12 * expected);
  RC_ASSERT(std::abs(judgement.utilisation * *judgement.multiplier - 1) <= 1e-14);
}

/// Principal stresses in long double, greatest first.
std::array<Real, 3> principalsInLongDouble(const Demand& demand) {
  const PlaneStress& s = demand.stress;
  const Real mean = (static_cast<Real>(s.sx) + s.sy) / 2;
  const Real radius = std::hypot((static_cast<Real>(s.sx) - s.sy) / 2, static_cast<Real>(s.txy));
  std::array<Real, 3> all = {mean + radius, mean - radius, demand.sz};
  std::ranges::sort(all, std::greater());
  return all;
}

RC_GTEST_PROP(PrincipalCriteria, areTheirPublishedEquations, ()) {
  using enum StrengthKey;
  const Criterion criterion =
      *rc::gen::element(Criterion::vonMises, Criterion::tresca, Criterion::rankine, Criterion::mohrCoulomb);
  const Strengths f = anyStrengthsFor(criterion);
  Demand demand = demandOf(*anyStress());
  demand.sz = *anyComponent();
  const auto [a, b, c] = principalsInLongDouble(demand);
  const Real scale = std::max({std::abs(a), std::abs(c), Real(1e-3)});
  const Judgement judgement = Judge::of(criterion, f, {}, demand)->at({});
  const auto isNear = [&](double value, Real expected, Real strength) {
    return std::abs(value - expected) <= 1e-13L * scale / strength + 1e-12L * std::abs(expected);
  };
  const Real ft = *f[tension];
  if (criterion == Criterion::vonMises)
    RC_ASSERT(isNear(judgement.utilisation,
                     std::sqrt(((a - b) * (a - b) + (b - c) * (b - c) + (c - a) * (c - a)) / 2) / ft, ft));
  if (criterion == Criterion::tresca)
    RC_ASSERT(isNear(judgement.utilisation, (a - c) / ft, ft));
  if (criterion == Criterion::rankine) {
    const Real fc = *f[compression];
    RC_ASSERT(isNear(judgement.utilisation, std::max({a / ft, -c / fc, Real(0)}), std::min(ft, fc)));
  }
  if (criterion != Criterion::mohrCoulomb)
    return;
  const Real phi = static_cast<Real>(*f[friction]) * std::acos(-1.0L) / 180;
  const Real resists = *f[cohesion] * std::cos(phi) - (a + c) / 2 * std::sin(phi);
  const Real grows = (a - c) / 2 + (a + c) / 2 * std::sin(phi);
  RC_PRE(std::abs(resists) > 1e-6L * scale && std::abs(grows) > 1e-6L * scale);
  if (resists > 0)
    RC_ASSERT(std::abs(judgement.utilisation - (a - c) / 2 / resists) <=
              1e-8L * std::max(Real(1), (a - c) / 2 / resists));
  else
    RC_ASSERT(std::isinf(judgement.utilisation));
  RC_ASSERT(judgement.multiplier.has_value() == (grows > 0));
  if (grows > 0)
    RC_ASSERT(std::abs(*judgement.multiplier - *f[cohesion] * std::cos(phi) / grows) <=
              1e-8L * *judgement.multiplier);
}

RC_GTEST_PROP(PlaneCriteria, areTheirPublishedEquations, ()) {
  using enum StrengthKey;
  const Criterion criterion = *rc::gen::element(Criterion::coulomb, Criterion::throat, Criterion::bond);
  const Strengths f = anyStrengthsFor(criterion);
  const Real sn = *anyComponent();
  const Real t = *anyComponent();
  RC_PRE(sn != 0 || t != 0);
  const double utilisation =
      Judge::of(criterion, f, {}, demandOf({static_cast<double>(sn), 0, static_cast<double>(t)}))
          ->utilisation({});
  const auto isNear = [&](Real expected) {
    return std::abs(utilisation - expected) <= 1e-12L * std::abs(expected);
  };
  if (criterion == Criterion::throat) {
    const Real combined = *f[fu] / (static_cast<Real>(*f[betaW]) * *f[gammaM2]);
    RC_ASSERT(isNear(
        std::max(std::sqrt(sn * sn + 3 * t * t) / combined, std::abs(sn) / (0.9L * *f[fu] / *f[gammaM2]))));
  }
  if (criterion == Criterion::bond)
    RC_ASSERT(isNear(std::hypot(std::max(sn, Real(0)) / *f[tension], t / *f[StrengthKey::shear])));
  if (criterion != Criterion::coulomb)
    return;
  const Real slope = std::tan(static_cast<Real>(*f[friction]) * std::acos(-1.0L) / 180);
  const Real resists = *f[cohesion] - sn * slope;
  RC_PRE(std::abs(resists) > 1e-3L * std::abs(sn));
  const Real limit = f[cutoff].value_or(0);
  if (resists < 0 || (sn > 0 && limit == 0))
    RC_ASSERT(std::isinf(utilisation));
  else
    RC_ASSERT(isNear(std::max(std::abs(t) / resists, sn > 0 ? sn / limit : Real(0))) ||
              std::abs(utilisation - std::abs(t) / resists) <= 1e-11L * utilisation);
}

RC_GTEST_PROP(LineCriteria, areProportionalToTheLoad, (bool doubled)) {
  const Criterion criterion = *anyLineCriterion();
  const Strengths f = *anyLineStrengths();
  const PlaneStress stress = *anyStress();
  const Angle angle = *anyAngle();
  const double factor = doubled ? 2 : 0.7;
  const auto one = Judge::of(criterion, f, {}, demandOf(stress));
  const auto more = Judge::of(criterion, f, {}, demandOf(factor * stress));
  RC_ASSERT(one && more);
  RC_ASSERT(std::abs(factor * one->utilisation(angle) - more->utilisation(angle)) <=
            1e-12 * more->utilisation(angle));
}

RC_GTEST_PROP(LineCriteria, theMultiplierTakesTheLoadOntoTheLimit, ()) {
  const Criterion criterion = *anyLineCriterion();
  const Strengths f = *anyLineStrengths();
  const PlaneStress stress = *anyStress();
  const Angle angle = *anyAngle();
  const auto judge = Judge::of(criterion, f, {}, demandOf(stress));
  const std::optional<double> multiplier = judge->at(angle).multiplier;
  RC_PRE(multiplier.has_value());
  const auto atLimit = Judge::of(criterion, f, {}, demandOf(*multiplier * stress));
  RC_ASSERT(std::abs(atLimit->utilisation(angle) - 1) <= 1e-11);
}

RC_GTEST_PROP(LineCriteria, turningStateAndLineTogetherChangesNothing, ()) {
  const Criterion criterion = *anyLineCriterion();
  const Strengths f = *anyLineStrengths();
  const PlaneStress stress = *anyStress();
  const Angle angle = *anyAngle();
  const Angle turn = *anyAngle();
  const auto judge = Judge::of(criterion, f, {}, demandOf(stress));
  const auto turned = Judge::of(criterion, f, {}, demandOf(inTurnedAxes(stress, turn)));
  RC_ASSERT(std::abs(judge->utilisation(angle) - turned->utilisation(angle - turn)) <=
            1e-11 * (1 + scaleOf(stress) / 0.01));
}

RC_GTEST_PROP(LineCriteria, areMirrored, ()) {
  const Criterion criterion = *anyLineCriterion();
  const Strengths f = *anyLineStrengths();
  const PlaneStress stress = *anyStress();
  const Angle angle = *anyAngle();
  const auto judge = Judge::of(criterion, f, {}, demandOf(stress));
  const auto mirrored = Judge::of(criterion, f, {}, demandOf({stress.sx, stress.sy, -stress.txy}));
  RC_ASSERT(std::abs(judge->utilisation(angle) - mirrored->utilisation(-angle)) <=
            1e-12 * judge->utilisation(angle));
}

TEST(QuadraticUtilisation, losesNoDigitsOnEitherSide) {
  for (const double b : {-1.0, -1e-3, -1e-10, 1e-10, 1e-3, 1.0})
    for (double a = 1e-20; a < 1e3; a *= 10) {
      const long double root = std::sqrt(static_cast<long double>(b) * b + 4.0L * a);
      const long double exact = b >= 0 ? (b + root) / 2 : 2.0L * a / (root - b);
      EXPECT_NEAR(utilisationOfQuadratic(a, b), static_cast<double>(exact),
                  1e-15 * static_cast<double>(exact))
          << a << ' ' << b;
    }
}

TEST(LineCriteria, aStateOfZeroHasNoMultiplierAndNoMode) {
  for (const Criterion criterion : criteriaFor(MaterialKind::generic)) {
    const auto judge = Judge::of(criterion, c24(), {}, demandOf({}));
    ASSERT_TRUE(judge) << wordOf(criterion);
    EXPECT_EQ(judge->at(Angle::fromDegrees(20)), (Judgement{.unstressed = true})) << wordOf(criterion);
  }
}

TEST(LineCriteria, nameTheModeByTheGreatestSingleRatio) {
  const auto mode = [](const PlaneStress& stress) {
    return *Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf(stress))->at(Angle()).mode;
  };
  EXPECT_EQ(mode({10, 0, 0.1}), Mode::tensionAlong);
  EXPECT_EQ(mode({-10, 0, 0.1}), Mode::compressionAlong);
  EXPECT_EQ(mode({1, 0.3, 0.1}), Mode::tensionAcross);
  EXPECT_EQ(mode({1, -2, 0.1}), Mode::compressionAcross);
  EXPECT_EQ(mode({1, 0, -3}), Mode::shear);
  EXPECT_EQ(mode({0, 0.2, 2}), Mode::interaction);
}

} // namespace
} // namespace planewright

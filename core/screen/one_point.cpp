// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/one_point.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

constexpr double fromX = std::numeric_limits<double>::quiet_NaN();
/// Utilisations within this share of each other are equal, as in the band of one point.
constexpr double tieShare = 1e-12;

double utilisationAt(const ScreenedForms& forms, const LineStress& stresses) {
  double greatest = 0;
  for (const SignedForm& part : forms.parts) {
    const LoadTerms terms = termsOf(part, stresses);
    greatest = std::max(greatest, utilisationOfQuadratic(terms.a, terms.b));
  }
  return greatest;
}

LineStress stressesAt(const StateOfLine& state, double X, double shear) {
  return {withoutRounding(state.mean + X, state.scale), withoutRounding(state.mean - X, state.scale),
          withoutRounding(shear, state.scale)};
}

/// The sum of a combination at a point with the size of its terms, tension positive.
Demand demandAt(const ScreenPlan& plan, const ScreenedCombination& combination, const Field& field,
                std::size_t point) {
  Demand demand;
  for (const ActingCase& acting : combination.acting) {
    const PlaneStress stress = field.stressOf(acting.index, point);
    demand.stress = demand.stress + acting.factor * stress;
    demand.scale += std::abs(acting.factor) * scaleOf(stress);
  }
  if (combination.acting.size() > 1)
    demand.stress = withoutRounding(demand.stress, demand.scale);
  if (plan.positive == Positive::compression)
    demand.stress = -1.0 * demand.stress;
  return demand;
}

} // namespace

Angle lineAt(const ScreenedCheck& check, const Field& field, std::size_t point) {
  const double own = field.lineOf(point);
  return std::isnan(own) ? check.band.nominal : folded(Angle::fromDegrees(own));
}

PointResult judgedByCore(const ScreenPlan& plan, const Field& field, std::size_t point) {
  PointResult result;
  result.utilisation = -1;
  for (std::size_t c = 0; c < plan.combinations.size(); ++c) {
    const Demand demand = demandAt(plan, plan.combinations[c], field, point);
    for (std::size_t i = 0; i < plan.checks.size(); ++i) {
      const ScreenedCheck& check = plan.checks[i];
      const double factor = check.forms[c].factor.value;
      // What a strength lacks was said when the plan was made.
      const Judge judge = *Judge::of(check.setup.criterion, factor * check.setup.strengths,
                                     forStrengthsTimes(factor, check.setup.parameters), demand);
      const Angle line = lineAt(check, field, point);
      const Band band = bandOf(line - Angle::fromDegrees(field.axesOf(point)), check.band.tolerance);
      const WorstInBand worst = worstIn(judge, band);
      if (worst.judgement.utilisation > result.utilisation) {
        result.utilisation = worst.judgement.utilisation;
        result.mode = worst.judgement.mode;
        result.combination = static_cast<std::uint32_t>(c);
        result.check = static_cast<std::uint32_t>(i);
        result.worstAngle = (line + (worst.angle - band.nominal)).degrees();
      }
    }
  }
  return result;
}

WorstFinder::WorstFinder(const ScreenedCheck& check)
    : m_tolerance(check.band.tolerance.degrees()), m_twice(cosSinOfDouble(check.band.tolerance)) {}

void WorstFinder::add(const ScreenedForms& forms, const StateOfLine& state, double X, double shear,
                      double offset) {
  m_candidates.push_back({X, shear, utilisationAt(forms, stressesAt(state, X, shear)), offset});
}

/// The direction nearest to the nominal one, of the two with this X, then the smaller; what rounding puts
/// outside of the band is its end.
double WorstFinder::offsetOf(const StateOfLine& state, double radius, double X) const {
  const double toFirst = Angle::fromRadians(std::atan2(state.shear, state.half) / 2).degrees();
  const double turn =
      Angle::fromRadians(std::atan2(std::sqrt(std::max((radius - X) * (radius + X), 0.0)), X) / 2).degrees();
  const double one = folded(Angle::fromDegrees(toFirst - turn)).degrees();
  const double other = folded(Angle::fromDegrees(toFirst + turn)).degrees();
  const double nearer = std::abs(one) != std::abs(other) ? (std::abs(one) < std::abs(other) ? one : other)
                                                         : std::min(one, other);
  return std::clamp(nearer, -m_tolerance, m_tolerance);
}

WorstOfState WorstFinder::worstOf(const ScreenedForms& forms, const StateOfLine& given) {
  StateOfLine state = given;
  double radius = std::hypot(state.half, state.shear);
  if (isRounding(radius, state.scale))
    radius = state.half = state.shear = 0;
  m_candidates.clear();
  add(forms, state, state.half, state.shear, 0);
  if (m_tolerance > 0 && radius > 0) {
    const double right = state.half * m_twice.cos - state.shear * m_twice.sin;
    const double left = state.half * m_twice.cos + state.shear * m_twice.sin;
    add(forms, state, right, state.shear * m_twice.cos + state.half * m_twice.sin, -m_tolerance);
    add(forms, state, left, state.shear * m_twice.cos - state.half * m_twice.sin, m_tolerance);
    const bool hasFirst = state.half >= radius * m_twice.cos;
    const bool hasSecond = state.half <= -radius * m_twice.cos;
    if (hasFirst)
      add(forms, state, radius, 0, fromX);
    if (hasSecond)
      add(forms, state, -radius, 0, fromX);
    const double high = hasFirst ? radius : std::max(left, right);
    const double low = hasSecond ? -radius : std::min(left, right);
    m_turns.clear();
    for (const SignedForm& part : forms.parts)
      addTurnsOf(part, state.mean, radius, m_turns);
    for (const double X : m_turns)
      if (X > low && X < high)
        add(forms, state, X, std::sqrt((radius - X) * (radius + X)), fromX);
  }
  const double greatest = std::ranges::max(m_candidates, {}, &Candidate::utilisation).utilisation;
  const Candidate* worst = nullptr;
  for (Candidate& one : m_candidates) {
    if (!(one.utilisation >= greatest - tieShare * greatest || one.utilisation == greatest))
      continue;
    if (std::isnan(one.offset))
      one.offset = offsetOf(state, radius, one.X);
    if (!worst || std::abs(one.offset) < std::abs(worst->offset) ||
        (std::abs(one.offset) == std::abs(worst->offset) && one.offset < worst->offset))
      worst = &one;
  }
  WorstOfState result{worst->utilisation, Angle::fromDegrees(worst->offset), std::nullopt};
  if (result.utilisation > 0)
    result.mode = lineModeOf(forms.strengths, stressesAt(state, worst->X, worst->shear), result.utilisation);
  return result;
}

} // namespace planewright

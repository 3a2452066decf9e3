// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/line_criteria.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

Judgement proportional(double utilisation, Mode mode) {
  if (utilisation == 0)
    return {};
  return {utilisation, 1 / utilisation, mode};
}

Result<Judgement> rankine(const Strengths& strengths, const std::array<double, 3>& s) {
  const Result<double> tension = needed(strengths, StrengthKey::tension);
  const Result<double> compression = needed(strengths, StrengthKey::compression);
  for (const Result<double>* one : {&tension, &compression})
    if (!*one)
      return tl::unexpected(one->error());
  const double pulls = std::max(s[0], 0.0) / *tension;
  const double presses = std::max(-s[2], 0.0) / *compression;
  return pulls >= presses ? proportional(pulls, Mode::tension) : proportional(presses, Mode::compression);
}

Result<Judgement> mohrCoulomb(const Strengths& strengths, const std::array<double, 3>& s) {
  const Result<double> cohesion = needed(strengths, StrengthKey::cohesion);
  const Result<double> friction = needed(strengths, StrengthKey::friction);
  for (const Result<double>* one : {&cohesion, &friction})
    if (!*one)
      return tl::unexpected(one->error());
  if (s[0] == 0 && s[2] == 0)
    return Judgement{};
  const CosSin phi = cosSin(Angle::fromDegrees(*friction));
  const double radius = s[0] / 2 - s[2] / 2;
  const double mean = s[0] / 2 + s[2] / 2;
  const double resists = radiusAtFailure(*cohesion, *friction, s);
  Judgement judgement;
  judgement.utilisation = resists > 0 ? radius / resists : std::numeric_limits<double>::infinity();
  const double grows = radius + mean * phi.sin;
  if (grows > 0)
    judgement.multiplier = *cohesion * phi.cos / grows;
  judgement.mode = Mode::shear;
  return judgement;
}

} // namespace

std::array<double, 3> principalsOf(const Demand& demand) {
  const Circle circle = circleOf(demand.stress, demand.scale, demand.sz);
  std::array<double, 3> s{circle.s1, circle.s2, demand.sz};
  const double scale = std::max(demand.scale, std::abs(demand.sz));
  for (double& one : s)
    one = withoutRounding(one, scale);
  std::ranges::sort(s, std::greater());
  return s;
}

double misesOf(const std::array<double, 3>& s) {
  return std::hypot(s[0] - s[1], s[1] - s[2], s[2] - s[0]) / std::sqrt(2.0);
}

double radiusAtFailure(double cohesion, double friction, const std::array<double, 3>& s) {
  const CosSin phi = cosSin(Angle::fromDegrees(friction));
  return cohesion * phi.cos - (s[0] / 2 + s[2] / 2) * phi.sin;
}

Result<Judgement> judgementOfPrincipals(Criterion criterion, const Strengths& strengths,
                                        const Demand& demand) {
  const std::array<double, 3> s = principalsOf(demand);
  if (criterion == Criterion::rankine)
    return rankine(strengths, s);
  if (criterion == Criterion::mohrCoulomb)
    return mohrCoulomb(strengths, s);
  const Result<double> yield = needed(strengths, StrengthKey::tension);
  if (!yield)
    return tl::unexpected(yield.error());
  return proportional((criterion == Criterion::tresca ? s[0] - s[2] : misesOf(s)) / *yield, Mode::yield);
}

} // namespace planewright

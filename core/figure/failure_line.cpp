// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/failure_line.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int steps = 48;

/// Tension positive, tnt >= 0.
using Upper = std::vector<Traction>;

double value(const Strengths& strengths, StrengthKey key) {
  return strengths[key].value_or(0);
}

Upper coulombLine(const Strengths& strengths, double reach) {
  const double cohesion = value(strengths, StrengthKey::cohesion);
  const CosSin phi = cosSin(Angle::fromDegrees(value(strengths, StrengthKey::friction)));
  const double slope = phi.sin / phi.cos;
  const double end = std::min(value(strengths, StrengthKey::cutoff), cohesion / slope);
  const auto limit = [&](double sn) { return Traction{sn, std::max(cohesion - sn * slope, 0.0)}; };
  Upper line = {limit(-reach), limit(end)};
  if (line.back().tnt > 0)
    line.push_back({end, 0});
  return line;
}

/// The arc of an ellipse with these half axes, from sn to the end of the greater sn.
void addArc(Upper& line, double from, double to, double alongSn, double alongTau) {
  for (int i = 0; i <= steps; ++i) {
    const double sn = from + (to - from) * i / steps;
    line.push_back({sn, alongTau * std::sqrt(std::max(0.0, 1 - (sn / alongSn) * (sn / alongSn)))});
  }
}

Upper throatLine(const Strengths& strengths) {
  const double combined = value(strengths, StrengthKey::fu) /
                          (value(strengths, StrengthKey::betaW) * value(strengths, StrengthKey::gammaM2));
  const double normal = 0.9 * value(strengths, StrengthKey::fu) / value(strengths, StrengthKey::gammaM2);
  const double end = std::min(combined, normal);
  Upper line = {{-end, 0}};
  addArc(line, -end, end, combined, combined / std::sqrt(3.0));
  line.push_back({end, 0});
  return line;
}

Upper bondLine(const Strengths& strengths, double reach) {
  const double fs = value(strengths, StrengthKey::shear);
  Upper line = {{-reach, fs}};
  addArc(line, 0, value(strengths, StrengthKey::tension), value(strengths, StrengthKey::tension), fs);
  return line;
}

Upper upperLine(const CheckSetup& check, const Strengths& strengths, double reach) {
  switch (check.criterion) {
  case Criterion::coulomb:
    return coulombLine(strengths, reach);
  case Criterion::throat:
    return throatLine(strengths);
  default:
    return bondLine(strengths, reach);
  }
}

std::optional<Traction> marginEndOf(const CheckSetup& check, const Strengths& strengths, const Judge& judge) {
  const LineStress at = judge.state().at(check.band->nominal);
  if (check.criterion == Criterion::coulomb) {
    const CosSin phi = cosSin(Angle::fromDegrees(value(strengths, StrengthKey::friction)));
    const double limit = value(strengths, StrengthKey::cohesion) - at.along * phi.sin / phi.cos;
    const bool pulled = at.along > value(strengths, StrengthKey::cutoff);
    return limit > 0 && !pulled ? std::optional(Traction{at.along, std::copysign(limit, at.shear)})
                                : std::nullopt;
  }
  const std::optional<double> multiplier = judge.at(check.band->nominal).multiplier;
  if (!multiplier)
    return std::nullopt;
  return Traction{*multiplier * at.along, *multiplier * at.shear};
}

} // namespace

std::vector<FailureLine> failureLinesOf(const Readout& readout, double reach) {
  std::vector<FailureLine> lines;
  double greatest = 0;
  const StateReading& state = readout.state();
  const double sense = readout.positive == Positive::tension ? 1 : -1;
  for (std::size_t i = 0; i < state.checks.size(); ++i) {
    const CheckSetup& check = readout.checks[i];
    if (check.plane.empty() || state.checks[i].problem)
      continue;
    const Strengths strengths = state.checks[i].factor.value * check.strengths;
    const Result<Judge> judge = judgeOf(readout, state, i);
    if (!judge)
      continue;
    FailureLine line;
    line.check = check.id;
    line.material = check.material;
    const double utilisation = state.checks[i].worst.utilisation;
    if (lines.empty() || utilisation > greatest) {
      for (FailureLine& other : lines)
        other.leads = false;
      line.leads = true;
      greatest = utilisation;
    }
    line.upper = upperLine(check, strengths, reach);
    line.planeAt = tractionOn(state.stress, NormalAngle{check.band->nominal});
    line.marginEnd = marginEndOf(check, strengths, *judge);
    const WorstInBand worst = worstIn(*judge, bandOf(check.band->nominal, Angle::fromDegrees(90)));
    if (std::isfinite(worst.judgement.utilisation) && worst.judgement.utilisation > 0) {
      line.touch = NormalAngle{folded(worst.angle)};
      line.touchAt = tractionOn(state.stress, *line.touch);
    }
    // The tensor of a study that counts compression positive is the negated one.
    for (Traction& at : line.upper)
      at.sn *= sense;
    if (line.marginEnd)
      line.marginEnd = Traction{sense * line.marginEnd->sn, sense * line.marginEnd->tnt};
    lines.push_back(std::move(line));
  }
  return lines;
}

} // namespace planewright

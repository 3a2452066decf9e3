// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/judge.h"

#include "core/strength/line_criteria.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double singleShare = 0.9;

struct Ratio {
  Mode mode;
  double value;
};

Ratio ratioOf(double stress, double tension, double compression, Mode pulls, Mode presses) {
  return stress >= 0 ? Ratio{pulls, stress / tension} : Ratio{presses, -stress / compression};
}

Mode governing(std::initializer_list<Ratio> ratios, double utilisation) {
  const Ratio& greatest = *std::ranges::max_element(ratios, {}, &Ratio::value);
  return greatest.value > singleShare * utilisation ? greatest.mode : Mode::interaction;
}

} // namespace

Result<Judge> Judge::of(Criterion criterion, const Strengths& strengths, const Parameters& parameters,
                        const Demand& demand) {
  Judge judge;
  judge.m_criterion = criterion;
  judge.m_strengths = strengths;
  judge.m_state = {demand.stress, circleOf(demand.stress, demand.scale, demand.sz), demand.scale};
  judge.m_isUnstressed = demand.stress == PlaneStress{} && demand.sz == 0;
  const ActsOn actsOn = rowOf(criterion).actsOn;
  if (actsOn == ActsOn::principal) {
    Result<Judgement> judgement = judgementOfPrincipals(criterion, strengths, demand);
    if (!judgement)
      return tl::unexpected(std::move(judgement).error());
    judge.m_hasDirection = false;
    judge.m_fixedMode = judgement->mode;
    judge.m_branches = {Fixed{judgement->utilisation, judgement->multiplier}};
    return judge;
  }
  Result<std::vector<Branch>> branches = actsOn == ActsOn::plane
                                             ? planeBranchesOf(criterion, strengths)
                                             : lineBranchesOf(criterion, strengths, parameters, demand);
  if (!branches)
    return tl::unexpected(std::move(branches).error());
  judge.m_branches = *std::move(branches);
  if (actsOn == ActsOn::line && demand.bendingShare != 0)
    if (const Result<LineStrengths> mixed = lineStrengthsOf(strengths, demand)) {
      judge.m_strengths[StrengthKey::alongTension] = mixed->Xt;
      judge.m_strengths[StrengthKey::alongCompression] = mixed->Xc;
    }
  return judge;
}

Parameters forStrengthsTimes(double factor, Parameters parameters) {
  if (parameters.F12)
    *parameters.F12 /= factor * factor;
  return parameters;
}

double Judge::utilisation(Angle direction) const {
  double greatest = 0;
  for (const Branch& branch : m_branches)
    greatest = std::max(greatest, utilisationOf(branch, m_state, direction));
  return greatest;
}

Judgement Judge::at(Angle direction) const {
  Judgement judgement;
  judgement.utilisation = utilisation(direction);
  judgement.unstressed = m_isUnstressed;
  for (const Branch& branch : m_branches) {
    const std::optional<double> multiplier = multiplierOf(branch, m_state, direction);
    if (multiplier && (!judgement.multiplier || *multiplier < *judgement.multiplier))
      judgement.multiplier = multiplier;
  }
  if (judgement.utilisation > 0)
    judgement.mode = modeAt(direction, judgement.utilisation);
  return judgement;
}

Mode lineModeOf(const LineStrengths& f, const LineStress& s, double utilisation) {
  return governing({ratioOf(s.along, f.Xt, f.Xc, Mode::tensionAlong, Mode::compressionAlong),
                    ratioOf(s.across, f.Yt, f.Yc, Mode::tensionAcross, Mode::compressionAcross),
                    {Mode::shear, std::abs(s.shear) / f.S}},
                   utilisation);
}

std::optional<Mode> Judge::modeAt(Angle direction, double utilisation) const {
  using enum StrengthKey;
  const LineStress s = m_state.at(direction);
  const auto f = [this](StrengthKey key) { return m_strengths[key].value_or(0); };
  switch (m_criterion) {
  case Criterion::vonMises:
  case Criterion::tresca:
  case Criterion::rankine:
  case Criterion::mohrCoulomb:
    return m_fixedMode;
  case Criterion::hankinson:
  case Criterion::compressionAtAngle:
    return m_state.circle.mean >= 0 ? Mode::tensionAtAngle : Mode::compressionAtAngle;
  case Criterion::coulomb:
    return utilisationOf(m_branches[1], m_state, direction) >= utilisation ? Mode::separation : Mode::slip;
  case Criterion::throat:
    return utilisationOf(m_branches[1], m_state, direction) >= utilisation ? Mode::normal : Mode::throat;
  case Criterion::bond:
    return governing({{Mode::separation, std::max(s.along, 0.0) / f(tension)},
                      {Mode::shear, std::abs(s.shear) / f(StrengthKey::shear)}},
                     utilisation);
  case Criterion::taperedEdge: {
    const bool pulls = m_state.circle.mean >= 0;
    return governing(
        {ratioOf(s.along, f(alongBending), f(alongBending), Mode::tensionAlong, Mode::compressionAlong),
         ratioOf(s.across, f(acrossTension), f(acrossCompression), Mode::tensionAcross,
                 Mode::compressionAcross),
         {Mode::shear, std::abs(s.shear) / (taperShearFactor(pulls) * f(StrengthKey::shear))}},
        utilisation);
  }
  default:
    return lineModeOf(
        {f(alongTension), f(alongCompression), f(acrossTension), f(acrossCompression), f(StrengthKey::shear)},
        s, utilisation);
  }
}

} // namespace planewright

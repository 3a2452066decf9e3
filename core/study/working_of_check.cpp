// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/working_of_check.h"

#include "core/strength/line_criteria.h"
#include "core/strength/written_criterion.h"
#include "core/study/case_sources.h"
#include "core/study/judge_checks.h"
#include "core/study/stress_form.h"
#include "core/study/stress_formulas.h"

#include <cmath>

namespace planewright {

namespace {

const Text common = PW_TEXT("Working", "common practice, no source");

/// Writes the steps of one check in one state.
class WorkingOfCheck {
public:
  WorkingOfCheck(const Study& study, const Readout& readout, const StateReading& state, std::size_t check,
                 const Judge& judge)
      : m_setup(readout.checks[check]), m_reading(state.checks[check]), m_state(state), m_judge(judge),
        m_demand(demandOf(readout, state)), m_countsCompression(readout.positive == Positive::compression),
        m_steps(writtenUnitsOf(study), stressFormOf(study, state).decimals) {}

  std::vector<Step> steps() {
    addFactor();
    addBendingShare();
    const bool scales = m_reading.factor.origin != FactorOrigin::none;
    WrittenStrengths strengths(m_steps, m_setup.strengths,
                               scales ? std::optional(m_reading.factor.value) : std::nullopt, m_demand);
    const Angle nominal = m_setup.band ? m_setup.band->nominal : Angle();
    addStresses(nominal, false);
    at(nominal, m_reading.nominal).addUtilisation(m_steps, strengths);
    const Angle worst = m_reading.worstAngle.value_or(nominal);
    if (worst != nominal) {
      m_steps.turnTo(StepsAt::worst);
      addStresses(worst, true);
      at(worst, m_reading.worst).addUtilisation(m_steps, strengths);
    }
    if (!m_reading.first)
      return m_steps.steps();
    const Angle first = m_reading.first->angle;
    if (first != worst) {
      m_steps.turnTo(first == nominal ? StepsAt::nominal : StepsAt::first);
      addStresses(first, true);
    }
    at(first, m_judge.at(first)).addMultiplier(m_steps, strengths);
    return m_steps.steps();
  }

private:
  WrittenCriterion at(Angle direction, const Judgement& judgement) const {
    return {m_setup.criterion, m_setup.parameters, m_judge, direction, judgement};
  }

  void addFactor() {
    const StrengthFactor& factor = m_reading.factor;
    if (factor.origin != FactorOrigin::quotient) {
      m_steps.put("k", factor.value, dimension::none);
      return;
    }
    const Formula partial = m_steps.put("γ_{M}", factor.partialFactor, dimension::none);
    const Formula duration =
        factor.duration ? m_steps.put("k_{mod}", factor.durationFactor, dimension::none) : Formula(1);
    const Text name = factor.duration
                          ? PW_TEXT("Working", "factor of the strengths, duration of the loads: %1")
                                .with(labelOf(*factor.duration))
                          : PW_TEXT("Working", "factor of the strengths");
    m_steps.addStrength({name, "k", duration / partial, factor.value, dimension::none, common});
  }

  /// Which parts of sx count goes by bendingShareOf: those that pull as the whole of it does.
  void addBendingShare() {
    if (!isMixed(m_setup.strengths, m_demand) || !hasMixedStrength(m_setup.criterion))
      return;
    const double sense = m_state.stress.sx < 0 ? -1 : 1;
    const Formula bending = m_steps.putStress("σ_{x,M}", m_state.bending);
    Formula whole = bending;
    const auto add = [&](const char* symbol, double part) {
      if (sense * part > 0 && !isRounding(part, m_state.scale))
        whole = whole + m_steps.putStress(symbol, part);
    };
    add("σ_{x,N}", m_state.axial);
    add("σ_{x,0}", m_state.stress.sx - m_state.axial - m_state.bending);
    m_steps.addStrength(
        {PW_TEXT("Working", "share of bending in σ_{x}, of the parts that act as the whole does"), "w",
         bending / whole, m_demand.bendingShare, dimension::none, common});
  }

  /// The stresses at a direction: as steps where the working of the state does not have them, as those of
  /// the nominal one it does.
  void addStresses(Angle direction, bool isTurned) {
    if (isOfUniaxialStress(m_setup.criterion))
      addUniaxial(direction, isTurned);
    switch (rowOf(m_setup.criterion).actsOn) {
    case ActsOn::line:
      return addAlongLine(direction, isTurned);
    case ActsOn::plane:
      return addOnPlane(direction, isTurned);
    case ActsOn::principal:
      return addPrincipals();
    }
  }

  /// A formula of the study's stresses as one of those that strengths are asked to carry.
  Formula tensionPositive(const Formula& formula) const { return m_countsCompression ? -formula : formula; }

  void putGiven(const char* angleSymbol, Angle direction) {
    m_steps.putStress("σ_{x}", m_state.stress.sx);
    m_steps.putStress("σ_{y}", m_state.stress.sy);
    m_steps.putStress("τ_{xy}", m_state.stress.txy);
    m_steps.put(angleSymbol, direction.degrees(), dimension::angle);
  }

  void addStress(const Text& name, const char* symbol, const Formula& formula, double value, bool isStep) {
    if (!isStep) {
      m_steps.putStress(symbol, value);
      return;
    }
    m_steps.addStress({m_countsCompression ? PW_TEXT("Working", "%1, tension positive").with(name) : name,
                       symbol, tensionPositive(formula), value, dimension::stress, common});
  }

  void addAlongLine(Angle direction, bool isTurned) {
    const bool areSteps = (isTurned || m_countsCompression) && !hasAngleForm(m_setup.criterion);
    const LineStress s = m_judge.state().at(direction);
    const Formula phi = Formula::symbol("φ");
    putGiven("φ", direction);
    addStress(PW_TEXT("Working", "stress along the %1").with(m_setup.line), stress_symbol::along,
              normalStressAt(phi), s.along, areSteps);
    addStress(PW_TEXT("Working", "stress across the %1").with(m_setup.line), stress_symbol::across,
              normalStressAt(phi, -1), s.across, areSteps);
    addStress(PW_TEXT("Working", "shear on the cut that crosses the %1").with(m_setup.line),
              stress_symbol::shear, shearStressAt(phi), s.shear, areSteps);
  }

  void addOnPlane(Angle direction, bool isTurned) {
    const bool areSteps = isTurned || m_countsCompression;
    const LineStress s = m_judge.state().at(direction);
    const Formula theta = Formula::symbol("θ");
    putGiven("θ", direction);
    addStress(PW_TEXT("Working", "normal stress on the plane %1").with(m_setup.plane), stress_symbol::normal,
              normalStressAt(theta), s.along, areSteps);
    addStress(PW_TEXT("Working", "shear on the plane %1").with(m_setup.plane), stress_symbol::planeShear,
              shearStressAt(theta), s.shear, areSteps);
  }

  /// The one principal stress and the angle of its axis to the line, 0 to 90 deg.
  void addUniaxial(Angle direction, bool isTurned) {
    const Circle& circle = m_state.circle;
    if (!circle.theta1)
      return;
    const bool isFirst = std::abs(circle.s1) >= std::abs(circle.s2);
    const double value = isFirst ? circle.s1 : circle.s2;
    const Formula principal = m_steps.putStress(isFirst ? "σ_{1}" : "σ_{2}", value);
    if (!isTurned)
      addStress(PW_TEXT("Working", "the one principal stress"), stress_symbol::uniaxial, principal,
                m_countsCompression ? -value : value, true);
    const Angle axis = (isFirst ? circle.theta1 : circle.theta2())->value;
    m_steps.put("φ", direction.degrees(), dimension::angle);
    m_steps.put("θ_{1}", circle.theta1->value.degrees(), dimension::angle);
    m_steps.add({PW_TEXT("Working", "angle of that stress to the %1").with(m_setup.line),
                 stress_symbol::toLine, absolute(fromAxis(direction, isFirst)),
                 apart(axis, direction).degrees(), dimension::angle, common});
  }

  /// From the axis of s1, or of s2 at right angles to it, to a direction: folded to within 90 deg.
  Formula fromAxis(Angle direction, bool isFirst) const {
    const double turn = (direction - m_state.circle.theta1->value).degrees();
    const double toAxis = isFirst ? 0 : 90;
    const double whole = toAxis - 180 * std::round((turn + toAxis) / 180);
    Formula difference = Formula::symbol("φ") - Formula::symbol("θ_{1}");
    if (whole == 0)
      return difference;
    return whole > 0 ? difference + Formula::degrees(whole) : difference - Formula::degrees(-whole);
  }

  /// Greatest, middle and least of the three, tension positive.
  void addPrincipals() {
    const std::array<double, 3> sorted = principalsOf(m_demand);
    const Formula s1 = m_steps.putStress("σ_{1}", m_state.circle.s1);
    const Formula s2 = m_steps.putStress("σ_{2}", m_state.circle.s2);
    const Formula sz = m_steps.putStress("σ_{z}", m_state.sz);
    const Formula greatestOf = greatest({s1, s2, sz});
    const Formula leastOf = least({s1, s2, sz});
    addStress(PW_TEXT("Working", "greatest principal stress"), stress_symbol::greatest,
              m_countsCompression ? leastOf : greatestOf, sorted[0], true);
    if (m_setup.criterion == Criterion::vonMises)
      addStress(PW_TEXT("Working", "middle principal stress"), stress_symbol::middle,
                greatest({s2, least({s1, sz})}), sorted[1], true);
    addStress(PW_TEXT("Working", "least principal stress"), stress_symbol::least,
              m_countsCompression ? greatestOf : leastOf, sorted[2], true);
  }

  const CheckSetup& m_setup;
  const CheckReading& m_reading;
  const StateReading& m_state;
  const Judge& m_judge;
  Demand m_demand;
  bool m_countsCompression;
  CheckSteps m_steps;
};

} // namespace

std::vector<Step> workingOfCheck(const Study& study, const Readout& readout, const StateReading& state,
                                 std::size_t check) {
  if (check >= state.checks.size()) // the state is not judged
    return {};
  const Result<Judge> judge = judgeOf(readout, state, check);
  return judge ? WorkingOfCheck(study, readout, state, check, *judge).steps() : std::vector<Step>();
}

} // namespace planewright

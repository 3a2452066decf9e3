// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/working_of_state.h"

#include "core/study/stress_form.h"
#include "core/study/stress_formulas.h"

namespace planewright {

namespace {

const Formula sx = Formula::symbol("σ_{x}");
const Formula sy = Formula::symbol("σ_{y}");
const Formula txy = Formula::symbol("τ_{xy}");
const Formula sz = Formula::symbol("σ_{z}");
const Formula mean = Formula::symbol("σ_{m}");
const Formula radius = Formula::symbol("r");
const Formula s1 = Formula::symbol("σ_{1}");
const Formula s2 = Formula::symbol("σ_{2}");
const Formula theta1 = Formula::symbol("θ_{1}");

/// The same angle of a normal where the formula leaves (-90, 90] deg.
Formula foldedOnce(const Formula& formula, const NumbersPutIn& numbers) {
  return formula.valueWith(numbers) > -90 ? formula : formula + Formula::degrees(180);
}

const Text source = PW_TEXT("Working", "common practice, no source");

/// Writes the steps of one state.
class Working {
public:
  Working(const Study& study, const StateReading& state)
      : m_form(stressFormOf(study, state)), m_state(state) {
    m_given = {stress(sx, state.stress.sx), stress(sy, state.stress.sy), stress(txy, state.stress.txy)};
  }

  std::vector<Step> steps(const Readout& readout) {
    addCircle();
    addAngles();
    addGreatestShear();
    addPlane(PW_TEXT("Working", "normal stress on the reading plane"),
             PW_TEXT("Working", "shear on the reading plane"), readout.reading, m_state.reading);
    for (std::size_t i = 0; i < readout.watched.size(); ++i) {
      const WatchedReading& plane = readout.watched[i];
      addPlane(PW_TEXT("Working", "normal stress on the plane %1").with(plane.name),
               PW_TEXT("Working", "shear on the plane %1").with(plane.name), plane.normal,
               m_state.watched[i]);
    }
    for (std::size_t i = 0; i < readout.lines.size(); ++i)
      addLine(readout.lines[i], m_state.lines[i]);
    return std::move(m_steps);
  }

private:
  NumberPutIn stress(const Formula& symbol, double value) const {
    return {symbol.symbol(), m_form.inUnit(value), m_form.decimals + 1, false};
  }

  NumbersPutIn givenWith(const Formula& symbol, Angle angle) const {
    NumbersPutIn numbers = m_given;
    numbers.push_back({symbol.symbol(), angle.degrees(), angleDecimals + 1, true});
    return numbers;
  }

  void addStress(Text name, const char* symbolOf, const Formula& formula, const NumbersPutIn& numbers,
                 double result) {
    m_steps.push_back({std::move(name), symbol(symbolOf), formula, namedBy(formula, numbers),
                       m_form.inUnit(result), m_form.decimals, m_form.unit.name, source});
  }

  void addAngle(Text name, const char* symbolOf, const Formula& formula, const NumbersPutIn& numbers,
                Angle result) {
    m_steps.push_back({std::move(name), symbol(symbolOf), formula, namedBy(formula, numbers),
                       result.degrees(), angleDecimals, "°", source});
  }

  void addCircle() {
    const Circle& circle = m_state.circle;
    addStress(PW_TEXT("Working", "mean stress"), "σ_{m}", (sx + sy) / 2, m_given, circle.mean);
    addStress(PW_TEXT("Working", "radius of the circle"), "r", hypotenuse((sx - sy) / 2, txy), m_given,
              circle.radius);
    const NumbersPutIn centreAndRadius = {stress(mean, circle.mean), stress(radius, circle.radius)};
    addStress(PW_TEXT("Working", "greater principal stress"), "σ_{1}", mean + radius, centreAndRadius,
              circle.s1);
    addStress(PW_TEXT("Working", "lesser principal stress"), "σ_{2}", mean - radius, centreAndRadius,
              circle.s2);
  }

  void addAngles() {
    const Circle& circle = m_state.circle;
    if (!circle.theta1)
      return;
    const Formula principal = foldedOnce(arcTangent(2 * txy, sx - sy) / 2, m_given);
    addAngle(PW_TEXT("Working", "normal of the plane of σ_{1}"), "θ_{1}", principal, m_given,
             circle.theta1->value);
    const NumbersPutIn angle = {{theta1.symbol(), circle.theta1->value.degrees(), angleDecimals + 1, true}};
    addAngle(PW_TEXT("Working", "normal of the plane of greatest τ_{nt}"), "θ_{τ}",
             foldedOnce(theta1 - Formula::degrees(45), angle), angle, circle.thetaTauMax->value);
  }

  void addGreatestShear() {
    const Circle& circle = m_state.circle;
    const Formula spread = greatest({s1, s2, sz}) - least({s1, s2, sz});
    addStress(PW_TEXT("Working", "greatest shear of all planes"), "τ_{abs max}", spread / 2,
              {stress(s1, circle.s1), stress(s2, circle.s2), stress(sz, m_state.sz)}, circle.tauAbsMax);
  }

  void addPlane(Text normalName, Text shearName, NormalAngle normal, const Traction& traction) {
    const Formula theta = Formula::symbol("θ");
    const NumbersPutIn numbers = givenWith(theta, normal.value);
    addStress(std::move(normalName), "σ_{n}", normalStressAt(theta), numbers, traction.sn);
    addStress(std::move(shearName), "τ_{nt}", shearStressAt(theta), numbers, traction.tnt);
  }

  void addLine(const LineReading& line, const LineStress& stresses) {
    const Formula phi = Formula::symbol("φ");
    const NumbersPutIn numbers = givenWith(phi, line.angle.value);
    addStress(PW_TEXT("Working", "stress along the %1").with(line.name), "σ_{φ}", normalStressAt(phi),
              numbers, stresses.along);
    addStress(PW_TEXT("Working", "stress across the %1").with(line.name), "σ_{φ+90°}",
              normalStressAt(phi, -1), numbers, stresses.across);
    addStress(PW_TEXT("Working", "shear on the cut that crosses the %1").with(line.name), "τ_{φ}",
              shearStressAt(phi), numbers, stresses.shear);
  }

  StressForm m_form;
  const StateReading& m_state;
  NumbersPutIn m_given;
  std::vector<Step> m_steps;
};

} // namespace

std::vector<Step> workingOf(const Study& study, const Readout& readout, const StateReading& state) {
  return Working(study, state).steps(readout);
}

} // namespace planewright

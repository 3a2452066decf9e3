// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/conventions.h"

#include "core/quantity/format.h"
#include "core/study/stress_form.h"
#include "core/table/cautions.h"

namespace planewright {

namespace {

Text senseOf(const Study& study) {
  return study.convention.positive == Positive::tension ? PW_TEXT("Figure", "Tension positive.")
                                                        : PW_TEXT("Figure", "Compression positive.");
}

Text shearSenseOf(const Study& study) {
  return study.convention.shearAxis == ShearAxis::tensorDown
             ? PW_TEXT(
                   "Figure",
                   "τ_{nt} acts on the n face, positive towards t (n turned by +90°), and is drawn + down: "
                   "turning the plane by θ turns its point by 2θ in the same sense.")
             : PW_TEXT("Figure",
                       "τ_{nt} acts on the n face, positive towards t (n turned by +90°), and is drawn + up: "
                       "turning the plane by θ turns its point by 2θ the other way.");
}

/// The name, and the kind where the name does not say it.
Text nameOf(const LineReading& line) {
  if (line.name == wordOf(line.kind))
    return PW_TEXT("Figure", "Line “%1”").with(line.name);
  return PW_TEXT("Figure", "Line “%1” (%2)").with(line.name).with(labelOf(line.kind));
}

Text lineOf(const LineReading& line) {
  const Text base = PW_TEXT("Figure", "%1: φ = %2, given as %3")
                        .with(nameOf(line))
                        .with(shownDegrees(line.angle.value, angleDecimals))
                        .with(line.typed);
  if (line.tolerance == Angle())
    return PW_TEXT("Figure", "%1, without tolerance.").with(base);
  return PW_TEXT("Figure", "%1, ± %2.").with(base).with(shownDegrees(line.tolerance, angleDecimals));
}

Text thirdStressOf(const Study& study, const StateReading& state) {
  const StressForm stresses = stressFormOf(study, state);
  return PW_TEXT("Figure", "With σ_{3} = %1 the greatest shear on any plane is %2.")
      .with(state.sz == 0 ? "0" : stresses.withUnit(state.sz))
      .with(stresses.withUnit(state.circle.tauAbsMax));
}

Text missingOf(const std::vector<std::string>& ids) {
  std::string cases;
  for (const std::string& id : ids)
    cases += (cases.empty() ? "" : ", ") + id;
  return PW_TEXT("Figure", "No stresses are given for %1: counted as 0.").with(cases);
}

} // namespace

std::vector<Text> conventionsOf(const Study& study, const Readout& readout) {
  const StateReading& state = readout.state();
  std::vector<Text> sentences;
  sentences.reserve(readout.lines.size() + 10);
  for (const LineReading& line : readout.lines)
    sentences.push_back(lineOf(line));
  if (!state.circle.theta1)
    sentences.push_back(PW_TEXT("Figure", "The circle is a point: every direction is principal."));
  sentences.push_back(thirdStressOf(study, state));
  if (const std::vector<std::string> missing = missingCases(readout, state); !missing.empty())
    sentences.push_back(missingOf(missing));
  if (!state.factors.empty())
    sentences.push_back(misnamed(state.combination, state.factors));
  sentences.push_back(senseOf(study));
  sentences.push_back(PW_TEXT("Figure", "Angles counter-clockwise from +x, seen from +z."));
  if (readout.axes != Angle())
    sentences.push_back(PW_TEXT("Figure", "The elements are drawn with x inclined by %1.")
                            .with(shownDegrees(readout.axes, angleDecimals)));
  sentences.push_back(shearSenseOf(study));
  sentences.push_back(PW_TEXT("Figure", "Arrows in one scale, small ones at a least length."));
  sentences.push_back(PW_TEXT("Figure", "Stresses at one point, not a design check: the code in force and a "
                                        "licensed engineer decide."));
  return sentences;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/judge_checks.h"

#include "core/quantity/format.h"
#include "core/quantity/lexer.h"
#include "core/quantity/slopes.h"
#include "core/strength/cautions.h"
#include "core/study/text_fields.h"
#include "core/study/typed.h"
#include "core/words/decimal_sign.h"

#include <algorithm>

namespace planewright {

namespace {

/// The factors of a material, read; an empty text is none.
struct Factors {
  std::optional<double> given;
  std::optional<double> partial;
  std::vector<std::optional<double>> durations; ///< in the order of Duration
  bool hasDurations() const {
    return std::ranges::any_of(durations, [](const auto& one) { return one.has_value(); });
  }
};

std::optional<double> read(const Study& study, Spot spot, const std::string& text) {
  return text.empty() ? std::nullopt : std::optional(valueOf(study, spot, text));
}

Factors factorsOf(const Study& study, const Material& material) {
  Factors factors;
  factors.given = read(study, Spot::strengthFactor, material.factor);
  factors.partial = read(study, Spot::partialFactor, material.partialFactor);
  for (const TextField<DurationTexts>& field : textFieldsOf<DurationTexts>())
    factors.durations.push_back(read(study, field.spot, material.durations.*field.text));
  return factors;
}

Strengths strengthsOf(const Study& study, const Material& material) {
  Strengths strengths;
  strengths.kind = material.kind;
  strengths.seam = material.seam;
  for (const StrengthKey key : keysOf(material.kind))
    strengths[key] = read(study, spotOf(key), strengthText(material, key));
  return strengths;
}

Parameters parametersOf(const Study& study, const ParameterTexts& texts) {
  Parameters parameters;
  parameters.n = read(study, Spot::checkN, texts.n);
  parameters.F12 = read(study, Spot::checkF12, texts.F12);
  parameters.kc90 = read(study, Spot::checkKc90, texts.kc90);
  if (const auto edge = read(study, Spot::checkEdge, texts.edge))
    parameters.edge = Angle::fromDegrees(*edge);
  return parameters;
}

std::optional<Band> bandOf(const Readout& readout, const Check& check) {
  const auto line = std::ranges::find(readout.lines, check.line, &LineReading::name);
  if (!check.line.empty() && line != readout.lines.end())
    return bandOf(line->angle.value, line->tolerance);
  const auto plane = std::ranges::find(readout.watched, check.plane, &WatchedReading::name);
  if (!check.plane.empty() && plane != readout.watched.end())
    return bandOf(plane->normal.value, plane->tolerance);
  return std::nullopt;
}

/// A grain typed as a slope, to one side and without a tolerance.
bool isOneSidedSlope(const Readout& readout, const std::string& name) {
  const auto line = std::ranges::find(readout.lines, name, &LineReading::name);
  return line != readout.lines.end() && line->kind == LineKind::grain && line->tolerance == Angle() &&
         readSlope(line->typed, tokensOf(line->typed), Slopes::line).has_value();
}

CheckSetup setupOf(const Study& study, const Readout& readout, const Check& check, const Material& material,
                   const Factors& factors) {
  CheckSetup setup;
  setup.id = check.id;
  setup.material = material.name;
  setup.criterion = check.criterion;
  setup.line = check.line;
  setup.plane = check.plane;
  setup.band = bandOf(readout, check);
  setup.parameters = parametersOf(study, check.parameters);
  setup.strengths = strengthsOf(study, material);
  setup.basis = material.basis;
  setup.cautions = cautionsOf(check.criterion, setup.strengths, setup.parameters, setup.band);
  if (material.kind == MaterialKind::timber) {
    if (factors.partial && !factors.given && !factors.hasDurations())
      setup.cautions.push_back(PW_TEXT("Strength", "The material has a partial factor and no factors for the "
                                                   "duration of loads: k_{mod} counts as 1."));
    if (isOneSidedSlope(readout, check.line))
      setup.cautions.push_back(
          PW_TEXT("Strength", "The slope of the grain counts to one side, and the sign of τ_{xy} decides "
                              "whether it is pulled or pressed across: where its sense is not known, give 0° "
                              "with the slope as tolerance."));
  }
  return setup;
}

/// The shortest duration that acts; that of permanent loads where nothing does.
Duration shortestOf(const Readout& readout, const StateReading& state) {
  Duration shortest = Duration::permanent;
  for (const ActingCase& acting : state.acting)
    shortest = std::max(shortest, readout.cases[acting.index].duration);
  return shortest;
}

Result<StrengthFactor> factorOf(const Factors& factors, Duration duration) {
  StrengthFactor factor;
  if (factors.given) {
    factor.value = *factors.given;
    factor.origin = FactorOrigin::given;
    return factor;
  }
  if (!factors.partial && !factors.hasDurations())
    return factor;
  factor.origin = FactorOrigin::quotient;
  factor.partialFactor = factors.partial.value_or(1);
  if (factors.hasDurations()) {
    const std::optional<double>& own = factors.durations[static_cast<std::size_t>(duration)];
    if (!own)
      return tl::unexpected(
          Problem{{},
                  0,
                  0,
                  {},
                  PW_TEXT("Strength", "The material has no factor for loads of the duration “%1”.")
                      .with(labelOf(duration)),
                  PW_TEXT("Strength", "Give it among the factors of the material.")});
    factor.duration = duration;
    factor.durationFactor = *own;
  }
  factor.value = factor.durationFactor / factor.partialFactor;
  return factor;
}

/// A weld carries its own partial factor, by which its criterion divides.
StrengthFactor factorOfWeld(const Strengths& strengths) {
  StrengthFactor factor;
  factor.betaW = strengths[StrengthKey::betaW];
  factor.partialFactor = strengths[StrengthKey::gammaM2].value_or(1);
  return factor;
}

/// Factors that raise a strength by half are rare, a point that was left out is not.
void addCautionsOfFactor(std::vector<Text>& cautions, const StrengthFactor& factor) {
  constexpr double high = 1.5;
  if (factor.origin == FactorOrigin::given && factor.value > high)
    cautions.push_back(
        PW_TEXT("Strength", "The factor of the strengths is %1, which is above %2: see that it is meant.")
            .with(numberText(exactNumber(factor.value)))
            .with(numberText(exactNumber(high))));
  if (factor.duration && factor.durationFactor > high)
    cautions.push_back(
        PW_TEXT("Strength", "The duration factor for “%1” is %2, which is above %3: see that it is meant.")
            .with(labelOf(*factor.duration))
            .with(numberText(exactNumber(factor.durationFactor)))
            .with(numberText(exactNumber(high))));
}

/// What the stresses of this state ask for, and what its criterion leaves out of them.
void addCautionsOfStress(std::vector<Text>& cautions, const Demand& demand, const Judge& judge,
                         const CheckSetup& setup) {
  if (rowOf(setup.criterion).actsOn != ActsOn::principal && !isRounding(demand.sz, demand.scale))
    cautions.push_back(
        PW_TEXT("Strength", "σ_{z} acts here, and this criterion does not see it: judge it apart."));
  if (!setup.line.empty() && setup.band && pullsAcross(judge.state(), *setup.band))
    if (auto caution = cautionOfTensionAcross(setup.strengths.kind))
      cautions.push_back(*std::move(caution));
  if (setup.criterion == Criterion::taperedEdge && demand.bendingShare < 1 &&
      !(demand.stress == PlaneStress{}))
    cautions.push_back(PW_TEXT("Strength",
                               "The stress along the edge is compared with f_{m}: what is no bending, or is "
                               "typed as a stress, is taken as bending."));
}

/// Whether strengths are at design level: given so, or characteristic ones with a partial or typed factor. A
/// factor of 1 leaves them characteristic, whatever it was made of.
bool isDesign(StrengthBasis basis, const Factors& factors, double factor) {
  return basis == StrengthBasis::design ||
         (basis == StrengthBasis::characteristic && (factors.given || factors.partial) && factor != 1);
}

Text allowablePairing(Basis loads) {
  if (loads == Basis::allowable)
    return {};
  return loads == Basis::design
             ? PW_TEXT("Strength", "Allowable strengths against factored design loads.")
             : PW_TEXT("Strength", "Allowable strengths against a characteristic combination: name it "
                                   "allowable if it is meant so.");
}

Text pairingOf(StrengthBasis basis, const Factors& factors, double factor, MaterialKind kind, Basis loads) {
  if (basis == StrengthBasis::testMean)
    return PW_TEXT("Strength", "Against means of tests: not a design check.");
  if (kind == MaterialKind::throat) // carries its own partial factor
    return loads == Basis::design
               ? Text{}
               : PW_TEXT("Strength", "Design strengths of the weld against loads that are not design loads.");
  if (basis == StrengthBasis::allowable)
    return allowablePairing(loads);
  if (!isDesign(basis, factors, factor))
    return PW_TEXT("Strength", "Against characteristic strengths: not a design check.");
  return loads == Basis::design
             ? Text{}
             : PW_TEXT("Strength", "Design strengths against loads that are not design loads.");
}

CheckReading judged(const Readout& readout, const StateReading& state, const CheckSetup& setup,
                    const Factors& factors) {
  CheckReading reading;
  const Result<StrengthFactor> factor = setup.strengths.kind == MaterialKind::throat
                                            ? factorOfWeld(setup.strengths)
                                            : factorOf(factors, shortestOf(readout, state));
  reading.pairing =
      pairingOf(setup.basis, factors, factor ? factor->value : 0, setup.strengths.kind, state.basis);
  if (!factor) {
    reading.hasFactor = false;
    reading.problem = factor.error();
    return reading;
  }
  reading.factor = *factor;
  addCautionsOfFactor(reading.cautions, *factor);
  const Demand demand = demandOf(readout, state);
  const Result<Judge> judge = judgeBy(setup.criterion, setup, setup.parameters, factor->value, demand);
  if (!judge) {
    reading.problem = judge.error();
    return reading;
  }
  addCautionsOfStress(reading.cautions, demand, *judge, setup);
  if (!setup.band) {
    reading.nominal = reading.worst = judge->at({});
    if (reading.worst.multiplier)
      reading.first = {*reading.worst.multiplier, Angle()};
    return reading;
  }
  reading.nominal = judge->at(setup.band->nominal);
  const WorstInBand worst = worstIn(*judge, *setup.band);
  reading.worst = worst.judgement;
  reading.worstAngle = worst.angle;
  reading.first = worst.first;
  return reading;
}

} // namespace

Demand demandOf(const Readout& readout, const StateReading& state) {
  const double sense = readout.positive == Positive::tension ? 1 : -1;
  return {sense * state.stress, sense * state.sz, state.scale,
          bendingShareOf(state.stress.sx, state.axial, state.bending)};
}

void judgeChecks(Readout& readout, const Study& study, const Point& point) {
  for (const Check& check : point.checks) {
    const Material& material = *findMaterial(study, check.material);
    const Factors factors = factorsOf(study, material);
    const CheckSetup& setup = readout.checks.emplace_back(setupOf(study, readout, check, material, factors));
    for (StateReading& state : readout.states)
      if (state.judged)
        state.checks.push_back(judged(readout, state, setup, factors));
  }
}

Result<Judge> judgeBy(Criterion criterion, const CheckSetup& setup, const Parameters& parameters,
                      double factor, const Demand& demand) {
  return Judge::of(criterion, factor * setup.strengths, forStrengthsTimes(factor, parameters), demand);
}

Result<Judge> judgeOf(const Readout& readout, const StateReading& state, std::size_t check) {
  const CheckSetup& setup = readout.checks[check];
  const CheckReading& reading = state.checks[check];
  if (reading.problem)
    return tl::unexpected(*reading.problem);
  return judgeBy(setup.criterion, setup, setup.parameters, reading.factor.value, demandOf(readout, state));
}

JudgesOfCheck judgesOf(const Readout& readout, std::size_t check) {
  JudgesOfCheck judges;
  judges.all.reserve(readout.states.size());
  for (std::size_t i = 0; i < readout.states.size(); ++i) {
    if (!readout.states[i].judged)
      continue;
    Result<Judge> judge = judgeOf(readout, readout.states[i], check);
    if (!judge)
      continue;
    if (i == readout.shown)
      judges.shown = judges.all.size();
    judges.all.push_back(*std::move(judge));
  }
  return judges;
}

} // namespace planewright

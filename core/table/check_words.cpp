// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/check_words.h"

#include "core/quantity/format.h"
#include "core/strength/cautions.h"
#include "core/strength/shown_ratio.h"
#include "core/study/judge_checks.h"
#include "core/table/few_names.h"
#include "core/words/decimal_sign.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int angleDecimals = 2;
constexpr int endDecimals = 1;

/// Ends and tolerances are rounded to the safe side, so that what is printed holds.
Angle roundedTo(Angle angle, int decimals, bool up) {
  const double scale = std::pow(10.0, decimals);
  const double units = angle.degrees() * scale;
  return Angle::fromDegrees((up ? std::ceil(units - 1e-9) : std::floor(units + 1e-9)) / scale);
}

Text lineOrPlane(const CheckSetup& check) {
  return check.plane.empty() ? PW_TEXT("Check", "lines") : PW_TEXT("Check", "normals");
}

Text ranges(const std::vector<Within>& within) {
  Text all;
  for (const Within& one : within) {
    const ShownEnds ends = shownEndsOf(one);
    const Text words = one.to.degrees() > 90 ? PW_TEXT("Check", "from %1 over 90° to %2")
                                             : PW_TEXT("Check", "from %1 to %2");
    const Text range = words.with(ends.from).with(ends.to);
    all = all.empty() ? range : PW_TEXT("Check", "%1 and %2").with(all).with(range);
  }
  return all;
}

bool isHalfTurn(const std::vector<Within>& within) {
  return within.size() == 1 && (within.front().to - within.front().from).degrees() >= 180;
}

Text slopeSentence(double slope) {
  if (slope == 0)
    return PW_TEXT("Check", "Utilisation stands still at the nominal direction.");
  const Text words = slope > 0
                         ? PW_TEXT("Check", "Utilisation grows by %1 per degree counter-clockwise at the "
                                            "nominal direction.")
                         : PW_TEXT("Check", "Utilisation grows by %1 per degree clockwise at the nominal "
                                            "direction.");
  return words.with(shownNumber(std::abs(slope), decimalsFor(std::abs(slope), 2)));
}

Text bestSentence(const CheckSetup& check, const BestDirection& best) {
  const Text words = check.plane.empty()
                         ? PW_TEXT("Check", "Least utilisation %1 at %2 (for choosing a fibre direction, not "
                                            "for re-describing a member).")
                         : PW_TEXT("Check", "Least utilisation %1 at %2 (for choosing the direction of a "
                                            "joint, not for re-describing one that is there).");
  return words.with(shownUtilisation(best.utilisation)).with(shownDegrees(best.angle, endDecimals));
}

/// "n = 2.5": the parameter, of which a criterion has one at most, where it is not the usual value.
Text unusualOf(const Parameters& given) {
  if (given.n && *given.n != 2)
    return symbol("n = %1").with(withDecimalSign(exactNumber(*given.n)));
  if (given.F12)
    return symbol("F_{12} = %1 MPa⁻²").with(shownNumber(*given.F12, decimalsFor(std::abs(*given.F12))));
  if (given.kc90 && *given.kc90 != 1)
    return symbol("k_{c,90} = %1").with(withDecimalSign(exactNumber(*given.kc90)));
  if (given.edge)
    return PW_TEXT("Check", "edge at %1").with(shownDegrees(*given.edge, angleDecimals));
  return {};
}

/// One way in which bases do not match, and where.
struct Mismatch {
  Text what;
  std::vector<std::string> materials;
  std::vector<std::string> combinations;
};

void addNew(std::vector<std::string>& names, const std::string& name) {
  if (std::ranges::find(names, name) == names.end())
    names.push_back(name);
}

std::vector<Text> mismatchesOf(const Readout& readout, std::size_t from, std::size_t to) {
  std::vector<Mismatch> mismatches;
  std::vector<std::string> materials;
  std::vector<std::string> combinations;
  for (std::size_t i = from; i < to; ++i) {
    addNew(materials, readout.checks[i].material);
    for (const StateReading& state : readout.states) {
      if (!state.judged)
        continue;
      addNew(combinations, state.combination);
      const Text& pairing = state.checks[i].pairing;
      if (pairing.empty())
        continue;
      auto at = std::ranges::find(mismatches, pairing, &Mismatch::what);
      if (at == mismatches.end())
        at = mismatches.insert(at, {pairing, {}, {}});
      addNew(at->materials, readout.checks[i].material);
      addNew(at->combinations, state.combination);
    }
  }
  std::vector<Text> sentences;
  for (const Mismatch& one : mismatches) {
    Text sentence = one.what;
    if (one.combinations.size() < combinations.size())
      sentence = PW_TEXT("Check", "%1: %2").with(fewOf(one.combinations)).with(sentence);
    if (one.materials.size() < materials.size())
      sentence = PW_TEXT("Check", "%1: %2").with(fewOf(one.materials)).with(sentence);
    sentences.push_back(sentence);
  }
  return sentences;
}

} // namespace

const Text& wordOfStanding(Standing standing) {
  static const Text words[] = {PW_TEXT("Check", "not checked"), PW_TEXT("Check", "within"),
                               PW_TEXT("Check", "not judged"), PW_TEXT("Check", "exceeds")};
  return words[static_cast<std::size_t>(standing)];
}

Text shortVerdict(const Verdict& verdict) {
  switch (verdict.standing) {
  case Standing::within:
    if (!verdict.stressed)
      return PW_TEXT("Check", "within: no stress is given");
    return PW_TEXT("Check", "within, %1 of 1").with(shownUtilisation(verdict.governing->utilisation));
  case Standing::exceeds:
    return PW_TEXT("Check", "exceeds, %1").with(shownUtilisation(verdict.governing->utilisation));
  case Standing::unjudged:
    return PW_TEXT("Check", "outside the criterion");
  case Standing::notChecked:
    break;
  }
  return wordOfStanding(Standing::notChecked);
}

Text verdictSentence(const Verdict& verdict) {
  switch (verdict.standing) {
  case Standing::within:
    return verdict.stressed
               ? PW_TEXT("Check", "Stress at this point within the stated strengths.")
               : PW_TEXT("Check", "No stress is given at this point: none of its strengths is used.");
  case Standing::exceeds:
    return PW_TEXT("Check", "Stress at this point exceeds the stated strengths.");
  case Standing::unjudged:
    return PW_TEXT("Check", "A combination could not be judged: nothing is said of the point.");
  case Standing::notChecked:
    break;
  }
  return PW_TEXT("Check", "No check yet: nothing is judged against strengths.");
}

Text checkName(const CheckSetup& check) {
  Text name = PW_TEXT("Check", "%1, %2").with(check.material).with(labelOf(check.criterion));
  if (const Text unusual = unusualOf(check.parameters); !unusual.empty())
    name = PW_TEXT("Check", "%1 (%2)").with(name).with(unusual);
  const std::string& direction = check.line.empty() ? check.plane : check.line;
  return direction.empty() ? name : PW_TEXT("Check", "%1: %2").with(direction).with(name);
}

Text shownWorst(const CheckReading& reading) {
  if (reading.problem)
    return wordOfStanding(Standing::unjudged);
  if (!std::isfinite(reading.worst.utilisation))
    return PW_TEXT("Check", "no finite number");
  return verbatim(shownUtilisation(reading.worst.utilisation));
}

Text notJudgedSentence(const Readout& readout, const JudgedCheck& unjudged) {
  const Problem& problem = *readingOf(readout, unjudged).problem;
  const Text sentence = PW_TEXT("Check", "Not judged: %1, in %2. %3")
                            .with(checkName(readout.checks[unjudged.check]))
                            .with(readout.states[unjudged.state].combination)
                            .with(problem.what);
  return problem.mend.empty() ? sentence : PW_TEXT("Check", "%1 %2").with(sentence).with(problem.mend);
}

Text multiplierSentence(const Judgement& judgement) {
  if (judgement.unstressed)
    return PW_TEXT("Check", "No stress acts.");
  const bool exceeds = exceedsLimit(judgement.utilisation);
  // A multiplier of 0 is one of a plane that takes nothing, however small the loads.
  if (judgement.multiplier.value_or(0) == 0)
    return exceeds ? PW_TEXT("Check", "No multiple of all loads is within the limit.")
                   : PW_TEXT("Check", "No multiple of all loads reaches the limit.");
  if (exceeds)
    return PW_TEXT("Check", "All loads must be multiplied by %1.")
        .with(shownMultiplier(*judgement.multiplier));
  const double grows = std::max(*judgement.multiplier, 1.0); // but for rounding
  return PW_TEXT("Check", "All loads could be multiplied by %1.").with(shownMultiplier(grows));
}

Text multiplierSentence(const CheckReading& reading) {
  Judgement band = reading.worst;
  band.multiplier = reading.leastMultiplier();
  Text sentence = multiplierSentence(band);
  if (reading.worst.unstressed || !reading.first || !reading.worstAngle ||
      reading.first->angle == *reading.worstAngle || reading.first->multiplier == 0)
    return sentence;
  return PW_TEXT("Check", "%1 The direction at %2 comes to its limit first.")
      .with(sentence)
      .with(shownDegrees(folded(reading.first->angle), angleDecimals));
}

Text worstSentence(const CheckSetup& check, const CheckReading& reading) {
  if (!check.band || reading.problem || check.band->tolerance == Angle())
    return {};
  return PW_TEXT("Check", "Worst at %1, inside %2 ±\u00a0%3; nominal %4.")
      .with(shownDegrees(*reading.worstAngle, angleDecimals))
      .with(shownDegrees(check.band->nominal, angleDecimals))
      .with(shownDegrees(check.band->tolerance, angleDecimals))
      .with(shownUtilisation(reading.nominal.utilisation));
}

Text factorSentence(const StrengthFactor& factor) {
  // Factors are short decimals; their quotient is cut to four digits.
  const auto number = [](double value) {
    const double scale = std::pow(10.0, decimalsFor(value, 4));
    return withDecimalSign(exactNumber(std::round(value * scale) / scale));
  };
  if (factor.betaW)
    return PW_TEXT("Check", "f_{u} over β_{w} %1 and γ_{M2} %2.")
        .with(number(*factor.betaW))
        .with(number(factor.partialFactor));
  if (factor.origin == FactorOrigin::none)
    return PW_TEXT("Check", "Strengths with factor 1.");
  if (factor.origin == FactorOrigin::given)
    return PW_TEXT("Check", "Strengths times %1, as given.").with(number(factor.value));
  if (!factor.duration)
    return PW_TEXT("Check", "Strengths over the partial factor %1: times %2.")
        .with(number(factor.partialFactor))
        .with(number(factor.value));
  return PW_TEXT("Check", "Strengths times %1 (%2) over %3: times %4.")
      .with(number(factor.durationFactor))
      .with(labelOf(*factor.duration))
      .with(number(factor.partialFactor))
      .with(number(factor.value));
}

std::vector<Text> cautionsOf(const CheckSetup& check, const CheckReading& reading) {
  std::vector<Text> cautions;
  if (!reading.pairing.empty())
    cautions.push_back(reading.pairing);
  cautions.insert(cautions.end(), check.cautions.begin(), check.cautions.end());
  cautions.insert(cautions.end(), reading.cautions.begin(), reading.cautions.end());
  cautions.push_back(limitsOfPointChecks(check.strengths.kind).front());
  return cautions;
}

std::vector<Text> mismatchesOf(const Readout& readout) {
  return mismatchesOf(readout, 0, readout.checks.size());
}

std::vector<Text> mismatchesOf(const Readout& readout, std::size_t check) {
  return mismatchesOf(readout, check, check + 1);
}

std::vector<Text> cautionsOf(const Readout& readout, std::size_t check) {
  const CheckSetup& setup = readout.checks[check];
  std::vector<Text> cautions = mismatchesOf(readout, check);
  cautions.insert(cautions.end(), setup.cautions.begin(), setup.cautions.end());
  for (const StateReading& state : readout.states)
    if (state.judged)
      for (const Text& caution : state.checks[check].cautions)
        if (std::ranges::find(cautions, caution) == cautions.end())
          cautions.push_back(caution);
  cautions.push_back(limitsOfPointChecks(setup.strengths.kind).front());
  return cautions;
}

ShownEnds shownEndsOf(const Within& within) {
  constexpr int mostDecimals = 6;
  for (int decimals = endDecimals;; ++decimals) {
    const Angle from = roundedTo(within.from, decimals, true);
    const Angle to = roundedTo(within.to, decimals, false);
    if (from <= to || decimals == mostDecimals)
      return {shownDegrees(from, decimals),
              shownDegrees(to.degrees() > 90 ? to - Angle::fromDegrees(180) : to, decimals)};
  }
}

bool isJudgedAllRound(const Readout& readout, std::size_t check) {
  return readout.checks[check].band && !verdictOfCheck(readout, check).unjudged;
}

std::vector<Within> directionsWithin(const Readout& readout, std::size_t check) {
  return isJudgedAllRound(readout, check) ? withinLimit(judgesOf(readout, check).all) : std::vector<Within>();
}

std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check) {
  return directionsOf(readout, check, judgesOf(readout, check).all);
}

std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check, Judges judges) {
  const CheckSetup& setup = readout.checks[check];
  if (!isJudgedAllRound(readout, check))
    return std::nullopt;
  DirectionsOfCheck directions;
  directions.within = withinLimit(judges);
  if (setup.strengths.kind != MaterialKind::throat)
    directions.best = bestDirection(judges);
  lookFrom(setup.band->nominal, judges, directions);
  return directions;
}

void lookFrom(Angle nominal, Judges judges, DirectionsOfCheck& directions) {
  directions.allowed = allowedTolerance(directions.within, nominal);
  directions.slope = slopePerDegree(judges, nominal);
}

std::vector<Text> sentencesOf(const CheckSetup& check, const DirectionsOfCheck& directions) {
  std::vector<Text> sentences;
  if (directions.within.empty())
    sentences.push_back(PW_TEXT("Check", "No angle holds."));
  else if (isHalfTurn(directions.within))
    sentences.push_back(PW_TEXT("Check", "Every angle is within the limit."));
  else
    sentences.push_back(PW_TEXT("Check", "Within the limit for %1 %2.")
                            .with(lineOrPlane(check))
                            .with(ranges(directions.within)));
  if (directions.allowed && !isHalfTurn(directions.within))
    sentences.push_back(
        PW_TEXT("Check", "Tolerance could be ±\u00a0%1.")
            .with(shownDegrees(roundedTo(*directions.allowed, endDecimals, false), endDecimals)));
  if (directions.slope)
    sentences.push_back(slopeSentence(*directions.slope));
  if (directions.best && std::isfinite(directions.best->utilisation))
    sentences.push_back(bestSentence(check, *directions.best));
  return sentences;
}

} // namespace planewright

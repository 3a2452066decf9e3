// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/check_words.h"

#include "core/quantity/format.h"
#include "core/strength/cautions.h"
#include "core/strength/shown_ratio.h"
#include "core/study/judge_checks.h"

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
    const Text range = PW_TEXT("Check", "from %1 to %2")
                           .with(shownDegrees(roundedTo(one.from, endDecimals, true), endDecimals))
                           .with(shownDegrees(roundedTo(one.to, endDecimals, false), endDecimals));
    all = all.empty() ? range : PW_TEXT("Check", "%1 and %2").with(all).with(range);
  }
  return all;
}

bool isHalfTurn(const std::vector<Within>& within) {
  return within.size() == 1 && (within.front().to - within.front().from).degrees() >= 180;
}

/// Whether a check has a direction and no combination was left unjudged.
bool isJudgedAllRound(const Readout& readout, std::size_t check) {
  return readout.checks[check].band && !verdictOfCheck(readout, check).unjudged;
}

Text signedSlope(double slope) {
  const std::string size = shownNumber(std::abs(slope), decimalsFor(std::abs(slope), 2));
  return verbatim((slope < 0 ? "−" : "+") + size);
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
    return PW_TEXT("Check", "Stress at this point within the stated strengths.");
  case Standing::exceeds:
    return PW_TEXT("Check", "Stress at this point exceeds the stated strengths.");
  case Standing::unjudged:
    return PW_TEXT("Check", "A combination could not be judged: nothing is said of the point.");
  case Standing::notChecked:
    break;
  }
  return PW_TEXT("Check", "No strengths are given: nothing is judged against any.");
}

Text checkName(const CheckSetup& check) {
  const Text name = PW_TEXT("Check", "%1, %2").with(check.material).with(labelOf(check.criterion));
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

Text multiplierSentence(const Judgement& judgement) {
  if (judgement.utilisation == 0)
    return PW_TEXT("Check", "No stress acts.");
  if (!judgement.multiplier)
    return std::isfinite(judgement.utilisation) && judgement.utilisation <= 1
               ? PW_TEXT("Check", "No multiple of all loads reaches the limit.")
               : PW_TEXT("Check", "No multiple of all loads is within the limit.");
  const Text number = verbatim(shownMultiplier(*judgement.multiplier));
  return *judgement.multiplier >= 1 ? PW_TEXT("Check", "All loads could grow by %1.").with(number)
                                    : PW_TEXT("Check", "All loads must shrink to %1.").with(number);
}

Text worstSentence(const CheckSetup& check, const CheckReading& reading) {
  if (!check.band || reading.problem || check.band->tolerance == Angle())
    return {};
  return PW_TEXT("Check", "Worst at %1, inside ± %2; nominal %3.")
      .with(shownDegrees(*reading.worstAngle, angleDecimals))
      .with(shownDegrees(check.band->tolerance, angleDecimals))
      .with(shownUtilisation(reading.nominal.utilisation));
}

Text factorSentence(const StrengthFactor& factor) {
  // Factors are short decimals; their quotient is cut to four digits.
  const auto number = [](double value) {
    const double scale = std::pow(10.0, decimalsFor(value, 4));
    return exactNumber(std::round(value * scale) / scale);
  };
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
  if (!reading.problem && reading.worst.mode)
    if (auto caution = cautionOfMode(check.strengths, *reading.worst.mode))
      cautions.push_back(*std::move(caution));
  cautions.push_back(limitsOfPointChecks(check.strengths.kind).front());
  return cautions;
}

std::vector<Within> directionsWithin(const Readout& readout, std::size_t check) {
  return isJudgedAllRound(readout, check) ? withinLimit(judgesOf(readout, check)) : std::vector<Within>();
}

std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check) {
  const CheckSetup& setup = readout.checks[check];
  if (!isJudgedAllRound(readout, check))
    return std::nullopt;
  const std::vector<Judge> judges = judgesOf(readout, check);
  DirectionsOfCheck directions;
  directions.within = withinLimit(judges);
  directions.allowed = allowedTolerance(directions.within, setup.band->nominal);
  directions.slope = slopePerDegree(judges, setup.band->nominal);
  directions.best = bestDirection(judges);
  return directions;
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
        PW_TEXT("Check", "Tolerance could be ± %1.")
            .with(shownDegrees(roundedTo(*directions.allowed, endDecimals, false), endDecimals)));
  if (directions.slope)
    sentences.push_back(PW_TEXT("Check", "%1 per degree.").with(signedSlope(*directions.slope)));
  if (std::isfinite(directions.best.utilisation))
    sentences.push_back(
        PW_TEXT("Check", "Least utilisation %1 at %2 (for choosing a fibre or scarf direction, not for "
                         "re-describing a member).")
            .with(shownUtilisation(directions.best.utilisation))
            .with(shownDegrees(directions.best.angle, endDecimals)));
  return sentences;
}

} // namespace planewright

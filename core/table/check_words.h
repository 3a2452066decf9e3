// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/over_angles.h"
#include "core/study/verdict.h"

namespace planewright {

/// What is said of checks in the window, figures, sheets and readings: always of the stress at this point
/// only, utilisations rounded upwards, multipliers downwards.

/// "within", "exceeds", "not checked", "not judged".
const Text& wordOfStanding(Standing standing);
/// "within, 0.87 of 1", "exceeds, 1.07", "not checked", "outside the criterion", "within: no stress is
/// given".
Text shortVerdict(const Verdict& verdict);
/// "Stress at this point within the stated strengths." and its kin.
Text verdictSentence(const Verdict& verdict);

/// "grain: GL24h, sum of squares", with the parameters that are not the usual ones: "Hankinson (n = 2.5)".
Text checkName(const CheckSetup& check);
/// The utilisation with its limit, or why there is none: "0.87", "no finite number", "not judged".
Text shownWorst(const CheckReading& reading);

/// "Not judged: grain: C24, Hankinson, in ULS1. ..." with what is wrong and how to mend it.
Text notJudgedSentence(const Readout& readout, const JudgedCheck& unjudged);

/// "All loads could be multiplied by 1.15.", "All loads must be multiplied by 0.93.", or that no multiple
/// reaches the limit or is within it: in one direction, and in a band, by its least multiplier.
Text multiplierSentence(const Judgement& judgement);
Text multiplierSentence(const CheckReading& reading);
/// "Worst at 8.71°, inside 5.71° ± 3°; nominal 0.81."; empty without a band.
Text worstSentence(const CheckSetup& check, const CheckReading& reading);
/// "Strengths times 0.8 (medium term) over 1.25: times 0.64.", what a weld divides by, or that they are taken
/// as given.
Text factorSentence(const StrengthFactor& factor);

/// How bases of loads and strengths do not match in any judged combination, for all checks of a point or for
/// one; with the material and the combinations where it is not all of them: "ULS1: Design strengths against
/// ...".
std::vector<Text> mismatchesOf(const Readout& readout);
std::vector<Text> mismatchesOf(const Readout& readout, std::size_t check);

/// All that must stand with the verdict of a check in a state: pairing of bases, what the criterion, the
/// factor and the stresses ask for, and what a check at a point does not see, the shortest of that last.
std::vector<Text> cautionsOf(const CheckSetup& check, const CheckReading& reading);
/// The same for a check over all judged combinations.
std::vector<Text> cautionsOf(const Readout& readout, std::size_t check);

/// What follows for other directions of the line or plane, over all judged combinations.
struct DirectionsOfCheck {
  std::vector<Within> within;
  std::optional<Angle> allowed;      ///< the tolerance that the nominal direction could have
  std::optional<double> slope;       ///< change of the utilisation per degree
  std::optional<BestDirection> best; ///< none for a weld, which is where it is
  bool operator==(const DirectionsOfCheck&) const = default;
};
/// Whether a check has a direction and no combination was left unjudged.
bool isJudgedAllRound(const Readout& readout, std::size_t check);
/// The directions within the limit alone; none for a check without a direction, or where a combination could
/// not be judged.
std::vector<Within> directionsWithin(const Readout& readout, std::size_t check);
/// None for a check without a direction, or where a combination could not be judged.
std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check);
/// By the judges of the check.
std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check, Judges judges);
/// Works out what is seen from a nominal direction, the tolerance and the slope, where the rest stays.
void lookFrom(Angle nominal, Judges judges, DirectionsOfCheck& directions);

/// The ends of directions within the limit for people: rounded inwards, so that what is shown holds, and
/// folded into [-90, 90].
struct ShownEnds {
  std::string from;
  std::string to;
};
ShownEnds shownEndsOf(const Within& within);

/// "Within the limit for lines from −12.0° to 37.0°.", "Tolerance could be ± 5.1°.", how the utilisation
/// grows at the nominal direction, or "No angle holds.", and the best direction with what it is for.
std::vector<Text> sentencesOf(const CheckSetup& check, const DirectionsOfCheck& directions);

} // namespace planewright

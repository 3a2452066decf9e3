// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/over_angles.h"
#include "core/study/verdict.h"

namespace planewright {

/// What is said of checks in the window, figures, sheets and readings: always of the stress at this point
/// only, utilisations rounded upwards, multipliers downwards.

/// "within", "exceeds", "not checked", "not judged".
const Text& wordOfStanding(Standing standing);
/// "within, 0.87 of 1", "exceeds, 1.07", "not checked", "outside the criterion".
Text shortVerdict(const Verdict& verdict);
/// "Stress at this point within the stated strengths." and its kin.
Text verdictSentence(const Verdict& verdict);

/// "grain: GL24h, sum of squares".
Text checkName(const CheckSetup& check);
/// The utilisation with its limit, or why there is none: "0.87", "no finite number", "not judged".
Text shownWorst(const CheckReading& reading);

/// "All loads could grow by 1.15.", "All loads must shrink to 0.93.", or that no multiple reaches the limit.
Text multiplierSentence(const Judgement& judgement);
/// "Worst at 8.71°, inside ± 3°; nominal 0.81."; empty without a band.
Text worstSentence(const CheckSetup& check, const CheckReading& reading);
/// "Strengths times 0.80 (medium term)/1.25 = 0.64.", or that they are taken as given.
Text factorSentence(const StrengthFactor& factor);

/// All that must stand with the verdict of a check in a state: pairing of bases, what the criterion and the
/// mode ask for, and what a check at a point does not see, the shortest of that last.
std::vector<Text> cautionsOf(const CheckSetup& check, const CheckReading& reading);

/// What follows for other directions of the line or plane, over all judged combinations.
struct DirectionsOfCheck {
  std::vector<Within> within;
  std::optional<Angle> allowed; ///< the tolerance that the nominal direction could have
  std::optional<double> slope;  ///< change of the utilisation per degree
  BestDirection best;
};
/// The directions within the limit alone; none for a check without a direction, or where a combination could
/// not be judged.
std::vector<Within> directionsWithin(const Readout& readout, std::size_t check);
/// None for a check without a direction, or where a combination could not be judged.
std::optional<DirectionsOfCheck> directionsOf(const Readout& readout, std::size_t check);

/// "Within the limit for lines from −12.0° to 37.0°.", "Tolerance could be ± 5.1°.", "+0.03 per degree." or
/// "No angle holds.", and the best direction with what it is for.
std::vector<Text> sentencesOf(const CheckSetup& check, const DirectionsOfCheck& directions);

} // namespace planewright

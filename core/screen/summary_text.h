// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_reader.h"
#include "core/screen/results.h"
#include "core/screen/summary.h"

namespace planewright {

/// What was left out on request, and how many points that met.
struct LeftOut {
  std::string name;
  std::size_t points = 0;
};

/// "Rows with a fault: %1 of %2; points that lack something: %3 of %4." and its like, with the counts.
Text withFaultCounts(const Text& words, const FieldReading& reading);

/// Points and how many of them were judged; how many exceed; the greatest utilisation beside the one that
/// 99.9 % of the points do not exceed, and what that means. At least one point is judged.
std::vector<Text> outcomeSentences(const Field& field, const FieldResults& results,
                                   const FieldSummary& summary);

/// What is said of a field beside its results, as lines of text: by what it was judged, what was read and
/// what was left out, how many points exceed, the greatest utilisation beside the one that 99.9 % of the
/// points do not exceed, the ten worst points, the histogram, and the cautions that belong to the checks.
/// Utilisations are rounded upwards, multipliers downwards. `point` is the one by which the plan was made; at
/// least one point of the field is judged.
std::string summaryText(const Study& study, std::string_view point, const ScreenPlan& plan,
                        const FieldReading& reading, const FieldResults& results, const FieldSummary& summary,
                        const std::vector<LeftOut>& leftOut, const Translate& translate = {});

/// The part of it that neither a table of the points nor a drawing of their number by utilisation shows: by
/// what was judged, what was read and left out, and the cautions; a line for each.
std::string fieldNotes(const Study& study, std::string_view point, const ScreenPlan& plan,
                       const FieldReading& reading, const FieldResults& results, const FieldSummary& summary,
                       const std::vector<LeftOut>& leftOut, const Translate& translate = {});

} // namespace planewright

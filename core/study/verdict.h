// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// How a point stands against the strengths of its checks; in the order of their weight.
enum class Standing {
  notChecked, ///< there is nothing to be judged
  within,
  unjudged, ///< within as far as it was judged, but something could not be
  exceeds
};

/// One check of one combination at a point.
struct JudgedCheck {
  std::string point;
  std::size_t state = 0;  ///< in the Readout of the point
  std::size_t check = 0;  ///< in the checks of the Readout
  double utilisation = 0; ///< the worst in the band
  bool operator==(const JudgedCheck&) const = default;
};

/// What all that was judged comes to.
struct Verdict {
  Standing standing = Standing::notChecked;
  std::optional<JudgedCheck> governing; ///< the greatest utilisation; of equals the first
  std::optional<JudgedCheck> unjudged;  ///< the first that could not be judged
  bool stressed = false;                ///< anything that was judged has a stress
  bool operator==(const Verdict&) const = default;
};

/// Whose words stand for a verdict: what could not be judged where all that was judged is within, else what
/// governs; none where there is nothing to be judged.
const std::optional<JudgedCheck>& toldOf(const Verdict& verdict);

/// Of one check in one combination; of all checks in one; of one check over all combinations; of all.
Verdict verdictOf(const Readout& readout, std::size_t state, std::size_t check);
Verdict verdictOfState(const Readout& readout, std::size_t state);
Verdict verdictOfCheck(const Readout& readout, std::size_t check);
Verdict verdictOf(const Readout& readout);
Verdict verdictOf(const std::vector<Readout>& points);

const CheckReading& readingOf(const Readout& readout, const JudgedCheck& judged);

/// Whether all that follows from the checks is the same in two Readouts, whatever plane each of them reads.
bool isJudgedAlike(const Readout& a, const Readout& b);

/// One row of the summary: a check of a point over all combinations.
struct SummaryRow {
  std::string point;
  CheckSetup check;
  Verdict verdict;
  std::string combination; ///< that is told of the verdict
  CheckReading reading;    ///< there
  bool operator==(const SummaryRow&) const = default;
};

/// All points of a valid study with all their checks.
struct Summary {
  std::vector<SummaryRow> rows;
  std::vector<std::string> unchecked; ///< points without any check
  Standing standing = Standing::notChecked;
  bool operator==(const Summary&) const = default;
};
Summary summarise(const Study& study);

} // namespace planewright

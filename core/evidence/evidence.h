// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"
#include "core/words/problem.h"

#include <optional>
#include <span>

namespace planewright {

/// How a published value is judged; the words stand in the files of checks.
enum class CheckStatus {
  ok,        ///< "OK": computed and printed differ by at most the tolerance
  lastDigit, ///< "LAST_DIGIT": the source rounded on its way; judged by own arithmetic
  sign,      ///< "SIGN": the source prints a magnitude or has another rule of signs; magnitudes are judged
  noPrintedValue ///< "NO_PRINTED_VALUE": only the inputs are published; no outside check of a number
};

template <>
const std::vector<Named<CheckStatus>>& namesOf<CheckStatus>();

/// One published value beside what the program computes from the published inputs, both in `unit`.
struct CheckResult {
  std::string id;
  std::string source;  ///< the work
  std::string locator; ///< where in the work
  std::string basis;   ///< "read in the work itself", "from memory" ...
  std::string inputs;
  std::string quantity; ///< a word of core/evidence/quantity.h: "s1", "thp1", "Iz"
  std::string unit;
  CheckStatus status = CheckStatus::ok;
  std::optional<double> printed = std::nullopt;
  double tolerance = 0;
  double computed = 0;
  double recomputed = 0; ///< own arithmetic that stands beside the printed value in the file
  bool agrees = false;   ///< judged as the status says; without a printed value, by own arithmetic
};

/// Every row of a file of checks, recomputed in its order. The first row names the columns. Rows that do not
/// read, and quantities that nothing computes, are Problems with their line: no row is passed over.
Results<std::vector<CheckResult>> recomputed(std::span<const std::string_view> rows);

/// A shipped file of checks.
struct ShippedChecks {
  std::string name;                       ///< "section_tables.csv"
  std::span<const std::string_view> rows; ///< its heading first
};
/// The shipped files in the order in which they are reported.
std::span<const ShippedChecks> shippedChecks();

/// The shipped list of misprints, its heading first.
std::span<const std::string_view> shippedMisprints();

/// The shipped checks of all files, recomputed.
Results<std::vector<CheckResult>> publishedChecks();

} // namespace planewright

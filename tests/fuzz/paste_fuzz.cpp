// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a table pasted into a study, with and without its first row as a header. What is taken
// passes as edits and copies out to a table that changes nothing; what is refused leaves no edit and is
// refused with Problems that point into the table.
#include "core/record/copied_points.h"
#include "core/record/pasted_points.h"
#include "tests/fuzz/promises.h"

#include <cstdint>

using namespace planewright;

namespace {

/// With a section, so that forces can be taken.
Study study() {
  return edited(newStudy(),
                {Insert{{Spot::section, "beam", {}}, std::nullopt},
                 Insert{{Spot::fibre, "P1", {}}, std::nullopt}, Type{{Spot::fibreSection, "P1", {}}, "beam"}})
      .value();
}

void checkTaken(const Study& before, const PastedPoints& pasted) {
  const Result<Study> after = edited(before, pasted.edits);
  require(after && problemsIn(*after).empty());
  for (const char separator : {'\t', ','}) {
    const PastedPoints again = pastedPoints(*after, copiedPoints(after->points, separator));
    require(again.isSound() && again.edits.empty());
  }
}

void checkProblem(const Problem& problem, int lines) {
  require(problem.line >= 0 && problem.line <= lines && problem.column >= 0);
  require(problem.column <= static_cast<int>(mostTableColumns) + 1);
  requireWords(problem);
}

void check(std::string_view text, const ColumnChoices& choices) {
  static const Study before = study();
  const PastedPoints pasted = pastedPoints(before, text, choices);
  for (const PastedRow& row : pasted.rows)
    require(row.cells.size() == pasted.columns.size());
  if (pasted.isSound())
    return checkTaken(before, pasted);
  require(pasted.edits.empty());
  const auto isBreak = [](char c) { return c == '\n' || c == '\r'; };
  const auto lines = static_cast<int>(std::count_if(text.begin(), text.end(), isBreak)) + 1;
  for (const Problem& problem : pasted.allProblems())
    checkProblem(problem, lines);
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  using enum ColumnKind;
  const std::string_view text(reinterpret_cast<const char*>(data), size);
  check(text, {});
  check(text, {{loadCase, sx, N, note, point}, false});
  return 0;
}

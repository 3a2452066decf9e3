// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a table of very many points, whole and in pieces: the same comes of it, every row is
// either taken or counted, what is told points into the table, and no number that is none gets past.
#include "tests/support/field_reading.h"

#include "core/stress/circle.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <cmath>
#include <cstdint>
#include <cstdlib>

using namespace planewright;

namespace {

void require(bool condition) {
  if (!condition)
    std::abort();
}

void checkProblem(const Problem& problem, int lines) {
  require(problem.line >= 0 && problem.line <= lines && problem.column >= 0);
  require(!problem.what.empty());
  const std::string words = plain(problem);
  require(isUtf8(words));
  require(std::none_of(words.begin(), words.end(), [](unsigned char c) { return c < 0x20 || c == 0x7F; }));
}

void checkField(const FieldReading& reading) {
  require(reading.faultyRows <= reading.rows && reading.notFinite <= reading.faultyRows);
  require(reading.faults.size() <= 100);
  const Field& field = reading.field;
  std::size_t incomplete = 0;
  for (std::size_t point = 0; point < field.size(); ++point) {
    require(isUtf8(field.nameOf(point)) && !field.nameOf(point).empty());
    incomplete += field.standingOf(point) == PointStanding::incomplete;
    for (std::size_t k = 0; k < field.cases().size(); ++k) {
      const PlaneStress stress = field.stressOf(k, point);
      const bool isGiven = !std::isnan(stress.sx);
      require(isGiven == !std::isnan(stress.sy) && isGiven == !std::isnan(stress.txy));
      require(!isGiven || scaleOf(stress) <= 1e100);
      require(isGiven || field.standingOf(point) != PointStanding::whole);
    }
  }
  require(incomplete == reading.incompletePoints);
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  static const Study study = readingStudy();
  const std::string_view table(reinterpret_cast<const char*>(data), size);
  const auto lines = static_cast<int>(std::count(table.begin(), table.end(), '\n')) + 1;
  const Results<FieldReading> reading = readingOf(study, table);
  for (const Problem& problem : reading ? reading->faults : reading.error())
    checkProblem(problem, lines);
  if (reading)
    checkField(*reading);
  require(written(reading) == written(readingOf(study, table, {}, 1 + size / 3)));
  return 0;
}

// SPDX-License-Identifier: GPL-3.0-or-later
// Reads each line "field<tab>text" of the input, the form of the corpus files, and holds what is read to its
// promises: a taken text reads back to the same, a refused one points into itself.
#include "tests/support/expression_corpus.h"

#include "tests/fuzz/promises.h"

#include <cmath>
#include <cstdint>

using namespace planewright;

namespace {

void checkEntry(const Entry& entry, const EntryKind& kind) {
  require(std::isfinite(entry.value) && !(entry.value == 0 && std::signbit(entry.value)));
  require(std::isfinite(entry.halfWidth) && entry.halfWidth >= 0);
  const auto again = readEntry(entry.text, kind);
  require(again && *again == entry);
}

void checkProblem(const Problem& problem, std::string_view text) {
  require(problem.place.empty() && problem.line == 0);
  require(problem.column >= 1 && static_cast<std::size_t>(problem.column) <= text.size() + 1);
  require(!problem.mend.empty());
  require(text.find(problem.quoted) != std::string_view::npos);
  require(plain(problem).size() < 2000);
  requireWords(problem);
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  for (const std::string_view line : parts({reinterpret_cast<const char*>(data), size}, '\n')) {
    const auto cells = parts(line, '\t');
    const auto kind = cells.size() > 1 ? fieldOf(cells[0]) : std::nullopt;
    if (!kind)
      continue;
    const auto entry = readEntry(cells[1], *kind);
    if (entry)
      checkEntry(*entry, *kind);
    else
      checkProblem(entry.error(), cells[1]);
  }
  return 0;
}

// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/paste holds one table for each trap, NAME.table, and beside it NAME.problems: one line for
// each expected Problem of pasting it into a new study, "LINE:COLUMN QUOTED", or no line for one that is
// taken.
#include "core/record/pasted_points.h"

#include "tests/support/corpus.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Corpus& corpus() {
  static const Corpus tables("paste", ".table");
  return tables;
}

class PasteCorpus : public testing::TestWithParam<std::string> {};

TEST_P(PasteCorpus, hasTheExpectedProblems) {
  const PastedPoints pasted = pastedPoints(newStudy(), corpus().bytesOf(GetParam()));
  std::string lines;
  for (const Problem& problem : pasted.allProblems()) {
    EXPECT_FALSE(problem.what.empty());
    EXPECT_FALSE(problem.mend.empty());
    lines +=
        std::to_string(problem.line) + ":" + std::to_string(problem.column) + " " + problem.quoted + "\n";
  }
  EXPECT_TRUE(corpus().matches(GetParam(), lines));
  EXPECT_TRUE(pasted.edits.empty() || pasted.isSound());
}

INSTANTIATE_TEST_SUITE_P(Files, PasteCorpus, testing::ValuesIn(corpus().names()),
                         [](const auto& file) { return testName(file.param); });

TEST(PasteCorpusFolder, hasAFileForEachListOfProblems) {
  EXPECT_GE(corpus().names().size(), 40u);
  EXPECT_EQ(corpus().strays(), std::set<std::string>());
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/paste holds one table for each trap, NAME.table, and beside it NAME.problems: one line for
// each expected Problem of pasting it into a new study, "LINE:COLUMN QUOTED", or no line for one that is
// taken.
#include "core/record/pasted_points.h"

#include "tests/support/approved.h"

#include <gtest/gtest.h>

#include <set>

namespace planewright {
namespace {

std::filesystem::path corpus() {
  return std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "corpus/paste";
}

std::set<std::string> names() {
  std::set<std::string> names;
  for (const auto& entry : std::filesystem::directory_iterator(corpus()))
    if (entry.path().extension() == ".table")
      names.insert(entry.path().stem().string());
  return names;
}

class PasteCorpus : public testing::TestWithParam<std::string> {};

TEST_P(PasteCorpus, hasTheExpectedProblems) {
  std::ifstream stream(corpus() / (GetParam() + ".table"), std::ios::binary);
  const std::string text{std::istreambuf_iterator<char>(stream), {}};
  const PastedPoints pasted = pastedPoints(newStudy(), text);
  std::string lines;
  for (const Problem& problem : pasted.allProblems()) {
    EXPECT_FALSE(problem.what.empty());
    EXPECT_FALSE(problem.mend.empty());
    lines +=
        std::to_string(problem.line) + ":" + std::to_string(problem.column) + " " + problem.quoted + "\n";
  }
  EXPECT_TRUE(matchesApproved("../corpus/paste/" + GetParam() + ".problems", lines));
  EXPECT_TRUE(pasted.edits.empty() || pasted.isSound());
}

INSTANTIATE_TEST_SUITE_P(Files, PasteCorpus, testing::ValuesIn(names()), [](const auto& file) {
  std::string name = file.param;
  std::erase(name, '-');
  return name;
});

TEST(PasteCorpusFolder, hasAFileForEachListOfProblems) {
  const std::set<std::string> files = names();
  EXPECT_GE(files.size(), 20u);
  for (const auto& entry : std::filesystem::directory_iterator(corpus()))
    EXPECT_TRUE(files.contains(entry.path().stem().string())) << entry.path();
}

} // namespace
} // namespace planewright

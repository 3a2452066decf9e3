// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/study holds one study file for each trap, NAME.planewright, and beside it NAME.problems: one
// line for each expected Problem, "LINE:COLUMN PLACE QUOTED", or no line for a file that must be read.
#include "core/record/study_file.h"

#include "tests/support/corpus.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Corpus& corpus() {
  static const Corpus studies("study", ".planewright");
  return studies;
}

class StudyCorpus : public testing::TestWithParam<std::string> {};

TEST_P(StudyCorpus, hasTheExpectedProblems) {
  const Results<Study> study = readStudy(corpus().bytesOf(GetParam()));
  EXPECT_TRUE(corpus().matches(GetParam(), study ? std::string() : listed(study.error())));
  if (study) {
    EXPECT_EQ(readStudy(writeStudy(*study)), study);
    return;
  }
  for (const Problem& problem : study.error())
    EXPECT_FALSE(problem.what.empty());
}

INSTANTIATE_TEST_SUITE_P(Files, StudyCorpus, testing::ValuesIn(corpus().names()),
                         [](const auto& file) { return testName(file.param); });

TEST(StudyCorpusFolder, hasAFileForEachListOfProblems) {
  EXPECT_GE(corpus().names().size(), 70u);
  EXPECT_EQ(corpus().strays(), std::set<std::string>());
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/study holds one study file for each trap, NAME.planewright, and beside it NAME.problems: one
// line for each expected Problem, "LINE:COLUMN PLACE QUOTED", or no line for a file that must be read.
#include "core/record/study_file.h"

#include "tests/support/approved.h"

#include <gtest/gtest.h>

#include <set>

namespace planewright {
namespace {

std::filesystem::path corpus() {
  return std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "corpus/study";
}

std::set<std::string> names() {
  std::set<std::string> names;
  for (const auto& entry : std::filesystem::directory_iterator(corpus()))
    if (entry.path().extension() == ".planewright")
      names.insert(entry.path().stem().string());
  return names;
}

std::string bytesOf(const std::string& file) {
  std::ifstream stream(corpus() / file, std::ios::binary);
  return {std::istreambuf_iterator<char>(stream), {}};
}

std::string listed(const Problems& problems) {
  std::string lines;
  for (const Problem& problem : problems)
    lines += std::to_string(problem.line) + ":" + std::to_string(problem.column) + " " +
             (problem.place.empty() ? "-" : problem.place) + " " + problem.quoted + "\n";
  return lines;
}

class StudyCorpus : public testing::TestWithParam<std::string> {};

TEST_P(StudyCorpus, hasTheExpectedProblems) {
  const Results<Study> study = readStudy(bytesOf(GetParam() + ".planewright"));
  EXPECT_TRUE(matchesApproved("../corpus/study/" + GetParam() + ".problems",
                              study ? std::string() : listed(study.error())));
  if (study) {
    EXPECT_EQ(readStudy(writeStudy(*study)), study);
    return;
  }
  for (const Problem& problem : study.error())
    EXPECT_FALSE(problem.what.empty());
}

INSTANTIATE_TEST_SUITE_P(Files, StudyCorpus, testing::ValuesIn(names()), [](const auto& file) {
  std::string name = file.param;
  std::erase(name, '-');
  return name;
});

TEST(StudyCorpusFolder, hasAFileForEachListOfProblems) {
  const std::set<std::string> files = names();
  EXPECT_GE(files.size(), 70u);
  for (const auto& entry : std::filesystem::directory_iterator(corpus()))
    EXPECT_TRUE(files.contains(entry.path().stem().string())) << entry.path();
}

} // namespace
} // namespace planewright

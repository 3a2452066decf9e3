// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/embedded holds one file that carries a study for each trap, NAME.carrier, and beside it
// NAME.problems: what is said about it, or nothing for a file whose study must be read.
#include "core/record/embedded_study.h"

#include "tests/support/corpus.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Corpus& corpus() {
  static const Corpus files("embedded", ".carrier");
  return files;
}

class EmbeddedCorpus : public testing::TestWithParam<std::string> {};

TEST_P(EmbeddedCorpus, saysWhatIsExpected) {
  const Results<OpenedStudy> opened = openedStudy(corpus().bytesOf(GetParam()));
  std::string said;
  for (const Problem& problem : opened ? Problems() : opened.error())
    said += plain(problem) + "\n";
  EXPECT_TRUE(corpus().matches(GetParam(), said));
  EXPECT_TRUE(!opened || opened->isRestored);
}

INSTANTIATE_TEST_SUITE_P(Files, EmbeddedCorpus, testing::ValuesIn(corpus().names()),
                         [](const auto& file) { return testName(file.param); });

TEST(EmbeddedCorpusFolder, hasAFileForEachListOfProblems) {
  EXPECT_GE(corpus().names().size(), 20u);
  EXPECT_EQ(corpus().strays(), std::set<std::string>());
}

} // namespace
} // namespace planewright

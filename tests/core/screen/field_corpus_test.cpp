// SPDX-License-Identifier: GPL-3.0-or-later
// Every table of tests/corpus/field, and what comes of it. The fuzzer starts from the same files.
#include "tests/support/corpus.h"
#include "tests/support/field_reading.h"

namespace planewright {
namespace {

const Corpus corpus("field", ".table");

class FieldCorpus : public testing::TestWithParam<std::string> {};

TEST_P(FieldCorpus, tellsWhatIsExpected) {
  EXPECT_TRUE(corpus.matches(GetParam(), written(readingOf(readingStudy(), corpus.bytesOf(GetParam())))));
}

INSTANTIATE_TEST_SUITE_P(Corpus, FieldCorpus, testing::ValuesIn(corpus.names()),
                         [](const auto& instance) { return testName(instance.param); });

TEST(FieldCorpus, hasNoFileWithoutATable) {
  EXPECT_TRUE(corpus.strays().empty());
}

} // namespace
} // namespace planewright

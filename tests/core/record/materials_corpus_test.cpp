// SPDX-License-Identifier: GPL-3.0-or-later
// tests/corpus/materials holds one file of materials for each trap, NAME.json, and beside it NAME.problems:
// as in tests/corpus/study.
#include "core/record/materials_file.h"
#include "tests/support/corpus.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Corpus& corpus() {
  static const Corpus materials("materials", ".json");
  return materials;
}

class MaterialsCorpus : public testing::TestWithParam<std::string> {};

TEST_P(MaterialsCorpus, hasTheExpectedProblems) {
  const auto materials = readMaterials(corpus().bytesOf(GetParam()));
  EXPECT_TRUE(corpus().matches(GetParam(), materials ? std::string() : listed(materials.error())));
  if (materials) {
    EXPECT_EQ(readMaterials(writeMaterials(*materials)), materials);
  }
}

INSTANTIATE_TEST_SUITE_P(Files, MaterialsCorpus, testing::ValuesIn(corpus().names()),
                         [](const auto& file) { return testName(file.param); });

TEST(MaterialsCorpusFolder, hasAFileForEachListOfProblems) {
  EXPECT_GE(corpus().names().size(), 14u);
  EXPECT_EQ(corpus().strays(), std::set<std::string>());
}

} // namespace
} // namespace planewright

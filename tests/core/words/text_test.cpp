// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/problem.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(Text, indicesBecomeLoweredRuns) {
  const Runs expected = {{"σ", false}, {"n", true}, {" MPa", false}};
  EXPECT_EQ(runs(PW_TEXT("Test", "σ_{n} MPa")), expected);
  EXPECT_EQ(plain(PW_TEXT("Test", "σ_{n} MPa")), "σn MPa");
}

TEST(Text, argumentsStandWhereTheTranslationPutsThem) {
  const Text text = PW_TEXT("Test", "%1 of %2").with("3").with("24");
  EXPECT_EQ(plain(text), "3 of 24");
  const Translate turned = [](const std::string&, const std::string&) { return std::string("%2: %1"); };
  EXPECT_EQ(plain(text, turned), "24: 3");
}

TEST(Text, verbatimWordsAreNeverReadAsMarkers) {
  EXPECT_EQ(plain(PW_TEXT("Test", "[%1]").with("100 %1 _{x}")), "[100 %1 _{x}]");
}

TEST(Text, anArgumentKeepsItsOwnIndex) {
  const Runs expected = {{"on σ", false}, {"1", true}, {", up", false}};
  EXPECT_EQ(runs(PW_TEXT("Test", "on %1, up").with(symbol("σ_{1}"))), expected);
}

TEST(Problem, saysPlaceLineAndColumnBeforeTheSentences) {
  const Problem problem{"study",
                        3,
                        5,
                        "1,5",
                        PW_TEXT("Test", "“%1” has a decimal comma.").with("1,5"),
                        PW_TEXT("Test", "Write 1.5.")};
  EXPECT_EQ(plain(problem), "study, line 3, column 5: “1,5” has a decimal comma. Write 1.5.");
}

TEST(Problem, staysOnOneLineAndSteersNoTerminal) {
  const Problem problem{"P\n1", 0, 0, {}, PW_TEXT("Test", "“%1” is odd.").with("\x1B[31m\x7F\t"), {}};
  EXPECT_EQ(plain(problem), "P 1: “ [31m  ” is odd.");
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/study/slips.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

Study studyOf(const char* sx, const char* sy, const char* txy, const char* reading, const char* line) {
  Study study = newStudy();
  study.points.front().stress = {{"G", sx, sy, txy, "0 MPa"}};
  study.points.front().reading = reading;
  study.points.front().lines.front().angle = line;
  return study;
}

/// The golden state 80, 20, -30 MPa with normal 25 deg and line 1 in 10.
Study golden() {
  return studyOf("80 MPa", "20 MPa", "-30 MPa", "25 deg", "1 in 10");
}

std::vector<std::string> slipsThatMake(const Study& study, Asked asked, const char* typed) {
  const auto result = compared(study, evaluate(study), asked, typed);
  EXPECT_TRUE(result) << (result ? "" : plain(result.error()));
  std::vector<std::string> words;
  if (result) {
    EXPECT_FALSE(result->agrees);
    for (const Text& slip : result->slips)
      words.push_back(plain(slip));
  }
  return words;
}

bool holds(const std::vector<std::string>& words, const std::string& piece) {
  return std::ranges::any_of(words,
                             [&](const std::string& one) { return one.find(piece) != std::string::npos; });
}

TEST(Slips, aRightNumberAgreesToItsLastDigit) {
  const Study study = golden();
  const Readout readout = evaluate(study);
  for (const char* typed : {"46.302295", "46.30", "46.3", "46"})
    EXPECT_TRUE(compared(study, readout, Asked::sn, typed)->agrees) << typed;
  EXPECT_FALSE(compared(study, readout, Asked::sn, "46.31")->agrees);
  EXPECT_TRUE(compared(study, readout, Asked::s1, "92.43 MPa")->agrees);
}

// Each number worked by hand from the formulas with the slip in them.
TEST(Slips, numbersWorkedByHandAreNamed) {
  // sn(115 deg) = 100 - 46.302295
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::sn, "53.70"), "the cut taken for that of its normal"));
  // 50 + 30 cos 25 - 30 sin 25
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::sn, "64.51"), "doubling forgotten"));
  // 50 + 30 cos 50 + 30 sin 50
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::sn, "92.26"), "sign of τxy"));
  // cos and sin of 50 rad: 0.964966, -0.262375
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::sn, "86.82"), "functions of radians"));
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::tnt, "42.26"), "another convention"));
  // the line 1 in 10 read as 10 degrees: 50 + 30 cos 20 - 30 sin 20
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::along, "67.93"), "n degrees"));
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::along, "26.53"), "across"));
  // hypot(60, 30) = 67.082
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::tauMax, "67.08"), "whole difference"));
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::tauMax, "46.21"), "all planes"));
}

// Lord et al. 2026, chapter 12: the key-equations box has the mean in the radius (resources/checks,
// conventions).
TEST(Slips, aMisprintedBoxOfFormulasIsNamed) {
  // hypot(50, 30) = 58.309..., s1 = 108.31
  EXPECT_TRUE(holds(slipsThatMake(golden(), Asked::s1, "108.31"), "the radius with the mean"));
}

TEST(Slips, eachIsNamedForTheNumberThatItMakes) {
  for (const Study& study : {golden(), studyOf("-18.6 MPa", "4.2 MPa", "7.5 MPa", "-63.2 deg", "1 in 12"),
                             studyOf("3 MPa", "-1 MPa", "0.4 MPa", "12 deg", "-1 in 7")}) {
    const Readout readout = evaluate(study);
    for (const Named<Asked>& asked : namesOf<Asked>())
      for (const Slip& slip : slipsFor(asked.value, readout)) {
        // An expression stands for 1e-12 of its value, a plain number for half its last digit.
        const auto result = compared(study, readout, asked.value, exactNumber(slip.value) + "*1");
        ASSERT_TRUE(result);
        EXPECT_FALSE(result->agrees) << plain(slip.words);
        EXPECT_TRUE(std::ranges::count(result->slips, slip.words) == 1) << plain(slip.words);
      }
  }
}

TEST(Slips, aNumberOfNoKnownSlipNamesNone) {
  EXPECT_TRUE(slipsThatMake(golden(), Asked::sn, "12.345678").empty());
}

TEST(Slips, aPointWithoutALineIsToldSo) {
  Study study = golden();
  study.points.front().lines.clear();
  const auto result = compared(study, evaluate(study), Asked::along, "3");
  ASSERT_FALSE(result);
  EXPECT_EQ(plain(result.error().what), "This point has no line.");
  EXPECT_FALSE(compared(golden(), evaluate(golden()), Asked::sn, "3 kN"));
}

} // namespace
} // namespace planewright

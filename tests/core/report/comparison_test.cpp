// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/comparison.h"

#include "core/study/edit.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

std::string told(const Study& before, const Edits& edits) {
  return comparisonText(compared(before, *edited(before, edits)));
}

TEST(Comparison, aStudyDoesNotDifferFromItself) {
  EXPECT_EQ(told(judgedStudy(), {}), "Nothing differs.\n");
}

TEST(Comparison, whatIsShownIsNoDifference) {
  EXPECT_EQ(told(judgedStudy(), {Type{{Spot::shownCombination, {}, {}}, "1.35 G"}}), "Nothing differs.\n");
}

TEST(Comparison, listsInputsAndResults) {
  EXPECT_EQ(
      told(judgedStudy(), {Type{{Spot::sx, "P1", "G"}, "6 MPa"}}),
      "Inputs that differ\n"
      "  P1, G: σx: 6 MPa, was 1.6 MPa\n"
      "Results that differ\n"
      "  verdict of the study: Stress at this point exceeds the stated strengths., was Stress at this point "
      "within the stated strengths.\n"
      "  P1: greatest σ1: 9.455 MPa (1.35 G + 1.5 S), was 3.523 MPa (1.35 G + 1.5 S)\n"
      "  P1: greatest shear in the plane: 4.730 MPa (1.35 G + 1.5 S), was 1.768 MPa (1.35 G + 1.5 S)\n"
      "  P1: check grain: exceeds, 1.36 (1.35 G), was within, 0.36 of 1 (1.35 G + 1.5 S)\n"
      "  P1: check scarf: exceeds, 1.90 (1.35 G + 1.5 S), was within, 0.76 of 1 (1.35 G + 1.5 S)\n");
}

TEST(Comparison, aThingThatCameIsOneRow) {
  const std::string text = told(judgedStudy(), {Insert{{Spot::point, "P2", {}}, std::nullopt},
                                                Insert{{Spot::loadCase, "W", {}}, std::nullopt}});
  EXPECT_NE(text.find("point P2: there, was nothing"), std::string::npos) << text;
  EXPECT_NE(text.find("load case W: there, was nothing"), std::string::npos) << text;
  EXPECT_EQ(text.find("P2: reading"), std::string::npos) << text;
}

RC_GTEST_PROP(Comparison, goesBothWays, ()) {
  const Study a = *anyStudy();
  const Study b = *anyStudy();
  const Comparison forth = compared(a, b);
  const Comparison back = compared(b, a);
  RC_ASSERT(forth.inputs.size() == back.inputs.size());
  RC_ASSERT(forth.results.size() == back.results.size());
  RC_ASSERT(compared(a, a).empty());
}

} // namespace
} // namespace planewright

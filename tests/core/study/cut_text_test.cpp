// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/cut_text.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

TEST(CutText, anAngleCarriesItsUnit) {
  EXPECT_EQ(angleText(Angle::fromDegrees(12.5)), "12.5 deg");
  EXPECT_EQ(angleText(Angle::fromDegrees(-0.0)), "0 deg");
}

TEST(CutText, theNormalStandsSquareToTheCut) {
  EXPECT_EQ(normalTextForCut("30"), "-60 deg");
  EXPECT_EQ(normalTextForCut("-60 deg"), "30 deg");
  EXPECT_EQ(normalTextForCut("0"), "90 deg");
  EXPECT_EQ(normalTextForCut("90 deg/4"), "-67.5 deg");
}

TEST(CutText, aCutRunsAlongASlope) {
  EXPECT_EQ(normalTextForCut("1 in 1"), "-45 deg");
  EXPECT_EQ(normalTextForCut("-1:1"), "45 deg");
}

RC_GTEST_PROP(CutText, anAngleReadsBackAsTheSameDouble, (int numerator)) {
  const Angle angle = Angle::fromDegrees(numerator / 7.0 / 1e6);
  const Result<Entry> back = readEntry(angleText(angle), {dimension::angle, degreeUnit()});
  RC_ASSERT(back.has_value());
  RC_ASSERT(back->value == angle.degrees());
}

TEST(CutText, whatDoesNotReadSaysWhy) {
  const Result<std::string> normal = normalTextForCut("1,5");
  ASSERT_FALSE(normal);
  EXPECT_EQ(normal.error().quoted, "1,5");
  EXPECT_FALSE(normalTextForCut("12 kN"));
  EXPECT_FALSE(normalTextForCut(""));
}

RC_GTEST_PROP(CutText, aCutReadsBack, (int tenths)) {
  const NormalAngle normal{folded(Angle::fromDegrees(tenths % 1800 / 10.0))};
  const Result<std::string> back = normalTextForCut(cutText(normal));
  RC_ASSERT(back.has_value());
  const Result<Entry> angle = readEntry(*back, {dimension::angle, degreeUnit()});
  RC_ASSERT(angle.has_value());
  RC_ASSERT(apart(Angle::fromDegrees(angle->value), normal.value).degrees() < 1e-12);
}

} // namespace
} // namespace planewright

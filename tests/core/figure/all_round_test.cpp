// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/all_round.h"

#include "core/study/edit.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

AllRound fresh(const Readout& readout, std::size_t check) {
  AllRound allRound;
  allRound.follow(readout, check);
  return allRound;
}

TEST(AllRound, saysAfterAnyEditWhatOneThatSawNoneBeforeSays) {
  Study study = judgedStudy();
  AllRound allRound;
  allRound.follow(evaluate(study), 0);
  const auto holdsFor = [&](std::size_t check) {
    const Readout readout = evaluate(study);
    allRound.follow(readout, check);
    const AllRound other = fresh(readout, check);
    EXPECT_EQ(allRound.curves(), other.curves());
    EXPECT_EQ(allRound.directions(), other.directions());
  };
  Point& point = study.points.front();
  point.lines.front().angle = "30 deg";
  holdsFor(0);
  point.lines.front().tolerance = "7 deg";
  holdsFor(0);
  point.stress.front().sx = "3 MPa";
  holdsFor(0);
  holdsFor(1);
  holdsFor(0);
  study.materials.front().acrossTension = "0.3 MPa";
  holdsFor(0);
  study.shown.combination = "1.35 G";
  holdsFor(0);
  study.materials.front().acrossTension = "";
  holdsFor(0);
  EXPECT_FALSE(allRound.directions()) << "nothing can be judged";
  study.materials.front().acrossTension = "0.4 MPa";
  holdsFor(0);
  EXPECT_TRUE(allRound.directions());
}

TEST(AllRound, keepsItsCurvesWhileTheLineTurnsAndLooksFromItsDirection) {
  Study study = judgedStudy();
  AllRound allRound;
  allRound.follow(evaluate(study), 0);
  const Vec* const curve = allRound.curves().greatest.data();
  const std::optional<double> slope = allRound.directions()->slope;
  study.points.front().lines.front().angle = "40 deg";
  allRound.follow(evaluate(study), 0);
  EXPECT_EQ(allRound.curves().greatest.data(), curve);
  EXPECT_NE(allRound.directions()->slope, slope);
}

} // namespace
} // namespace planewright

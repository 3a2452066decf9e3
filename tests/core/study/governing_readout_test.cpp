// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/governing_readout.h"

#include "core/study/verdict.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(GoverningReadout, showsTheGreatestUtilisation) {
  Study study = judgedStudy();
  study.combinations.push_back({"0.1 G", {{"G", "0.1"}}, Basis::design});
  study.shown.combination = "0.1 G";
  EXPECT_EQ(governingReadout(study, "P1").state().combination, "1.35 G + 1.5 S");
}

TEST(GoverningReadout, showsTheGreatestStressWhereNothingIsChecked) {
  Study study = judgedStudy();
  study.points.front().checks.clear();
  study.combinations.push_back({"2 G + 2 S", {{"G", "2"}, {"S", "2"}}, Basis::design});
  const Readout readout = governingReadout(study, "P1");
  EXPECT_EQ(readout.state().combination, "2 G + 2 S");
  EXPECT_EQ(readout.states, evaluate(study, "P1").states) << "all but what is shown is as ever";
}

TEST(GoverningReadout, isOfTheNamedPoint) {
  Study study = judgedStudy();
  study.points.push_back(study.points.front());
  study.points.back().name = "P2";
  study.points.back().stress = {CaseStress{"G", "9 MPa", "0 MPa", "0 MPa"},
                                CaseStress{"S", "-12 MPa", "0 MPa", "0 MPa"}};
  EXPECT_EQ(governingReadout(study, "P2").point, "P2");
  EXPECT_EQ(governingReadout(study, "P2").state().combination, "1.35 G");
}

} // namespace
} // namespace planewright

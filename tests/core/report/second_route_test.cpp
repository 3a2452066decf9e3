// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/second_route.h"

#include "core/report/make_sheet.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

TEST(SecondRoute, agreesOnAStudyThatIsJudged) {
  const RouteComparison routes = comparedRoutes(readoutsOf(judgedStudy(), {}));
  EXPECT_TRUE(routes.agrees());
  EXPECT_LT(routes.greatest, 1e-13);
  EXPECT_GE(routes.compared, 40u);
}

TEST(SecondRoute, findsEachResultThatIsWrong) {
  const Readout right = evaluate(judgedStudy());
  const auto wrongWhen = [&](auto spoil) {
    Readout readout = right;
    spoil(readout.states[1]);
    return !comparedRoutes({readout}).agrees();
  };
  EXPECT_FALSE(wrongWhen([](StateReading&) {}));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.stress.txy += 1e-6; }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.circle.s1 += 1e-6; }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) {
    state.circle.theta1 = NormalAngle{state.circle.theta1->value + Angle::fromDegrees(1e-3)};
  }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.reading.tnt = -state.reading.tnt; }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { std::swap(state.lines[0].along, state.lines[0].across); }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.watched[0].sn *= 1.0001; }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.checks[0].first->multiplier *= 1.0001; }));
  EXPECT_TRUE(wrongWhen([](StateReading& state) { state.checks[0].worst.utilisation *= 0.999; }));
}

TEST(SecondRoute, aResultThatIsNoNumberDisagrees) {
  Readout readout = evaluate(judgedStudy());
  readout.states[0].circle.s2 = std::numeric_limits<double>::quiet_NaN();
  EXPECT_FALSE(comparedRoutes({readout}).agrees());
}

RC_GTEST_PROP(SecondRoute, agreesOnAnyStudy, ()) {
  const RouteComparison routes = comparedRoutes(readoutsOf(*anyStudy(), {}));
  if (!routes.agrees())
    RC_LOG(plain(routes.disagree.front().quantity));
  RC_ASSERT(routes.agrees());
}

} // namespace
} // namespace planewright

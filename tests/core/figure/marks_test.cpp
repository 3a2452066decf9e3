// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/marks.h"

#include "tests/core/figure/studies.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <set>

namespace planewright {
namespace {

std::vector<Mark> marksOfGiven(const Given& given) {
  const Study study = studyOf(given);
  return marksOf(study, evaluate(study));
}

TEST(Marks, haveTheirLabelsInTheOrderOfTheTable) {
  std::vector<std::string> labels;
  for (const Mark& mark : marksOfGiven({8.4, -0.6, 2.1, 5.710593, 0, 30, 0, true}))
    labels.push_back(plain(mark.longForm));
  const std::vector<std::string> expected = {"n 7.969 | −2.847", "x",           "y",
                                             "σ1 8.866",         "σ2 −1.066",   "τ 4.966",
                                             "τ −4.966",         "along 8.727", "across −0.927"};
  EXPECT_EQ(labels, expected);
}

TEST(Marks, goShortFromTheLeastWantedOn) {
  Study study = studyOf({8.4, -0.6, 2.1, 5, 0, 30, 0, true});
  study.points.front().planes = {{"scarf", "55 deg", ""}};
  std::vector<Mark> marks = marksOf(study, evaluate(study));
  std::stable_sort(marks.begin(), marks.end(),
                   [](const Mark& a, const Mark& b) { return a.priority < b.priority; });
  std::string names;
  for (const Mark& mark : marks)
    names += plain(mark.shortForm) + " ";
  EXPECT_EQ(names, "n σ1 σ2 along across τ τ x y scarf ");
}

TEST(Marks, aDegenerateStateHasNoPrincipalOrShearMarks) {
  for (const Mark& mark : marksOfGiven({5, 5, 0, 20, 0, 30, 0, true})) {
    EXPECT_NE(mark.kind, PlaneKind::s1);
    EXPECT_NE(mark.kind, PlaneKind::shearMax);
    EXPECT_NEAR(mark.at.sn, 5, 1e-12);
    EXPECT_NEAR(mark.at.tnt, 0, 1e-12);
  }
}

TEST(Marks, severalLinesAreToldApart) {
  const Study study = studyOf({8.4, -0.6, 2.1, 5, 0, 30, 0, true});
  const Readout readout = evaluate(study, "P1", {{Line{"weld", LineKind::weld, "40 deg", ""}}, {}});
  std::set<std::string> labels;
  for (const Mark& mark : marksOf(study, readout))
    labels.insert(plain(mark.shortForm));
  for (const char* label : {"along grain", "across grain", "along weld", "across weld"})
    EXPECT_EQ(labels.count(label), 1U) << label;
}

TEST(Signs, outlinesAreClosedTurnsOfOneSense) {
  for (const Sign sign : {Sign::filledSquare, Sign::hollowSquare, Sign::uprightTick, Sign::levelTick,
                          Sign::filledLozenge, Sign::hollowLozenge}) {
    const SignShape shape = shapeOf(sign, 2);
    ASSERT_EQ(shape.outline.size(), 4U);
    double area = 0;
    for (std::size_t i = 0; i < 4; ++i) {
      const Vec a = shape.outline[i];
      const Vec b = shape.outline[(i + 1) % 4];
      area += (a.x * b.y - a.y * b.x) / 2;
    }
    EXPECT_GT(area, 0.2);
    EXPECT_LT(area, 4);
  }
  EXPECT_TRUE(shapeOf(Sign::filledRound, 2).filled);
  EXPECT_FALSE(shapeOf(Sign::hollowRound, 2).filled);
}

TEST(Signs, crossingIsFilledAndFollowingHollow) {
  EXPECT_EQ(signOf(PlaneKind::crossing), Sign::filledLozenge);
  EXPECT_EQ(signOf(PlaneKind::following), Sign::hollowLozenge);
  EXPECT_EQ(roleOf(PlaneKind::reading), Role::reading);
}

} // namespace
} // namespace planewright

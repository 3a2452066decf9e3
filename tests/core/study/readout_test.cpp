// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"
#include "core/study/named_directions.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

Study goldenStudy() {
  return *edited(newStudy(),
                 Edits{Type{{Spot::sx, "P1", "G"}, "80"}, Type{{Spot::sy, "P1", "G"}, "20"},
                       Type{{Spot::txy, "P1", "G"}, "-30"}, Type{{Spot::lineAngle, "P1", "grain"}, "1 in 10"},
                       Type{{Spot::reading, "P1", {}}, "25"}});
}

Edits factor(const std::string& combination, const std::string& caseId, const std::string& text) {
  return {Insert{{Spot::factor, combination, caseId}, {}}, Type{{Spot::factor, combination, caseId}, text}};
}

Study withCombination(const Study& study, const std::string& name,
                      const std::vector<std::pair<std::string, std::string>>& factors) {
  Study after = *edited(study, Edit{Insert{{Spot::combination, name, {}}, {}}});
  for (const auto& [caseId, text] : factors)
    after = *edited(after, factor(name, caseId, text));
  return after;
}

TEST(Readout, theGoldenState) {
  const Readout readout = evaluate(goldenStudy());
  ASSERT_EQ(readout.states.size(), 1U);
  const StateReading& state = readout.state();
  EXPECT_EQ(state.combination, "G");
  EXPECT_TRUE(state.judged);
  EXPECT_NEAR(state.reading.sn, 46.302295, 5e-7);
  EXPECT_NEAR(state.reading.tnt, -42.264962, 5e-7);
  EXPECT_NEAR(state.lines.at(0).along, 73.465347, 5e-7);
  EXPECT_TRUE(missingCases(readout, state).empty());
}

TEST(Readout, rowsComeInTheFixedOrder) {
  const Study study = *edited(goldenStudy(), Edit{Insert{{Spot::plane, "P1", "scarf"}, {}}});
  const Readout readout = evaluate(study);
  std::vector<PlaneKind> kinds;
  for (const PlaneReading& plane : planesOf(readout, readout.state()))
    kinds.push_back(plane.kind);
  using enum PlaneKind;
  EXPECT_EQ(kinds, (std::vector{reading, x, y, s1, s2, shearMax, shearMin, crossing, following, watched}));
}

TEST(Readout, theCutThatFollowsTheLineCarriesTheOppositeShear) {
  const Readout readout = evaluate(goldenStudy());
  const auto planes = planesOf(readout, readout.state());
  const auto following = std::ranges::find(planes, PlaneKind::following, &PlaneReading::kind);
  ASSERT_NE(following, planes.end());
  EXPECT_NEAR(following->normal->value.degrees(), -84.289407, 5e-7);
  EXPECT_NEAR(following->cut()->value.degrees(), 5.710593, 5e-7);
  EXPECT_NEAR(following->traction.sn, 26.534653, 5e-7);
  EXPECT_NEAR(following->traction.tnt, 35.346535, 5e-7);
}

// A combination is a weighted sum of the cases; a missing case counts as zero and is named.
TEST(Readout, combinesCasesAndNamesTheMissing) {
  const Study cases = *edited(
      goldenStudy(), Edits{Insert{{Spot::loadCase, "S", {}}, {}}, Insert{{Spot::loadCase, "W", {}}, {}},
                           Insert{{Spot::caseStress, "P1", "S"}, {}}, Type{{Spot::sx, "P1", "S"}, "-10"}});
  const Study study = withCombination(cases, "sum", {{"G", "1.35"}, {"S", "1.5"}, {"W", "0.9"}});
  const Readout readout = evaluate(study);
  ASSERT_EQ(readout.states.size(), 4U);
  const StateReading& sum = readout.states.front();
  EXPECT_DOUBLE_EQ(sum.stress.sx, 1.35 * 80 - 1.5 * 10);
  EXPECT_DOUBLE_EQ(sum.scale, 1.35 * 80 + 1.5 * 10);
  EXPECT_EQ(missingCases(readout, sum), std::vector<std::string>{"W"});
  EXPECT_TRUE(sum.judged);
  EXPECT_FALSE(readout.states.back().judged);
}

TEST(Readout, termsThatCancelLeaveNoFalseAngle) {
  const Study cases = *edited(
      newStudy(), Edits{Type{{Spot::sx, "P1", "G"}, "0.3"}, Type{{Spot::sy, "P1", "G"}, "0.1"},
                        Insert{{Spot::loadCase, "S", {}}, {}}, Insert{{Spot::caseStress, "P1", "S"}, {}},
                        Type{{Spot::sx, "P1", "S"}, "-0.1"}, Type{{Spot::sy, "P1", "S"}, "0.1"}});
  // 0.3 - 0.1 and 0.1 + 0.1 differ in the last digit only: that digit is no stress and no direction.
  ASSERT_NE(0.3 - 0.1, 0.1 + 0.1);
  const StateReading state = evaluate(withCombination(cases, "both", {{"G", "1"}, {"S", "1"}})).state();
  EXPECT_EQ(state.stress.sx, state.stress.sy);
  EXPECT_EQ(state.reading.tnt, 0);
  EXPECT_EQ(state.circle.radius, 0);
  EXPECT_FALSE(state.circle.theta1);
}

TEST(Readout, whatCancelsToRoundingIsZero) {
  const Study cases =
      *edited(newStudy(), Edits{Type{{Spot::txy, "P1", "G"}, "0.3"}, Insert{{Spot::loadCase, "S", {}}, {}},
                                Insert{{Spot::caseStress, "P1", "S"}, {}},
                                Type{{Spot::txy, "P1", "S"}, "-0.1"}, Type{{Spot::sx, "P1", "S"}, "2"}});
  const StateReading state = evaluate(withCombination(cases, "c", {{"G", "1"}, {"S", "3"}})).state();
  EXPECT_EQ(state.stress.txy, 0);
  EXPECT_EQ(state.stress.sx, 6);
}

// σz counts by its own terms: large stresses in the plane do not make a small one rounding.
TEST(Readout, aThirdStressThatCancelsToRoundingIsZero) {
  const Study cases = *edited(
      newStudy(), Edits{Type{{Spot::sz, "P1", "G"}, "0.3"}, Type{{Spot::sx, "P1", "G"}, "1e20"},
                        Insert{{Spot::loadCase, "S", {}}, {}}, Insert{{Spot::caseStress, "P1", "S"}, {}},
                        Type{{Spot::sz, "P1", "S"}, "-0.1"}});
  ASSERT_NE(0.3 - 3 * 0.1, 0);
  EXPECT_EQ(evaluate(withCombination(cases, "c", {{"G", "1"}, {"S", "3"}})).state().sz, 0);
  EXPECT_EQ(evaluate(withCombination(cases, "c", {{"G", "1"}, {"S", "1"}})).state().sz, 0.3 - 0.1);
}

TEST(Readout, onlyAPlainCaseMayBeDragged) {
  const Study study = goldenStudy();
  EXPECT_EQ(draggableCase(study, evaluate(study)), "G");
  const Study factored = withCombination(study, "c", {{"G", "1.35"}});
  EXPECT_FALSE(draggableCase(factored, evaluate(factored)));
  const Study plainOne = withCombination(study, "c", {{"G", "1"}});
  EXPECT_EQ(draggableCase(plainOne, evaluate(plainOne)), "G");
}

TEST(NamedDirections, principalAndLineDirectionsStandByName) {
  const auto directions = directionsForNormal(evaluate(goldenStudy()));
  EXPECT_TRUE(std::ranges::is_sorted(directions, {}, &NamedDirection::angle));
  const auto named = [&](const std::string& name) {
    const auto at = std::ranges::find_if(
        directions, [&](const NamedDirection& direction) { return plain(direction.name) == name; });
    return at == directions.end() ? 1000.0 : at->angle.degrees();
  };
  EXPECT_EQ(named("σ1"), -22.5);
  EXPECT_EQ(named("σ2"), 67.5);
  EXPECT_EQ(named("greatest shear +"), -67.5);
  EXPECT_NEAR(named("following the grain"), -84.289407, 5e-7);
  EXPECT_EQ(named("x"), 0);
  EXPECT_EQ(named("y"), 90);
  EXPECT_EQ(named("15°"), 15);
  EXPECT_EQ(named("0°"), 1000.0);
}

TEST(NamedDirections, aDegenerateStateNamesNoPrincipalOne) {
  for (const NamedDirection& direction : directionsForLine(evaluate(newStudy())))
    EXPECT_NE(plain(direction.name), "σ1");
}

} // namespace
} // namespace planewright

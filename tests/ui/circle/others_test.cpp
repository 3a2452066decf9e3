// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/circle/panel.h"

#include "ui/circle/circle_words.h"
#include "ui/circle/others.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Stage stageOf(const Panel& panel) {
  return {panel.desk.study(), panel.desk.readout(), panel.plot.scale()};
}

/// Every word of a layer, one label a line.
std::string wordsOf(const Picture& picture) {
  std::string words;
  for (const auto& part : picture.parts)
    if (const auto* label = std::get_if<Label>(&part))
      words += plain(label->runs) + "\n";
  return words;
}

std::string wordsOf(const Panel& panel) {
  return wordsOf(wordsLayer(stageOf(panel), panel.plot.size(), {}));
}

bool has(const std::string& words, const std::string& piece) {
  return words.find(piece) != std::string::npos;
}

TEST(Union, HoldsEveryDiscAndNothingElse) {
  const std::vector<Round> rounds = {{{100, 80}, 30, true}, {{125, 80}, 40, true}, {{220, 80}, 10, true}};
  const QPainterPath shape = unionOfDiscs(rounds, 0, 400);
  for (double x = 60; x < 240; x += 0.7)
    for (double y = 35; y < 125; y += 0.7) {
      double outside = 1e9;
      for (const Round& round : rounds)
        outside = std::min(outside, std::hypot(x - round.centre.x(), y - round.centre.y()) - round.radius);
      const bool onTheEdge = std::abs(outside) <= 0.6;
      EXPECT_TRUE(onTheEdge || shape.contains(QPointF(x, y)) == (outside < 0)) << x << ", " << y;
    }
}

TEST(Union, IsCutAtTheEndsItIsGiven) {
  const QRectF box = unionOfDiscs({{{0, 0}, 1e7, true}}, -200, 300).boundingRect();
  EXPECT_EQ(box.left(), -200);
  EXPECT_EQ(box.right(), 300);
}

TEST(Others, AreHairlinesUpToTwentyFourAndOneShapeAbove) {
  Panel few(studyWithCombinations(25));
  EXPECT_FALSE(drawingOfOthers(stageOf(few)).hairlines.isEmpty());
  EXPECT_TRUE(drawingOfOthers(stageOf(few)).shape.isEmpty());
  EXPECT_FALSE(has(wordsOf(few), "combinations"));
  Panel many(studyWithCombinations(26));
  EXPECT_TRUE(drawingOfOthers(stageOf(many)).hairlines.isEmpty());
  EXPECT_FALSE(drawingOfOthers(stageOf(many)).shape.isEmpty());
  EXPECT_TRUE(has(wordsOf(many), "all 26 combinations"));
}

TEST(Others, SingleCasesBesideCombinationsAreNotDrawn) {
  Panel panel(studyWithCombinations(4));
  EXPECT_EQ(panel.desk.readout().states.size(), 6U);
  EXPECT_EQ(othersOf(panel.desk.readout()).size(), 3U);
}

TEST(Others, AClickOnACircleTakesItsCombination) {
  Panel panel(studyWithCombinations(5));
  const StateReading& other = panel.desk.readout().states[0];
  const Round round = stageOf(panel).roundOf(other);
  const QPointF at = round.at(Angle::fromDegrees(200), round.radius);
  panel.press(at);
  panel.release(at);
  EXPECT_EQ(panel.desk.readout().state().combination, "k0");
  EXPECT_EQ(panel.steps(), 0);
}

TEST(Others, TheCombinationUnderThePointerIsNamed) {
  Panel panel(studyWithCombinations(5));
  const Round round = stageOf(panel).roundOf(panel.desk.readout().states[0]);
  const QPointF at = round.at(Angle::fromDegrees(200), round.radius);
  QTest::mouseMove(panel.plot.viewport(), at.toPoint());
  EXPECT_EQ(panel.plot.tipAt(at), "k0");
  panel.desk.show("P1", "k0");
  EXPECT_EQ(panel.plot.tipAt(at), "") << "it is the shown one now";
}

TEST(Words, NameTheUnitAndTheEndsOfTheAxis) {
  Study study = studyOf();
  study.units.stress = "psi";
  const std::string words = wordsOf(Panel(study));
  EXPECT_TRUE(has(words, "σn (psi)")) << words;
  EXPECT_TRUE(has(words, "τnt (psi), + down")) << words;
  EXPECT_LT(words.find("compression"), words.find("tension"));
  study.convention = {Positive::compression, ShearAxis::tensorUp};
  const std::string swapped = wordsOf(Panel(study));
  EXPECT_GT(swapped.find("compression"), swapped.find("tension")) << swapped;
  EXPECT_TRUE(has(swapped, "τnt (psi), + up"));
  EXPECT_TRUE(has(swapped, "2θ turns the other way"));
}

TEST(Words, SayWhereZeroIs) {
  EXPECT_TRUE(has(wordsOf(Panel(studyOf("100 MPa", "101 MPa", "0.3 MPa"))), "to the left"));
  EXPECT_TRUE(has(wordsOf(Panel(studyOf("-100 MPa", "-101 MPa", "0.3 MPa"))), "to the right"));
  EXPECT_FALSE(has(wordsOf(Panel(studyOf())), "0 is"));
}

TEST(Words, SayWhatAStateWithoutACircleMeans) {
  EXPECT_TRUE(has(wordsOf(Panel(newStudy())), "zero stress: every direction is principal"));
  EXPECT_TRUE(has(wordsOf(Panel(studyOf("5 MPa", "5 MPa", "0 MPa"))), "every direction is principal"));
  EXPECT_FALSE(has(wordsOf(Panel(studyOf())), "principal"));
}

TEST(Words, NameWhatTheReadingPlaneSnappedTo) {
  EXPECT_EQ(plain(snapNote({symbol("σ_{1}"), symbol("x")})), "on σ1, x");
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/failure_drawing.h"
#include "core/figure/failure_line.h"
#include "core/figure/figure.h"
#include "core/figure/metrics.h"
#include "core/figure/utilisation_drawing.h"
#include "tests/support/judged_study.h"
#include "tests/support/picture_parts.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Readout readout() {
  return evaluate(judgedStudy());
}

TEST(UtilisationCurves, areTheJudgesAtEachDirection) {
  const Readout now = readout();
  const UtilisationCurves curves = utilisationCurvesOf(now, 0);
  const Result<Judge> shown = judgeOf(now, now.state(), 0);
  ASSERT_GE(curves.shown.size(), 181);
  EXPECT_EQ(curves.shown.front().x, -90);
  EXPECT_EQ(curves.shown.back().x, 90);
  for (std::size_t i = 0; i < curves.shown.size(); ++i) {
    EXPECT_EQ(curves.shown[i].y, shown->utilisation(Angle::fromDegrees(curves.shown[i].x)));
    EXPECT_GE(curves.greatest[i].y, curves.shown[i].y);
  }
  EXPECT_EQ(curves.others.size(), 1);
}

TEST(UtilisationCurves, ofManyCombinationsLeaveTheOthersOut) {
  Study study = judgedStudy();
  for (int i = 0; i < 30; ++i)
    study.combinations.push_back({"c" + std::to_string(i), {{"G", "1.1"}}, Basis::design});
  const UtilisationCurves curves = utilisationCurvesOf(evaluate(study), 0);
  EXPECT_TRUE(curves.others.empty());
  EXPECT_FALSE(curves.greatest.empty());
  ASSERT_EQ(curves.greatest.size(), curves.shown.size());
  EXPECT_LT(curves.greatest.size(), 200) << "the turning points of the shown one alone";
  for (std::size_t i = 0; i < curves.shown.size(); ++i)
    EXPECT_GE(curves.greatest[i].y, curves.shown[i].y);
}

TEST(UtilisationCurves, ofOtherCombinationsHaveTheirOwnTurningPoints) {
  Study study = judgedStudy();
  for (int i = 0; i < 20; ++i)
    study.combinations.push_back({"c" + std::to_string(i), {{"S", std::to_string(i + 1)}}, Basis::design});
  const Readout now = evaluate(study);
  const UtilisationCurves curves = utilisationCurvesOf(now, 0);
  ASSERT_EQ(curves.others.size(), 21);
  std::size_t state = 0;
  for (const UtilisationCurve& curve : curves.others) {
    state += state == now.shown ? 1 : 0;
    const Result<Judge> judge = judgeOf(now, now.states[state++], 0);
    EXPECT_LT(curve.size(), 200);
    double greatest = 0;
    for (const Vec point : curve)
      greatest = std::max(greatest, point.y);
    EXPECT_EQ(greatest, worstIn(*judge, bandOf({}, Angle::fromDegrees(90))).judgement.utilisation);
  }
}

TEST(UtilisationFrame, mapsBothWays) {
  for (const bool logarithmic : {false, true}) {
    const UtilisationFrame frame = utilisationFrameIn({0, 0, 300, 200}, 10, 1, 37, logarithmic, {});
    EXPECT_EQ(frame.highest, logarithmic ? 100 : 2);
    for (const double degrees : {-90.0, -12.5, 0.0, 90.0})
      EXPECT_NEAR(frame.degreesAt(frame.xOf(degrees)), degrees, 1e-9);
    EXPECT_NEAR(frame.yOf(1e9), frame.plot.top, 1e-9);
    EXPECT_NEAR(frame.yOf(0), frame.plot.bottom, 1e-9);
  }
}

TEST(UtilisationLines, endAtTheTopOfThePlot) {
  const UtilisationFrame frame = utilisationFrameIn({0, 0, 300, 200}, 10, 1, 5, false, {});
  const UtilisationCurve curve = {{-90, 1}, {-45, 3}, {0, 4}, {45, 1}, {90, beyondEveryLimit}};
  const std::vector<Path> lines = utilisationLines(frame, curve, {});
  ASSERT_EQ(lines.size(), 2);
  EXPECT_NEAR(lines[0].points.back().y, frame.plot.top, 1e-9);
  EXPECT_NEAR(lines[0].points.back().x, frame.xOf(-67.5), 1e-9);
  EXPECT_NEAR(lines[1].points.front().y, frame.plot.top, 1e-9);
  EXPECT_NEAR(lines[1].points.back().y, frame.plot.top, 1e-9);
}

TEST(UtilisationGround, labelsNeverOverlap) {
  const Readout now = readout();
  for (const double width : {200.0, 300.0, 500.0}) {
    const UtilisationFrame frame = utilisationFrameIn({0, 0, width, 0.8 * width}, 11, 1, 2, false, {});
    const Picture picture = utilisationGround(frame, now.checks[0], directionsWithin(now, 0), {});
    const std::vector<Label> labels = partsOf<Label>(picture);
    for (std::size_t i = 0; i < labels.size(); ++i)
      for (std::size_t j = 0; j < i; ++j)
        EXPECT_FALSE(overlap(boxOf(labels[i]), boxOf(labels[j])))
            << plain(labels[i].runs) << " and " << plain(labels[j].runs) << " at " << width;
  }
}

TEST(FailureLine, isWhereTheUtilisationIsOne) {
  using enum StrengthKey;
  for (const MaterialKind kind : {MaterialKind::coulomb, MaterialKind::throat, MaterialKind::bond}) {
    Study study = judgedStudy();
    Material& material = study.materials[1];
    material = Material{};
    material.name = "glue";
    material.kind = kind;
    if (kind == MaterialKind::coulomb) {
      material.cohesion = "2 MPa";
      material.friction = "30 deg";
      material.cutoff = "0.5 MPa";
    } else if (kind == MaterialKind::throat) {
      material.fu = "360 MPa";
      material.betaW = "0.8";
      material.gammaM2 = "1.25";
    } else {
      material.tension = "1 MPa";
      material.shear = "3 MPa";
    }
    study.points[0].checks[1].criterion = criteriaFor(kind).front();
    for (const Positive positive : {Positive::tension, Positive::compression}) {
      study.convention.positive = positive;
      const Readout now = evaluate(study);
      const std::vector<FailureLine> lines = failureLinesOf(now, 50);
      ASSERT_EQ(lines.size(), 1);
      const double sense = positive == Positive::tension ? 1 : -1;
      for (const Traction& at : lines.front().upper) {
        Strengths strengths = now.checks[1].strengths;
        const auto judge =
            Judge::of(now.checks[1].criterion, strengths, {}, {{sense * at.sn, 0, at.tnt}, 0, 1e-9, 0});
        const double utilisation = judge->utilisation({});
        const bool isCorner = at.tnt == 0;
        EXPECT_TRUE(isCorner || std::abs(utilisation - 1) < 1e-9)
            << wordOf(kind) << ' ' << at.sn << ' ' << at.tnt;
      }
    }
  }
}

TEST(FailureLine, ofSeveralChecksTheWorstLeadsAndTheTouchesAreNamed) {
  Study study = judgedStudy();
  Material weak = study.materials[1];
  weak.name = "weak";
  weak.tension = "0.5 MPa";
  study.materials.push_back(weak);
  study.points[0].checks.push_back({"second", "weak", Criterion::bond, "", "scarf", {}});
  const Readout now = evaluate(study);
  const std::vector<FailureLine> lines = failureLinesOf(now, 50);
  ASSERT_EQ(lines.size(), 2);
  EXPECT_FALSE(lines[0].leads);
  EXPECT_TRUE(lines[1].leads);
  const std::vector<TouchLabel> labels = touchLabelsOf(now);
  ASSERT_EQ(labels.size(), 2);
  EXPECT_TRUE(plain(labels[0].shortForm).starts_with("glue "));
  EXPECT_TRUE(plain(labels[1].shortForm).starts_with("weak "));
  EXPECT_EQ(labels[0].role, Role::other);
  EXPECT_EQ(labels[1].role, Role::limit);
  std::vector<std::string> words;
  for (const Label& label : partsOf<Label>(*figureOf(study, now, {})))
    if (plain(label.runs).find("weak ") != std::string::npos ||
        plain(label.runs).find("glue ") != std::string::npos)
      words.push_back(plain(label.runs));
  EXPECT_GE(words.size(), 2) << "both stand beside the circle";
}

TEST(UtilisationScale, isLogarithmicWhereTheWorstWouldLieOverTheLinearOne) {
  EXPECT_FALSE(suitsLogarithm(std::nullopt));
  EXPECT_FALSE(suitsLogarithm(WorstInBand{{1.9}, {}}));
  EXPECT_TRUE(suitsLogarithm(WorstInBand{{2.1}, {}}));
  EXPECT_FALSE(suitsLogarithm(WorstInBand{{HUGE_VAL}, {}})) << "no scale shows it";
}

TEST(UtilisationKey, tellsTheCurvesApartWithinItsRow) {
  const UtilisationCurves curves = utilisationCurvesOf(readout(), 0);
  const Picture picture = utilisationKey({10, 0, 210, heightOfKey(curves, 10)}, 10, 1, curves,
                                         "1.35 G + 1.5 S + a long name of a combination", {});
  const std::vector<Label> labels = partsOf<Label>(picture);
  ASSERT_EQ(labels.size(), 2);
  EXPECT_TRUE(plain(labels[0].runs).starts_with("1.35 G"));
  EXPECT_EQ(plain(labels[1].runs), "greatest of all");
  EXPECT_LE(boxOf(labels[1]).right, 210);
  Study alone = judgedStudy();
  alone.combinations.pop_back();
  EXPECT_TRUE(
      utilisationKey({0, 0, 200, 0}, 10, 1, utilisationCurvesOf(evaluate(alone), 0), "", {}).parts.empty());
}

/// Clamping grows with the loads too, so that the plane of the greatest ratio may never slip.
TEST(FailureLine, isTouchedFirstByTheGrowingCircleNotByTheWorstPlane) {
  Study study = judgedStudy();
  Material& material = study.materials[1];
  material = Material{};
  material.name = "glue";
  material.kind = MaterialKind::coulomb;
  material.cohesion = "1 MPa";
  material.friction = "40 deg";
  study.points[0].checks[1].criterion = Criterion::coulomb;
  study.points[0].stress = {CaseStress{"G", "-3 MPa", "-0.6 MPa", "0 MPa"}};
  study.combinations.resize(1);
  study.combinations[0] = {"G", {{"G", "1"}}, Basis::design};
  const Readout now = evaluate(study);
  const std::vector<FailureLine> lines = failureLinesOf(now, 50);
  ASSERT_EQ(lines.size(), 1);
  ASSERT_TRUE(lines[0].touch);
  // Where |tnt| + sn tan 40 is greatest: cos 2(theta - theta1) = sin 40, 25 deg to either side of theta1
  // = 90.
  EXPECT_NEAR(std::abs(lines[0].touch->value.degrees()), 65, 1e-9);
  const std::vector<TouchLabel> labels = touchLabelsOf(now);
  ASSERT_EQ(labels.size(), 1);
  EXPECT_EQ(labels[0].at, lines[0].touchAt);
  EXPECT_TRUE(plain(labels[0].longForm).starts_with("first touch"));
  EXPECT_NE(plain(labels[0].shortForm).find("65.0°"), std::string::npos);
}

TEST(Figure, carriesTheCheckAndItsPlot) {
  const Study study = judgedStudy();
  for (const double width : {90.0, 160.0}) {
    FigureOrder order;
    order.width = width;
    const Result<Picture> with = figureOf(study, evaluate(study), order);
    ASSERT_TRUE(with);
    order.parts.check = order.parts.utilisation = false;
    const Result<Picture> without = figureOf(study, evaluate(study), order);
    ASSERT_TRUE(without);
    EXPECT_GT(with->height, without->height + 30);
    std::string words;
    for (const Label& label : partsOf<Label>(*with))
      words += plain(label.runs) + "\n";
    EXPECT_NE(words.find("Stress at this point"), std::string::npos);
    EXPECT_NE(words.find("licensed engineer"), std::string::npos);
  }
}

} // namespace
} // namespace planewright

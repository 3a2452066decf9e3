// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/figure.h"

#include "core/figure/svg.h"
#include "core/words/version.h"
#include "tests/core/figure/faults.h"
#include "tests/core/figure/studies.h"
#include "tests/core/figure/well_formed.h"
#include "tests/support/approved.h"

#include <gtest/gtest.h>

#include <limits>

namespace planewright {
namespace {

FigureOrder wide(double width) {
  FigureOrder order;
  order.width = width;
  return order;
}

Given notch() {
  return {8.4, -0.6, 2.1, 5.71, 3, 30, 0, true};
}

void expectSound(const Picture& picture) {
  EXPECT_EQ(labelFault(picture), "");
  EXPECT_EQ(strokeFault(picture), "");
}

/// At 160 mm the panel of the circle is about 98 by 95 mm, at 90 mm it is 89 by 56 mm.
void expectLargeCircle(const Picture& picture, const Readout& readout) {
  if (readout.state().circle.radius > 0) {
    EXPECT_GE(circleDiameter(picture), 0.4 * (picture.width > 100 ? 95 : 55));
  }
}

TEST(Figure, isSoundInTheSpecialStates) {
  for (const Given& given : specialStates())
    for (const double width : {160.0, 90.0}) {
      SCOPED_TRACE(testing::Message() << given.sx << " " << given.sy << " " << given.txy << " phi "
                                      << given.phi << " theta " << given.theta << " at " << width);
      const Study study = studyOf(given);
      const Picture picture = figure(study, wide(width));
      expectSound(picture);
      expectLargeCircle(picture, evaluate(study));
    }
}

TEST(Figure, isSoundInRandomStates) {
  for (unsigned seed = 0; seed < 2500; ++seed) {
    Dice dice(seed);
    const Study study = someStudy(dice);
    const double width = seed % 2 == 0 ? 160 : 90;
    SCOPED_TRACE(testing::Message() << "seed " << seed << " at " << width);
    const Picture picture = figure(study, wide(width));
    expectSound(picture);
    expectLargeCircle(picture, evaluate(study));
    if (HasFailure())
      return;
  }
}

TEST(Figure, isSoundInEveryWidthTextAndChoiceOfParts) {
  for (unsigned seed = 0; seed < 400; ++seed) {
    Dice dice(seed);
    const Study study = someStudy(dice);
    FigureOrder order = wide(dice.within(90, 400));
    order.textPoints = dice.within(7, 10);
    order.parts = {dice.flip(), dice.flip(), dice.flip(), dice.flip(), dice.flip(), dice.flip(), dice.flip()};
    order.caption =
        dice.flip() ? verbatim("Stresses at the notch, with a caption that may run over a line") : Text{};
    order.studyName = dice.flip() ? "chord" : "";
    SCOPED_TRACE(testing::Message() << "seed " << seed << " at " << order.width << " with "
                                    << order.textPoints);
    expectSound(figure(study, order));
    if (HasFailure())
      return;
  }
}

TEST(Figure, longNamesAndManyPlanesComeOutWell) {
  Study study = studyOf(notch());
  study.points.front().note = std::string(120, 'W') + " & <σ> " + std::string(80, 'i');
  study.points.front().lines.front().name = "a line with a very long name, & <Ω>, and more of it";
  for (int i = 0; i < 24; ++i)
    study.points.front().planes.push_back(
        {"a watched plane with a long name, number " + exactNumber(i), exactNumber(7.0 * i) + " deg", ""});
  study.combinations = {
      {std::string("1.35 G + 1.5 (S + 0.7 W) ") + std::string(120, 'Q'), {{"G", "1.35"}}, Basis::design}};
  for (const double width : {90.0, 160.0}) {
    FigureOrder order = wide(width);
    order.studyName = std::string(200, 'n');
    const Picture picture = figure(study, order);
    expectSound(picture);
    EXPECT_EQ(faultIn(svgOf(picture, Palette::paper)), "");
  }
}

TEST(Figure, looksAsApproved) {
  FigureOrder order = wide(160);
  order.studyName = "chord-notch";
  order.parts.version = false; // a new version changes no approved figure
  const Study study = studyOf(notch());
  EXPECT_TRUE(matchesApproved("figure/notch-160.svg", svgOf(figure(study, order), paletteOf(order))));
  order.width = 90;
  EXPECT_TRUE(matchesApproved("figure/notch-90.svg", svgOf(figure(study, order), paletteOf(order))));
  order.mono = true;
  EXPECT_TRUE(
      matchesApproved("figure/zero-90-mono.svg", svgOf(figure(studyOf({}), order), paletteOf(order))));
}

TEST(Figure, compressionPositiveTensorUpAndInclinedAxesLookAsApproved) {
  Study study = studyOf({8.4, -0.6, 2.1, 0, 0, 30, 20, false});
  study.convention = {Positive::compression, ShearAxis::tensorUp};
  study.units.stress = "psi";
  FigureOrder order = wide(160);
  order.parts.version = false;
  EXPECT_TRUE(matchesApproved("figure/compression-160.svg", svgOf(figure(study, order), Palette::paper)));
}

TEST(Figure, saysWhatItShows) {
  FigureOrder order = wide(160);
  order.studyName = "chord-notch";
  order.caption = verbatim("Stresses at the notch");
  const std::string words = wordsOf(figure(studyOf(notch()), order));
  for (const char* expected : {"P1 — invented",
                               "case G",
                               "σx 8.400",
                               "τxy 2.100",
                               "σn 7.969",
                               "τnt −2.847",
                               "θ 30.0°",
                               "φ 5.7° ± 3°",
                               "n 7.969 | −2.847",
                               "σ1 8.866",
                               "σ2 −1.066",
                               "along 8.727",
                               "across −0.927",
                               "τ 4.966",
                               "2θ",
                               "τnt (MPa), + down",
                               "σn (MPa)",
                               "compression",
                               "tension",
                               "Reading plane",
                               "Crossing the grain (stress along it)",
                               "12.51°",
                               "Stresses at the notch"})
    EXPECT_NE(words.find(expected), std::string::npos) << expected << "\n" << words;
  EXPECT_NE(words.find("Planewright " + std::string(programVersion()) + " · chord-notch"), std::string::npos);
}

TEST(Figure, leavesOutWhatIsNotAsked) {
  FigureOrder order = wide(160);
  order.parts = {false, false, false, false, false, false, false, false, false};
  const std::string words = wordsOf(figure(studyOf(notch()), order));
  for (const char* left : {"P1", "case G", "Given axes", "Circle", "Plane\n", "Planewright"})
    EXPECT_EQ(words.find(left), std::string::npos) << left;
  EXPECT_NE(words.find("Tension positive."), std::string::npos);
}

TEST(Figure, setsNoTextUnderItsLeastSize) {
  constexpr double sevenPoints = 7 * 25.4 / 72;
  for (const double width : {90.0, 160.0}) {
    FigureOrder order = wide(width);
    order.textPoints = 7;
    for (const auto& part : figure(studyOf(notch()), order).parts)
      if (const Label* label = std::get_if<Label>(&part)) {
        EXPECT_GE(label->size, sevenPoints - 1e-9) << plain(label->runs);
      }
  }
}

TEST(Figure, refusesWidthsAndTextOutOfRange) {
  const Study study = studyOf(notch());
  const Readout readout = evaluate(study);
  for (const double width : {89.9, 400.1, 0.0, -160.0, std::numeric_limits<double>::quiet_NaN()}) {
    const Result<Picture> picture = figureOf(study, readout, wide(width));
    ASSERT_FALSE(picture) << width;
    EXPECT_EQ(picture.error().place, "width");
    EXPECT_FALSE(picture.error().mend.empty());
  }
  FigureOrder order = wide(160);
  order.textPoints = 6.9;
  EXPECT_EQ(figureOf(study, readout, order).error().place, "text");
}

TEST(Figure, saysHowManyWatchedPlanesHaveNoName) {
  Study study = studyOf(notch());
  for (int i = 0; i < 60; ++i)
    study.points.front().planes.push_back(
        {"watched plane " + exactNumber(i), exactNumber(3.0 * i) + " deg", ""});
  const Picture picture = figure(study, wide(90));
  expectSound(picture);
  EXPECT_NE(wordsOf(picture).find("Without room for their names on the circle:"), std::string::npos);
  EXPECT_NE(wordsOf(picture).find("watched plane 59"), std::string::npos);
}

TEST(Figure, refusesMoreLinesThanItsCircleCanName) {
  const Study study = studyOf(notch());
  Extras extras;
  for (int i = 0; i < 60; ++i)
    extras.lines.push_back(
        {"line number " + exactNumber(i), LineKind::other, exactNumber(3.0 * i) + " deg", ""});
  const Result<Picture> picture = figureOf(study, evaluate(study, "P1", extras), wide(90));
  ASSERT_FALSE(picture);
  EXPECT_NE(plain(picture.error()).find("fewer lines"), std::string::npos);
}

TEST(Figure, equalOrdersGiveEqualBytes) {
  const Study study = studyOf(notch());
  EXPECT_EQ(svgOf(figure(study, wide(160)), Palette::paper), svgOf(figure(study, wide(160)), Palette::paper));
}

TEST(Figure, speaksTheLanguageItIsGiven) {
  FigureOrder order = wide(160);
  order.translate = [](const std::string&, const std::string& source) {
    return source == "Tension positive." ? "Zug positiv." : source;
  };
  EXPECT_NE(wordsOf(figure(studyOf(notch()), order)).find("Zug positiv."), std::string::npos);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/circle/panel.h"

#include "core/figure/look.h"
#include "ui/look/look.h"

#include <QApplication>
#include <QChart>
#include <QGraphicsItem>
#include <QLineSeries>

#include <gtest/gtest.h>

#include <array>
#include <cmath>

namespace planewright {
namespace {

constexpr std::array shapes = {QSize(1600, 300), QSize(1400, 900), QSize(1000, 360), QSize(900, 700),
                               QSize(700, 700),  QSize(430, 560),  QSize(418, 369),  QSize(400, 900),
                               QSize(300, 600),  QSize(250, 800)};

/// Pixels per unit of both axes of the chart itself.
QPointF pixelsPerUnit(const CirclePlot& plot) {
  const QPointF origin = plot.chart()->mapToPosition({0, 0});
  const QPointF one = plot.chart()->mapToPosition({1, 1});
  return {std::abs(one.x() - origin.x()), std::abs(one.y() - origin.y())};
}

/// The rectangle of what was painted in the state's colour, nothing else being shown.
QRect boxOfCircle(CirclePlot& plot) {
  for (QGraphicsItem* item : plot.chart()->childItems())
    if (item->zValue() > 3.5 && item->zValue() != 4)
      item->hide();
  const QImage image = plot.grab().toImage();
  const QColor wanted = plot.look().colour(Role::state);
  QRect box;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      if (image.pixelColor(x, y) == wanted)
        box |= QRect(x, y, 1, 1);
  return box;
}

TEST(EqualScaleFrame, HasOneScaleRightAfterEveryResize) {
  Panel panel(studyOf());
  for (const QSize shape : shapes) {
    panel.view.resize(shape);
    const QPointF unit = pixelsPerUnit(panel.plot);
    EXPECT_LT(std::abs(unit.x() / unit.y() - 1), 1e-9) << shape.width() << "x" << shape.height();
    QTest::qWait(1);
    const QPointF later = pixelsPerUnit(panel.plot);
    EXPECT_LT(std::abs(later.x() / later.y() - 1), 1e-9) << shape.width() << "x" << shape.height();
  }
}

TEST(EqualScaleFrame, TheChartDrawsWhereTheScaleSays) {
  for (const char* size : {"1", "1e-9", "1e9"}) {
    const std::string unit = std::string(" * ") + size + " MPa";
    Panel panel(studyOf("(80)" + unit, "(20)" + unit, "(-30)" + unit));
    const auto* series = qobject_cast<QLineSeries*>(panel.plot.chart()->series().front());
    const Round round = panel.plot.round();
    for (const QPointF point : series->points()) {
      const QPointF away = panel.plot.chart()->mapToPosition(point) - round.centre;
      EXPECT_NEAR(std::hypot(away.x(), away.y()), round.radius, 1e-6) << size;
    }
  }
}

TEST(EqualScaleFrame, TheGrabbedCircleIsRoundAtEveryShape) {
  for (const QSize shape : shapes) {
    Panel panel(studyOf(), shape);
    const QRect box = boxOfCircle(panel.plot);
    EXPECT_GT(box.width(), 50) << shape.width() << "x" << shape.height();
    EXPECT_LE(std::abs(box.width() - box.height()), 2) << shape.width() << "x" << shape.height();
  }
}

TEST(CircleFit, TheCircleIsNeverACoin) {
  const std::vector<Study> studies = {studyOf(),
                                      studyOf("10 MPa", "0 MPa", "0 MPa", "0 deg"),
                                      studyOf("0 MPa", "0 MPa", "3 MPa"),
                                      studyOf("1000 MPa", "1010 MPa", "-3 MPa"),
                                      studyOf("-80 MPa", "-20 MPa", "30 MPa"),
                                      studyWithCombinations(20)};
  for (const Study& study : studies)
    for (const QSize shape : shapes) {
      const Panel panel(study, shape);
      const double shorter = std::min(shape.width(), shape.height());
      EXPECT_GE(2 * panel.plot.round().radius, 0.4 * shorter)
          << study.points.front().stress.front().sx << " at " << shape.width() << "x" << shape.height();
    }
}

TEST(CircleFit, AllCombinationsLeaveTheShownCircleLegible) {
  Panel panel(studyWithCombinations(20), {418, 369});
  panel.plot.setFit(Fit::allCombinations);
  EXPECT_GE(2 * panel.plot.round().radius, 0.3 * 369);
  const Stage stage{panel.desk.study(), panel.desk.readout(), panel.plot.scale()};
  for (const StateReading* other : othersOf(panel.desk.readout())) {
    const Round round = stage.roundOf(*other);
    EXPECT_GE(round.centre.x() - round.radius, stage.scale.plot().left());
    EXPECT_LE(round.centre.x() + round.radius, stage.scale.plot().right());
    EXPECT_GE(round.centre.y() - round.radius, stage.scale.plot().top());
  }
}

TEST(CircleFit, KeepsTheOriginWhenThatCostsLittle) {
  const auto zero = [](const Panel& panel) { return panel.plot.scale().pixelOf({0, 0}).x(); };
  const Panel near(studyOf("30 MPa", "10 MPa", "3 MPa"));
  EXPECT_GE(zero(near), near.plot.scale().plot().left());
  const Panel far(studyOf("100 MPa", "101 MPa", "0.3 MPa"));
  EXPECT_LT(zero(far), far.plot.scale().plot().left());
}

TEST(CircleFit, DoesNotBreatheWhileThePlaneTurns) {
  Panel panel(studyOf());
  const EqualScale before = panel.plot.scale();
  for (double normal = -90; normal <= 90; normal += 7.5) {
    panel.plot.turnTo(Angle::fromDegrees(normal));
    EXPECT_EQ(panel.plot.scale(), before) << normal;
  }
}

TEST(CircleFit, AStateWithoutACircleStandsInAFrameAllTheSame) {
  for (const char* stress : {"0 MPa", "5 MPa", "-5e-9 MPa"}) {
    const Panel panel(studyOf(stress, stress, "0 MPa"));
    EXPECT_EQ(panel.plot.round().radius, 0);
    EXPECT_TRUE(std::isfinite(panel.plot.scale().pixelsPerUnit())) << stress;
    EXPECT_TRUE(panel.plot.scale().plot().contains(panel.plot.round().centre)) << stress;
    EXPECT_TRUE(panel.plot.scale().plot().contains(panel.plot.scale().pixelOf({0, 0}))) << stress;
  }
}

TEST(CircleLook, NoLightPatchIsLeftInTheDark) {
  Panel panel(studyWithCombinations(30), {900, 700});
  panel.view.setPalette(paletteFor({Palette::dark}));
  QTest::qWait(1);
  const QImage image = panel.view.grab().toImage();
  int light = 0;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      light += image.pixelColor(x, y).lightnessF() > 0.6F;
  EXPECT_LT(light, image.width() * image.height() / 50);
  EXPECT_EQ(image.pixelColor(3, image.height() / 2), Look{Palette::dark}.colour(Role::canvas));
}

} // namespace
} // namespace planewright

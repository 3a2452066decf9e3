// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/facing.h"
#include "ui/element/geometry.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

constexpr QSizeF shapes[] = {{342, 369}, {460, 580}, {700, 560}, {1600, 400}, {300, 900}};
Angle deg(double degrees) {
  return Angle::fromDegrees(degrees);
}
QPointF point(Vec at) {
  return {at.x, at.y};
}

TEST(ElementGeometry, pixelAndAngleGoBothWays) {
  for (const QSizeF size : shapes)
    for (const double axes : {0.0, 25.0, -140.0}) {
      const ElementGeometry geometry = fittedElement(size, deg(axes));
      for (double angle = -179; angle <= 180; angle += 7)
        for (const double radius : {0.3, 0.8, 1.0})
          EXPECT_NEAR(geometry.directionOf(point(geometry.pixel(deg(angle), radius)))->degrees(), angle,
                      1e-9);
    }
}

TEST(ElementGeometry, hasNoDirectionAtTheCentre) {
  const ElementGeometry geometry = fittedElement({460, 580}, Angle());
  const QPointF centre = point(geometry.frame.centre);
  EXPECT_FALSE(geometry.directionOf(centre));
  EXPECT_FALSE(geometry.motion(centre, centre + QPointF(50, 0)));
}

TEST(ElementGeometry, motionsTakeTheShortWayAndAddUp) {
  const ElementGeometry geometry = fittedElement({460, 580}, Angle());
  const auto at = [&](double degrees) { return point(geometry.pixel(deg(degrees), 0.9)); };
  EXPECT_NEAR(geometry.motion(at(170), at(-170))->degrees(), 20, 1e-9);
  double sum = 0;
  for (int i = 0; i < 400; ++i)
    sum += geometry.motion(at(i), at(i + 1))->degrees();
  EXPECT_NEAR(sum, 400, 1e-9);
}

TEST(ElementGeometry, leavesRoomForWhatStandsRoundIt) {
  for (const QSizeF size : shapes) {
    const ElementGeometry geometry = fittedElement(size, Angle());
    const ElementFrame& frame = geometry.frame;
    EXPECT_EQ(geometry.compact, size.width() < 400);
    EXPECT_GE(frame.centre.y - frame.outer, headingHeight + 16);
    EXPECT_LE(frame.centre.y + frame.outer, size.height() - captionHeight);
    EXPECT_GE(frame.centre.x - frame.outer, geometry.compact ? 24 : 76);
  }
  EXPECT_NEAR(fittedElement({342, 369}, Angle()).frame.outer, 139.5, 1e-9);
  EXPECT_EQ(fittedElement({4000, 3000}, Angle()).frame.outer, 450);
}

TEST(ElementGeometry, targetsAreWideEnough) {
  for (const QSizeF size : shapes) {
    const ElementGeometry geometry = fittedElement(size, Angle());
    const Angle knob = deg(60);
    const Angle line = deg(-20);
    for (const double off : {-11.0, 11.0}) {
      EXPECT_EQ(geometry.handleAt(point(geometry.pixel(knob, part::knob)) + QPointF(off, 0), knob, line),
                ElementHandle::reading);
      EXPECT_EQ(geometry.handleAt(point(geometry.pixel(line, 0.8)) + QPointF(0, off), knob, line),
                ElementHandle::line);
      EXPECT_EQ(geometry.handleAt(point(geometry.pixel(line + deg(180), 0.8)) + QPointF(off, 0), knob, line),
                ElementHandle::line);
    }
    EXPECT_EQ(geometry.handleAt(point(geometry.pixel(deg(120), 0.9)), knob, line), ElementHandle::none);
    EXPECT_EQ(geometry.handleAt(point(geometry.pixel(knob, 0.3)), knob, line), ElementHandle::none);
    EXPECT_EQ(geometry.handleAt(point(geometry.pixel(line, 0.8)), knob, std::nullopt), ElementHandle::none);
  }
}

TEST(ElementGeometry, theRadiusDecidesWhereKnobAndBarAreAligned) {
  for (const QSizeF size : shapes)
    for (int i = 0; i < 24; ++i) {
      const ElementGeometry geometry = fittedElement(size, Angle());
      const Angle angle = deg(15.0 * i);
      const auto handle = [&](double radius) {
        return geometry.handleAt(point(geometry.pixel(angle, radius)), angle, angle);
      };
      EXPECT_EQ(handle(0.89), ElementHandle::reading);
      EXPECT_EQ(handle(part::knob), ElementHandle::reading);
      EXPECT_EQ(handle(0.87), ElementHandle::line);
      EXPECT_EQ(handle(0.74), ElementHandle::line);
    }
}

TEST(ElementGeometry, arcsAreThoseOfTheHandlesOwnRadius) {
  const ElementGeometry geometry = fittedElement({460, 580}, Angle());
  const double outer = geometry.frame.outer;
  EXPECT_NEAR(geometry.arcOf(6, ElementHandle::reading).radians(), 6 / (0.955 * outer), 1e-12);
  EXPECT_NEAR(geometry.arcOf(6, ElementHandle::line).radians(), 6 / (0.8 * outer), 1e-12);
}

TEST(Facing, keepsTheSideOfTheHand) {
  Facing facing;
  EXPECT_EQ(facing.shown(deg(-45)).degrees(), -45);
  facing.keepNear(deg(134), deg(-45));
  EXPECT_EQ(facing.shown(deg(-45)).degrees(), 135);
  EXPECT_EQ(facing.shown(deg(20)).degrees(), 20) << "another angle stands on its own side";
  facing.keepNear(deg(-46), deg(-45));
  EXPECT_EQ(facing.shown(deg(-45)).degrees(), -45);
  facing.keepNear(deg(-269), deg(90));
  EXPECT_FALSE(facing.isOther(deg(90)));
}

} // namespace
} // namespace planewright

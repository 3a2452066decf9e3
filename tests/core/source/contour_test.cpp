// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/contour.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>
#include <numbers>

namespace planewright {
namespace {

constexpr double pi = std::numbers::pi;

void expectMoments(const AreaMoments& actual, const AreaMoments& expected, double scale) {
  EXPECT_NEAR(actual.area, expected.area, 1e-13 * scale);
  EXPECT_NEAR(actual.y, expected.y, 1e-13 * scale);
  EXPECT_NEAR(actual.z, expected.z, 1e-13 * scale);
  EXPECT_NEAR(actual.yy, expected.yy, 1e-13 * scale);
  EXPECT_NEAR(actual.zz, expected.zz, 1e-13 * scale);
  EXPECT_NEAR(actual.yz, expected.yz, 1e-13 * scale);
}

TEST(Contour, momentsOfATriangle) {
  // Area 3, centroid (y 2/3, z 1); b h^3/12, h b^3/12, b^2 h^2/24 about the corner.
  expectMoments(momentsOf(polygon({{0, 0}, {0, 3}, {2, 0}})), {3, 2, 3, 2, 4.5, 1.5}, 10);
}

TEST(Contour, momentsOfACircleAwayFromTheOrigin) {
  const double area = 4 * pi;
  const AreaMoments expected = {area, 5 * area, -3 * area, area + 25 * area, area + 9 * area, -15 * area};
  expectMoments(momentsOf(moved(circle(2), 5, -3)), expected, 500);
}

TEST(Contour, aHoleCountsNegative) {
  Contour ring = circle(2);
  for (const Edge& edge : reversed(circle(1)))
    ring.push_back(edge);
  expectMoments(momentsOf(ring), {3 * pi, 0, 0, 15 * pi / 4, 15 * pi / 4, 0}, 50);
  EXPECT_EQ(spansAt(ring, 0, Side::above), (std::vector<Span>{{-2, -1}, {1, 2}}));
}

TEST(Contour, exchangingTheAxesExchangesTheMoments) {
  const Contour shape = moved(circle(2), 5, -3);
  const AreaMoments a = momentsOf(shape);
  expectMoments(momentsOf(transposed(shape)), {a.area, a.z, a.y, a.zz, a.yy, a.yz}, 500);
}

// A half circle: first moment 2 r^3/3; a level beyond the shape leaves nothing, one below it all of it.
TEST(Contour, thePartAboveALevelOfACircle) {
  EXPECT_NEAR(momentsAbove(circle(3), 0).y, 18, 1e-13);
  EXPECT_NEAR(momentsAbove(circle(3), 0).area, 4.5 * pi, 1e-13);
  EXPECT_EQ(momentsAbove(circle(3), 3).area, 0);
  expectMoments(momentsAbove(circle(3), -3), momentsOf(circle(3)), 100);
}

// First moment of the segment above y: (2/3)(r^2 - y^2)^(3/2).
RC_GTEST_PROP(Contour, firstMomentOfASegment, ()) {
  const double y = *rc::gen::inRange(-999, 1000) / 1000.0;
  RC_ASSERT(std::abs(momentsAbove(circle(1), y).y - 2.0 / 3 * std::pow(1 - y * y, 1.5)) < 1e-14);
}

// Against thin level strips: the spans and the integrals along the edges are two routes to one area.
RC_GTEST_PROP(Contour, momentsAreThoseOfStrips, ()) {
  std::vector<SectionPoint> corners;
  const int count = *rc::gen::inRange(3, 9);
  for (int i = 0; i < count; ++i) {
    const double angle = 2 * pi * i / count;
    const double radius = *rc::gen::inRange(20, 100);
    corners.push_back({radius * std::sin(angle), radius * std::cos(angle)});
  }
  const Contour shape = polygon(corners);
  const double level = *rc::gen::inRange(-90, 90);
  AreaMoments strips;
  constexpr int steps = 20000;
  const double thin = (100 - level) / steps;
  for (int i = 0; i < steps; ++i) {
    const double y = level + (i + 0.5) * thin;
    for (const Span& span : spansAt(shape, y, Side::above)) {
      const double z = (span.from + span.to) / 2;
      strips = strips + AreaMoments{thin * span.length(),
                                    thin * span.length() * y,
                                    thin * span.length() * z,
                                    thin * span.length() * y * y,
                                    0,
                                    thin * span.length() * y * z};
    }
  }
  const AreaMoments exact = momentsAbove(shape, level);
  RC_ASSERT(std::abs(exact.area - strips.area) < 0.5);
  RC_ASSERT(std::abs(exact.y - strips.y) < 50);
  RC_ASSERT(std::abs(exact.z - strips.z) < 50);
  RC_ASSERT(std::abs(exact.yy - strips.yy) < 5000);
  RC_ASSERT(std::abs(exact.yz - strips.yz) < 5000);
}

TEST(Contour, levelsInAnEdgeAreSeenFromEitherSide) {
  const Contour square = polygon({{0, 0}, {0, 2}, {2, 2}, {2, 0}});
  EXPECT_EQ(spansAt(square, 0, Side::above), (std::vector<Span>{{0, 2}}));
  EXPECT_TRUE(spansAt(square, 0, Side::below).empty());
  EXPECT_EQ(spansAt(square, 2, Side::below), (std::vector<Span>{{0, 2}}));
  EXPECT_TRUE(spansAt(square, 2, Side::above).empty());
}

} // namespace
} // namespace planewright

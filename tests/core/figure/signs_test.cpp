// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/signs.h"

#include <gtest/gtest.h>

#include <cmath>
#include <numbers>

namespace planewright {
namespace {

/// How far a sign reaches from its own middle in a direction: all signs are convex round it.
double reachOf(const PlacedSign& sign, double direction) {
  const SignShape shape = shapeOf(sign.sign, sign.size);
  if (shape.round)
    return sign.size / 2;
  const Vec d{std::cos(direction), std::sin(direction)};
  double reach = 0;
  for (std::size_t i = 0; i < shape.outline.size(); ++i) {
    const Vec a = shape.outline[i];
    const Vec e = shape.outline[(i + 1) % shape.outline.size()] - a;
    const double across = d.x * e.y - d.y * e.x;
    const double at = (a.x * e.y - a.y * e.x) / across;    // along the direction
    const double along = (a.x * d.y - a.y * d.x) / across; // along the edge
    if (std::abs(across) > 1e-12 && at > 0 && along >= 0 && along <= 1)
      reach = std::max(reach, at);
  }
  return reach;
}

/// Share of the directions in which a sign stands out from all signs over it in the same place.
double shareSeen(const std::vector<PlacedSign>& signs, std::size_t which) {
  int seen = 0;
  for (int i = 0; i < 720; ++i) {
    const double direction = (i + 0.3) * std::numbers::pi / 360;
    bool out = true;
    for (std::size_t above = which + 1; above < signs.size(); ++above)
      out = out && reachOf(signs[which], direction) > reachOf(signs[above], direction);
    seen += out ? 1 : 0;
  }
  return seen / 720.0;
}

std::vector<PlacedSign> inOnePlace(const std::vector<Sign>& kinds) {
  std::vector<PlacedSign> signs;
  for (const Sign kind : kinds)
    signs.push_back({kind, Role::state, {10, 20}, 2, 0.25});
  return signs;
}

TEST(ShowHidden, eachOfSeveralSignsInOnePlaceIsSeen) {
  const std::vector<std::vector<Sign>> piles = {
      {Sign::filledSquare, Sign::filledRound},
      {Sign::filledLozenge, Sign::filledSquare, Sign::filledRound},
      {Sign::hollowLozenge, Sign::hollowSquare, Sign::filledLozenge, Sign::filledSquare, Sign::filledRound}};
  for (const std::vector<Sign>& pile : piles) {
    std::vector<PlacedSign> signs = inOnePlace(pile);
    EXPECT_LT(shareSeen(signs, 0), 0.6);
    showHidden(signs);
    for (std::size_t i = 0; i < signs.size(); ++i) {
      EXPECT_GE(shareSeen(signs, i), 0.4) << i << " of " << signs.size();
      EXPECT_LE(signs[i].size, 6);
    }
    EXPECT_DOUBLE_EQ(signs.back().size, 2);
  }
}

TEST(ShowHidden, signsApartKeepTheirSize) {
  std::vector<PlacedSign> signs = inOnePlace({Sign::filledSquare, Sign::filledRound});
  signs[0].at.x += 5;
  showHidden(signs);
  EXPECT_DOUBLE_EQ(signs[0].size, 2);
}

TEST(ShowHidden, likeSignsDoNotGrowOverEachOther) {
  std::vector<PlacedSign> signs = inOnePlace({Sign::hollowRound, Sign::hollowRound});
  showHidden(signs);
  EXPECT_DOUBLE_EQ(signs[0].size, 2);
}

} // namespace
} // namespace planewright

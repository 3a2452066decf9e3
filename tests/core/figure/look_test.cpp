// SPDX-License-Identifier: GPL-3.0-or-later
// Contrast of two colours as W3C, Web Content Accessibility Guidelines 2.1, defines it: of their relative
// luminances, which is what a print in greys keeps of them. Its limits: 4.5 for text (success criterion
// 1.4.3), 3 for what has to be told apart in a drawing (1.4.11).
#include "core/figure/look.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <initializer_list>

namespace planewright {
namespace {

constexpr double text = 4.5;
constexpr double stroke = 3;
constexpr double seen = 1.15; ///< of aids on which nothing depends

double luminance(Colour colour) {
  const auto channel = [&](unsigned shift) {
    const double value = ((colour.rgb >> shift) & 0xFFU) / 255.0;
    return value <= 0.03928 ? value / 12.92 : std::pow((value + 0.055) / 1.055, 2.4);
  };
  return 0.2126 * channel(16) + 0.7152 * channel(8) + 0.0722 * channel(0);
}

double contrast(Role front, Role ground, Palette palette) {
  const double a = luminance(colourOf(front, palette));
  const double b = luminance(colourOf(ground, palette));
  return (std::max(a, b) + 0.05) / (std::min(a, b) + 0.05);
}

class Contrast : public testing::TestWithParam<Palette> {
protected:
  void holds(std::initializer_list<Role> fronts, std::initializer_list<Role> grounds, double least) {
    for (const Role front : fronts)
      for (const Role ground : grounds)
        EXPECT_GE(contrast(front, ground, GetParam()), least)
            << "role " << static_cast<int>(front) << " on " << static_cast<int>(ground);
  }
};

TEST_P(Contrast, ofWordsIsThatOfText) {
  using enum Role;
  holds({ink, soft, state, reading, line, limit, wrong}, {canvas, field, window}, text);
  holds({ink}, {band, selection, safeGround, wrongGround}, text);
  holds({wrong}, {wrongGround}, text);
}

TEST_P(Contrast, ofStrokesThatMeanSomethingIsThatOfGraphics) {
  using enum Role;
  holds({ink, soft, state, reading, line, limit, other}, {canvas}, stroke);
  holds({focus}, {window, field}, stroke);
  holds({safeEdge}, {canvas}, stroke);
}

TEST_P(Contrast, ofAidsIsEnoughToBeSeen) {
  using enum Role;
  holds({hush, grain, grid, rule, band}, {canvas}, seen);
}

// L* of CIE 1976 from the relative luminance.
double lightness(Role role, Palette palette) {
  return 116 * std::cbrt(luminance(colourOf(role, palette))) - 16;
}

TEST_P(Contrast, ofClassesOfUtilisationIsInEvenSteps) {
  using enum Role;
  holds({utilised50}, {canvas}, seen);
  const double whole = lightness(utilised100, GetParam()) - lightness(utilised50, GetParam());
  Role before = utilised50;
  for (const Role role : {utilised80, utilised95, utilised100}) {
    EXPECT_NEAR((lightness(role, GetParam()) - lightness(before, GetParam())) / whole, 1.0 / 3, 0.01);
    before = role;
  }
}

INSTANTIATE_TEST_SUITE_P(Palettes, Contrast,
                         testing::Values(Palette::light, Palette::dark, Palette::mono, Palette::paper,
                                         Palette::contrast));

// The same guidelines, success criterion 1.4.6: 7 for text; and strokes as words are elsewhere.
TEST(Look, theSetOfMuchContrastHasIt) {
  using enum Role;
  for (const Role front : {ink, soft, state, reading, line, limit, wrong})
    EXPECT_GE(contrast(front, canvas, Palette::contrast), 7) << "role " << static_cast<int>(front);
  for (const Role ground : {band, selection, safeGround, wrongGround})
    EXPECT_GE(contrast(ink, ground, Palette::contrast), 7) << "role " << static_cast<int>(ground);
  for (const Role front : {other, focus, safeEdge, rule})
    EXPECT_GE(contrast(front, canvas, Palette::contrast), text) << "role " << static_cast<int>(front);
}

} // namespace
} // namespace planewright

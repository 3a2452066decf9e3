// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/svg.h"

#include "tests/core/figure/well_formed.h"
#include "tests/support/approved.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Label labelOf(const Runs& runs) {
  return {{10, 20}, runs, 3, Align::end, Role::state, true, true, "key"};
}

/// One of everything that a picture can hold.
Picture sample() {
  Picture picture{40, 25.5, {}, "Title & <more>", "Said \"in words\"\x01\xff", {}};
  picture.parts.push_back(Path{{{1, 2}, {3.00049, 4}, {-1e-9, 5}}, true, {}, Role::band});
  picture.parts.push_back(Path{{{1, 2}, {30, 2}}, false, Pen{Role::line, 0.35, Dash::longDashDot}, {}});
  picture.parts.push_back(Arc{{20, 12}, 5, 0, 360, Pen{Role::state, 0.5, Dash::solid}, Role::canvas});
  picture.parts.push_back(Arc{{20, 12}, 4, 0, 90, Pen{Role::reading, 0.35, Dash::shortDash}, {}});
  picture.parts.push_back(Arc{{20, 12}, 3, 45, -200, Pen{Role::ink, 0.13, Dash::dotted}, {}});
  picture.parts.push_back(labelOf({{"σ", false}, {"n", true}, {" < 8 & 9  'x'", false}}));
  return picture;
}

TEST(Svg, writesEveryPartAsApproved) {
  EXPECT_TRUE(matchesApproved("figure/parts.svg", svgOf(sample(), Palette::paper)));
}

TEST(Svg, isWellFormed) {
  const std::string svg = svgOf(sample(), Palette::mono);
  EXPECT_EQ(faultIn(svg), "");
  EXPECT_NE(svg.find("width=\"40mm\" height=\"25.5mm\" viewBox=\"0 0 40 25.5\""), std::string::npos);
}

TEST(Svg, aWholeLabelStandsInOneTextElement) {
  Picture picture{10, 10, {labelOf({{"τ", false}, {"nt", true}, {" −2.85", false}})}, "", "", {}};
  const std::string svg = svgOf(picture, Palette::paper);
  EXPECT_NE(
      svg.find(">τ<tspan font-size=\"2.1\" dy=\"0.66\">nt</tspan><tspan dy=\"-0.66\"> −2.85</tspan></text>"),
      std::string::npos)
      << svg;
}

TEST(Svg, quarterArcEndsWhereItShould) {
  Picture picture{10, 10, {Arc{{5, 5}, 2, 0, 90, Pen{}, {}}}, "", "", {}};
  EXPECT_NE(svgOf(picture, Palette::paper).find("d=\"M7 5A2 2 0 0 0 5 3\""), std::string::npos);
}

TEST(Svg, theCheckOfWellFormednessFindsFaults) {
  EXPECT_EQ(faultIn("<?xml version=\"1.0\"?>\n<a b=\"c\"><d/>&amp;</a>\n"), "");
  for (const char* wrong :
       {"<a>", "<a></b>", "<a>&</a>", "<a b=\"<\"/>", "<a/><b/>", "<a>\x01</a>", "x<a/>", "<a"})
    EXPECT_NE(faultIn(wrong), "") << wrong;
}

TEST(Look, paperIsTheLightSetOnWhite) {
  EXPECT_EQ(colourOf(Role::canvas, Palette::paper).rgb, 0xFFFFFFU);
  EXPECT_EQ(colourOf(Role::reading, Palette::paper), colourOf(Role::reading, Palette::light));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place_list.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

TEST(Place, pathAndBack) {
  const Place place{Spot::sx, "P1", "G"};
  EXPECT_EQ(pathOf(place), "points/P1/stress/G/sx");
  EXPECT_EQ(placeOf("points/P1/stress/G/sx"), place);
}

TEST(Place, slashesAndTildesInNamesAreWrittenSoThatThePathStaysOne) {
  const Place place{Spot::factor, "a/b ~ c", "N/A"};
  EXPECT_EQ(pathOf(place), "combinations/a~1b ~0 c/factors/N~1A");
  EXPECT_EQ(placeOf(pathOf(place)), place);
}

TEST(Place, noPlaceHasAMadeUpPath) {
  EXPECT_FALSE(placeOf("points/P1/stress/G/sq"));
  EXPECT_FALSE(placeOf(""));
  EXPECT_FALSE(placeOf("points"));
}

TEST(Place, everySpotHasItsRowAndItsOwnPath) {
  for (int i = 0; i <= static_cast<int>(Spot::shownCombination); ++i) {
    const auto spot = static_cast<Spot>(i);
    ASSERT_EQ(rowOf(spot).spot, spot);
    EXPECT_FALSE(rowOf(spot).label.empty());
    const std::string path = rowOf(spot).path;
    const auto stars = std::ranges::count(path, '*');
    const Place place{spot, stars > 0 ? "a" : "", stars > 1 ? "b" : ""};
    EXPECT_EQ(placeOf(pathOf(place)), place) << path;
  }
}

TEST(Place, everyTypedPlaceOfANewStudyHoldsItsText) {
  const Study study = newStudy();
  for (const Place& place : typedPlacesIn(study))
    EXPECT_TRUE(textAt(study, place)) << pathOf(place);
  EXPECT_EQ(textAt(study, {Spot::sx, "P1", "G"}), "0 MPa");
  EXPECT_EQ(textAt(study, {Spot::lineKind, "P1", "grain"}), "grain");
  EXPECT_EQ(textAt(study, {Spot::positive, {}, {}}), "tension");
  EXPECT_EQ(textAt(study, {Spot::caseExcludes, "G", {}}), "");
  EXPECT_FALSE(textAt(study, {Spot::sx, "P1", "Q"}));
  EXPECT_FALSE(textAt(study, {Spot::reading, "P2", {}}));
}

// Each dimension falls back to its own base, so that a study with several wrong units is told all of them.
TEST(Place, aUnitThatDoesNotReadCountsAsTheBase) {
  Study study = newStudy();
  study.units = {"x", "x", "x", "x"};
  EXPECT_EQ(entryKindOf(study, Spot::sx).unit, (Unit{"MPa", dimension::stress, 1, 1}));
  EXPECT_EQ(entryKindOf(study, Spot::unitForce).unit, (Unit{"N", dimension::force, 1, 1}));
  EXPECT_EQ(entryKindOf(study, Spot::unitLength).unit, (Unit{"mm", dimension::length, 1, 1}));
  EXPECT_EQ(entryKindOf(study, Spot::unitMoment).unit, (Unit{"N*mm", dimension::moment, 1, 1}));
}

TEST(Place, anExpressionIsReadInTheStudysUnit) {
  Study study = newStudy();
  study.units.stress = "psi";
  EXPECT_EQ(entryKindOf(study, Spot::sx).unit.name, "psi");
  EXPECT_EQ(entryKindOf(study, Spot::lineAngle).slopes, Slopes::line);
  EXPECT_EQ(entryKindOf(study, Spot::planeNormal).slopes, Slopes::none);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_map.h"

#include "core/strength/judgement.h"
#include "tests/support/field_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>
#include <numeric>

namespace planewright {
namespace {

bool always() {
  return true;
}

struct Place {
  double x, y, utilisation;
};

struct Mapped {
  Field field{{"A"}, {false, false, false, false, true, true}};
  FieldResults results;

  explicit Mapped(const std::vector<Place>& places) : results(places.size()) {
    for (std::size_t i = 0; i < places.size(); ++i) {
      field.setPlace(field.add("n", Layer::none, 1), places[i].x, places[i].y);
      PointResult result;
      result.utilisation = places[i].utilisation;
      results.set(i, result);
    }
  }
  std::vector<std::uint32_t> all() const {
    std::vector<std::uint32_t> points(field.size());
    std::iota(points.begin(), points.end(), 0U);
    return points;
  }
  FieldMapPixels drawn(const MapView& view, int size, const std::vector<std::uint32_t>& wanted) const {
    return *fieldMapPixels(field, results, wanted, view, size, always);
  }
};

TEST(FieldMap, classesEndWhereTheyAreSaidTo) {
  EXPECT_EQ(mapClassOf(0), MapClass::upTo50);
  EXPECT_EQ(mapClassOf(0.5), MapClass::upTo50);
  EXPECT_EQ(mapClassOf(std::nextafter(0.5, 1)), MapClass::upTo80);
  EXPECT_EQ(mapClassOf(0.8), MapClass::upTo80);
  EXPECT_EQ(mapClassOf(0.81), MapClass::upTo95);
  EXPECT_EQ(mapClassOf(0.95), MapClass::upTo95);
  EXPECT_EQ(mapClassOf(0.951), MapClass::upTo100);
  EXPECT_EQ(mapClassOf(1), MapClass::upTo100);
  EXPECT_EQ(mapClassOf(1.0001), MapClass::exceeding);
  EXPECT_EQ(mapClassOf(HUGE_VAL), MapClass::exceeding);
  EXPECT_EQ(mapClassOf(NAN), MapClass::notJudged);
}

RC_GTEST_PROP(FieldMap, theClassThatExceedsIsThatOfTheVerdict, ()) {
  const double utilisation = 1 + *rc::gen::inRange(-4000, 4000) * 1e-12;
  RC_ASSERT((mapClassOf(utilisation) == MapClass::exceeding) == exceedsLimit(utilisation));
}

TEST(FieldMap, theExtentIsThatOfPointsWithBothPlaces) {
  const Mapped field({{-3, 10, 0}, {5, NAN, 0}, {NAN, 50, 0}, {4, -2, 0}});
  const FieldExtent extent = *extentOf(field.field);
  EXPECT_EQ(extent.lowX, -3);
  EXPECT_EQ(extent.highX, 4);
  EXPECT_EQ(extent.lowY, -2);
  EXPECT_EQ(extent.highY, 10);
  EXPECT_EQ(extent.points, 2U);
  EXPECT_FALSE(extentOf(Mapped({{NAN, 1, 0}}).field));
  EXPECT_FALSE(extentOf(Field({"A"}, {})));
}

RC_GTEST_PROP(FieldMap, allPlacesLieInsideWithOneScaleAndYUpwards, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const double size = std::pow(10, dice.between(-6, 9));
  std::vector<Place> places;
  for (std::size_t i = 0; i <= dice.below(30); ++i)
    places.push_back({dice.between(-size, size), dice.between(-size, size) * dice.between(0, 2), 0.3});
  const Mapped mapped(places);
  const int width = 20 + static_cast<int>(dice.below(900));
  const int height = 20 + static_cast<int>(dice.below(900));
  const MapView view = wholeOf(*extentOf(mapped.field), width, height, 8);
  bool touches = places.size() == 1;
  for (const Place& place : places) {
    const Vec at = view.pixelOf(place.x, place.y);
    RC_ASSERT(at.x >= 8 - 1e-6 && at.x <= width - 8 + 1e-6);
    RC_ASSERT(at.y >= 8 - 1e-6 && at.y <= height - 8 + 1e-6);
    touches = touches || at.x < 8 + 1e-6 || at.y < 8 + 1e-6;
    const Vec back = view.placeAt(at);
    RC_ASSERT(std::abs(back.x - place.x) < 1e-9 * size && std::abs(back.y - place.y) < 1e-9 * size);
  }
  RC_ASSERT(touches);
  const Vec middle = view.pixelOf(view.centreX, view.centreY);
  const Vec up = view.pixelOf(view.centreX + 1 / view.scale, view.centreY + 2 / view.scale);
  RC_ASSERT(std::abs(up.x - middle.x - 1) < 1e-6 && std::abs(up.y - middle.y + 2) < 1e-6);
}

TEST(FieldMap, theNeighbourIsTheNearestThatWay) {
  const Mapped mapped({{0, 0, 1}, {10, 4, 1}, {5, 6, 1}, {0, 0, 1}, {NAN, 1, 1}, {-3, 3, 1}, {-1, -9, 1}});
  const auto from = [&](double x, double y, MapWay way) {
    return neighbourOf(mapped.field, mapped.all(), x, y, way);
  };
  EXPECT_EQ(from(0, 0, MapWay::right), 1U);
  EXPECT_EQ(from(0, 0, MapWay::up), 5U); // on the border of two ways
  EXPECT_EQ(from(0, 0, MapWay::left), 5U);
  EXPECT_EQ(from(0, 0, MapWay::down), 6U);
  EXPECT_EQ(from(10, 4, MapWay::right), std::nullopt);
  EXPECT_EQ(from(-1, -9, MapWay::up), 0U); // the first of two on one spot
  EXPECT_EQ(neighbourOf(mapped.field, {6}, 0, 0, MapWay::up), std::nullopt);
}

RC_GTEST_PROP(FieldMap, aStepToANeighbourCanBeTakenBack, ()) {
  std::vector<Place> places;
  for (int i = 0; i < 30; ++i)
    places.push_back({i % 6 * 2.0, i / 6 * 3.0, 1});
  const Mapped mapped(places);
  const auto at = *rc::gen::inRange(0U, 30U);
  const auto step = [&](std::uint32_t point, MapWay way) {
    return neighbourOf(mapped.field, mapped.all(), mapped.field.xOf(point), mapped.field.yOf(point), way);
  };
  if (const auto right = step(at, MapWay::right)) {
    RC_ASSERT(*right == at + 1);
    RC_ASSERT(step(*right, MapWay::left) == at);
  } else {
    RC_ASSERT(at % 6 == 5);
  }
  if (const auto up = step(at, MapWay::up)) {
    RC_ASSERT(*up == at + 6);
    RC_ASSERT(step(*up, MapWay::down) == at);
  } else {
    RC_ASSERT(at >= 24);
  }
}

TEST(FieldMap, placesWithoutExtentLieInTheMiddle) {
  for (const double value : {0.0, 3e5, -1e300, 1.7e308}) {
    const MapView view = wholeOf(*extentOf(Mapped({{value, value, 0}, {value, value, 0}}).field), 100, 60, 8);
    EXPECT_EQ(view.pixelOf(value, value), (Vec{50, 30}));
    EXPECT_GT(view.scale, 0);
  }
  const MapView wide = wholeOf({-1.7e308, 0, 1.7e308, 0, 2}, 100, 60, 8);
  EXPECT_GT(wide.scale, 0);
  EXPECT_TRUE(std::isfinite(wide.centreX));
}

TEST(FieldMap, marksOfEvenlySpreadPointsTouch) {
  const FieldExtent deck = {0, 0, 100, 50, 5000};
  const MapView view = wholeOf(deck, 1016, 516, 8);
  EXPECT_EQ(markSize(deck, view, 2, 14), 10);
  EXPECT_EQ(markSize(deck, view, 2, 6), 6);
  EXPECT_EQ(markSize({0, 0, 100, 0, 1000000}, view, 2, 14), 2);
  EXPECT_EQ(markSize({0, 0, 100, 0, 100}, view, 2, 14), 10);
  EXPECT_EQ(markSize({1, 1, 1, 1, 1}, view, 2, 14), 2);
}

TEST(FieldMap, theWorseOfTwoMarksIsOnTop) {
  const Mapped mapped({{5, 5, 0.2}, {5, 5, 0.97}, {5, 5, NAN}, {5, 5, 0.97}, {6, 5, 1.4}, {20, 5, NAN}});
  const MapView view{40, 10, 20, 5, 1};
  const FieldMapPixels pixels = mapped.drawn(view, 2, mapped.all());
  const auto at = [&](int x, int y) { return static_cast<std::size_t>(y * 40 + x); };
  EXPECT_EQ(pixels.points[at(4, 4)], 1U);
  EXPECT_EQ(pixels.classes[at(4, 4)], MapClass::upTo100);
  EXPECT_EQ(pixels.points[at(5, 4)], 4U);
  EXPECT_EQ(pixels.classes[at(6, 5)], MapClass::exceeding);
  EXPECT_EQ(pixels.classes[at(19, 4)], MapClass::notJudged);
  EXPECT_EQ(pixels.classes[at(0, 0)], MapClass::empty);
  // What a filter keeps back lies under the rest.
  const FieldMapPixels few = mapped.drawn(view, 2, {0, 5});
  EXPECT_EQ(few.points[at(4, 4)], 0U);
  EXPECT_EQ(few.classes[at(6, 5)], MapClass::notWanted);
  EXPECT_EQ(few.classes[at(19, 4)], MapClass::notJudged);
}

TEST(FieldMap, thePointNearAPixelIsTheNearest) {
  const Mapped mapped({{5, 5, 0.2}, {10, 5, 0.3}});
  const FieldMapPixels pixels = mapped.drawn({40, 10, 20, 5, 1}, 1, mapped.all());
  EXPECT_EQ(pixels.pointNear(5, 5, 0), 0U);
  EXPECT_EQ(pixels.pointNear(7, 5, 6), 0U);
  EXPECT_EQ(pixels.pointNear(8, 5, 6), 1U);
  EXPECT_EQ(pixels.pointNear(39, 9, 6), std::nullopt);
  EXPECT_EQ(pixels.pointNear(-3, 5, 6), std::nullopt);
  EXPECT_EQ(pixels.pointNear(-1, 5, 6), 0U);
  EXPECT_EQ(pixels.pointNear(1000000, -1000000, 6), std::nullopt);
}

RC_GTEST_PROP(FieldMap, everyPlacedPointIsSeenOrLiesUnderOneThatStandsNoBetter, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  std::vector<Place> places;
  for (std::size_t i = 0; i <= dice.below(300); ++i)
    places.push_back({dice.between(0, 60), dice.between(0, 40), dice.below(6) ? dice.between(0, 1.3) : NAN});
  const Mapped mapped(places);
  std::vector<std::uint32_t> wanted;
  for (const std::uint32_t point : mapped.all())
    if (dice.below(4))
      wanted.push_back(point);
  const MapView view = wholeOf(*extentOf(mapped.field), 70, 50, 4);
  const FieldMapPixels pixels = mapped.drawn(view, 3, wanted);
  const auto classOf = [&](std::uint32_t point) {
    return std::ranges::binary_search(wanted, point) ? mapClassOf(places[point].utilisation)
                                                     : MapClass::notWanted;
  };
  for (const std::uint32_t point : mapped.all()) {
    const Vec at = view.pixelOf(places[point].x, places[point].y);
    const auto pixel = static_cast<std::size_t>(at.y) * 70 + static_cast<std::size_t>(at.x);
    const std::uint32_t seen = pixels.points[pixel];
    RC_ASSERT(seen != FieldMapPixels::noPoint);
    RC_ASSERT(pixels.classes[pixel] == classOf(seen));
    RC_ASSERT(classOf(seen) >= classOf(point));
    if (classOf(point) > MapClass::notJudged)
      RC_ASSERT(places[seen].utilisation >= places[point].utilisation);
  }
}

TEST(FieldMap, farOutsideIsNotDrawnAndDoesNoHarm) {
  const Mapped mapped({{1e300, -1e300, 2}, {-1e300, 1e300, 2}, {5, 5, 0.2}});
  const FieldMapPixels pixels = mapped.drawn({40, 10, 5, 5, 1e6}, 3, mapped.all());
  EXPECT_EQ(std::ranges::count(pixels.classes, MapClass::exceeding), 0);
  EXPECT_EQ(std::ranges::count(pixels.classes, MapClass::upTo50), 9);
  EXPECT_EQ(mapped.drawn({0, 0, 5, 5, 1}, 3, mapped.all()).points.size(), 0U);
}

TEST(FieldMap, endsWhereItIsTold) {
  const Mapped mapped({{5, 5, 0.2}});
  EXPECT_FALSE(
      fieldMapPixels(mapped.field, mapped.results, mapped.all(), {40, 10, 5, 5, 1}, 3, [] { return false; }));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element.h"
#include "core/quantity/format.h"
#include "core/study/edit.h"
#include "tests/support/picture_parts.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>
#include <numbers>
#include <set>

namespace planewright {
namespace {

/// What a test says about a point; the rest is that of a new study.
struct Given {
  PlaneStress stress{8.4, -0.6, 2.1};
  double reading = 30;
  double line = 5.7;
  double tolerance = 3;
  double axes = 0;
  LineKind kind = LineKind::grain;
  Positive positive = Positive::tension;
};

std::string with(double value, const char* unit) {
  return exactNumber(value) + " " + unit;
}

Study studyOf(const Given& given) {
  Study study = newStudy();
  study.convention.positive = given.positive;
  Point& point = study.points.front();
  point.stress = {{study.cases.front().id, with(given.stress.sx, "MPa"), with(given.stress.sy, "MPa"),
                   with(given.stress.txy, "MPa"), "0 MPa"}};
  point.reading = with(given.reading, "deg");
  point.axes = with(given.axes, "deg");
  point.lines = {Line{"seam", given.kind, with(given.line, "deg"),
                      given.tolerance == 0 ? "" : with(given.tolerance, "deg")}};
  return study;
}

struct Drawn {
  Picture picture;
  std::vector<LabelWish> wishes;
};

Drawn drawn(const Given& given, const ElementOrder& order) {
  const Study study = studyOf(given);
  Drawn result;
  result.wishes = drawElement(result.picture, study, evaluate(study), order);
  return result;
}

ElementOrder orderOf(double outer = 100) {
  ElementOrder order;
  order.outer = outer;
  order.textSize = outer / 10;
  return order;
}

ElementOrder withHandles() {
  ElementOrder order = orderOf();
  order.handles = true;
  return order;
}

double lengthOf(Vec v) {
  return std::hypot(v.x, v.y);
}

/// An arrow as a reader sees it: a shaft, followed by its filled head.
struct Arrow {
  Vec tail;
  Vec tip;
  Vec along() const { return tip - tail; }
  Vec middle() const { return 0.5 * (tail + tip); }
  double length() const { return lengthOf(along()); }
};

std::vector<Arrow> arrowsIn(const Picture& picture, Role role = Role::state) {
  const std::vector<Path> paths = partsOf<Path>(picture);
  std::vector<Arrow> arrows;
  for (std::size_t i = 1; i < paths.size(); ++i) {
    const Path& head = paths[i];
    if (head.fill != role || head.points.size() != 3)
      continue;
    const Vec tail = paths[i - 1].points.front();
    const auto distance = [&](Vec p) { return lengthOf(p - tail); };
    arrows.push_back({tail, *std::ranges::max_element(head.points, {}, distance)});
  }
  return arrows;
}

/// Normal arrows point from or at the centre; shear arrows run round it.
bool isShear(const Arrow& arrow) {
  const Vec a = arrow.along();
  const Vec m = arrow.middle();
  return std::abs(a.x * m.x + a.y * m.y) < 0.1 * lengthOf(a) * lengthOf(m);
}

std::vector<Arrow> shearsIn(const Picture& picture) {
  std::vector<Arrow> arrows = arrowsIn(picture);
  std::erase_if(arrows, [](const Arrow& arrow) { return !isShear(arrow); });
  return arrows;
}

std::vector<Arrow> normalsIn(const Picture& picture) {
  std::vector<Arrow> arrows = arrowsIn(picture);
  std::erase_if(arrows, isShear);
  return arrows;
}

/// The arrow of a list whose middle lies nearest to a direction (deg, y up) from the centre (0, 0).
Arrow towards(const std::vector<Arrow>& arrows, double degrees) {
  const double radians = degrees * std::numbers::pi / 180;
  const Vec direction{std::cos(radians), -std::sin(radians)};
  return *std::ranges::max_element(arrows, {}, [&](const Arrow& arrow) {
    return (arrow.middle().x * direction.x + arrow.middle().y * direction.y) / lengthOf(arrow.middle());
  });
}

const LabelWish& wishOf(const Drawn& drawn, std::string_view key) {
  return *std::ranges::find(drawn.wishes, key, &LabelWish::key);
}

TEST(ElementArrows, tensionLeavesEveryFaceAndCompressionPressesOnIt) {
  for (const double stress : {5.0, -5.0}) {
    const std::vector<Arrow> arrows = arrowsIn(drawn({.stress = {stress, stress, 0}}, orderOf()).picture);
    ASSERT_EQ(arrows.size(), 4U);
    for (const Arrow& arrow : arrows)
      EXPECT_EQ(lengthOf(arrow.tip) > lengthOf(arrow.tail), stress > 0);
  }
}

TEST(ElementArrows, positiveShearRunsUpTheXFaceAndAlongTheYFace) {
  const std::vector<Arrow> arrows = arrowsIn(drawn({.stress = {0, 0, 3}, .reading = 0}, orderOf()).picture);
  ASSERT_EQ(arrows.size(), 4U);
  EXPECT_LT(towards(arrows, 0).along().y, 0);
  EXPECT_GT(towards(arrows, 90).along().x, 0);
  EXPECT_GT(towards(arrows, 180).along().y, 0);
  EXPECT_LT(towards(arrows, 270).along().x, 0);
}

TEST(ElementArrows, theGivenElementShowsTheGivenComponents) {
  ElementOrder order = orderOf();
  order.turned = false;
  const Drawn result = drawn({.stress = {80, -20, -30}, .reading = 25}, order);
  const std::vector<Arrow> normals = normalsIn(result.picture);
  const std::vector<Arrow> shears = shearsIn(result.picture);
  ASSERT_EQ(normals.size(), 4U);
  ASSERT_EQ(shears.size(), 4U);
  EXPECT_GT(towards(normals, 0).along().x, 0);
  EXPECT_GT(towards(normals, 90).along().y, 0) << "sigma_y presses from above";
  EXPECT_GT(towards(shears, 0).along().y, 0) << "negative shear runs down the x face";
  EXPECT_EQ(plain(wishOf(result, "sigma_x").longForm), "σx 80.00");
  EXPECT_EQ(plain(wishOf(result, "sigma_y").longForm), "σy −20.00");
  EXPECT_EQ(plain(wishOf(result, "tau_xy").longForm), "τxy −30.00");
}

TEST(ElementArrows, aComponentPrintedAsZeroHasNone) {
  EXPECT_TRUE(arrowsIn(drawn({.stress = {}}, orderOf()).picture).empty());
  EXPECT_TRUE(normalsIn(drawn({.stress = {0, 0, 3}, .reading = 0}, orderOf()).picture).empty());
  EXPECT_TRUE(shearsIn(drawn({.stress = {80, 20, -30}, .reading = -22.5}, orderOf()).picture).empty());
  EXPECT_TRUE(shearsIn(drawn({.stress = {8, 8, 1e-4}, .reading = 0}, orderOf()).picture).empty());
  EXPECT_EQ(shearsIn(drawn({.stress = {8, 8, 1e-3}, .reading = 0}, orderOf()).picture).size(), 4U);
}

TEST(ElementArrows, smallOnesKeepALeastLength) {
  const Drawn result = drawn({.stress = {8, 0.01, 0}, .reading = 0}, orderOf());
  EXPECT_NEAR(towards(arrowsIn(result.picture), 90).length(), 13, 1e-9);
  EXPECT_NEAR(towards(arrowsIn(result.picture), 0).length(), 25, 1e-9);
}

// Arrows that breathe while the element turns would say that the stress changes.
TEST(ElementArrows, oneScaleOverADragOfSixtyMoves) {
  const PlaneStress stress{8.4, 6, 2.1};
  const double scale = arrowScale(evaluate(studyOf({.stress = stress})).state(), 25);
  for (int move = 0; move < 60; ++move) {
    const double theta = 1.5 * move;
    const Drawn result = drawn({.stress = stress, .reading = theta}, orderOf());
    const Traction acts = tractionOn(stress, {Angle::fromDegrees(theta)});
    const double normal = towards(normalsIn(result.picture), theta).length();
    EXPECT_NEAR(normal, scale * std::abs(acts.sn), 1e-9) << theta;
    EXPECT_LE(normal, 25);
  }
}

TEST(ElementArrows, theXArrowIsEqualAtZeroAndNinety) {
  const Arrow at0 = towards(normalsIn(drawn({.reading = 0}, orderOf()).picture), 0);
  const Arrow at90 = towards(normalsIn(drawn({.reading = 90}, orderOf()).picture), 0);
  EXPECT_NEAR(lengthOf(at0.tip - at90.tip), 0, 1e-9);
  EXPECT_NEAR(lengthOf(at0.tail - at90.tail), 0, 1e-9);
}

TEST(ElementArrows, compressionPositiveDrawsTheSameBodyWithTheOtherNumbers) {
  const Drawn tension = drawn({.stress = {80, 20, -30}}, withHandles());
  const Drawn compression =
      drawn({.stress = {-80, -20, 30}, .positive = Positive::compression}, withHandles());
  EXPECT_EQ(tension.picture, compression.picture);
  EXPECT_EQ(plain(wishOf(tension, "sigma_n").longForm), "σn 39.02");
  EXPECT_EQ(plain(wishOf(compression, "sigma_n").longForm), "σn −39.02");
  const Drawn pressed =
      drawn({.stress = {80, 0, 0}, .reading = 0, .positive = Positive::compression}, orderOf());
  EXPECT_LT(towards(arrowsIn(pressed.picture), 0).along().x, 0) << "a typed +80 presses on the face";
}

TEST(ElementArrows, pointTheWayTheSeenFaceIsPulled) {
  // 45 deg in uniaxial tension: the upper right face slides to the lower right.
  const Drawn result = drawn({.stress = {10, 0, 0}, .reading = 45}, orderOf());
  const Arrow shear = towards(shearsIn(result.picture), 45);
  EXPECT_GT(shear.along().x, 0);
  EXPECT_GT(shear.along().y, 0);
}

RC_GTEST_PROP(ElementArrows, areInEquilibrium, ()) {
  const auto component = [] { return *rc::gen::inRange(-1000, 1001) / 10.0; };
  const Given given{.stress = {component(), component(), component()},
                    .reading = *rc::gen::inRange(-900, 901) / 10.0,
                    .axes = *rc::gen::inRange(-90, 91) / 1.0};
  Vec force{};
  double moment = 0;
  for (const Arrow& arrow : arrowsIn(drawn(given, orderOf()).picture)) {
    force = force + arrow.along();
    moment += arrow.middle().x * arrow.along().y - arrow.middle().y * arrow.along().x;
  }
  RC_ASSERT(lengthOf(force) < 1e-9);
  RC_ASSERT(std::abs(moment) < 1e-6);
}

/// Farthest place of all strokes and fills from the centre, without the letters.
double reachOf(const Picture& picture) {
  double reach = 0;
  for (const Path& path : partsOf<Path>(picture))
    for (const Vec point : path.points)
      reach = std::max(reach, lengthOf(point) + (path.pen ? path.pen->width / 2 : 0));
  for (const Arc& arc : partsOf<Arc>(picture))
    reach = std::max(reach, lengthOf(arc.centre) + arc.radius + (arc.pen ? arc.pen->width / 2 : 0));
  return reach;
}

RC_GTEST_PROP(Element, staysInsideItsCircle, ()) {
  const auto component = [] { return *rc::gen::inRange(-1000, 1001) / 10.0; };
  const Given given{.stress = {component(), component(), component()},
                    .reading = *rc::gen::inRange(-900, 901) / 10.0,
                    .line = *rc::gen::inRange(-900, 901) / 10.0,
                    .tolerance = *rc::gen::inRange(0, 100) / 1.0,
                    .axes = *rc::gen::inRange(-180, 181) / 1.0,
                    .kind =
                        *rc::gen::element(LineKind::grain, LineKind::fibre, LineKind::weld, LineKind::bond)};
  ElementOrder order = orderOf();
  order.turned = *rc::gen::arbitrary<bool>();
  order.handles = order.turned && *rc::gen::arbitrary<bool>();
  order.givenArrows = *rc::gen::arbitrary<bool>();
  order.lineArc = *rc::gen::arbitrary<bool>();
  const Drawn result = drawn(given, order);
  RC_ASSERT(reachOf(result.picture) <= (order.handles ? 103.0 : 92.0));
  for (const Label& letter : partsOf<Label>(result.picture))
    RC_ASSERT(lengthOf(letter.at) <= (order.handles ? 114 : 100));
  for (const LabelWish& wish : result.wishes)
    RC_ASSERT(lengthOf(wish.mark) <= 100 + 1e-9);
}

TEST(Element, theMembersInclinationTurnsTheWholeDrawing) {
  const double turn = 20;
  const Drawn level = drawn({}, withHandles());
  const Drawn inclined = drawn({.axes = turn}, withHandles());
  const std::vector<Path> from = partsOf<Path>(level.picture);
  const std::vector<Path> to = partsOf<Path>(inclined.picture);
  ASSERT_EQ(from.size(), to.size());
  const double c = std::cos(turn * std::numbers::pi / 180);
  const double s = std::sin(turn * std::numbers::pi / 180);
  for (std::size_t i = 0; i < from.size(); ++i)
    for (std::size_t k = 0; k < from[i].points.size(); ++k) {
      const Vec p = from[i].points[k];
      EXPECT_NEAR(lengthOf(to[i].points[k] - Vec{c * p.x + s * p.y, c * p.y - s * p.x}), 0, 1e-9);
    }
  EXPECT_EQ(plain(wishOf(inclined, "theta").longForm), "θ 30.0°") << "angles stay those from the x axis";
}

TEST(Element, theCutIsTheHeavyFaceThatTheNormalLeaves) {
  const ElementOrder order = orderOf();
  const std::vector<Path> paths = partsOf<Path>(drawn({.reading = 0}, order).picture);
  const auto cut = std::ranges::find_if(paths, [&](const Path& path) {
    return path.pen == Pen{Role::reading, order.cut, Dash::solid};
  });
  ASSERT_NE(cut, paths.end());
  ASSERT_EQ(cut->points.size(), 2U);
  for (const Vec end : cut->points)
    EXPECT_NEAR(end.x, 38, 1e-9);
}

TEST(Element, theOtherFaceIsTheSamePlane) {
  ElementOrder order = withHandles();
  const Drawn one = drawn({}, order);
  order.otherFace = true;
  const Drawn other = drawn({}, order);
  const auto knobOf = [](const Drawn& d) {
    for (const Arc& arc : partsOf<Arc>(d.picture))
      if (arc.fill == Role::reading)
        return arc.centre;
    return Vec{};
  };
  EXPECT_NEAR(lengthOf(knobOf(one) + knobOf(other)), 0, 1e-9);
  for (const char* key : {"sigma_n", "tau_nt", "sigma_t", "theta"})
    EXPECT_EQ(wishOf(one, key).longForm, wishOf(other, key).longForm);
  for (const Arrow& arrow : arrowsIn(one.picture))
    EXPECT_TRUE(std::ranges::any_of(arrowsIn(other.picture), [&](const Arrow& twin) {
      return lengthOf(twin.tip - arrow.tip) < 1e-9 && lengthOf(twin.tail - arrow.tail) < 1e-9;
    }));
}

TEST(Element, knobAndBarsNeverTouch) {
  for (double angle = -75; angle <= 90; angle += 15) {
    const Picture picture = drawn({.reading = angle, .line = angle}, withHandles()).picture;
    double bars = 0;
    for (const Path& path : partsOf<Path>(picture))
      if (path.fill == Role::canvas)
        for (const Vec corner : path.points)
          bars = std::max(bars, lengthOf(corner));
    double knob = 200;
    for (const Arc& arc : partsOf<Arc>(picture))
      if (arc.fill == Role::reading)
        knob = lengthOf(arc.centre) - arc.radius;
    EXPECT_GT(bars, 80);
    EXPECT_LT(bars + 1, knob);
  }
}

TEST(Element, givenArrowsGiveWayWhereTheyWouldLieOnTheTurnedOnes) {
  ElementOrder order = orderOf();
  order.givenArrows = true;
  const auto pale = [&](double reading) {
    const Picture picture = drawn({.reading = reading}, order).picture;
    return std::ranges::count_if(partsOf<Path>(picture), [&](const Path& path) {
      return path.pen == Pen{Role::other, order.medium, Dash::solid};
    });
  };
  EXPECT_GT(pale(20), 0);
  EXPECT_GT(pale(-70), 0);
  EXPECT_EQ(pale(13), 0);
  EXPECT_EQ(pale(-77), 0);
  EXPECT_EQ(pale(90), 0);
}

std::vector<Path> textureOf(LineKind kind, double line, double reading) {
  std::vector<Path> strokes =
      partsOf<Path>(drawn({.reading = reading, .line = line, .kind = kind}, orderOf()).picture);
  std::erase_if(strokes, [](const Path& path) { return !path.pen || path.pen->role != Role::grain; });
  return strokes;
}

/// Signed distance (rounded) of a stroke from the centre, seen along the line; none for a stroke across it.
std::set<long> rowsOf(const std::vector<Path>& strokes, double line) {
  const double radians = line * std::numbers::pi / 180;
  const Vec left{-std::sin(radians), -std::cos(radians)};
  std::set<long> rows;
  for (const Path& stroke : strokes)
    rows.insert(std::lround(100 * (stroke.points[0].x * left.x + stroke.points[0].y * left.y)));
  return rows;
}

TEST(ElementTexture, runsAlongTheLineAndDoesNotTurnWithTheSquare) {
  const double line = 33;
  const double radians = line * std::numbers::pi / 180;
  for (const LineKind kind : {LineKind::grain, LineKind::fibre, LineKind::bond}) {
    for (const double reading : {0.0, 20.0, 77.0})
      for (const Path& stroke : textureOf(kind, line, reading)) {
        const Vec along = stroke.points[1] - stroke.points[0];
        EXPECT_NEAR(along.x * std::sin(radians) + along.y * std::cos(radians), 0, 1e-9);
      }
    const std::set<long> rows = rowsOf(textureOf(kind, line, line), line);
    const std::set<long> turned = rowsOf(textureOf(kind, line, line + 20), line);
    EXPECT_TRUE(std::ranges::includes(turned, rows));
  }
}

TEST(ElementTexture, staysInsideTheTurnedSquare) {
  for (const LineKind kind : {LineKind::grain, LineKind::fibre, LineKind::weld, LineKind::bond})
    for (const double reading : {0.0, 31.0, -68.0})
      for (const Path& stroke : textureOf(kind, 12, reading))
        for (const Vec end : stroke.points) {
          const double radians = reading * std::numbers::pi / 180;
          EXPECT_LT(std::abs(end.x * std::cos(radians) - end.y * std::sin(radians)), 38);
          EXPECT_LT(std::abs(end.x * std::sin(radians) + end.y * std::cos(radians)), 38);
        }
}

TEST(ElementTexture, hasNoDirection) {
  const auto ends = [](double line) {
    std::multiset<std::pair<long, long>> places;
    for (const Path& stroke : textureOf(LineKind::grain, line, 10))
      for (const Vec end : stroke.points)
        places.insert({std::lround(1e6 * end.x), std::lround(1e6 * end.y)});
    return places;
  };
  EXPECT_EQ(ends(90), ends(-90));
  EXPECT_GT(ends(90).size(), 40U);
}

TEST(ElementTexture, everyKindIsToldApart) {
  EXPECT_GT(textureOf(LineKind::grain, 0, 0).size(), textureOf(LineKind::fibre, 0, 0).size());
  EXPECT_EQ(textureOf(LineKind::bond, 0, 0).size(), 2U);
  EXPECT_EQ(textureOf(LineKind::other, 0, 0).size(), 0U);
  const std::vector<Path> weld = textureOf(LineKind::weld, 0, 0);
  EXPECT_EQ(std::ranges::count_if(weld, [](const Path& p) { return p.points[0].y == p.points[1].y; }), 1);
  EXPECT_GT(weld.size(), 8U);
}

TEST(ElementLabels, sayWhatActsOnTheReadingPlaneAndTheLine) {
  const Drawn result =
      drawn({.stress = {80, 20, -30}, .reading = 25, .line = 5.7, .tolerance = 3}, orderOf());
  EXPECT_EQ(plain(wishOf(result, "sigma_n").longForm), "σn 46.30");
  EXPECT_EQ(plain(wishOf(result, "tau_nt").longForm), "τnt −42.26");
  EXPECT_EQ(plain(wishOf(result, "sigma_t").longForm), "σt 53.70");
  EXPECT_EQ(plain(wishOf(result, "theta").longForm), "θ 25.0°");
  EXPECT_EQ(plain(wishOf(result, "phi").longForm), "φ 5.7° ± 3°");
  EXPECT_EQ(plain(wishOf(result, "phi").shortForm), "φ");
  const Drawn sure = drawn({.tolerance = 0}, orderOf());
  EXPECT_EQ(plain(wishOf(sure, "phi").longForm), "φ 5.7°");
}

TEST(ElementLabels, standAtTheirArrows) {
  const Drawn result = drawn({.stress = {80, 20, -30}, .reading = 25}, orderOf());
  const Vec n = wishOf(result, "sigma_n").mark;
  EXPECT_NEAR(lengthOf(n - towards(normalsIn(result.picture), 25).tip), 0, 1e-9);
  EXPECT_NEAR(lengthOf(wishOf(result, "tau_nt").mark - towards(shearsIn(result.picture), 25).tip), 0, 1e-9);
}

TEST(Element, withoutALineThereIsNeitherBandNorTexture) {
  Study study = studyOf({});
  study.points.front().lines.clear();
  Picture picture;
  const std::vector<LabelWish> wishes = drawElement(picture, study, evaluate(study), withHandles());
  EXPECT_EQ(std::ranges::count(wishes, "phi", &LabelWish::key), 0);
  for (const Path& path : partsOf<Path>(picture))
    EXPECT_TRUE(!path.pen || (path.pen->role != Role::line && path.pen->role != Role::grain));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/reading_by_value.h"

#include "core/study/edit.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using Kind = PlanesOfValue::Kind;

Study typed(const std::string& sx, const std::string& sy, const std::string& txy,
            const std::string& reading) {
  return *edited(newStudy(),
                 Edits{Type{{Spot::sx, "P1", "G"}, sx}, Type{{Spot::sy, "P1", "G"}, sy},
                       Type{{Spot::txy, "P1", "G"}, txy}, Type{{Spot::reading, "P1", {}}, reading}});
}

Result<ReadingByValue> asked(const Study& study, Component component, const std::string& text) {
  return readingFor(study, evaluate(study), component, text);
}

Study turned(const Study& study, const std::string& reading) {
  return *edited(study, Edit{Type{{Spot::reading, "P1", {}}, reading}});
}

TEST(ReadingByValue, theNearerOfTwoPlanesComesFirst) {
  // sn = 50 + 30 cos 2 theta: 65 at theta = -30 and 30 deg.
  const Study study = typed("80", "20", "0", "20 deg");
  const auto found = asked(study, Component::sn, "65");
  ASSERT_TRUE(found);
  EXPECT_EQ(found->planes.kind, Kind::two);
  EXPECT_NEAR(found->planes.first.value.degrees(), 30, 1e-12);
  ASSERT_TRUE(found->other);
  EXPECT_EQ(plain(found->note), "also at −30.0°");
  EXPECT_NEAR(evaluate(turned(study, found->reading)).state().reading.sn, 65, 1e-12);
  EXPECT_NEAR(evaluate(turned(study, *found->other)).state().reading.sn, 65, 1e-12);
}

TEST(ReadingByValue, aPrincipalValueIsTouched) {
  const auto found = asked(typed("8.4", "-0.6", "2.1", "0"), Component::sn, "8.87");
  ASSERT_TRUE(found);
  EXPECT_EQ(found->planes.kind, Kind::touching);
  EXPECT_FALSE(found->other);
  EXPECT_TRUE(plain(found->note).starts_with("touches the circle at σ1, ± ")) << plain(found->note);
  const auto least = asked(typed("80", "20", "-30", "0"), Component::tnt, "-42.4");
  ASSERT_TRUE(least);
  EXPECT_TRUE(plain(least->note).starts_with("touches the circle at the least τnt, ± "))
      << plain(least->note);
}

TEST(ReadingByValue, whatIsOutOfReachNamesTheRange) {
  const auto found = asked(typed("80", "20", "-30", "0"), Component::sn, "93");
  ASSERT_FALSE(found);
  EXPECT_EQ(plain(found.error().what), "σn reaches only 7.57 to 92.43 MPa.");
  EXPECT_EQ(found.error().quoted, "93");
  EXPECT_EQ(found.error().place, "points/P1/reading");
}

TEST(ReadingByValue, aDegenerateStateHasTheValueOnEveryPlane) {
  const Study study = typed("5", "5", "0", "12 deg");
  const auto found = asked(study, Component::sn, "5");
  ASSERT_TRUE(found);
  EXPECT_EQ(plain(found->note), "every direction");
  EXPECT_EQ(found->reading, "12 deg");
  EXPECT_FALSE(asked(study, Component::tnt, "1"));
}

TEST(ReadingByValue, theTextIsReadInTheStudysUnit) {
  const Study study =
      *edited(typed("80", "20", "0", "20 deg"), Edit{Type{{Spot::unitStress, {}, {}}, "kPa"}});
  const auto bare = asked(study, Component::sn, "65000");
  const auto named = asked(study, Component::sn, "65 MPa");
  ASSERT_TRUE(bare);
  ASSERT_TRUE(named);
  EXPECT_EQ(bare->reading, named->reading);
  EXPECT_EQ(asked(study, Component::sn, "12 kN").error().quoted, "12 kN");
}

RC_GTEST_PROP(ReadingByValue, findsWhereItCameFrom, ()) {
  const auto number = [] { return std::to_string(*rc::gen::inRange(-1000, 1000)); };
  const Study study = typed(number(), number(), number(), std::to_string(*rc::gen::inRange(-89, 90)));
  const Readout readout = evaluate(study);
  const Component component = *rc::gen::element(Component::sn, Component::tnt);
  const Traction there = readout.state().reading;
  const double wanted = component == Component::sn ? there.sn : there.tnt;
  const auto found = readingFor(study, readout, component, std::to_string(wanted));
  RC_ASSERT(found.has_value());
  const Traction again = evaluate(turned(study, found->reading)).state().reading;
  const double got = component == Component::sn ? again.sn : again.tnt;
  RC_ASSERT(std::abs(got - wanted) <= 1e-6 + 1e-12 * std::abs(wanted));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/leave_out.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::ElementsAre;

TEST(LeaveOut, meetsByNameBeginningAndRegion) {
  Field field({"A"}, {false, false, false, true, false, false});
  for (const char* name : {"a1", "a2", "b1", "b2"}) {
    const std::size_t point = field.add(name, Layer::none, 1);
    field.setRegion(point, point == 2 ? "corner" : "");
  }
  EXPECT_EQ(leaveOut(field, "a*"), 2U);
  EXPECT_EQ(leaveOut(field, "a1"), 1U);
  EXPECT_EQ(leaveOut(field, "corner"), 1U);
  EXPECT_EQ(leaveOut(field, "b"), 0U);
  EXPECT_EQ(field.standingOf(2), PointStanding::leftOut);
  EXPECT_EQ(field.standingOf(3), PointStanding::whole);
}

TEST(LeaveOut, byAListTellsTheNamesThatNoPointHas) {
  Field field({"A"}, {true, false, false, false, false, false});
  field.add("n1", Layer::top, 2);
  field.add("n1", Layer::bottom, 3);
  field.add("n2", Layer::top, 4);
  EXPECT_THAT(leaveOutListed(field, {"n9", "n1", "m", "n1"}), ElementsAre("m", "n9"));
  EXPECT_EQ(field.standingOf(0), PointStanding::leftOut);
  EXPECT_EQ(field.standingOf(1), PointStanding::leftOut);
  EXPECT_EQ(field.standingOf(2), PointStanding::whole);
  EXPECT_THAT(leaveOutListed(field, {}), ElementsAre());
}

} // namespace
} // namespace planewright

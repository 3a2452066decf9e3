// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/demand.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(BendingShare, isThatOfTheMix) {
  EXPECT_EQ(bendingShareOf(10, 0, 10), 1);
  EXPECT_EQ(bendingShareOf(10, 10, 0), 0);
  EXPECT_NEAR(bendingShareOf(10, 4, 6), 0.6, 1e-15);
  EXPECT_NEAR(bendingShareOf(-10, -4, -6), 0.6, 1e-15);
}

TEST(BendingShare, countsWhatIsTypedAsAxial) {
  EXPECT_NEAR(bendingShareOf(10, 0, 5), 0.5, 1e-15);
}

TEST(BendingShare, partsThatPullTheOtherWayNeverRaiseAStrength) {
  EXPECT_EQ(bendingShareOf(-3, 2, -5), 1);
  EXPECT_EQ(bendingShareOf(3, 5, -2), 0);
  EXPECT_EQ(bendingShareOf(0, 5, -5), 0);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/shown_ratio.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <limits>

namespace planewright {
namespace {

TEST(ShownUtilisation, isRoundedSoThatItNeverReassures) {
  EXPECT_EQ(shownUtilisation(0), "0.00");
  EXPECT_EQ(shownUtilisation(0.87), "0.87");
  EXPECT_EQ(shownUtilisation(0.8701), "0.88");
  EXPECT_EQ(shownUtilisation(1), "1.00");
  EXPECT_EQ(shownUtilisation(1.0004), "1.01");
  EXPECT_EQ(shownUtilisation(0.9996), "0.9996");
  EXPECT_EQ(shownUtilisation(0.99), "0.99");
  EXPECT_EQ(shownUtilisation(0.990001), "0.991");
  EXPECT_EQ(shownUtilisation(0.9999999), "0.9999999");
  EXPECT_EQ(shownUtilisation(1 + 5e-10), "1.00");
  EXPECT_EQ(shownUtilisation(1 + 2e-9), "1.01");
  EXPECT_EQ(shownUtilisation(12.3), "12.30");
  EXPECT_EQ(shownUtilisation(std::numeric_limits<double>::infinity()), "∞");
}

TEST(ShownMultiplier, isRoundedDown) {
  EXPECT_EQ(shownMultiplier(1.1599), "1.15");
  EXPECT_EQ(shownMultiplier(1.15), "1.15");
  EXPECT_EQ(shownMultiplier(0.9999), "0.99");
  EXPECT_EQ(shownMultiplier(0.0234), "0.023");
  EXPECT_EQ(shownMultiplier(0), "0.00");
}

RC_GTEST_PROP(ShownUtilisation, isNeverLess, ()) {
  const double value = *rc::gen::inRange(0, 3000000) / 1e6;
  RC_ASSERT(std::stod(shownUtilisation(value)) >= value * (1 - 1e-12));
  RC_ASSERT(std::stod(shownMultiplier(value)) <= value * (1 + 1e-12));
}

} // namespace
} // namespace planewright

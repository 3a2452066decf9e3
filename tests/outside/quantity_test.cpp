// SPDX-License-Identifier: GPL-3.0-or-later
// Factors of units against their definitions.
#include "core/quantity/expression.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

// Factors as they are printed stand in resources/checks; here what they follow from: 1 lb = 0.45359237 kg and
// 1 yd = 0.9144 m (international yard and pound agreement, 1959), g_n = 9.80665 m/s2 (3rd CGPM, 1901); both
// from memory.
TEST(OutsideUnits, factorsFollowFromTheDefinitions) {
  const auto value = [](const char* typed, Dimension dimension) {
    return readEntry(typed, {dimension, {}, Slopes::none}).value().value;
  };
  EXPECT_DOUBLE_EQ(value("1 lbf", dimension::force), 0.45359237 * 9.80665);
  EXPECT_DOUBLE_EQ(value("3 ft", dimension::length), 914.4);
  EXPECT_DOUBLE_EQ(value("1 tf", dimension::force), 9806.65);
  EXPECT_DOUBLE_EQ(value("1 psi", dimension::stress), 0.45359237 * 9.80665 / (25.4 * 25.4));
  EXPECT_DOUBLE_EQ(value("144 psf", dimension::stress), value("1 psi", dimension::stress));
}

} // namespace
} // namespace planewright

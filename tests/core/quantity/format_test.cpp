// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <charconv>
#include <cmath>
#include <limits>

namespace planewright {
namespace {

TEST(Format, exactNumbersHaveFifteenDigitsAtMost) {
  EXPECT_EQ(exactNumber(0), "0");
  EXPECT_EQ(exactNumber(-0.0), "0");
  EXPECT_EQ(exactNumber(80), "80");
  EXPECT_EQ(exactNumber(-2.1), "-2.1");
  EXPECT_EQ(exactNumber(0.1 + 0.2), "0.3");
  EXPECT_EQ(exactNumber(1.0 / 3), "0.333333333333333");
  EXPECT_EQ(exactNumber(1e-5), "0.00001");
  EXPECT_EQ(exactNumber(1.25e-6), "1.25e-6");
  EXPECT_EQ(exactNumber(123456789012345), "123456789012345");
  EXPECT_EQ(exactNumber(1e15), "1e15");
  EXPECT_EQ(exactNumber(-1.5e300), "-1.5e300");
  EXPECT_EQ(exactNumber(9.9999999999999999e22), "1e23");
}

RC_GTEST_PROP(Format, exactNumbersReadBackWithinFifteenDigits, (std::int64_t mantissa)) {
  const int exponent = *rc::gen::inRange(-290, 280);
  const double value = static_cast<double>(mantissa) * std::pow(10.0, exponent);
  const std::string text = exactNumber(value);
  double read = 1;
  const auto end = std::from_chars(text.data(), text.data() + text.size(), read);
  RC_ASSERT(end.ptr == text.data() + text.size());
  RC_ASSERT(std::abs(read - value) <= 5e-15 * std::abs(value));
  RC_ASSERT(exactNumber(read) == text);
}

TEST(Format, shortestNumbersHaveAllTheDigitsTheyNeed) {
  EXPECT_EQ(shortestNumber(-0.0), "0");
  EXPECT_EQ(shortestNumber(-22.5), "-22.5");
  EXPECT_EQ(shortestNumber(0.1 + 0.2), "0.30000000000000004");
  EXPECT_EQ(shortestNumber(1.0 / 3), "0.3333333333333333");
  EXPECT_EQ(shortestNumber(1.25e-6), "1.25e-6");
  EXPECT_EQ(shortestNumber(-1.5e300), "-1.5e300");
}

RC_GTEST_PROP(Format, shortestNumbersReadBackAsTheSameDouble, (std::int64_t mantissa)) {
  const int exponent = *rc::gen::inRange(-290, 280);
  const double value = static_cast<double>(mantissa) / 7 * std::pow(10.0, exponent);
  const std::string text = shortestNumber(value);
  double read = 1;
  const auto end = std::from_chars(text.data(), text.data() + text.size(), read);
  RC_ASSERT(end.ptr == text.data() + text.size());
  RC_ASSERT(read == value);
}

TEST(Format, shownNumbersHaveTrueMinusAndNoNegativeZero) {
  EXPECT_EQ(shownNumber(-2.1, 2), "−2.10");
  EXPECT_EQ(shownNumber(-0.004, 2), "0.00");
  EXPECT_EQ(shownNumber(-0.0, 1), "0.0");
  EXPECT_EQ(shownNumber(-0.4, 0), "0");
  EXPECT_EQ(shownNumber(84, 0), "84");
  EXPECT_EQ(shownNumber(999999999999999, 0), "999999999999999");
  EXPECT_EQ(shownNumber(1.2344e20, 2), "1.234e+20");
  EXPECT_EQ(shownNumber(-1.2344e20, 2), "−1.234e+20");
  EXPECT_EQ(shownNumber(0.00012344, 16), "1.234e−04");
  EXPECT_EQ(shownNumber(0.4e-16, 16), "0");
  EXPECT_EQ(shownNumber(-0.6e-16, 16), "−6.000e−17");
  EXPECT_EQ(shownNumber(12, -1), "1.200e+01");
  EXPECT_EQ(shownNumber(-0.0, -1), "0.000e+00");
  EXPECT_EQ(shownNumber(-0.0, 20), "0");
}

TEST(Format, decimalsGiveTheLargestFourDigits) {
  EXPECT_EQ(decimalsFor(8.4), 3);
  EXPECT_EQ(decimalsFor(84), 2);
  EXPECT_EQ(decimalsFor(-840), 1);
  EXPECT_EQ(decimalsFor(8400), 0);
  EXPECT_EQ(decimalsFor(1e9), 0);
  EXPECT_EQ(decimalsFor(0), 3);
  EXPECT_EQ(decimalsFor(1e-9), 12);
  EXPECT_EQ(decimalsFor(9.9994), 3);
  EXPECT_EQ(decimalsFor(9.9996), 2);
  EXPECT_EQ(decimalsFor(84, 6), 4);
}

// What twelve decimals would show as zeros is shown with its power of ten, what is nothing beside it as 0.
TEST(Format, theTiniestIsShownWithItsPowerOfTen) {
  for (const double largest : {9.87654e-10, 1.23456e-14, 5e-300, 5e-324}) {
    const int decimals = decimalsFor(largest);
    EXPECT_EQ(shownNumber(-largest, decimals), shownNumber(-largest, -1)) << largest;
    EXPECT_EQ(shownNumber(1e-8 * largest, decimals), "0") << largest;
  }
  EXPECT_EQ(shownNumber(1.23456e-14, decimalsFor(1.23456e-14)), "1.235e−14");
  EXPECT_EQ(shownNumber(2e-15, decimalsFor(1.23456e-14)), "2.000e−15");
}

TEST(Format, degrees) {
  EXPECT_EQ(shownDegrees(Angle::fromDegrees(5.7106), 2), "5.71°");
  EXPECT_EQ(shownDegrees(Angle::fromDegrees(-67.5), 1), "−67.5°");
}

TEST(Format, slopes) {
  const auto slope = [](double run) { return shownSlope(Angle::fromRadians(std::atan2(1, run))); };
  EXPECT_EQ(slope(10), "1 in 10");
  EXPECT_EQ(slope(12.5), "1 in 12.5");
  EXPECT_EQ(slope(1234), "1 in 1230");
  EXPECT_EQ(slope(1e6), "1 in 1000000");
  EXPECT_EQ(shownSlope(Angle::fromRadians(std::atan2(-1, 8))), "−1 in 8");
  EXPECT_EQ(shownSlope(Angle::fromDegrees(45)), "1 in 1");
  EXPECT_EQ(shownSlope(Angle::fromDegrees(0)), "");
  EXPECT_EQ(shownSlope(Angle::fromDegrees(45.1)), "");
  EXPECT_EQ(shownSlope(Angle::fromDegrees(-90)), "");
  EXPECT_EQ(shownSlope(Angle::fromDegrees(std::numeric_limits<double>::denorm_min())), "");
}

} // namespace
} // namespace planewright

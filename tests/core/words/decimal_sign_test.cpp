// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <gtest/gtest.h>

#include <thread>

namespace planewright {
namespace {

TEST(DecimalSigns, areForPeopleOnlyAndForAWhile) {
  EXPECT_EQ(shownNumber(-12.346, 2), "−12.35");
  {
    const WritesDecimals comma(DecimalSign::comma);
    EXPECT_EQ(shownNumber(-12.346, 2), "−12,35");
    EXPECT_EQ(shownNumber(-0.001, 2), "0,00");
    EXPECT_EQ(shownNumber(1.2345e20, 2), "1,234e+20");
    EXPECT_EQ(shownDegrees(Angle::fromDegrees(5.71), 1), "5,7°");
    EXPECT_EQ(shownNumber(1234, 0), "1234");
    EXPECT_EQ(exactNumber(0.5), "0.5");
    EXPECT_EQ(shortestNumber(0.5), "0.5");
    const WritesDecimals inside(DecimalSign::point);
    EXPECT_EQ(shownNumber(0.5, 1), "0.5");
  }
  EXPECT_EQ(shownNumber(0.5, 1), "0.5");
}

TEST(DecimalSigns, ofKeptTextsAreChosenWhereTheyAreShown) {
  const Text text = PW_TEXT("Test", "b = %1 mm").with(numberText(shownNumber(12.5, 1))).with("EN 1.2");
  EXPECT_EQ(plain(text), "b = 12.5 mm");
  const WritesDecimals comma(DecimalSign::comma);
  EXPECT_EQ(plain(text, [](const std::string&, const std::string&) { return "%2: b = %1 mm"; }),
            "EN 1.2: b = 12,5 mm");
}

TEST(DecimalSigns, areThoseOfOneThread) {
  const WritesDecimals comma(DecimalSign::comma);
  std::string beside;
  std::thread([&] { beside = shownNumber(0.5, 1); }).join();
  EXPECT_EQ(beside, "0.5");
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/value_echo.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

QString echo(Spot spot, const char* typed) {
  return echoOfValue(newStudy(), {spot, "ash", {}}, typed);
}

TEST(ValueEcho, isInTheUnitOfTheField) {
  EXPECT_EQ(echo(Spot::strengthShear, "12 kN/(10 mm*100 mm)"), "12.00 MPa");
  EXPECT_EQ(echo(Spot::strengthShear, "2 ksi"), "13.79 MPa");
  EXPECT_EQ(echo(Spot::partialFactor, "1/0.8"), "1.250");
}

TEST(ValueEcho, saysNothingThatTheTextSaysAlreadyAndNothingOfAWrongOne) {
  EXPECT_EQ(echo(Spot::strengthShear, "4.0 MPa"), "");
  EXPECT_EQ(echo(Spot::partialFactor, "1.30"), "");
  EXPECT_EQ(echo(Spot::strengthShear, ""), "");
  EXPECT_EQ(echo(Spot::strengthShear, "4 kN"), "");
}

} // namespace
} // namespace planewright

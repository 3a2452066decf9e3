// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/turning.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace planewright {
namespace {

Angle degrees(double value) {
  return Angle::fromDegrees(value);
}

const std::vector<NamedDirection> directions = {
    {degrees(-60), verbatim("low"), true},        {degrees(0), symbol("x"), true},
    {degrees(12.3456789), symbol("σ_{1}"), true}, {degrees(30), verbatim("30°"), false},
    {degrees(30), verbatim("scarf"), true},       {degrees(90), symbol("y"), true}};

Rest restAt(double angle, Qt::KeyboardModifiers held = Qt::NoModifier, double pixel = 0.286) {
  return restOf(Turn(degrees(angle)), directions, degrees(2), degrees(pixel), held);
}

double keyed(double now, int key, Qt::KeyboardModifiers held = Qt::NoModifier) {
  return keyedTurn(degrees(now), key, held, directions)->degrees();
}

TEST(Turn, AddsTheMotionsOfThePointerWithATenthUnderShift) {
  Turn turn(degrees(10));
  turn.move(degrees(5), Qt::NoModifier);
  turn.move(degrees(-20), Qt::ShiftModifier);
  turn.move(degrees(1), Qt::ControlModifier);
  EXPECT_DOUBLE_EQ(turn.now().degrees(), 14);
  EXPECT_EQ(turn.start(), degrees(10));
}

TEST(Rest, TakesANamedDirectionWithinReachExactly) {
  EXPECT_EQ(restAt(11).angle, degrees(12.3456789));
  EXPECT_EQ(restAt(14.3).angle, degrees(12.3456789));
  EXPECT_EQ(restAt(14.4).angle, degrees(14.4));
  EXPECT_FALSE(restAt(14.4).snapped());
}

TEST(Rest, SnapsAcrossTheSeamAtNinety) {
  EXPECT_EQ(restAt(-89.5).angle, degrees(90));
  EXPECT_EQ(restAt(91.5).angle, degrees(90));
}

TEST(Rest, NamesEveryDirectionThatCoincides) {
  const Rest rest = restAt(29);
  ASSERT_EQ(rest.on.size(), 2U);
  EXPECT_EQ(plain(rest.on[0]), "30°");
  EXPECT_EQ(plain(rest.on[1]), "scarf");
}

TEST(Rest, IsFreeUnderShiftAndControl) {
  EXPECT_EQ(restAt(11, Qt::ControlModifier).angle, degrees(11));
  EXPECT_EQ(restAt(11.12345, Qt::ShiftModifier).angle, degrees(11.12));
}

TEST(Rest, RoundsToWhatAPixelCanTellApart) {
  EXPECT_EQ(restAt(45.678).angle, degrees(45.7));
  EXPECT_EQ(restAt(45.678, Qt::NoModifier, 0.09).angle, degrees(45.68));
  EXPECT_EQ(restAt(45.678, Qt::NoModifier, 1.5).angle, degrees(46));
}

TEST(Keys, TurnByOneATenthAndFifteenDegrees) {
  EXPECT_EQ(keyed(10, Qt::Key_Left), 9);
  EXPECT_EQ(keyed(10, Qt::Key_Down), 9);
  EXPECT_EQ(keyed(10, Qt::Key_Right), 11);
  EXPECT_EQ(keyed(10, Qt::Key_Up, Qt::ShiftModifier), 10.1);
  EXPECT_EQ(keyed(10, Qt::Key_Right, Qt::ControlModifier), 25);
  EXPECT_EQ(keyed(90, Qt::Key_Right), -89);
  EXPECT_EQ(keyed(10, Qt::Key_Home), 0);
  EXPECT_FALSE(keyedTurn(degrees(10), Qt::Key_A, Qt::NoModifier, directions));
}

TEST(Keys, TenTenthsMakeAWholeDegree) {
  double now = 0.7;
  for (int i = 0; i < 10; ++i)
    now = keyed(now, Qt::Key_Right, Qt::ShiftModifier);
  EXPECT_EQ(now, 1.7);
}

TEST(Keys, StepThroughTheNamedDirectionsAndRound) {
  EXPECT_EQ(keyed(0, Qt::Key_PageUp), 12.3456789);
  EXPECT_EQ(keyed(12.3456789, Qt::Key_PageUp), 30);
  EXPECT_EQ(keyed(30, Qt::Key_PageUp), 90);
  EXPECT_EQ(keyed(90, Qt::Key_PageUp), -60);
  EXPECT_EQ(keyed(-60, Qt::Key_PageDown), 90);
  EXPECT_EQ(keyed(90, Qt::Key_PageDown), 30);
  EXPECT_EQ(keyed(1, Qt::Key_PageDown), 0);
}

TEST(Rounding, GivesTheNearestDoubleOfTheDecimalNumber) {
  EXPECT_EQ(roundedTo(0.30000004, 0.1), 0.3);
  EXPECT_EQ(roundedTo(-1234.5678, 0.01), -1234.57);
  EXPECT_EQ(roundedTo(1234567, 1000), 1235000);
  EXPECT_EQ(roundedTo(2.34e-9, 1e-10), 2.3e-9);
  EXPECT_EQ(decadeBelow(0.286), 0.1);
  EXPECT_EQ(decadeBelow(1), 1);
  EXPECT_EQ(decadeBelow(99), 10);
}

} // namespace
} // namespace planewright

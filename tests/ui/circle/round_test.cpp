// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/round.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Round down{{100, 50}, 40, true};
const Round up{{100, 50}, 40, false};

TEST(Round, SeesAnglesCounterClockwiseFromTheRight) {
  EXPECT_DOUBLE_EQ(down.seenAt({140, 50}).degrees(), 0);
  EXPECT_DOUBLE_EQ(down.seenAt({100, 10}).degrees(), 90);
  EXPECT_DOUBLE_EQ(down.seenAt({100, 90}).degrees(), -90);
  EXPECT_EQ(down.at(Angle::fromDegrees(90), 40), QPointF(100, 10));
}

TEST(Round, ANormalTurnsHalfAsFarAsItsMark) {
  EXPECT_NEAR(down.turnBetween({140, 50}, {100, 10}).degrees(), 45, 1e-12);
  EXPECT_NEAR(down.turnBetween({200, 50}, {100, -900}).degrees(), 45, 1e-12) << "only the angle counts";
  EXPECT_NEAR(up.turnBetween({140, 50}, {100, 10}).degrees(), -45, 1e-12);
}

TEST(Round, TheShorterWayRoundIsMeant) {
  const QPointF from = down.at(Angle::fromDegrees(170), 40);
  const QPointF to = down.at(Angle::fromDegrees(-170), 40);
  EXPECT_NEAR(down.turnBetween(from, to).degrees(), 10, 1e-12);
  EXPECT_NEAR(down.turnBetween(to, from).degrees(), -10, 1e-12);
}

TEST(Round, SeenTurnIsTwiceTheNormalsAndReversedInTensorUp) {
  EXPECT_EQ(down.seenTurn(Angle::fromDegrees(25)).degrees(), 50);
  EXPECT_EQ(up.seenTurn(Angle::fromDegrees(25)).degrees(), -50);
}

TEST(Round, TurnAlongItsLine) {
  EXPECT_NEAR(down.turnAlong(40).radians(), 0.5, 1e-15);
}

} // namespace
} // namespace planewright

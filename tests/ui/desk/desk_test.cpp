// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/desk.h"

#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include <QSignalSpy>

namespace planewright {
namespace {

const Place reading{Spot::reading, "P1", {}};
const Place sx{Spot::sx, "P1", "G"};

void type(Desk& desk, const Place& place, const char* text, Gesture gesture) {
  EXPECT_FALSE(desk.request({Type{place, text}}, gesture, QStringLiteral("Type")));
}

TEST(Desk, aDragIsOneStepAndTheNextDragAnother) {
  Desk desk(newStudy());
  const Gesture first = desk.newGesture();
  for (const char* text : {"1", "2", "3", "4"})
    type(desk, reading, text, first);
  type(desk, reading, "9", desk.newGesture());
  EXPECT_EQ(desk.undoStack()->count(), 2);
  desk.undoStack()->undo();
  EXPECT_EQ(textAt(desk.study(), reading), "4 deg");
  desk.undoStack()->undo();
  EXPECT_EQ(desk.study(), newStudy());
}

TEST(Desk, aDragBackToItsStartLeavesNoStep) {
  Desk desk(newStudy());
  const Gesture gesture = desk.newGesture();
  type(desk, reading, "30", gesture);
  type(desk, reading, "0", gesture);
  EXPECT_EQ(desk.undoStack()->count(), 0);
  type(desk, reading, "12", gesture);
  EXPECT_EQ(desk.undoStack()->count(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(desk.study(), newStudy());
}

TEST(Desk, anEditThatChangesNothingLeavesNoStepAndTellsNobody) {
  Desk desk(newStudy());
  const QSignalSpy changed(&desk, &Desk::changed);
  type(desk, reading, "0", desk.newGesture());
  EXPECT_EQ(desk.undoStack()->count(), 0);
  EXPECT_EQ(changed.count(), 0);
}

TEST(Desk, aTurnOfTheReadingPlaneJudgesNothingAnew) {
  Desk desk(judgedStudy());
  const QSignalSpy changed(&desk, &Desk::changed);
  const QSignalSpy judged(&desk, &Desk::judgedAnew);
  type(desk, reading, "30", desk.newGesture());
  EXPECT_EQ(changed.count(), 1);
  EXPECT_EQ(judged.count(), 0);
  type(desk, {Spot::lineAngle, "P1", "grain"}, "1 in 12", desk.newGesture());
  EXPECT_EQ(judged.count(), 1);
  type(desk, sx, "2 MPa", desk.newGesture());
  EXPECT_EQ(judged.count(), 2);
  desk.undoStack()->undo();
  EXPECT_EQ(judged.count(), 3);
  desk.show("P1", "1.35 G + 1.5 S");
  EXPECT_EQ(judged.count(), 4);
  EXPECT_EQ(changed.count(), 5);
}

TEST(Desk, whatIsNotTakenChangesNothing) {
  Desk desk(newStudy());
  EXPECT_TRUE(desk.request({Type{sx, "12 kN"}}, desk.newGesture(), QStringLiteral("Type")));
  EXPECT_EQ(desk.study(), newStudy());
  EXPECT_EQ(desk.undoStack()->count(), 0);
}

TEST(Desk, aSaveInsideADragSplitsIt) {
  Desk desk(newStudy());
  const Gesture gesture = desk.newGesture();
  type(desk, reading, "1", gesture);
  desk.undoStack()->setClean();
  type(desk, reading, "2", gesture);
  EXPECT_EQ(desk.undoStack()->count(), 2);
  desk.undoStack()->undo();
  EXPECT_TRUE(desk.undoStack()->isClean());
  EXPECT_EQ(textAt(desk.study(), reading), "1 deg");
}

TEST(Desk, showingAnotherPointIsNoStepButUndoComesBackToWhereItHappened) {
  const Study two = *edited(newStudy(), Edits{Insert{{Spot::point, "P2", {}}, {}}});
  Desk desk(two);
  desk.show("P1", "");
  type(desk, sx, "5", desk.newGesture());
  desk.show("P2", "");
  EXPECT_EQ(desk.readout().point, "P2");
  EXPECT_EQ(desk.undoStack()->count(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(desk.readout().point, "P1");
}

TEST(Desk, theReadoutIsAlwaysThatOfTheStudy) {
  Desk desk(newStudy());
  type(desk, sx, "80", desk.newGesture());
  EXPECT_EQ(desk.readout(), evaluate(desk.study()));
  EXPECT_EQ(desk.readout().state().stress.sx, 80);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "element_rig.h"

#include <QToolTip>

#include <cmath>

namespace planewright {
namespace {

TEST(ElementDrag, theKnobFollowsTheHandAndSaysSoInWholeTenths) {
  ElementRig rig;
  rig.press(rig.knob());
  rig.move(rig.at(52, part::knob), Qt::ControlModifier);
  EXPECT_NEAR(rig.readingDegrees(), 52, 0.4);
  rig.release(rig.at(52, part::knob), Qt::ControlModifier);
  EXPECT_EQ(rig.readingDegrees(), std::round(10 * rig.readingDegrees()) / 10);
  EXPECT_EQ(rig.line(), "1 in 10");
}

TEST(ElementDrag, isOneStepOfUndo) {
  ElementRig rig;
  rig.press(rig.knob());
  for (int angle = 31; angle < 80; ++angle)
    rig.move(rig.at(angle, part::knob));
  rig.release(rig.at(80, part::knob));
  EXPECT_EQ(rig.steps(), 1);
  EXPECT_EQ(rig.desk.undoStack()->undoText(), QStringLiteral("Turn the reading plane"));
  rig.desk.undoStack()->undo();
  EXPECT_EQ(rig.reading(), "30 deg");
  rig.drag(rig.knob(), rig.at(60, part::knob));
  rig.drag(rig.knob(), rig.at(40, part::knob));
  EXPECT_EQ(rig.steps(), 2);
}

// Moves that arrive in a burst, before anything is painted, must not drift.
TEST(ElementDrag, aBurstOfMovesEndsWhereASingleMoveEnds) {
  ElementRig once;
  once.press(once.knob());
  once.move(once.at(200, 0.7), Qt::ControlModifier);
  once.move(once.at(-100, 0.9), Qt::ControlModifier);
  ElementRig burst;
  burst.press(burst.knob());
  for (int i = 0; i <= 230; ++i)
    burst.move(burst.at(30 + i, 0.6 + 0.001 * i), Qt::ControlModifier);
  burst.move(burst.at(-100, 0.9), Qt::ControlModifier);
  EXPECT_EQ(burst.reading(), once.reading());
  EXPECT_NEAR(burst.readingDegrees(), 80, 0.4);
}

TEST(ElementDrag, theKnobStaysUnderTheHandBeyondAQuarterTurn) {
  ElementRig rig;
  rig.press(rig.knob());
  for (int angle = 31; angle <= 135; ++angle)
    rig.move(rig.at(angle, part::knob));
  EXPECT_NEAR(rig.readingDegrees(), -45, 0.5);
  const QPoint off = rig.knob() - rig.at(135, part::knob);
  EXPECT_LE(off.manhattanLength(), 3);
  rig.release(rig.at(135, part::knob));
  EXPECT_LE((rig.knob() - rig.at(135, part::knob)).manhattanLength(), 3) << "it does not hop at the release";
  rig.desk.undoStack()->undo();
  EXPECT_LE((rig.knob() - rig.at(30, part::knob)).manhattanLength(), 3);
}

TEST(ElementDrag, aPressBesideTheMiddleDoesNotMakeTheKnobJump) {
  ElementRig rig;
  const QPoint place = rig.knob() + QPoint(5, 5);
  rig.press(place);
  rig.move(place + QPoint(1, 0), Qt::ControlModifier);
  EXPECT_NEAR(rig.readingDegrees(), 30, 0.5);
}

TEST(ElementDrag, aPressAloneChangesNothing) {
  ElementRig rig;
  rig.press(rig.knob());
  rig.move(rig.knob());
  rig.release(rig.knob());
  EXPECT_EQ(rig.steps(), 0);
}

TEST(ElementDrag, snapsWithinSixPixelsOfANamedDirection) {
  ElementRig rig({.sx = "80 MPa", .sy = "20 MPa", .txy = "-30 MPa", .reading = "-40 deg"});
  const double theta1 = -22.5;
  const double pixel = rig.geometry().arcOf(1, ElementHandle::reading).degrees();
  rig.press(rig.knob());
  rig.move(rig.at(theta1 + 4 * pixel, part::knob));
  EXPECT_EQ(rig.reading(), "-22.5 deg");
  EXPECT_EQ(labelOf(rig.view.picture(), "caption"), "normal at −22.5°  ·  cut at 67.5°  ·  on σ1");
  rig.move(rig.at(theta1 + 9 * pixel, part::knob));
  EXPECT_NE(rig.reading(), "-22.5 deg");
  rig.move(rig.at(theta1 + 4 * pixel, part::knob), Qt::ControlModifier);
  EXPECT_NE(rig.reading(), "-22.5 deg") << "Ctrl is free";
  rig.view.setSnapping(false);
  rig.move(rig.at(theta1 + 3 * pixel, part::knob));
  EXPECT_NE(rig.reading(), "-22.5 deg");
}

TEST(ElementDrag, aSnapTakesTheNamedDirectionToTheLastDigit) {
  ElementRig rig;
  const Angle theta1 = rig.desk.readout().state().circle.theta1->value;
  rig.drag(rig.knob(), rig.at(theta1.degrees() + 0.4, part::knob));
  EXPECT_NEAR(rig.readingDegrees(), theta1.degrees(), 1e-12);
  EXPECT_NEAR(rig.desk.readout().state().reading.tnt, 0, 1e-12);
}

TEST(ElementDrag, namesBothDirectionsWhereTwoCoincide) {
  ElementRig rig({.sx = "10 MPa", .sy = "0 MPa", .txy = "0 MPa", .reading = "30 deg", .line = "45 deg"},
                 {700, 560});
  rig.drag(rig.knob(), rig.at(1, part::knob));
  const std::string caption = labelOf(rig.view.picture(), "caption");
  EXPECT_NE(caption.find("σ1 and x"), std::string::npos) << caption;
}

TEST(ElementDrag, shiftCountsATenthAndIsFree) {
  ElementRig rig;
  rig.press(rig.knob());
  rig.move(rig.at(60, part::knob), Qt::ShiftModifier);
  EXPECT_NEAR(rig.readingDegrees(), 33, 0.1);
  rig.move(rig.at(50, part::knob), Qt::ShiftModifier);
  EXPECT_NEAR(rig.readingDegrees(), 32, 0.1);
}

TEST(ElementDrag, escapePutsBackTheStartAndLeavesNoStep) {
  ElementRig rig;
  rig.press(rig.bar());
  rig.move(rig.at(40, 0.8));
  ASSERT_NE(rig.line(), "1 in 10");
  rig.key(Qt::Key_Escape);
  EXPECT_EQ(rig.line(), "1 in 10");
  EXPECT_EQ(rig.steps(), 0);
  rig.move(rig.at(60, 0.8));
  rig.release(rig.at(60, 0.8));
  EXPECT_EQ(rig.line(), "1 in 10") << "the rest of the cancelled drag does nothing";
  EXPECT_EQ(rig.steps(), 0);
}

TEST(ElementDrag, aDragBackToItsStartLeavesNoStep) {
  ElementRig rig;
  const QPoint start = rig.bar();
  rig.press(start);
  rig.move(rig.at(40, 0.8));
  rig.move(start);
  rig.release(start);
  EXPECT_EQ(rig.line(), "1 in 10");
  EXPECT_EQ(rig.steps(), 0);
}

TEST(ElementDrag, aSlipOfThreePixelsOnABarChangesNothing) {
  ElementRig rig;
  for (const QPoint slip : {QPoint(3, 0), QPoint(0, 3), QPoint(-2, 2)})
    rig.drag(rig.bar(), rig.bar() + slip);
  EXPECT_EQ(rig.line(), "1 in 10");
  EXPECT_EQ(rig.steps(), 0);
}

TEST(ElementDrag, bothBarsTurnTheLine) {
  ElementRig rig;
  rig.drag(rig.bar(), rig.at(25, 0.8), Qt::ControlModifier);
  EXPECT_NEAR(rig.lineDegrees(), 25, 0.6);
  rig.drag(rig.at(rig.lineDegrees() + 180, 0.8), rig.at(235, 0.8), Qt::ControlModifier);
  EXPECT_NEAR(rig.lineDegrees(), 55, 0.6);
  EXPECT_EQ(rig.steps(), 2);
  EXPECT_EQ(rig.reading(), "30 deg");
}

TEST(ElementDrag, aPressMovesOnlyItsOwnHandleWhereBothAreAligned) {
  for (int i = 0; i < 24; ++i) {
    const double angle = 15.0 * i;
    const std::string text = angleText(Angle::fromDegrees(angle));
    ElementRig knob({.reading = text, .line = text});
    const double start = knob.readingDegrees();
    knob.drag(knob.at(start, part::knob), knob.at(start + 7, part::knob), Qt::ControlModifier);
    EXPECT_NE(knob.reading(), text) << angle;
    EXPECT_EQ(knob.line(), text) << angle;
    for (const double end : {start, start + 180}) {
      ElementRig bar({.reading = text, .line = text});
      bar.drag(bar.at(end, 0.82), bar.at(end + 7, 0.82), Qt::ControlModifier);
      EXPECT_EQ(bar.reading(), text) << angle;
      EXPECT_NE(bar.line(), text) << angle;
    }
  }
}

TEST(ElementDrag, inclinedAxesTurnTheHandlesWithThem) {
  ElementRig rig({.axes = "40 deg"});
  rig.drag(rig.knob(), rig.at(52, part::knob), Qt::ControlModifier);
  EXPECT_NEAR(rig.readingDegrees(), 52, 0.4);
}

TEST(ElementDrag, withoutALineThereIsNoBarToTake) {
  ElementRig rig;
  rig.desk.request({Remove{{Spot::line, rig.desk.readout().point, "grain"}}}, rig.desk.newGesture(), {});
  const int steps = rig.steps();
  rig.drag(rig.at(5.7, 0.8), rig.at(40, 0.8));
  EXPECT_EQ(rig.steps(), steps);
  EXPECT_FALSE(rig.view.placeOf(ElementHandle::line));
}

TEST(ElementDrag, showsTicksOnlyWhileItLasts) {
  ElementRig rig;
  const auto ticks = [&] {
    std::size_t count = 0;
    for (const Path& path : partsOf<Path>(rig.view.picture()))
      count += path.points.size() == 2 && path.pen == Pen{Role::reading, 1.5, Dash::solid} ? 1 : 0;
    return count;
  };
  const std::size_t before = ticks();
  rig.press(rig.knob());
  rig.move(rig.at(40, part::knob));
  EXPECT_GE(ticks(), before + 16) << "eight named directions, both ends";
  rig.release(rig.at(40, part::knob));
  EXPECT_EQ(ticks(), before);
}

TEST(ElementDrag, hasNoToolTip) {
  ElementRig rig;
  const auto hover = [&] {
    const QPoint at = rig.knob();
    QHelpEvent help(QEvent::ToolTip, at, rig.view.mapToGlobal(at));
    QApplication::sendEvent(&rig.view, &help);
    return QToolTip::text();
  };
  EXPECT_EQ(hover(), QStringLiteral("turn the reading plane"));
  rig.press(rig.knob());
  rig.move(rig.at(31, part::knob));
  hover();
  EXPECT_FALSE(QToolTip::isVisible());
}

} // namespace
} // namespace planewright

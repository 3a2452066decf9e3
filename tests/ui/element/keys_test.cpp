// SPDX-License-Identifier: GPL-3.0-or-later
#include "element_rig.h"

#include "ui/element/angle_field.h"

#include <QAccessible>
#include <QVBoxLayout>

namespace planewright {
namespace {

TEST(ElementKeys, arrowsTurnTheReadingPlane) {
  ElementRig rig;
  rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.reading(), "31 deg");
  rig.key(Qt::Key_Down);
  rig.key(Qt::Key_Left);
  EXPECT_EQ(rig.reading(), "29 deg");
  rig.key(Qt::Key_Up, Qt::ShiftModifier);
  EXPECT_EQ(rig.reading(), "29.1 deg");
  rig.key(Qt::Key_Left, Qt::ControlModifier);
  EXPECT_EQ(rig.reading(), "14.1 deg");
  rig.key(Qt::Key_Home);
  EXPECT_EQ(rig.reading(), "0 deg");
}

TEST(ElementKeys, pagesGoToTheNamedDirections) {
  ElementRig rig({.sx = "80 MPa", .sy = "20 MPa", .txy = "-30 MPa", .reading = "-30 deg", .line = "10 deg"});
  rig.key(Qt::Key_PageUp);
  EXPECT_EQ(rig.reading(), "-22.5 deg");
  rig.key(Qt::Key_PageUp);
  EXPECT_EQ(rig.reading(), "0 deg");
  rig.key(Qt::Key_PageDown);
  EXPECT_EQ(rig.reading(), "-22.5 deg");
  rig.key(Qt::Key_PageUp, Qt::ControlModifier);
  EXPECT_EQ(rig.reading(), "-22.5 deg") << "that is the next point";
}

TEST(ElementKeys, theKnobGoesOnRoundTheRing) {
  ElementRig rig({.reading = "89 deg"});
  rig.key(Qt::Key_Right);
  rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.reading(), "-89 deg");
  EXPECT_LE((rig.knob() - rig.at(91, part::knob)).manhattanLength(), 2);
}

TEST(ElementKeys, oneAfterTheOtherAreOneStepUntilTheHistoryChanges) {
  ElementRig rig;
  for (int i = 0; i < 5; ++i)
    rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.steps(), 1);
  rig.desk.undoStack()->undo();
  EXPECT_EQ(rig.reading(), "30 deg");
  rig.key(Qt::Key_Right);
  rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.steps(), 1);
  rig.drag(rig.knob(), rig.at(60, part::knob));
  rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.steps(), 3);
}

TEST(ElementKeys, onTwoPointsAreTwoSteps) {
  ElementRig rig;
  rig.desk.request({Insert{{Spot::point, "P2", {}}, {}}, Insert{{Spot::caseStress, "P2", "G"}, {}}},
                   rig.desk.newGesture(), {});
  rig.desk.show("P1", {});
  rig.key(Qt::Key_Right);
  rig.desk.show("P2", {});
  rig.key(Qt::Key_Right);
  EXPECT_EQ(rig.steps(), 3);
  rig.desk.undoStack()->undo();
  EXPECT_EQ(rig.reading(), "31 deg") << "the first point keeps its turn";
}

TEST(ElementKeys, tabGoesFromTheKnobToTheBarsAndOn) {
  QWidget window;
  QVBoxLayout layout(&window);
  QLineEdit before;
  QLineEdit after;
  Desk desk(studyOf({}));
  ElementView view(desk);
  layout.addWidget(&before);
  layout.addWidget(&view);
  layout.addWidget(&after);
  window.show();
  window.activateWindow();
  before.setFocus();
  QApplication::processEvents();
  QTest::keyClick(&before, Qt::Key_Tab);
  EXPECT_TRUE(view.hasFocus());
  EXPECT_EQ(view.currentHandle(), ElementHandle::reading);
  QTest::keyClick(&view, Qt::Key_Tab);
  EXPECT_TRUE(view.hasFocus());
  EXPECT_EQ(view.currentHandle(), ElementHandle::line);
  QTest::keyClick(&view, Qt::Key_Right);
  EXPECT_NEAR(desk.readout().lines.front().angle.value.degrees(), 6.710593, 1e-6);
  QTest::keyClick(&view, Qt::Key_Tab);
  EXPECT_TRUE(after.hasFocus());
  QTest::keyClick(&after, Qt::Key_Backtab);
  EXPECT_EQ(view.currentHandle(), ElementHandle::line);
  QTest::keyClick(&view, Qt::Key_Backtab);
  EXPECT_EQ(view.currentHandle(), ElementHandle::reading);
  QTest::keyClick(&view, Qt::Key_Backtab);
  EXPECT_TRUE(before.hasFocus());
}

TEST(ElementKeys, focusIsSeenOnTheHandle) {
  ElementRig rig;
  const auto focusAt = [&] {
    for (const Arc& arc : partsOf<Arc>(rig.view.picture()))
      if (arc.pen && arc.pen->role == Role::focus)
        return ElementHandle::reading;
    for (const Path& path : partsOf<Path>(rig.view.picture()))
      if (path.pen && path.pen->role == Role::focus)
        return ElementHandle::line;
    return ElementHandle::none;
  };
  EXPECT_EQ(focusAt(), ElementHandle::reading);
  rig.key(Qt::Key_Tab);
  EXPECT_EQ(focusAt(), ElementHandle::line);
  rig.view.clearFocus();
  EXPECT_EQ(focusAt(), ElementHandle::none);
}

TEST(ElementKeys, enterTypesAnAngle) {
  ElementRig rig;
  rig.key(Qt::Key_Return);
  auto* field = rig.view.findChild<AngleField*>();
  ASSERT_TRUE(field);
  EXPECT_EQ(field->text(), QStringLiteral("30 deg"));
  QTest::keyClicks(field, QStringLiteral("nonsense"));
  QTest::keyClick(field, Qt::Key_Return);
  EXPECT_EQ(rig.reading(), "30 deg") << "what cannot be read is not taken";
  EXPECT_TRUE(field->hasFocus());
  field->setText(QStringLiteral("12.5"));
  QTest::keyClick(field, Qt::Key_Return);
  EXPECT_EQ(rig.reading(), "12.5 deg");
  EXPECT_TRUE(rig.view.hasFocus());
  QCoreApplication::sendPostedEvents(nullptr, QEvent::DeferredDelete);
  EXPECT_FALSE(rig.view.findChild<AngleField*>());
}

TEST(ElementKeys, escapeGivesUpTheTypedAngle) {
  ElementRig rig;
  rig.key(Qt::Key_Enter);
  auto* field = rig.view.findChild<AngleField*>();
  ASSERT_TRUE(field);
  QTest::keyClicks(field, QStringLiteral("77"));
  QTest::keyClick(field, Qt::Key_Escape);
  EXPECT_EQ(rig.reading(), "30 deg");
  EXPECT_TRUE(rig.view.hasFocus());
}

TEST(ElementKeys, tabTakesTheTypedAngleToo) {
  ElementRig rig;
  rig.key(Qt::Key_Tab);
  rig.key(Qt::Key_Enter);
  auto* field = rig.view.findChild<AngleField*>();
  ASSERT_TRUE(field);
  EXPECT_EQ(field->text(), QStringLiteral("1 in 10"));
  field->setText(QStringLiteral("1 in 8"));
  QTest::keyClick(field, Qt::Key_Tab);
  EXPECT_EQ(rig.line(), "1 in 8");
  EXPECT_TRUE(rig.view.hasFocus());
  EXPECT_EQ(rig.view.currentHandle(), ElementHandle::line);
}

TEST(ElementKeys, areNamedForTheStatusLine) {
  ElementRig rig;
  EXPECT_EQ(rig.view.property("areaKeys").toString(),
            QStringLiteral("Left/Right turn by 1°, Shift 0.1°, Ctrl 15°"));
}

TEST(ElementAccess, isADialOfTheHandleThatKeysTurn) {
  ElementRig rig;
  QAccessibleInterface* access = QAccessible::queryAccessibleInterface(&rig.view);
  ASSERT_TRUE(access);
  EXPECT_EQ(access->role(), QAccessible::Dial);
  EXPECT_EQ(access->text(QAccessible::Name), QStringLiteral("Element"));
  EXPECT_EQ(access->text(QAccessible::Value), QStringLiteral("reading plane, normal at 30.0 degrees"));
  EXPECT_NE(access->text(QAccessible::Description).indexOf(QStringLiteral("grain, at 5.7 degrees")), -1);
  QAccessibleValueInterface* value = access->valueInterface();
  ASSERT_TRUE(value);
  EXPECT_EQ(value->currentValue().toDouble(), 30);
  value->setCurrentValue(-12.5);
  EXPECT_EQ(rig.reading(), "-12.5 deg");
  rig.key(Qt::Key_Tab);
  EXPECT_EQ(access->text(QAccessible::Value), QStringLiteral("grain, at 5.7 degrees, changes what is given"));
  value->setCurrentValue(20);
  EXPECT_EQ(rig.line(), "20 deg");
}

} // namespace
} // namespace planewright

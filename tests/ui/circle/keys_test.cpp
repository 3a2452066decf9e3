// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/circle/panel.h"

#include <QAccessible>
#include <QSignalSpy>
#include <QVBoxLayout>

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(CircleKeys, TurnTheReadingPlane) {
  Panel panel(studyOf());
  panel.key(Qt::Key_Right);
  EXPECT_EQ(panel.reading(), 26);
  panel.key(Qt::Key_Down, Qt::ShiftModifier);
  EXPECT_EQ(panel.reading(), 25.9);
  panel.key(Qt::Key_Left, Qt::ControlModifier);
  EXPECT_EQ(panel.reading(), 10.9);
  panel.key(Qt::Key_Home);
  EXPECT_EQ(panel.reading(), 0);
  panel.key(Qt::Key_PageDown);
  EXPECT_EQ(panel.reading(), panel.desk.readout().state().circle.theta1->value.degrees());
}

TEST(CircleKeys, OneStayOnAHandleIsOneStep) {
  Panel panel(studyOf());
  for (int i = 0; i < 5; ++i)
    panel.key(Qt::Key_Right);
  EXPECT_EQ(panel.steps(), 1);
  panel.plot.clearFocus();
  panel.plot.setFocus();
  panel.key(Qt::Key_Right);
  EXPECT_EQ(panel.steps(), 2);
  panel.desk.undoStack()->undo();
  EXPECT_EQ(panel.reading(), 30);
}

TEST(CircleKeys, OnTwoPointsAreTwoSteps) {
  Study study = studyOf();
  study.points.push_back(study.points.front());
  study.points.back().name = "P2";
  Panel panel(study);
  panel.key(Qt::Key_Right);
  panel.desk.show("P2", {});
  panel.key(Qt::Key_Right);
  EXPECT_EQ(panel.steps(), 2);
  panel.desk.undoStack()->undo();
  EXPECT_EQ(panel.desk.study().points.front().reading, "26 deg");
}

TEST(CircleKeys, LeaveAloneWhatIsNotTheirs) {
  Panel panel(studyOf());
  panel.key(Qt::Key_PageUp, Qt::AltModifier);
  panel.key(Qt::Key_A);
  EXPECT_EQ(panel.steps(), 0);
}

TEST(CircleKeys, EnterAsksForAnAngle) {
  Panel panel(studyOf());
  const QSignalSpy asked(&panel.view, &CircleView::angleEntryWanted);
  panel.key(Qt::Key_Return);
  EXPECT_EQ(asked.count(), 1);
}

TEST(CircleKeys, MoveTheEarTheWayTheArrowPoints) {
  for (const ShearAxis axis : {ShearAxis::tensorDown, ShearAxis::tensorUp}) {
    Study study = studyOf();
    study.convention.shearAxis = axis;
    Panel panel(study);
    panel.key(Qt::Key_Tab);
    ASSERT_EQ(panel.plot.currentHandle(), Handle::ear);
    panel.key(Qt::Key_Right);
    panel.key(Qt::Key_Up);
    const PlaneStress stress = panel.desk.readout().state().stress;
    EXPECT_GT(stress.sx, 80);
    EXPECT_LT(stress.sx, 90);
    EXPECT_EQ(stress.txy < -30, axis == ShearAxis::tensorDown);
    EXPECT_EQ(stress.sy, 20);
    EXPECT_EQ(panel.steps(), 1);
    EXPECT_EQ(panel.reading(), 25);
  }
}

/// A widget before and one after the panel, so that Tab has somewhere to go.
struct Row {
  explicit Row(const Study& study) : desk(study), view(desk, &window) {
    auto* layout = new QVBoxLayout(&window);
    for (QWidget* widget :
         {static_cast<QWidget*>(&before), static_cast<QWidget*>(&view), static_cast<QWidget*>(&after)})
      layout->addWidget(widget);
    before.setFocusPolicy(Qt::StrongFocus);
    after.setFocusPolicy(Qt::StrongFocus);
    QWidget::setTabOrder(&before, &view);
    QWidget::setTabOrder(&view, &after);
    window.resize(430, 600);
    window.show();
    window.activateWindow();
    QTest::qWait(1);
  }
  Desk desk;
  QWidget window;
  QWidget before;
  CircleView view;
  QWidget after;
};

TEST(CircleFocus, TabGoesFromTheReadingMarkToTheEarAndOn) {
  Row row(studyOf());
  row.view.plot().setFocus(Qt::TabFocusReason);
  EXPECT_EQ(row.view.plot().currentHandle(), Handle::reading);
  QTest::keyClick(&row.view.plot(), Qt::Key_Tab);
  EXPECT_TRUE(row.view.plot().hasFocus());
  EXPECT_EQ(row.view.plot().currentHandle(), Handle::ear);
  QTest::keyClick(&row.view.plot(), Qt::Key_Tab);
  EXPECT_FALSE(row.view.plot().hasFocus());
  row.view.plot().setFocus(Qt::BacktabFocusReason);
  EXPECT_EQ(row.view.plot().currentHandle(), Handle::ear);
  QTest::keyClick(&row.view.plot(), Qt::Key_Backtab);
  EXPECT_EQ(row.view.plot().currentHandle(), Handle::reading);
}

TEST(CircleFocus, IsSeen) {
  Panel panel(studyOf());
  const QImage focused = panel.plot.grab().toImage();
  panel.key(Qt::Key_Tab);
  const QImage onEar = panel.plot.grab().toImage();
  panel.plot.clearFocus();
  const QImage away = panel.plot.grab().toImage();
  EXPECT_NE(focused, onEar);
  EXPECT_NE(focused, away);
  EXPECT_NE(onEar, away);
}

TEST(CircleAccess, SaysAndTakesTheAngle) {
  Panel panel(studyOf());
  QAccessibleInterface* dial = QAccessible::queryAccessibleInterface(&panel.plot);
  ASSERT_NE(dial, nullptr);
  EXPECT_EQ(dial->role(), QAccessible::Dial);
  EXPECT_FALSE(dial->text(QAccessible::Name).isEmpty());
  EXPECT_EQ(dial->text(QAccessible::Value), "25.00 degrees");
  ASSERT_NE(dial->valueInterface(), nullptr);
  dial->valueInterface()->setCurrentValue(-40.5);
  EXPECT_EQ(panel.reading(), -40.5);
  EXPECT_EQ(panel.steps(), 1);
}

TEST(CircleAccess, NamesItsKeysForTheStatusLine) {
  Panel panel(studyOf());
  EXPECT_TRUE(panel.view.property("areaKeys").toString().contains("Shift"));
}

} // namespace
} // namespace planewright

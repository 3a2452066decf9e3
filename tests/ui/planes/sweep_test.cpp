// SPDX-License-Identifier: GPL-3.0-or-later
#include "planes_fixture.h"
#include "ui/entry/draft_edit.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/sweep_model.h"
#include "ui/planes/sweep_page.h"

#include <QAbstractItemModelTester>
#include <QApplication>
#include <QClipboard>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

struct SweepTest : testing::Test {
  Desk desk{planesStudy()};
  SweepPage page{desk};

  SweepTest() {
    page.resize(830, 300);
    page.show();
  }
  void type(const char* text) {
    page.step().selectAll();
    QTest::keyClicks(&page.step(), text);
    QTest::keyClick(&page.step(), Qt::Key_Return);
  }
  int rows() { return page.table().model()->rowCount(); }
};

TEST(SweepModel, goesAllRound) {
  Desk desk(planesStudy());
  SweepModel model(desk);
  QAbstractItemModelTester tester(&model, QAbstractItemModelTester::FailureReportingMode::Fatal);
  ASSERT_EQ(model.rowCount(), 36);
  EXPECT_EQ(model.index(0, 1).data().toString(), QString::fromUtf8("−85.00°"));
  EXPECT_EQ(model.index(35, 1).data().toString(), QString::fromUtf8("90.00°"));
  model.setStep(Angle::fromDegrees(30));
  EXPECT_EQ(model.rowCount(), 6);
  model.setStep(Angle::fromDegrees(1));
  EXPECT_EQ(model.rowCount(), 180);
}

TEST(SweepModel, theNearestRowIsTinted) {
  Desk desk(planesStudy());
  SweepModel model(desk);
  EXPECT_EQ(model.index(model.tintedRow(), 1).data().toString(), QString::fromUtf8("30.00°"));
  desk.request({Type{{Spot::reading, "P1", {}}, "-89"}}, desk.newGesture(), {});
  model.refresh();
  EXPECT_EQ(model.index(model.tintedRow(), 1).data().toString(), QString::fromUtf8("90.00°"));
}

TEST_F(SweepTest, enterAfterTheRowsCameAnewGoesNowhere) {
  type("30");
  page.table().setCurrentIndex({});
  const std::string before = desk.study().points[0].reading;
  for (const Qt::Key key : {Qt::Key_Return, Qt::Key_Delete})
    QTest::keyClick(&page.table(), key);
  EXPECT_EQ(desk.study().points[0].reading, before);
}

TEST_F(SweepTest, theStepIsAnExpression) {
  EXPECT_EQ(page.step().text(), "5 deg");
  type("90/4");
  EXPECT_EQ(page.step().text(), "22.5 deg");
  EXPECT_EQ(rows(), 8);
}

TEST_F(SweepTest, aWrongStepIsExplainedAndTheTableStays) {
  for (const char* wrong : {"0", "-5", "91", "0,5", "3 kN", ""}) {
    type(wrong);
    EXPECT_TRUE(page.step().isWrong()) << wrong;
    EXPECT_FALSE(page.complaint().isEmpty()) << wrong;
    EXPECT_EQ(rows(), 36);
  }
  QTest::keyClick(&page.step(), Qt::Key_Escape);
  EXPECT_EQ(page.step().text(), "5 deg");
  EXPECT_TRUE(page.complaint().isEmpty());
}

TEST_F(SweepTest, thePageMayGoWhileItsStepIsTyped) {
  auto* other = new SweepPage(desk);
  other->show();
  other->activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(other));
  other->step().setFocus();
  QTest::keyClicks(&other->step(), ",");
  delete other;
  EXPECT_EQ(rows(), 36);
}

TEST_F(SweepTest, enterBringsTheReadingPlaneToARow) {
  page.table().setCurrentIndex(page.table().model()->index(0, 2));
  QTest::keyClick(&page.table(), Qt::Key_Return);
  EXPECT_EQ(textAt(desk.study(), {Spot::reading, "P1", {}}), "-85 deg");
}

TEST_F(SweepTest, opensAtTheReadingPlane) {
  EXPECT_EQ(page.table().currentIndex().data().toString(), QString::fromUtf8("30.00°"));
}

TEST_F(SweepTest, copyTakesAll) {
  page.table().copyAll();
  EXPECT_EQ(QApplication::clipboard()->text().split('\n', Qt::SkipEmptyParts).size(), 37);
}

} // namespace
} // namespace planewright

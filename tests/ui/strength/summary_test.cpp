// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/summary_page.h"

#include "tests/support/judged_study.h"
#include "ui/strength/summary_model.h"

#include <QCheckBox>
#include <QLineEdit>
#include <QSignalSpy>
#include <QTableView>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study threePoints() {
  Study study = judgedStudy();
  Point second = study.points.front();
  second.name = "P2";
  second.stress[0].sx = "9 MPa";
  Point third = study.points.front();
  third.name = "P3";
  third.checks.clear();
  study.points.push_back(second);
  study.points.push_back(third);
  return study;
}

class SummaryTest : public testing::Test {
protected:
  SummaryTest() {
    m_page.resize(1000, 600);
    m_page.show();
    EXPECT_TRUE(QTest::qWaitForWindowExposed(&m_page));
  }
  QString cell(int row, int column) { return m_page.table().model()->index(row, column).data().toString(); }
  int rows() { return m_page.table().model()->rowCount(); }

  Desk m_desk{threePoints()};
  SummaryPage m_page{m_desk};
};

TEST_F(SummaryTest, hasARowForEachPointAndCheckWorstFirst) {
  EXPECT_EQ(rows(), 5);
  EXPECT_EQ(cell(0, SummaryModel::point), QStringLiteral("P2"));
  EXPECT_TRUE(cell(0, SummaryModel::utilisation).startsWith(QStringLiteral("▲")));
  EXPECT_EQ(cell(4, SummaryModel::point), QStringLiteral("P3"));
  EXPECT_EQ(cell(4, SummaryModel::utilisation), QStringLiteral("not checked"));
  EXPECT_TRUE(m_page.heading().contains(QStringLiteral("exceeds")));
}

TEST_F(SummaryTest, enterOpensThePointWithItsGoverningCombination) {
  QSignalSpy opened(&m_page, &SummaryPage::opened);
  m_page.table().setCurrentIndex(m_page.table().model()->index(0, 0));
  QTest::keyClick(&m_page.table(), Qt::Key_Return);
  EXPECT_EQ(opened.count(), 1);
  EXPECT_EQ(m_desk.readout().point, "P2");
  EXPECT_EQ(m_desk.readout().state().combination, "1.35 G + 1.5 S");
  EXPECT_EQ(m_desk.undoStack()->count(), 0);
}

TEST_F(SummaryTest, saysWhetherAnAngleIsOfALineOrOfANormal) {
  for (int row = 0; row < 4; ++row) {
    const QString check = cell(row, SummaryModel::check);
    const QString word =
        check.startsWith(QStringLiteral("scarf")) ? QStringLiteral("normal ") : QStringLiteral("line ");
    EXPECT_TRUE(cell(row, SummaryModel::angle).startsWith(word)) << check.toStdString();
  }
}

TEST_F(SummaryTest, isFilteredByWordsAndByWhatExceeds) {
  QTest::keyClicks(&m_page.filter(), QStringLiteral("glue"));
  EXPECT_EQ(rows(), 2);
  m_page.filter().clear();
  QTest::keyClicks(&m_page.filter(), QStringLiteral(" "));
  EXPECT_EQ(rows(), 5);
  QTest::mouseClick(&m_page.exceedsOnly(), Qt::LeftButton, {}, QPoint(8, m_page.exceedsOnly().height() / 2));
  EXPECT_EQ(rows(), 2) << "both checks of P2";
}

TEST_F(SummaryTest, followsTheStudyWhileItIsShown) {
  ASSERT_FALSE(m_desk.request({Remove{{Spot::point, "P2", {}}}}, m_desk.newGesture(), {}));
  EXPECT_EQ(rows(), 3);
}

} // namespace
} // namespace planewright

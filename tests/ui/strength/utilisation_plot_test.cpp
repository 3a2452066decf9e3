// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/utilisation_plot.h"

#include "tests/support/judged_study.h"

#include <QChart>
#include <QLineSeries>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

class UtilisationPlotTest : public testing::Test {
protected:
  UtilisationPlotTest() {
    m_plot.resize(340, 260);
    m_plot.show();
    EXPECT_TRUE(QTest::qWaitForWindowExposed(&m_plot));
  }
  double angle() const { return m_desk.readout().lines.front().angle.value.degrees(); }
  QPoint cursor() const {
    const UtilisationFrame& frame = m_plot.frame();
    return QPointF(frame.xOf(angle()), frame.plot.bottom - 10).toPoint();
  }
  void drag(QPoint from, QPoint to) {
    QTest::mousePress(m_plot.viewport(), Qt::LeftButton, {}, from);
    QTest::mouseMove(m_plot.viewport(), (from + to) / 2);
    QTest::mouseMove(m_plot.viewport(), to);
    QTest::mouseRelease(m_plot.viewport(), Qt::LeftButton, {}, to);
  }

  Desk m_desk{judgedStudy()};
  std::optional<std::size_t> m_selected = 0;
  UtilisationPlot m_plot{m_desk, [this] { return m_selected; }, nullptr};
};

TEST_F(UtilisationPlotTest, draggingTheCursorTurnsTheLineAsOneStep) {
  const int steps = m_desk.undoStack()->index();
  drag(cursor(), cursor() + QPoint(40, 0));
  const double perPixel = 180 / (m_plot.frame().plot.right - m_plot.frame().plot.left);
  EXPECT_NEAR(angle(), 3.814 + 40 * perPixel, 1);
  EXPECT_EQ(m_desk.undoStack()->index(), steps + 1);
}

TEST_F(UtilisationPlotTest, aPressBesideTheCursorMovesNothing) {
  drag(cursor() + QPoint(60, -30), cursor() + QPoint(90, -30));
  EXPECT_EQ(m_desk.undoStack()->index(), 0);
}

TEST_F(UtilisationPlotTest, keysTurnTheLineAsOneStep) {
  m_plot.setFocus();
  QTest::keyClick(&m_plot, Qt::Key_Home);
  QTest::keyClick(&m_plot, Qt::Key_Right);
  QTest::keyClick(&m_plot, Qt::Key_Right, Qt::ShiftModifier);
  EXPECT_NEAR(angle(), 1.1, 1e-9);
  EXPECT_EQ(m_desk.undoStack()->index(), 1);
}

TEST_F(UtilisationPlotTest, theCheckOfAPlaneTurnsItsPlane) {
  m_selected = 1;
  m_plot.refresh();
  m_plot.setFocus();
  QTest::keyClick(&m_plot, Qt::Key_Right);
  EXPECT_NEAR(m_desk.readout().watched.front().normal.value.degrees(), 61, 1e-9);
}

TEST_F(UtilisationPlotTest, showsNothingForACheckWithoutADirection) {
  m_selected.reset();
  m_plot.refresh();
  EXPECT_FALSE(m_plot.isVisible());
}

TEST_F(UtilisationPlotTest, aLogarithmicScaleIsKeptOnlyWhereItHelps) {
  EXPECT_TRUE(m_plot.reachesFar()) << "across the grain the tie carries little";
  m_plot.setLogarithmic(true);
  EXPECT_GT(m_plot.frame().highest, 9);
  ASSERT_FALSE(
      m_desk.request({Type{{Spot::sx, "P1", "G"}, "0.1 MPa"}, Type{{Spot::sx, "P1", "S"}, "0.1 MPa"}},
                     m_desk.newGesture(), {}));
  EXPECT_FALSE(m_plot.reachesFar());
  EXPECT_FALSE(m_plot.isLogarithmic());
  EXPECT_EQ(m_plot.frame().highest, 2);
}

} // namespace
} // namespace planewright

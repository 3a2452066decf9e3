// SPDX-License-Identifier: GPL-3.0-or-later
// With the greatest text the drawings grow too, and the hand still meets what it sees.
#include "shell_test.h"
#include "ui/circle/circle_plot.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/shell/appearance.h"
#include "ui/shell/main_window.h"
#include "ui/strength/strength_panel.h"
#include "ui/strength/utilisation_plot.h"

#include <QApplication>
#include <QMouseEvent>
#include <QTabBar>
#include <QTest>

#include <memory>

namespace planewright {
namespace {

class LargerText : public ShellTest {
protected:
  ~LargerText() override {
    m_window.reset();
    chooseTextPercent(100);
  }

  MainWindow& shown(QSize size) {
    chooseTextPercent(150);
    m_window = std::make_unique<MainWindow>(answers());
    m_window->openWorkedExample();
    m_window->resize(size);
    m_window->show();
    EXPECT_TRUE(QTest::qWaitForWindowActive(m_window.get()));
    return *m_window;
  }

  static void drag(QWidget& widget, QPointF from, QPointF to) {
    QTest::mousePress(&widget, Qt::LeftButton, {}, from.toPoint());
    QMouseEvent move(QEvent::MouseMove, to, widget.mapToGlobal(to), Qt::NoButton, Qt::LeftButton, {});
    QApplication::sendEvent(&widget, &move);
    QTest::mouseRelease(&widget, Qt::LeftButton, {}, to.toPoint());
  }

private:
  std::unique_ptr<MainWindow> m_window;
};

TEST_F(LargerText, theElementGrowsWithIt) {
  MainWindow& window = shown({2400, 1400});
  ElementView& element = window.element();
  EXPECT_NEAR(element.picture().width * 1.5, element.width(), 0.06 * element.width());
  type(window.desk(), Spot::reading, "0 deg");
  const QPointF knob = *element.placeOf(ElementHandle::reading);
  const QPointF middle(element.width() / 2.0, knob.y());
  drag(element, knob, {middle.x(), middle.y() - (knob.x() - middle.x())});
  EXPECT_NEAR(std::abs(window.desk().readout().reading.value.degrees()), 90, 2);
}

TEST_F(LargerText, theCircleGrowsWithIt) {
  MainWindow& window = shown({2400, 1400});
  CirclePlot& plot = window.circle().plot();
  EXPECT_NEAR(plot.zoom(), 1.5, 0.05);
  type(window.desk(), Spot::reading, "10 deg");
  QTest::qWait(10);
  const QPointF reading = *plot.handleAt(Handle::reading);
  const QPointF centre = plot.round().centre * plot.zoom();
  drag(*plot.viewport(), reading, centre + (centre - reading));
  EXPECT_NEAR(window.desk().readout().reading.value.degrees(), -80, 2);
}

TEST_F(LargerText, thePlotOfUtilisationGrowsWithIt) {
  MainWindow& window = shown({2400, 1400});
  UtilisationPlot& plot = window.strength().plot();
  ASSERT_TRUE(plot.isVisible());
  EXPECT_GT(plot.zoom(), 1.3);
  const auto nominal = [&] { return window.desk().readout().checks.front().band->nominal.degrees(); };
  const auto at = [&](double degrees) {
    return QPointF(plot.frame().xOf(degrees), plot.frame().plot.bottom - 4) * plot.zoom();
  };
  drag(*plot.viewport(), at(nominal()), at(45));
  EXPECT_NEAR(nominal(), 45, 1);
}

TEST_F(LargerText, leavesTheTabsTheirWords) {
  MainWindow& window = shown({1600, 1000});
  for (const auto* tabs : window.findChildren<QTabBar*>())
    EXPECT_LE(tabs->tabRect(tabs->count() - 1).right(), tabs->width());
}

} // namespace
} // namespace planewright

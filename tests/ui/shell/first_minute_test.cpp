// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/desk/desk.h"
#include "ui/element/element_view.h"
#include "ui/figure/figure_dialog.h"
#include "ui/shell/main_window.h"

#include <QApplication>
#include <QDir>
#include <QTest>

namespace planewright {
namespace {

/// Plays the first minute of a new user with the keyboard and counts the keys besides typed texts.
class FirstMinute : public ShellTest {
protected:
  void press(int key, Qt::KeyboardModifiers held = {}) {
    ++m_keys;
    QWidget* focused = QApplication::focusWidget();
    ASSERT_NE(focused, nullptr);
    QTest::keyClick(focused, static_cast<Qt::Key>(key), held);
  }
  static void write(const char* text) {
    QTest::keyClicks(QApplication::focusWidget(), QString::fromUtf8(text));
  }

  int m_keys = 0;
};

TEST_F(FirstMinute, fromThreeExpressionsToAFigureOnTheKeyboardAlone) {
  MainWindow window(answers());
  window.resize(1024, 700);
  window.show();
  window.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&window));

  write("-18.6 kN/(90 mm*240 mm)");
  press(Qt::Key_Tab);
  write("0");
  press(Qt::Key_Tab);
  write("1.5*12 kN/(90 mm*240 mm)");
  press(Qt::Key_Tab);
  write("1 in 10");
  press(Qt::Key_Tab);
  const Point& point = window.desk().study().points[0];
  EXPECT_EQ(point.stress[0].sx, "-18.6 kN/(90 mm*240 mm)");
  EXPECT_EQ(point.stress[0].sy, "0 MPa");
  EXPECT_EQ(point.stress[0].txy, "1.5*12 kN/(90 mm*240 mm)");
  EXPECT_EQ(point.lines.front().angle, "1 in 10");
  EXPECT_NEAR(window.desk().readout().state().stress.sx, -18600.0 / (90 * 240), 1e-12);
  EXPECT_NEAR(window.desk().readout().state().stress.txy, 1.5 * 12000.0 / (90 * 240), 1e-12);

  // The knob to the cut that crosses the grain, by named directions, and read the stress along there.
  press(Qt::Key_F6);
  ASSERT_EQ(QApplication::focusWidget(), &window.element());
  const auto away = [&window] {
    const Readout& readout = window.desk().readout();
    return apart(readout.reading.value, readout.lines[0].angle.value).degrees();
  };
  for (int pages = 0; pages < 12 && away() > 1e-9; ++pages)
    press(Qt::Key_PageUp);
  EXPECT_LE(away(), 1e-9);
  EXPECT_NEAR(window.desk().readout().state().reading.sn, window.desk().readout().state().lines[0].along,
              1e-9);

  // The study's own folder, so that the figure is saved beside it.
  m_savePath = file(QStringLiteral("first.planewright"));
  press(Qt::Key_S, Qt::ControlModifier);
  press(Qt::Key_E, Qt::ControlModifier);
  auto* dialog = window.findChild<FigureDialog*>();
  ASSERT_NE(dialog, nullptr);
  ASSERT_TRUE(QTest::qWaitFor([dialog] { return dialog->isActiveWindow(); }));
  press(Qt::Key_Return);
  const QStringList figures = QDir(QFileInfo(m_savePath).path()).entryList({QStringLiteral("first*.svg")});
  EXPECT_EQ(figures.size(), 1);
  EXPECT_LE(m_keys, 40);
}

} // namespace
} // namespace planewright

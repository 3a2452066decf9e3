// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/study_file.h"
#include "core/study/readout.h"
#include "shell_test.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/given/given_panel.h"
#include "ui/planes/planes_panel.h"
#include "ui/shell/main_window.h"
#include "ui/shell/state_bar.h"
#include "ui/strength/strength_panel.h"

#include <QAbstractButton>
#include <QApplication>
#include <QFile>
#include <QLabel>
#include <QMenu>
#include <QPushButton>
#include <QScrollBar>
#include <QTest>
#include <QTimer>

#include <gmock/gmock.h>

namespace planewright {
namespace {

/// An engineer who has no mouse.
class ByKeyboard : public ShellTest {
protected:
  ByKeyboard() {
    m_savePath = file("beam.planewright");
    m_window.resize(1400, 900);
    m_window.show();
    m_window.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&m_window));
  }

  /// Without a window manager the focus of the application can be lost behind a menu; the window keeps it.
  static QWidget* focused() {
    if (QWidget* widget = QApplication::focusWidget())
      return widget;
    return QApplication::activeWindow() ? QApplication::activeWindow()->focusWidget() : nullptr;
  }
  static void press(Qt::Key key, Qt::KeyboardModifiers held = {}) {
    ASSERT_NE(focused(), nullptr);
    QTest::keyClick(focused(), key, held);
  }
  static void write(const char* text) {
    QTest::keyClicks(focused(), QString::fromUtf8(text));
    press(Qt::Key_Return);
  }
  static bool isAt(const QString& name) {
    const QWidget* widget = focused();
    if (!widget)
      return false;
    const auto* button = qobject_cast<const QAbstractButton*>(widget);
    return widget->accessibleName().section(',', 0, 0) == name || (button && button->text() == name);
  }
  static void tabTo(const char* name) {
    const QString wanted = QString::fromUtf8(name);
    QStringList passed;
    for (int i = 0; i < 120 && !isAt(wanted); ++i) {
      press(Qt::Key_Tab);
      passed += focused() ? focused()->accessibleName() : QStringLiteral("nothing");
    }
    ASSERT_TRUE(isAt(wanted)) << name << " is not reached by Tab, but "
                              << passed.join(QStringLiteral("; ")).toStdString();
  }
  static void enter(const char* field, const char* text) {
    tabTo(field);
    press(Qt::Key_A, Qt::ControlModifier);
    write(text);
  }
  static void takeFrom(QMenu* menu, const QString& words) {
    ASSERT_NE(menu, nullptr);
    const auto isWanted = [&] {
      return menu->activeAction() && menu->activeAction()->text().remove('&').startsWith(words);
    };
    for (int i = 0; i < 40 && !isWanted(); ++i)
      QTest::keyClick(menu, Qt::Key_Down);
    ASSERT_TRUE(isWanted()) << words.toStdString() << " is not in the menu";
    QTest::keyClick(menu, Qt::Key_Return);
  }
  void fromMenu(Qt::Key letter, const char* words) {
    QTest::keyClick(&m_window, letter, Qt::AltModifier);
    takeFrom(qobject_cast<QMenu*>(QApplication::activePopupWidget()), words);
    QCoreApplication::processEvents();
  }
  /// The menu of a button waits for its answer, so that the answer is sent from behind.
  void choose(const char* button, const char* words) {
    tabTo(button);
    QTimer::singleShot(0, qApp, [words] {
      takeFrom(qobject_cast<QMenu*>(QApplication::activePopupWidget()), QString::fromUtf8(words));
    });
    press(Qt::Key_Space);
    comeBack();
  }
  void addTwice(const char* list) {
    fromMenu(Qt::Key_S, list);
    QWidget* dialog = QApplication::activeWindow();
    ASSERT_NE(dialog, &m_window);
    for (int i = 0; i < 2; ++i) {
      press(Qt::Key_A, Qt::AltModifier);
      QTest::qWait(150); // a mnemonic shows its button pressed for a while
    }
    leaveDialog();
  }
  /// Closes it; a window manager then gives the focus back.
  void leaveDialog() {
    press(Qt::Key_Escape);
    comeBack();
  }
  /// What a window manager does when a dialog or a menu has gone; without one the focus is lost.
  void comeBack() {
    QTest::qWait(20);
    m_window.activateWindow();
    ASSERT_TRUE(QTest::qWaitForWindowActive(&m_window));
    QCoreApplication::processEvents();
    if (!QApplication::focusWidget())
      m_window.given().focusFirst();
  }
  const Study& study() { return m_window.desk().study(); }
  bool says(const QString& words) const {
    for (const auto* label : m_window.findChildren<QLabel*>())
      if (label->isVisible() && label->text().contains(words))
        return true;
    return false;
  }

  MainWindow m_window{answers()};
};

/// The area of the window in which a widget stands, by its name.
std::string areaOf(const MainWindow& window, const QWidget& widget) {
  const std::pair<const char*, const QWidget*> areas[] = {
      {"given", &window.given()},     {"strength", &window.strength()}, {"bar", &window.stateBar()},
      {"element", &window.element()}, {"circle", &window.circle()},     {"planes", &window.planes()}};
  for (const auto& [name, area] : areas)
    if (area == &widget || area->isAncestorOf(&widget))
      return name;
  return "line under the bar";
}

/// Whether it stands, at least in part, in the view of whatever scrolls it.
bool isInView(const QWidget& widget) {
  QRect seen = widget.rect();
  const QWidget* at = &widget;
  for (; !at->isWindow(); at = at->parentWidget())
    seen = seen.translated(at->pos()).intersected(at->parentWidget()->rect());
  return !seen.isEmpty();
}

TEST_F(ByKeyboard, tabGoesFromAreaToAreaThroughAllThatIsSeen) {
  m_window.openWorkedExample();
  m_window.resize(1600, 1000);
  QTest::qWait(20);
  m_window.given().focusFirst();
  const QWidget* first = focused();
  std::vector<std::string> areas = {"given"};
  QStringList stops;
  do {
    press(Qt::Key_Tab);
    ASSERT_TRUE(focused());
    const auto* button = qobject_cast<QAbstractButton*>(focused());
    stops += button && button->accessibleName().isEmpty() ? button->text() : focused()->accessibleName();
    EXPECT_TRUE(isInView(*focused())) << stops.last().toStdString();
    if (const std::string area = areaOf(m_window, *focused()); area != areas.back())
      areas.push_back(area);
  } while (focused() != first && stops.size() < 200);
  EXPECT_THAT(areas, testing::ElementsAre("given", "strength", "bar", "line under the bar", "element",
                                          "circle", "planes", "given"));
  const qsizetype plot = stops.indexOf(QStringLiteral("Utilisation over the angle of the line"));
  ASSERT_GT(plot, 0);
  EXPECT_EQ(stops.at(plot + 1), "Scale: 0 to 2") << "the plot stands before its scale";
  const qsizetype chosen = stops.indexOf(QStringLiteral("case G"));
  ASSERT_GT(chosen, 0);
  EXPECT_EQ(stops.at(chosen - 1), "Stress") << "the choice of the case follows its heading";
}

TEST_F(ByKeyboard, whoComesBackFromAnotherWindowFindsTheColumnWhereItWas) {
  m_window.openWorkedExample();
  m_window.given().focusFirst();
  const QWidget* first = focused();
  QScrollBar& bar = *m_window.given().verticalScrollBar();
  QTest::qWait(20);
  ASSERT_GT(bar.maximum(), 300);
  bar.setValue(bar.maximum());
  QWidget another;
  another.show();
  another.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&another));
  m_window.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&m_window));
  EXPECT_EQ(focused(), first);
  EXPECT_EQ(bar.value(), bar.maximum());
}

TEST_F(ByKeyboard, threeCasesBuiltCombinationsAndThreePointsFromThreeSources) {
  addTwice("Load cases");
  ASSERT_EQ(study().cases.size(), 3U);
  addTwice("Points");
  ASSERT_EQ(study().points.size(), 3U);
  const std::string third = study().cases.back().id;

  // P1 by hand, with a slip that is answered in place.
  enter("σx", "25 kN");
  EXPECT_TRUE(says("not taken"));
  enter("σx", "-25 kN/(140 mm*300 mm)");
  enter("τxy", "1.5*25 kN/(140 mm*600 mm)");
  EXPECT_EQ(study().points[0].stress[0].sx, "-25 kN/(140 mm*300 mm)");

  // P2 from section forces; torsion is refused in place at this fibre.
  press(Qt::Key_PageDown, Qt::ControlModifier);
  choose("Add a source", "section forces");
  enter("Mz", "0.125*5.2 kN/m*(7.2 m)^2");
  enter("Vy", "-4.7");
  enter("T", "2");
  EXPECT_EQ(study().points[1].stress[0].forces->T, "0 kN*m");
  enter("T", "0");
  enter("h", "600");
  enter("b", "140");
  EXPECT_EQ(study().points[1].fibre->y, "-300 mm");

  // P3 from a rosette, in the third case.
  press(Qt::Key_PageDown, Qt::ControlModifier);
  tabTo("case G");
  press(Qt::Key_Right);
  press(Qt::Key_Right);
  press(Qt::Key_Space);
  ASSERT_TRUE(isAt(QString::fromStdString("case " + third)));
  choose("Add a source", "strain rosette");
  enter("εa", "312");
  enter("εb", "205");
  enter("εc", "-118");
  enter("E", "11.5 GPa");
  EXPECT_EQ(study().cases.back().nature, Nature::measured);

  fromMenu(Qt::Key_S, "Build combinations");
  QPushButton* take = nullptr;
  for (auto* button : QApplication::activeWindow()->findChildren<QPushButton*>())
    if (button->text().startsWith("Add "))
      take = button;
  ASSERT_NE(take, nullptr);
  tabTo(take->text().toUtf8().constData());
  press(Qt::Key_Space);
  leaveDialog();
  EXPECT_GE(study().combinations.size(), 4U);

  press(Qt::Key_S, Qt::ControlModifier);
  QFile saved(m_savePath);
  ASSERT_TRUE(saved.open(QIODevice::ReadOnly));
  const Results<Study> again = readStudy(saved.readAll().toStdString());
  ASSERT_TRUE(again);
  EXPECT_EQ(*again, study());
  const double modulus = 140.0 * 600 * 600 / 6;
  const Readout second = evaluate(*again, "P2");
  EXPECT_NEAR(second.cases.front().bending, 0.125 * 5.2 * 7200 * 7200 / modulus, 1e-9);
  EXPECT_NE(evaluate(*again, "P3").cases.back().stress.sx, 0);
  EXPECT_NE(evaluate(*again, "P1").cases.front().stress.txy, 0);
}

} // namespace
} // namespace planewright

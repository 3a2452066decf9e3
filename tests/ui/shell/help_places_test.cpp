// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/given/faces_dialog.h"
#include "ui/given/given_panel.h"
#include "ui/manual/manual.h"
#include "ui/manual/manual_html.h"
#include "ui/shell/help_key.h"
#include "ui/shell/help_window.h"
#include "ui/shell/main_window.h"
#include "ui/shell/problem_list.h"
#include "ui/shell/state_bar.h"
#include "ui/strength/strength_panel.h"

#include <QApplication>
#include <QClipboard>
#include <QMenuBar>
#include <QPushButton>
#include <QTest>

#include <functional>

namespace planewright {
namespace {

/// F1 on every widget of every window.
class HelpPlaces : public ShellTest {
protected:
  HelpPlaces() {
    m_window.resize(1400, 900);
    m_window.show();
    m_window.openWorkedExample();
    m_window.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&m_window));
  }

  static bool isThere(const QString& written) {
    const ManualPlace place = manualPlace(written);
    const QString html = manualHtml(place.page, QStringLiteral("en"), ManualMedium::program);
    return manualPages().contains(place.page) &&
           (place.anchor.isEmpty() || anchorsIn(html).contains(place.anchor));
  }

  /// Every widget that takes the focus has a place in its own window, and the place is there.
  static int widgetsWithPlaceIn(const QWidget& window) {
    int count = 0;
    for (const QWidget* widget : window.findChildren<QWidget*>()) {
      if (widget->focusPolicy() == Qt::NoFocus || widget->window() != &window)
        continue;
      const QWidget* holder = holderOfHelp(widget);
      const std::string who = std::string(widget->metaObject()->className()) + " “" +
                              widget->accessibleName().toStdString() + "” in “" +
                              window.windowTitle().toStdString() + "”";
      EXPECT_TRUE(holder && holder->window() == &window) << who << " has no place";
      EXPECT_TRUE(isThere(helpPlaceOf(widget))) << who << ": " << helpPlaceOf(widget).toStdString();
      ++count;
    }
    return count;
  }

  /// What a menu entry that begins so opens.
  QWidget* opened(const char* menu, const char* entry) {
    return openedBy([&] { choose(menu, entry); });
  }
  /// What a button opens.
  static QWidget* openedBy(QWidget& within, const char* words) {
    return openedBy([&] {
      for (auto* button : within.findChildren<QAbstractButton*>())
        if (button->text().remove(QLatin1Char('&')) == QString::fromUtf8(words))
          button->click();
    });
  }

private:
  void choose(const char* menu, const char* entry) {
    for (const QAction* one : m_window.menuBar()->actions()) {
      if (one->text().remove(QLatin1Char('&')) != QLatin1String(menu))
        continue;
      for (QAction* action : one->menu()->actions())
        if (action->text().remove(QLatin1Char('&')).startsWith(QString::fromUtf8(entry)))
          action->trigger();
    }
  }

  static QWidget* openedBy(const std::function<void()>& act) {
    const QWidgetList before = QApplication::topLevelWidgets();
    act();
    QCoreApplication::processEvents();
    for (QWidget* widget : QApplication::topLevelWidgets())
      if (!before.contains(widget) && widget->isVisible() && qobject_cast<QDialog*>(widget))
        return widget;
    return nullptr;
  }

protected:
  QString placeShownOn(QWidget& widget) {
    QTest::keyClick(&widget, Qt::Key_F1);
    return m_window.help().help().place();
  }

  MainWindow m_window{answers()};
};

TEST_F(HelpPlaces, areThereForEveryWidgetOfTheWindow) {
  EXPECT_GT(widgetsWithPlaceIn(m_window), 100);
}

TEST_F(HelpPlaces, areThereForEveryWidgetOfTheDialogs) {
  QGuiApplication::clipboard()->setText(QStringLiteral("point\tcase\tsx\nP9\tG\t1"));
  struct Entry {
    const char* menu;
    const char* words;
  };
  for (const Entry& entry :
       {Entry{"File", "Unsaved"}, Entry{"File", "Screen points"}, Entry{"File", "Export figure"},
        Entry{"File", "Calculation sheet"}, Entry{"Edit", "Paste table"}, Entry{"Edit", "Preferences"},
        Entry{"Study", "Title"}, Entry{"Study", "Points"}, Entry{"Study", "Sections"},
        Entry{"Study", "Load cases"}, Entry{"Study", "Combinations"}, Entry{"Study", "Build"},
        Entry{"Study", "Materials"}, Entry{"Study", "Compare"}, Entry{"Study", "Working"},
        Entry{"Help", "Published"}, Entry{"Help", "Handbook"}}) {
    const QWidget* dialog = opened(entry.menu, entry.words);
    ASSERT_NE(dialog, nullptr) << entry.words;
    EXPECT_GT(widgetsWithPlaceIn(*dialog), 0) << entry.words;
  }
}

TEST_F(HelpPlaces, areThereForDialogsOfDialogs) {
  QWidget* figure = opened("File", "Export figure");
  ASSERT_NE(figure, nullptr);
  for (const auto& [within, words] :
       {std::pair{figure, "All points…"},
        {static_cast<QWidget*>(&m_window.strength()), "All criteria side by side"},
        {static_cast<QWidget*>(&m_window.strength()), "More"}}) {
    const QWidget* dialog = openedBy(*within, words);
    ASSERT_NE(dialog, nullptr) << words;
    EXPECT_GT(widgetsWithPlaceIn(*dialog), 0) << words;
  }
  const FacesDialog faces(Line(), &m_window);
  EXPECT_GT(widgetsWithPlaceIn(faces), 2);
  const ProblemList problems(QStringLiteral("Problems"), {}, &m_window);
  EXPECT_GT(widgetsWithPlaceIn(problems), 0);
}

TEST_F(HelpPlaces, areShownByFOneInTheWindow) {
  m_window.given().focusFirst();
  EXPECT_EQ(placeShownOn(*m_window.focusWidget()), QStringLiteral("given#typed"));
  EXPECT_EQ(placeShownOn(m_window.stateBar().figureButton()), QStringLiteral("figures#arrange"));
}

TEST_F(HelpPlaces, leadToTheCriterionOfACheck) {
  QStringList places;
  for (const auto* button : m_window.strength().findChildren<QAbstractButton*>())
    places += helpPlaceOf(button);
  EXPECT_TRUE(places.contains(QStringLiteral("criteria#sum-of-squares")));
}

TEST_F(HelpPlaces, areShownByFOneInDialogs) {
  QWidget* screen = opened("File", "Screen points");
  ASSERT_NE(screen, nullptr);
  EXPECT_EQ(placeShownOn(*screen), QStringLiteral("screening#table"));
  EXPECT_EQ(placeShownOn(m_window.help().help()), QStringLiteral("window#handbook"));
}

TEST_F(HelpPlaces, areShownOverADialogThatMustBeAnswered) {
  QDialog dialog(&m_window);
  dialog.setProperty("helpPlace", "lines#faces");
  auto* button = new QPushButton(&dialog);
  dialog.open();
  EXPECT_EQ(placeShownOn(*button), QStringLiteral("lines#faces"));
  EXPECT_EQ(m_window.help().help().parentWidget(), &dialog);
}

TEST_F(HelpPlaces, leaveOtherKeysAlone) {
  m_window.given().focusFirst();
  const QWidgetList before = QApplication::topLevelWidgets();
  QTest::keyClick(m_window.focusWidget(), Qt::Key_F1, Qt::ControlModifier);
  EXPECT_EQ(QApplication::topLevelWidgets().size(), before.size());
}

} // namespace
} // namespace planewright

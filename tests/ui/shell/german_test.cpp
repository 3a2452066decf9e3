// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/look/column_area.h"
#include "ui/look/language.h"
#include "ui/shell/main_window.h"

#include <QAbstractButton>
#include <QApplication>
#include <QLabel>
#include <QMenuBar>
#include <QMessageBox>
#include <QPointer>
#include <QTest>
#include <QTimer>
#include <QTranslator>

#include <set>

namespace planewright {
namespace {

/// Asked before the languages, it answers nothing and keeps what of the program's own texts has no German.
class Recorder : public QTranslator {
public:
  Recorder() { EXPECT_TRUE(m_german.load(QStringLiteral(":/planewright/languages/planewright_de"))); }
  bool isEmpty() const override { return false; }
  QString translate(const char* context, const char* source, const char* comment, int n) const override {
    // The toolkit's own contexts begin with its letter; symbols of the trade are equal in every language.
    const bool isOurs = context && *context != 'Q' && qstrcmp(context, "Symbol") != 0 && source && *source;
    if (isOurs && m_german.translate(context, source, comment, n).isEmpty())
      m_missing.insert(std::string(context) + " | " + source);
    return {};
  }
  const std::set<std::string>& missing() const { return m_missing; }

private:
  QTranslator m_german;
  mutable std::set<std::string> m_missing;
};

class German : public ShellTest {
protected:
  German() { EXPECT_TRUE(speak(QStringLiteral("de"))); }
  ~German() override { EXPECT_TRUE(speak(QStringLiteral("en"))); }

  /// Everything that a menu offers, but for what ends the window or fills the screen; what waits for an
  /// answer is closed.
  static void followEveryMenu(MainWindow& window) {
    QTimer closing;
    QObject::connect(&closing, &QTimer::timeout, [] {
      if (QWidget* waiting = QApplication::activeModalWidget())
        waiting->close();
    });
    closing.start(20);
    const std::function<void(const QMenu&)> follow = [&](const QMenu& menu) {
      // Some of them list other files, once one was opened.
      QList<QPointer<QAction>> actions;
      for (QAction* action : menu.actions())
        actions << action;
      for (const QPointer<QAction>& action : actions)
        if (action && action->menu())
          follow(*action->menu());
        else if (action && !action->isSeparator() && action->isEnabled() && !isLeftAlone(*action))
          action->trigger();
    };
    for (const QAction* action : window.menuBar()->actions())
      follow(*action->menu());
    QTest::qWait(200);
  }
  static bool isLeftAlone(const QAction& action) {
    return action.shortcut() == QKeySequence(Qt::CTRL | Qt::Key_Q) || action.shortcut() == Qt::Key_F11 ||
           action.shortcut() == QKeySequence(QKeySequence::Print);
  }
};

TEST_F(German, everyTextThatTheWindowAsksForIsThere) {
  Recorder recorder;
  QCoreApplication::installTranslator(&recorder);
  {
    MainWindow window(answers());
    window.show();
    window.openWorkedExample();
    followEveryMenu(window);
  }
  QCoreApplication::removeTranslator(&recorder);
  for (const std::string& text : recorder.missing())
    ADD_FAILURE() << text;
}

TEST_F(German, theToolkitSpeaksItToo) {
  const QMessageBox box(QMessageBox::NoIcon, {}, {}, QMessageBox::Save | QMessageBox::Cancel);
  EXPECT_EQ(box.button(QMessageBox::Save)->text().remove('&'), "Speichern");
  EXPECT_EQ(box.button(QMessageBox::Cancel)->text().remove('&'), "Abbrechen");
}

TEST_F(German, noWordOfAButtonOrALabelIsCut) {
  MainWindow window(answers());
  for (const QSize& size : {QSize(1024, 700), QSize(1600, 1000)}) {
    window.resize(size);
    window.show();
    window.openWorkedExample();
    followEveryMenu(window);
    window.showPointPage();
    QCoreApplication::processEvents();
    for (const ColumnArea* column : window.findChildren<ColumnArea*>()) // of its dialogs too
      EXPECT_TRUE(!column->isVisible() || column->widget()->width() <= column->viewport()->width())
          << column->widget()->width() << " at " << size.width();
    for (QWidget* top : QApplication::topLevelWidgets())
      for (QWidget* part : top->findChildren<QWidget*>()) {
        const auto* label = qobject_cast<QLabel*>(part);
        const auto* button = qobject_cast<QAbstractButton*>(part);
        if (!part->isVisible() || (!label && !button) || (label && label->wordWrap()))
          continue;
        const QString words = label ? label->text() : button->text();
        const QSize needed = part->minimumSizeHint();
        EXPECT_GE(part->width(), needed.width())
            << words.toStdString() << " in " << top->windowTitle().toStdString();
        EXPECT_GE(part->height(), needed.height())
            << words.toStdString() << " in " << top->windowTitle().toStdString();
      }
  }
}

} // namespace
} // namespace planewright

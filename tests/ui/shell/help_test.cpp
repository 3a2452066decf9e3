// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/manual/manual.h"
#include "ui/shell/appearance.h"
#include "ui/shell/help_text.h"
#include "ui/shell/help_window.h"
#include "ui/shell/window_icon.h"

#include <QApplication>
#include <QLineEdit>
#include <QListWidget>
#include <QPalette>
#include <QScrollBar>
#include <QTest>

namespace planewright {
namespace {

class HelpTest : public ShellTest {
protected:
  HelpTest() {
    m_help.showPlace(QStringLiteral("first-figure"));
    EXPECT_TRUE(QTest::qWaitForWindowActive(&m_help));
  }

  QString chosenPage() const { return m_help.contents().currentItem()->text(); }

  HelpWindow m_help{nullptr};
};

TEST_F(HelpTest, showsThePlaceAskedFor) {
  m_help.showPlace(QStringLiteral("lines#slips"));
  EXPECT_EQ(m_help.place(), QStringLiteral("lines#slips"));
  EXPECT_EQ(chosenPage(), manualTitle(QStringLiteral("lines"), QStringLiteral("en")));
  EXPECT_GT(m_help.text().verticalScrollBar()->value(), 0);
}

TEST_F(HelpTest, listsAllPagesAndShowsTheChosenOne) {
  ASSERT_EQ(m_help.contents().count(), manualPages().size());
  for (int row = 0; row < m_help.contents().count(); ++row) {
    m_help.contents().setCurrentRow(row);
    EXPECT_EQ(m_help.place(), manualPages()[row]);
    EXPECT_GT(m_help.text().toPlainText().size(), 500);
  }
}

TEST_F(HelpTest, goesBackAndForward) {
  m_help.showPlace(QStringLiteral("keys"));
  QTest::keyClick(&m_help, Qt::Key_Left, Qt::AltModifier);
  EXPECT_EQ(m_help.place(), QStringLiteral("first-figure"));
  QTest::keyClick(&m_help, Qt::Key_Right, Qt::AltModifier);
  EXPECT_EQ(m_help.place(), QStringLiteral("keys"));
}

TEST_F(HelpTest, followsALinkByKeyboard) {
  m_help.showPlace(QStringLiteral("cautions"));
  m_help.text().setFocus();
  QTest::keyClick(&m_help.text(), Qt::Key_Tab);
  QTest::keyClick(&m_help.text(), Qt::Key_Return);
  EXPECT_EQ(m_help.place(), QStringLiteral("conventions#signs"));
}

TEST_F(HelpTest, findsWordsOverAllPages) {
  QTest::keyClick(&m_help, Qt::Key_F, Qt::ControlModifier);
  QTest::keyClicks(&m_help.search(), QStringLiteral("microstrain"));
  ASSERT_EQ(m_help.contents().count(), 1);
  EXPECT_EQ(m_help.place(), QStringLiteral("given"));
  EXPECT_EQ(m_help.text().textCursor().selectedText(), QStringLiteral("microstrain"));
  EXPECT_FALSE(m_help.text().extraSelections().isEmpty());
  QTest::keyClick(&m_help.search(), Qt::Key_Escape);
  EXPECT_EQ(m_help.contents().count(), manualPages().size());
  EXPECT_TRUE(m_help.text().extraSelections().isEmpty());
  EXPECT_TRUE(m_help.isVisible());
}

TEST_F(HelpTest, goesFromFindToFindOverThePages) {
  m_help.search().setFocus();
  QTest::keyClicks(&m_help.search(), QStringLiteral("tolerance"));
  const int pages = m_help.contents().count();
  ASSERT_GT(pages, 2);
  QStringList seen;
  for (int i = 0; i < 200; ++i) {
    QTest::keyClick(&m_help.search(), Qt::Key_Return);
    EXPECT_EQ(m_help.text().textCursor().selectedText().toLower(), QStringLiteral("tolerance"));
    if (!seen.contains(m_help.place()))
      seen += m_help.place();
  }
  EXPECT_EQ(seen.size(), pages);
  const QString here = m_help.place();
  const int at = m_help.text().textCursor().position();
  m_help.findNext();
  m_help.findPrevious();
  EXPECT_EQ(m_help.place(), here);
  EXPECT_EQ(m_help.text().textCursor().position(), at);
}

TEST_F(HelpTest, saysWhenNothingIsFound) {
  QTest::keyClicks(&m_help.search(), QStringLiteral("zzz"));
  EXPECT_EQ(m_help.contents().count(), 0);
  const QString here = m_help.place();
  m_help.findNext();
  EXPECT_EQ(m_help.place(), here);
}

TEST_F(HelpTest, wearsThePaletteAndStaysWhereItWas) {
  m_help.showPlace(QStringLiteral("conventions#circle"));
  const int at = m_help.text().verticalScrollBar()->value();
  chooseAppearance(Appearance::dark);
  QCoreApplication::processEvents();
  EXPECT_EQ(m_help.place(), QStringLiteral("conventions#circle"));
  EXPECT_NEAR(m_help.text().verticalScrollBar()->value(), at, 5);
  const QImage page = m_help.text().grab().toImage();
  EXPECT_LT(page.pixelColor(3, page.height() / 2).lightnessF(), 0.5F); // beside the words
  chooseAppearance(Appearance::system);
}

TEST_F(HelpTest, theAppearanceIsKeptAndWorn) {
  EXPECT_EQ(chosenAppearance(), Appearance::system);
  chooseAppearance(Appearance::dark);
  EXPECT_EQ(chosenAppearance(), Appearance::dark);
  EXPECT_LT(QApplication::palette().color(QPalette::Window).lightnessF(), 0.5F);
  chooseAppearance(Appearance::light);
  EXPECT_GT(QApplication::palette().color(QPalette::Window).lightnessF(), 0.5F);
  chooseAppearance(Appearance::system);
  EXPECT_GT(QApplication::palette().color(QPalette::Window).lightnessF(), 0.5F)
      << "the test's system is light";
}

TEST_F(HelpTest, theIconIsDrawnInEverySize) {
  for (const QSize& size : windowIcon().availableSizes())
    EXPECT_EQ(windowIcon().pixmap(size, 1.0).toImage().pixelColor(size.width() / 2, 0).alpha(), 0);
  EXPECT_GE(windowIcon().availableSizes().size(), 5);
}

} // namespace
} // namespace planewright

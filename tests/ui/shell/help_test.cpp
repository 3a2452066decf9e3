// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/shell/appearance.h"
#include "ui/shell/help_window.h"
#include "ui/shell/window_icon.h"

#include <QApplication>
#include <QPalette>

namespace planewright {
namespace {

class HelpTest : public ShellTest {};

TEST_F(HelpTest, everyPageHasAHeadingAndWords) {
  for (int i = 0; i < helpPageCount; ++i) {
    const auto page = static_cast<HelpPage>(i);
    const QString html = htmlOf(page, Look{});
    EXPECT_TRUE(html.contains(titleOf(page)));
    EXPECT_GT(html.size(), 600);
  }
}

TEST_F(HelpTest, thePicturesDifferAndWearThePalette) {
  const QImage given = helpPicture(QStringLiteral("picture:given"), Look{}, 1);
  const QImage turned = helpPicture(QStringLiteral("picture:turned"), Look{}, 1);
  const QImage dark = helpPicture(QStringLiteral("picture:turned"), Look{Palette::dark}, 1);
  EXPECT_NE(given, turned);
  EXPECT_NE(turned, dark);
  EXPECT_EQ(QColor(dark.pixel(0, 0)), Look{Palette::dark}.colour(Role::canvas));
  EXPECT_EQ(helpPicture(QStringLiteral("picture:given"), Look{}, 2).size(), given.size() * 2);
}

TEST_F(HelpTest, theWindowOpensThePageAskedFor) {
  HelpWindow help(nullptr);
  help.showPage(HelpPage::cautions);
  EXPECT_EQ(help.page(), HelpPage::cautions);
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

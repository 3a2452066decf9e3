// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/desk.h"
#include "ui/given/faces_dialog.h"
#include "ui/given/line_group.h"
#include "ui/look/quiet_button.h"

#include <QLineEdit>
#include <QMenu>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(SlopeOfUnknownSense, IsTheFirstEntryOfAGrain) {
  Desk desk(newStudy());
  LineGroup group(desk, 0);
  auto* slopes = qobject_cast<QuietButton*>(group.buttons()[1]);
  ASSERT_TRUE(slopes && slopes->menu());
  EXPECT_TRUE(slopes->menu()->actions().front()->text().contains(QStringLiteral("either way")));
  slopes->menu()->actions()[1]->trigger();
  const Line& line = shownPoint(desk.study()).lines.front();
  EXPECT_EQ(line.angle, "0 deg");
  EXPECT_EQ(line.tolerance, "1 in 10");
  EXPECT_EQ(desk.undoStack()->count(), 1);
}

TEST(FacesDialog, TellsTheTrueSlope) {
  FacesDialog dialog(nullptr);
  QTest::keyClicks(&dialog.first(), QStringLiteral("3 in 10"));
  QTest::keyClicks(&dialog.second(), QStringLiteral("4 in 10"));
  EXPECT_TRUE(dialog.told().contains(QStringLiteral("1 in 2")));
  EXPECT_NEAR(readEntry(dialog.slope(), {dimension::angle, degreeUnit(), Slopes::tolerance})->value,
              26.565051177, 1e-9);
  dialog.second().clear();
  QTest::keyClicks(&dialog.second(), QStringLiteral("steep"));
  EXPECT_TRUE(dialog.slope().empty());
}

} // namespace
} // namespace planewright

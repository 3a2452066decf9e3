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

TEST(SlopeOfUnknownSense, KeepsTheAngleThatWasTyped) {
  Study study = newStudy();
  study.points[0].lines = {{"grain", LineKind::grain, "15 deg", "2 deg"}};
  Desk desk(study);
  LineGroup group(desk, 0);
  QAction& entry = *qobject_cast<QuietButton*>(group.buttons()[1])->menu()->actions()[1];
  EXPECT_EQ(entry.text(), QStringLiteral("within 1 in 10 either way of 15 deg"));
  entry.trigger();
  EXPECT_EQ(shownPoint(desk.study()).lines.front().angle, "15 deg");
  EXPECT_EQ(shownPoint(desk.study()).lines.front().tolerance, "1 in 10");
}

TEST(FacesDialog, TellsTheTrueSlope) {
  FacesDialog dialog({"grain", LineKind::grain, "15 deg", ""}, nullptr);
  QTest::keyClicks(&dialog.first(), QStringLiteral("3 in 10"));
  QTest::keyClicks(&dialog.second(), QStringLiteral("4 in 10"));
  EXPECT_TRUE(dialog.told().contains(QStringLiteral("1 in 2")));
  EXPECT_EQ(dialog.slope(), "26.5651 deg") << "of 26.56505117...";
  EXPECT_TRUE(dialog.told().contains(
      QStringLiteral("The angle of the line stays 15 deg; its tolerance, now none, becomes 26.5651 deg.")));
  dialog.second().clear();
  QTest::keyClicks(&dialog.second(), QStringLiteral("steep"));
  EXPECT_TRUE(dialog.slope().empty());
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/title_dialog.h"

#include "ui/entry/draft_edit.h"
#include "ui/entry/entry_field.h"
#include "ui/shell/signing_line.h"

#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

struct TitleDialogTest : testing::Test {
  Desk desk{newStudy()};
  TitleDialog dialog{desk, nullptr};
  EntryField& name = *dialog.findChild<EntryField*>();

  TitleDialogTest() {
    dialog.show();
    dialog.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&dialog));
    name.edit().setFocus(Qt::TabFocusReason);
    name.edit().selectAll();
  }
  /// Types the name in two pieces, each taken by the study after a pause.
  void typeWithPauses() {
    QTest::keyClicks(&name.edit(), QStringLiteral("Heel"));
    EXPECT_TRUE(QTest::qWaitFor([this] { return desk.readout().point == "Heel"; }, 2000));
    QTest::keyClicks(&name.edit(), QStringLiteral(" joint"));
    EXPECT_TRUE(QTest::qWaitFor([this] { return desk.readout().point == "Heel joint"; }, 2000));
  }
};

TEST_F(TitleDialogTest, aStayInTheNameOfThePointIsOneStep) {
  typeWithPauses();
  EXPECT_EQ(desk.undoStack()->count(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(desk.study(), newStudy());
}

TEST_F(TitleDialogTest, escapePutsBackTheNameOfThePoint) {
  typeWithPauses();
  QTest::keyClick(&name.edit(), Qt::Key_Escape);
  EXPECT_EQ(desk.study(), newStudy());
  EXPECT_EQ(desk.undoStack()->count(), 0);
}

TEST_F(TitleDialogTest, followsTheShownPoint) {
  desk.request({Insert{{Spot::point, "P2", {}}, {}}}, desk.newGesture(), {});
  desk.show("P1", {});
  ASSERT_EQ(name.edit().text(), "P1");
  QTest::keyClicks(&name.edit(), QStringLiteral("x"));
  desk.show("P2", {});
  EXPECT_EQ(name.edit().text(), "P2");
  EXPECT_EQ(desk.study().points.front().name, "P1") << "what was not yet taken is dropped";
}

TEST_F(TitleDialogTest, saysWhetherANameWasGivenForTheStudyAsItIs) {
  const auto lines = dialog.findChildren<SigningLine*>();
  ASSERT_EQ(lines.size(), 2);
  EXPECT_FALSE(lines[1]->isVisible());
  desk.request({Type{{Spot::titleChecked, {}, {}}, "C. D."}}, desk.newCommand(), {});
  EXPECT_TRUE(lines[1]->text().startsWith(QStringLiteral("Given for the study as it is")));
  desk.request({Type{{Spot::sx, "P1", "G"}, "5 MPa"}}, desk.newCommand(), {});
  EXPECT_TRUE(lines[1]->text().startsWith(QStringLiteral("The study changed since it was checked.")));
  emit lines[1]->linkActivated(QStringLiteral("again"));
  EXPECT_TRUE(lines[1]->text().startsWith(QStringLiteral("Given for the study as it is")));
  EXPECT_FALSE(lines[0]->isVisible());
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "given_fixture.h"

#include "ui/given/note_field.h"

namespace planewright {
namespace {

struct NoteFieldTest : GivenTest {
  NoteField& note = *panel.findChild<NoteField*>();
  NoteFieldTest() {
    button("Notes").click();
    note.setFocus();
  }
};

TEST_F(NoteFieldTest, aStayIsOneStep) {
  QTest::keyClicks(&note, "Knot near");
  EXPECT_TRUE(QTest::qWaitFor([this] { return kept(Spot::pointNote) == "Knot near"; }, 2000));
  QTest::keyClicks(&note, " the edge");
  panel.focusFirst();
  EXPECT_EQ(kept(Spot::pointNote), "Knot near the edge");
  EXPECT_EQ(desk.undoStack()->count(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(note.toPlainText(), "");
}

TEST_F(NoteFieldTest, hasLines) {
  QTest::keyClicks(&note, "one");
  QTest::keyClick(&note, Qt::Key_Return);
  QTest::keyClicks(&note, "two");
  panel.focusFirst();
  EXPECT_EQ(kept(Spot::pointNote), "one\ntwo");
}

TEST_F(NoteFieldTest, tabLeavesIt) {
  QTest::keyClick(&note, Qt::Key_Tab);
  EXPECT_FALSE(note.hasFocus());
}

} // namespace
} // namespace planewright

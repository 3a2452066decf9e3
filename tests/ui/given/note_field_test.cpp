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

TEST_F(NoteFieldTest, leavesTheKeysOfTheWindowToIt) {
  const auto takes = [this](int key) {
    QKeyEvent event(QEvent::ShortcutOverride, key, Qt::ControlModifier);
    event.ignore();
    QCoreApplication::sendEvent(&note, &event);
    return event.isAccepted();
  };
  EXPECT_FALSE(takes(Qt::Key_E));
  EXPECT_FALSE(takes(Qt::Key_Z)) << "nothing is typed here";
  QTest::keyClicks(&note, "K");
  EXPECT_TRUE(takes(Qt::Key_Z));
}

/// With a second point to go to.
struct NoteOfTwoPoints : NoteFieldTest {
  NoteOfTwoPoints() {
    desk.request({Insert{{Spot::point, "P2", {}}, {}}, Insert{{Spot::caseStress, "P2", "G"}, {}}},
                 desk.newGesture(), {});
    desk.show("P1", {});
  }
};

TEST_F(NoteOfTwoPoints, aDraftGoesToThePointWhereItWasTyped) {
  QTest::keyClicks(&note, "Knot near");
  desk.show("P2", {});
  EXPECT_EQ(note.toPlainText(), "");
  EXPECT_TRUE(QTest::qWaitFor([this] { return kept(Spot::pointNote, "P1") == "Knot near"; }, 2000));
  EXPECT_EQ(kept(Spot::pointNote, "P2"), "");
  QTest::keyClicks(&note, "Sound");
  panel.focusFirst();
  EXPECT_EQ(kept(Spot::pointNote, "P1"), "Knot near");
  EXPECT_EQ(kept(Spot::pointNote, "P2"), "Sound");
  desk.undoStack()->undo();
  EXPECT_EQ(kept(Spot::pointNote, "P1"), "Knot near") << "each point's note is a step of its own";
}

TEST_F(NoteFieldTest, whatNoKeyTypedCountsToo) {
  QInputMethodEvent event;
  event.setCommitString(QStringLiteral("节疤"));
  QCoreApplication::sendEvent(&note, &event);
  desk.request({Type{{Spot::reading, "P1", {}}, "30"}}, desk.newGesture(), {});
  EXPECT_EQ(note.toPlainText(), QStringLiteral("节疤")) << "a change elsewhere leaves the draft";
  EXPECT_TRUE(QTest::qWaitFor([this] { return kept(Spot::pointNote) == "节疤"; }, 2000));
}

} // namespace
} // namespace planewright

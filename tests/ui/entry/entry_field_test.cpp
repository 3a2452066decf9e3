// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/entry_field.h"

#include "core/table/table.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"

#include <QApplication>
#include <QLineEdit>
#include <QSignalSpy>
#include <QTest>
#include <QVBoxLayout>
#include <QWheelEvent>

#include <gtest/gtest.h>

namespace planewright {
namespace {

const Place sx{Spot::sx, "P1", "G"};

EntryBinding stressBinding() {
  EntryBinding binding = boundTo([](const Study&) { return sx; });
  binding.echo = [](const Study& study, const Readout& readout, const std::string&) {
    const StateReading& state = readout.state();
    return fromUtf8(shownStress(study, state, state.stress.sx) + " " + study.units.stress);
  };
  return binding;
}

/// A window with the field under test and another place for the focus to go to.
struct EntryFieldTest : testing::Test {
  Desk desk{newStudy()};
  QWidget window;
  EntryField field{
      desk, stressBinding(), {rowOf(Spot::sx).label, "normal stress on the x face", true}, &window};
  QLineEdit elsewhere{&window};

  EntryFieldTest() {
    auto* rows = new QVBoxLayout(&window);
    rows->addWidget(&field);
    rows->addWidget(&elsewhere);
    window.resize(300, 200);
    window.show();
    window.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&window));
    elsewhere.setFocus();
  }

  void enter() {
    field.edit().setFocus(Qt::TabFocusReason);
    field.edit().selectAll();
  }
  void type(const char* text) { QTest::keyClicks(&field.edit(), text); }
  void press(Qt::Key key) { QTest::keyClick(&field.edit(), key); }
  void leave() { elsewhere.setFocus(Qt::TabFocusReason); }
  std::string kept() const { return *textAt(desk.study(), sx); }
  int steps() { return desk.undoStack()->count(); }
};

TEST_F(EntryFieldTest, showsTheStudysText) {
  EXPECT_EQ(field.edit().text(), "0 MPa");
  EXPECT_EQ(field.echoText(), "= 0.000 MPa");
  desk.request({Type{sx, "12 kN/(3 mm*2 mm)"}}, desk.newGesture(), {});
  EXPECT_EQ(field.edit().text(), "12 kN/(3 mm*2 mm)");
  EXPECT_EQ(field.echoText(), "= 2000 MPa");
}

TEST_F(EntryFieldTest, theEchoFollowsEachKey) {
  enter();
  type("8");
  EXPECT_EQ(field.echoText(), "= 8.000 MPa");
  type("4");
  EXPECT_EQ(field.echoText(), "= 84.00 MPa");
  EXPECT_EQ(kept(), "0 MPa") << "the study waits for the pause";
  type("/");
  EXPECT_EQ(field.echoText(), "still 0.000 MPa");
  EXPECT_EQ(field.complaintText(), "") << "the message waits";
}

TEST_F(EntryFieldTest, enterTakesTheTextAndCompletesItsUnit) {
  enter();
  type("-2.1");
  press(Qt::Key_Return);
  EXPECT_EQ(kept(), "-2.1 MPa");
  EXPECT_EQ(field.edit().text(), "-2.1 MPa");
  EXPECT_EQ(field.edit().selectedText(), "-2.1 MPa");
  EXPECT_TRUE(field.edit().hasFocus());
}

TEST_F(EntryFieldTest, leavingTakesTheText) {
  enter();
  type("7");
  leave();
  EXPECT_EQ(kept(), "7 MPa");
  EXPECT_EQ(field.edit().text(), "7 MPa");
}

TEST_F(EntryFieldTest, aPauseTakesAGoodTextAndLeavesTheDraftAlone) {
  enter();
  type("7");
  QTest::qWait(EntryField::settlePause / 3);
  EXPECT_EQ(kept(), "0 MPa");
  type("1");
  QTest::qWait(EntryField::settlePause / 2);
  EXPECT_EQ(kept(), "0 MPa") << "each key starts the pause anew";
  EXPECT_TRUE(QTest::qWaitFor([this] { return kept() == "71 MPa"; }, 2 * EntryField::settlePause));
  EXPECT_EQ(field.edit().text(), "71");
  EXPECT_EQ(field.edit().cursorPosition(), 2);
}

TEST_F(EntryFieldTest, oneStayIsOneStep) {
  enter();
  type("7");
  press(Qt::Key_Return);
  type("8");
  press(Qt::Key_Return);
  type("9");
  leave();
  EXPECT_EQ(kept(), "9 MPa");
  EXPECT_EQ(steps(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(kept(), "0 MPa");
  EXPECT_EQ(field.edit().text(), "0 MPa");
}

TEST_F(EntryFieldTest, eachStayIsAStepOfItsOwn) {
  for (const char* text : {"7", "8"}) {
    enter();
    type(text);
    leave();
  }
  EXPECT_EQ(steps(), 2);
}

TEST_F(EntryFieldTest, aStayThatChangesNothingIsNoStep) {
  enter();
  leave();
  enter();
  press(Qt::Key_Return);
  type("0 MPa");
  leave();
  EXPECT_EQ(steps(), 0);
}

TEST_F(EntryFieldTest, escapePutsBackTheTextAtEntry) {
  desk.request({Type{sx, "5"}}, desk.newGesture(), {});
  enter();
  type("7");
  QTest::qWait(2 * EntryField::settlePause);
  EXPECT_EQ(kept(), "7 MPa");
  type("8,");
  press(Qt::Key_Escape);
  EXPECT_EQ(kept(), "5 MPa");
  EXPECT_EQ(field.edit().text(), "5 MPa");
  EXPECT_EQ(field.echoText(), "= 5.000 MPa");
  leave();
  EXPECT_EQ(steps(), 1) << "only the step from before the stay";
}

TEST_F(EntryFieldTest, whatEnterTookIsNotPutBack) {
  enter();
  type("7");
  press(Qt::Key_Return);
  press(Qt::Key_Escape);
  EXPECT_EQ(kept(), "7 MPa");
  type("8,");
  press(Qt::Key_Escape);
  EXPECT_EQ(kept(), "7 MPa");
  EXPECT_EQ(field.edit().text(), "7 MPa");
  leave();
  EXPECT_EQ(steps(), 1);
}

TEST_F(EntryFieldTest, escapeWithNothingToPutBackGoesOn) {
  enter();
  QKeyEvent key(QEvent::KeyPress, Qt::Key_Escape, Qt::NoModifier);
  QCoreApplication::sendEvent(&field.edit(), &key);
  EXPECT_FALSE(key.isAccepted());
}

TEST_F(EntryFieldTest, aWrongTextIsExplainedAfterAPause) {
  QSignalSpy taken(&field, &EntryField::takenChanged);
  enter();
  type("12 kN*1,5");
  EXPECT_TRUE(field.isTaken());
  EXPECT_TRUE(QTest::qWaitFor([this] { return !field.isTaken(); }, 3 * EntryField::complaintPause));
  EXPECT_TRUE(field.edit().isWrong());
  EXPECT_TRUE(field.complaintText().contains("1,5")) << field.complaintText().toStdString();
  EXPECT_EQ(field.echoText(), "still 0.000 MPa");
  EXPECT_EQ(field.edit().selectedText(), "") << "typing goes on undisturbed";
  EXPECT_EQ(taken.count(), 1);
  EXPECT_TRUE(field.edit().accessibleDescription().contains("Not taken"));
}

TEST_F(EntryFieldTest, leavingExplainsAtOnceAndKeepsTheText) {
  enter();
  type("12 kN*1,5");
  leave();
  EXPECT_FALSE(field.isTaken());
  EXPECT_EQ(field.edit().text(), "12 kN*1,5");
  EXPECT_EQ(field.edit().selectedText(), "1,5");
  EXPECT_EQ(kept(), "0 MPa");
  EXPECT_EQ(steps(), 0);
}

TEST_F(EntryFieldTest, enterOnAWrongTextSelectsThePiece) {
  enter();
  type("3 bananas");
  press(Qt::Key_Return);
  EXPECT_FALSE(field.isTaken());
  EXPECT_EQ(field.edit().selectedText(), "bananas");
}

TEST_F(EntryFieldTest, mendingTakesTheMessageAway) {
  enter();
  type("1,5");
  leave();
  field.focusProblem();
  EXPECT_TRUE(field.edit().hasFocus());
  EXPECT_EQ(field.edit().selectedText(), "1,5");
  type("1.5");
  EXPECT_TRUE(field.isTaken());
  EXPECT_EQ(field.complaintText(), "");
  leave();
  EXPECT_EQ(kept(), "1.5 MPa");
}

TEST_F(EntryFieldTest, theMessageHasItsOwnLines) {
  const int before = field.sizeHint().height();
  const QRect line = field.edit().geometry();
  enter();
  type("1,5");
  leave();
  window.layout()->activate();
  EXPECT_GT(field.sizeHint().height(), before);
  EXPECT_EQ(field.edit().geometry(), line);
}

TEST_F(EntryFieldTest, aChangeElsewhereLeavesTheDraft) {
  enter();
  type("1,5");
  leave();
  desk.request({Type{{Spot::reading, "P1", {}}, "30"}}, desk.newGesture(), {});
  EXPECT_EQ(field.edit().text(), "1,5");
  EXPECT_FALSE(field.isTaken());
}

TEST_F(EntryFieldTest, aDragReplacesTheDraftAndSaysSo) {
  desk.request({Type{sx, "12 kN/(3 mm*2 mm)"}}, desk.newGesture(), {});
  field.refresh();
  enter();
  type("1,5");
  leave();
  const Gesture drag = desk.newGesture();
  desk.request({Type{sx, "5 MPa"}}, drag, {});
  desk.request({Type{sx, "6 MPa"}}, drag, {});
  EXPECT_EQ(field.edit().text(), "6 MPa");
  EXPECT_TRUE(field.isTaken());
  EXPECT_EQ(field.edit().toolTip(), "before the drag: 12 kN/(3 mm*2 mm)");
  desk.undoStack()->undo();
  EXPECT_EQ(field.edit().text(), "12 kN/(3 mm*2 mm)");
  EXPECT_EQ(field.edit().toolTip(), "");
}

TEST_F(EntryFieldTest, onlyADragSaysThatItWasOne) {
  desk.request({Type{sx, "5 MPa"}}, desk.newCommand(), {});
  EXPECT_EQ(field.edit().text(), "5 MPa");
  EXPECT_EQ(field.edit().toolTip(), "") << "pasted, or chosen in a menu";
}

TEST_F(EntryFieldTest, typingAfterADragTakesTheNoteAway) {
  desk.request({Type{sx, "5 MPa"}}, desk.newGesture(), {});
  EXPECT_NE(field.edit().toolTip(), "");
  enter();
  type("4");
  leave();
  EXPECT_EQ(field.edit().toolTip(), "");
}

TEST_F(EntryFieldTest, undoDuringAStayBeginsAnotherStep) {
  enter();
  type("7");
  press(Qt::Key_Return);
  desk.undoStack()->undo();
  EXPECT_EQ(field.edit().text(), "0 MPa");
  field.edit().selectAll();
  type("8");
  leave();
  EXPECT_EQ(kept(), "8 MPa");
  EXPECT_EQ(steps(), 1);
  desk.undoStack()->undo();
  EXPECT_EQ(kept(), "0 MPa");
}

TEST_F(EntryFieldTest, aLongTextShowsItsStartWhileNobodyTypes) {
  desk.request({Type{sx, "1.35*12.5 kN/(90 mm*240 mm) + 1.5*3.25 kN/(90 mm*240 mm)"}}, desk.newGesture(), {});
  EXPECT_EQ(field.edit().cursorPosition(), 0);
  enter();
  type("1.35*12.5 kN/(90 mm*240 mm) + 1.5*4.25 kN/(90 mm*240 mm)");
  EXPECT_GT(field.edit().cursorPosition(), 0);
  leave();
  EXPECT_EQ(field.edit().cursorPosition(), 0);
}

TEST_F(EntryFieldTest, theWheelChangesNothing) {
  enter();
  QWheelEvent wheel({5, 5}, {5, 5}, {}, {0, 120}, Qt::NoButton, Qt::NoModifier, Qt::NoScrollPhase, false);
  QCoreApplication::sendEvent(&field.edit(), &wheel);
  EXPECT_EQ(field.edit().text(), "0 MPa");
  EXPECT_EQ(kept(), "0 MPa");
}

TEST_F(EntryFieldTest, saysWhatItIs) {
  EXPECT_EQ(field.edit().accessibleName(), QString::fromUtf8("σx, normal stress on the x face"));
  EXPECT_EQ(field.edit().accessibleDescription(), "= 0.000 MPa");
}

TEST(EntryFieldEnd, aFieldMayGoWhileItIsTypedInto) {
  Desk desk(newStudy());
  QWidget window;
  auto* field = new EntryField(desk, stressBinding(), {rowOf(Spot::sx).label, {}}, &window);
  window.show();
  window.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&window));
  field->edit().setFocus();
  QTest::keyClicks(&field->edit(), "1,5");
  delete field;
  EXPECT_EQ(textAt(desk.study(), sx), "0 MPa");
}

/// Where the fibre lies, which has to be in the section.
struct RefusedPlace : testing::Test {
  Desk desk{
      *edited(newStudy(), Edits{Insert{{Spot::section, "beam", {}}, {}}, Insert{{Spot::fibre, "P1", {}}, {}},
                                Type{{Spot::fibreSection, "P1", {}}, "beam"}})};
  EntryField field{desk,
                   boundTo([](const Study&) {
                     return Place{Spot::fibreY, "P1", {}};
                   }),
                   {rowOf(Spot::fibreY).label, {}}};
  RefusedPlace() {
    field.edit().selectAll();
    QTest::keyClicks(&field.edit(), "250");
    QTest::keyClick(&field.edit(), Qt::Key_Return);
    EXPECT_FALSE(field.isTaken());
  }
  void makeHeight(const char* text) {
    EXPECT_FALSE(desk.request({Type{{Spot::size, "beam", "h"}, text}}, desk.newGesture(), {}));
  }
  std::string y() const { return *textAt(desk.study(), {Spot::fibreY, "P1", {}}); }
};

TEST_F(RefusedPlace, isTakenAsSoonAsAnotherEntryMakesItRight) {
  makeHeight("400");
  QCoreApplication::processEvents();
  EXPECT_FALSE(field.isTaken()) << "not enough yet";
  makeHeight("600");
  QCoreApplication::processEvents();
  EXPECT_TRUE(field.isTaken());
  EXPECT_EQ(y(), "250 mm");
  EXPECT_EQ(desk.undoStack()->count(), 3);
  desk.undoStack()->undo();
  EXPECT_EQ(y(), "0 mm") << "a step of its own";
}

TEST_F(RefusedPlace, isTakenAlsoWhereTheOtherEntryMovedTheFibre) {
  EXPECT_FALSE(desk.request({Type{{Spot::size, "beam", "h"}, "600"}, Type{{Spot::fibreY, "P1", {}}, "-300"}},
                            desk.newCommand(), {}));
  QCoreApplication::processEvents();
  EXPECT_TRUE(field.isTaken());
  EXPECT_EQ(y(), "250 mm");
}

TEST_F(RefusedPlace, waitsForEnterWhereAnUndoMakesItRight) {
  makeHeight("600");
  makeHeight("200");
  QCoreApplication::processEvents();
  ASSERT_FALSE(field.isTaken());
  desk.undoStack()->undo();
  QCoreApplication::processEvents();
  EXPECT_EQ(y(), "0 mm");
  EXPECT_TRUE(desk.undoStack()->canRedo());
  EXPECT_TRUE(field.complaintText().contains("can be taken")) << field.complaintText().toStdString();
}

/// A field that follows the shown point.
TEST(EntryFieldPoint, aDraftStaysWithItsPoint) {
  Study study = *edited(
      newStudy(), Edits{Insert{{Spot::point, "P2", {}}, {}}, Insert{{Spot::caseStress, "P2", "G"}, {}}});
  Desk desk(study);
  EntryField field(desk, boundTo([](const Study& now) {
                     return Place{Spot::sx, shownPoint(now).name, "G"};
                   }),
                   {rowOf(Spot::sx).label, {}, true});
  QSignalSpy said(&desk, &Desk::said);
  field.edit().selectAll();
  QTest::keyClicks(&field.edit(), "1,5");
  QTest::keyClick(&field.edit(), Qt::Key_Return);
  ASSERT_FALSE(field.isTaken());
  desk.show("P2", {});
  EXPECT_TRUE(field.isTaken());
  EXPECT_EQ(field.edit().text(), "0 MPa");
  ASSERT_EQ(said.count(), 1);
  EXPECT_TRUE(said.front().front().toString().contains("1,5"));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "given_fixture.h"

#include <QMenu>
#include <QSignalSpy>
#include <QToolButton>

namespace planewright {
namespace {

QAction* actionOf(QAbstractButton& button, const QString& words) {
  QMenu* menu = static_cast<QToolButton&>(button).menu();
  Q_EMIT menu->aboutToShow();
  for (QAction* action : menu->actions())
    if (action->text().section('\t', 0, 0) == words)
      return action;
  return nullptr;
}

QString focusedName() {
  return QApplication::focusWidget() ? QApplication::focusWidget()->accessibleName().section(',', 0, 0)
                                     : QString();
}

TEST_F(GivenTest, beginsAtTheFirstComponentWithItsTextSelected) {
  panel.focusFirst();
  EXPECT_TRUE(field("σx").edit().hasFocus());
  EXPECT_EQ(field("σx").edit().selectedText(), "0 MPa");
}

TEST_F(GivenTest, tabGoesDownWhatIsTypedFirst) {
  panel.focusFirst();
  QStringList names;
  for (int i = 0; i < 7; ++i) {
    names += focusedName();
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
  }
  EXPECT_EQ(names.join("; "), QString::fromUtf8("σx; σy; τxy; angle φ; ± within; normal at; cut itself at"));
}

TEST_F(GivenTest, aDayOfTypingByKeyboardAlone) {
  panel.focusFirst();
  const auto keys = [](const char* text) {
    QTest::keyClicks(QApplication::focusWidget(), text);
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
  };
  for (const char* text : {"-18.6 kN/(90 mm*240 mm)", "0", "1.5*12 kN/(90 mm*240 mm)", "1 in 10", "3", "30"})
    keys(text);
  EXPECT_EQ(kept(Spot::sx, "P1", "G"), "-18.6 kN/(90 mm*240 mm)");
  EXPECT_EQ(kept(Spot::txy, "P1", "G"), "1.5*12 kN/(90 mm*240 mm)");
  EXPECT_EQ(firstLine().angle, "1 in 10");
  EXPECT_EQ(firstLine().tolerance, "3 deg");
  EXPECT_EQ(kept(Spot::reading), "30 deg");
  EXPECT_EQ(desk.undoStack()->count(), 5) << "0 over 0 MPa changes nothing";
}

TEST_F(GivenTest, aLineIsEchoedBothWays) {
  type("angle φ", "1 in 10");
  EXPECT_EQ(field("angle φ").echoText(), QString::fromUtf8("= 5.71° from +x, 1 in 10"));
  type("angle φ", "10");
  EXPECT_EQ(field("angle φ").echoText(), QString::fromUtf8("= 10.00° from +x, 1 in 5.67"));
  EXPECT_TRUE(says(QString::fromUtf8("The cut following it has its normal at −80.00°.")));
}

TEST_F(GivenTest, normalAndCutAreOnePlane) {
  type("normal at", "30");
  EXPECT_EQ(field("cut itself at").edit().text(), "-60 deg");
  type("cut itself at", "10");
  EXPECT_EQ(kept(Spot::reading), "-80 deg");
  EXPECT_EQ(field("normal at").edit().text(), "-80 deg");
  EXPECT_EQ(field("cut itself at").edit().text(), "10 deg");
  type("cut itself at", "1 in 1");
  EXPECT_EQ(kept(Spot::reading), "-45 deg");
}

TEST_F(GivenTest, aNormalTakesNoSlope) {
  type("normal at", "1 in 10");
  EXPECT_FALSE(field("normal at").isTaken());
  EXPECT_FALSE(field("normal at").complaintText().isEmpty());
  EXPECT_EQ(kept(Spot::reading), "0 deg");
}

TEST_F(GivenTest, goToTurnsTheReadingPlane) {
  type("σx", "10");
  type("τxy", "-3");
  QAction* principal = actionOf(button("Go to"), QString::fromUtf8("σ1"));
  ASSERT_NE(principal, nullptr);
  principal->trigger();
  EXPECT_NEAR(desk.readout().state().reading.tnt, 0, 1e-12);
  EXPECT_NEAR(desk.readout().state().reading.sn, desk.readout().state().circle.s1, 1e-12);
}

TEST_F(GivenTest, aNameThatRepeatsTheKindFollowsIt) {
  actionOf(button("kind of line"), "weld")->trigger();
  EXPECT_EQ(firstLine().kind, LineKind::weld);
  EXPECT_EQ(firstLine().name, "weld");
  actionOf(button("kind of line"), QString::fromUtf8("another name…"))->trigger();
  type("name", "seam A");
  EXPECT_EQ(firstLine().name, "seam A");
  actionOf(button("kind of line"), "bond")->trigger();
  EXPECT_EQ(firstLine().name, "seam A");
}

TEST_F(GivenTest, aSecondLineHasFieldsOfItsOwn) {
  button("Second line").click();
  ASSERT_EQ(desk.study().points.front().lines.size(), 2U);
  EXPECT_EQ(desk.study().points.front().lines.back().kind, LineKind::bond);
  EXPECT_EQ(desk.readout().lines.size(), 2U);
  desk.undoStack()->undo();
  EXPECT_EQ(desk.study().points.front().lines.size(), 1U);
}

TEST_F(GivenTest, aPointCanBeWithoutALine) {
  type("angle φ", "1 in 10");
  actionOf(button("kind of line"), "no line")->trigger();
  EXPECT_TRUE(desk.study().points.front().lines.empty());
  EXPECT_FALSE(field("angle φ").isVisible());
  actionOf(button("kind of line"), "fibre")->trigger();
  EXPECT_EQ(firstLine().name, "fibre");
  EXPECT_TRUE(field("angle φ").isVisible());
  EXPECT_EQ(field("angle φ").edit().text(), "0 deg");
  EXPECT_EQ(field("angle φ").edit().toolTip(), "") << "nothing was dragged";
  desk.undoStack()->undo();
  desk.undoStack()->undo();
  EXPECT_EQ(field("angle φ").edit().text(), "1 in 10");
}

TEST_F(GivenTest, anotherSenseKeepsTheDigitsAndSaysSo) {
  type("σx", "5");
  QSignalSpy said(&desk, &Desk::said);
  button("Conventions").click();
  button("compression positive").click();
  EXPECT_EQ(kept(Spot::positive, {}), "compression");
  EXPECT_EQ(kept(Spot::sx, "P1", "G"), "5 MPa");
  ASSERT_EQ(said.count(), 1);
  EXPECT_TRUE(said.front().front().toString().contains("keep their digits"));
  button("compression positive").click();
  EXPECT_EQ(said.count(), 1) << "the choice that stands is no change";
  desk.undoStack()->undo();
  EXPECT_TRUE(static_cast<QAbstractButton&>(button("tension positive")).isChecked());
}

TEST_F(GivenTest, unitsAreTyped) {
  button("Conventions").click();
  type("stress", "psi");
  EXPECT_EQ(desk.study().units.stress, "psi");
  EXPECT_TRUE(says("bare numbers in psi"));
  type("stress", "kN");
  EXPECT_FALSE(field("stress").isTaken());
  EXPECT_EQ(desk.study().units.stress, "psi");
}

TEST_F(GivenTest, entriesNotTakenAreCounted) {
  QSignalSpy counted(&panel, &GivenPanel::entriesNotTaken);
  type("τxy", "1,5");
  EXPECT_EQ(counted.back(), (QVariantList{1, QString::fromUtf8("τxy")}));
  type("normal at", "1,5");
  EXPECT_EQ(counted.back(), (QVariantList{2, QString::fromUtf8("τxy")}));
  type("τxy", "1.5");
  EXPECT_EQ(counted.back(), (QVariantList{1, QString::fromUtf8("normal at")}));
  type("normal at", "1.5");
  EXPECT_EQ(counted.back().front(), 0);
}

TEST_F(GivenTest, problemsAreVisitedInTurn) {
  button("Conventions").click();
  type("σy", "1,5");
  type("normal at", "2,5");
  type("length", "kN");
  button("Conventions").click();
  panel.focusFirst();
  QStringList there;
  for (int i = 0; i < 4; ++i) {
    panel.focusNextProblem();
    there += focusedName();
  }
  EXPECT_EQ(there.join("; "), QString::fromUtf8("σy; normal at; length; σy"));
  panel.focusPreviousProblem();
  EXPECT_EQ(focusedName(), "length");
  panel.focusPreviousProblem();
  EXPECT_EQ(focusedName(), "normal at");
  EXPECT_EQ(field("normal at").edit().selectedText(), "2,5");
}

TEST_F(GivenTest, withoutProblemsTheCursorStays) {
  panel.focusFirst();
  panel.focusNextProblem();
  EXPECT_TRUE(field("σx").edit().hasFocus());
}

TEST_F(GivenTest, whatIsRarelyNeededComesWhenWanted) {
  EXPECT_FALSE(field("σz").isVisible());
  EXPECT_FALSE(field("x axis at").isVisible());
  button("Third direction").click();
  EXPECT_TRUE(field("σz").edit().hasFocus());
  type("σz", "-4");
  EXPECT_EQ(kept(Spot::sz, "P1", "G"), "-4 MPa");
  desk.request({Type{{Spot::axes, "P1", {}}, "20"}}, desk.newGesture(), {});
  EXPECT_TRUE(field("x axis at").isVisible());
}

Study twoCases() {
  return *edited(newStudy(), Edits{Insert{{Spot::loadCase, "S", {}}, {}}, Type{{Spot::sx, "P1", "G"}, "2"},
                                   Insert{{Spot::combination, "1.35 G + 1.5 S", {}}, {}},
                                   Insert{{Spot::factor, "1.35 G + 1.5 S", "G"}, {}},
                                   Type{{Spot::factor, "1.35 G + 1.5 S", "G"}, "1.35"},
                                   Insert{{Spot::factor, "1.35 G + 1.5 S", "S"}, {}},
                                   Type{{Spot::factor, "1.35 G + 1.5 S", "S"}, "1.5"}});
}

TEST_F(GivenTest, severalCasesAreChosenInAStrip) {
  desk.replace(twoCases());
  EXPECT_EQ(field("σx").edit().text(), "2 MPa");
  EXPECT_TRUE(says("in 1.35 G + 1.5 S: 2.700"));
  button("case S").click();
  EXPECT_EQ(field("σx").edit().text(), "") << "the point does not list this case yet";
  type("σx", "10");
  EXPECT_EQ(kept(Spot::sx, "P1", "S"), "10 MPa");
  EXPECT_EQ(field("σy").edit().text(), "0 MPa");
  EXPECT_TRUE(says("in 1.35 G + 1.5 S: 17.70"));
  button("case G").click();
  EXPECT_EQ(field("σx").edit().text(), "2 MPa");
}

TEST_F(GivenTest, theStripOpensOnACaseThatActsWhereItIsShown) {
  const Study study =
      *edited(twoCases(), Edits{Insert{{Spot::combination, "1 S", {}}, {}},
                                Insert{{Spot::factor, "1 S", "S"}, {}}, Insert{{Spot::point, "P2", {}}, {}},
                                Insert{{Spot::caseStress, "P2", "S"}, {}}, Type{{Spot::sx, "P2", "S"}, "7"}});
  desk.replace(study);
  EXPECT_EQ(field("σx").edit().text(), "2 MPa") << "G, which P1 lists";
  desk.show("P2", "1.35 G + 1.5 S");
  EXPECT_EQ(field("σx").edit().text(), "7 MPa") << "S, which P2 lists";
  desk.show("P1", "1 S");
  EXPECT_EQ(field("σx").edit().text(), "") << "S, which alone acts";
  desk.show("P1", "1.35 G + 1.5 S");
  EXPECT_EQ(field("σx").edit().text(), "2 MPa");

  button("case S").click();
  EXPECT_EQ(field("σx").edit().text(), "") << "a choice stays";
  type("σy", "1");
  EXPECT_EQ(kept(Spot::sy, "P1", "S"), "1 MPa");
  desk.undoStack()->undo();
  EXPECT_TRUE(button("case S").isChecked());
  desk.show("P2", "1.35 G + 1.5 S");
  button("case G").click();
  desk.show("P2", "1 S");
  EXPECT_TRUE(button("case S").isChecked());
}

TEST_F(GivenTest, aCaseThatThePointLacksIsSaidToCountAsZero) {
  const QString caution = QStringLiteral("No stresses are given for case S: it counts as 0.");
  EXPECT_FALSE(says(caution));
  desk.replace(twoCases());
  EXPECT_TRUE(says(caution)) << "the sum in 1.35 G + 1.5 S is without it";
  button("case S").click();
  type("σx", "10");
  EXPECT_FALSE(says(caution));
}

TEST_F(GivenTest, escapeTakesBackACaseThatTheStayMade) {
  const Study before = twoCases();
  desk.replace(before);
  button("case S").click();
  field("σx").edit().setFocus(Qt::TabFocusReason);
  QTest::keyClicks(&field("σx").edit(), "10");
  ASSERT_TRUE(QTest::qWaitFor([&] { return kept(Spot::sx, "P1", "S") == "10 MPa"; }));
  QTest::keyClick(&field("σx").edit(), Qt::Key_Escape);
  EXPECT_EQ(desk.study(), before);
  EXPECT_EQ(field("σx").edit().text(), "");
  EXPECT_EQ(desk.undoStack()->count(), 0);
}

TEST_F(GivenTest, anEntryNotTakenNamesItsCase) {
  desk.replace(twoCases());
  QSignalSpy counted(&panel, &GivenPanel::entriesNotTaken);
  button("case S").click();
  type("τxy", "1,5");
  EXPECT_EQ(counted.back(), (QVariantList{1, QString::fromUtf8("τxy of case S")}));
}

TEST_F(GivenTest, aSingleCaseNeedsNoSumLine) {
  EXPECT_FALSE(says("in G:"));
}

TEST_F(GivenTest, foldedGroupsKeepOneLine) {
  type("angle φ", "1 in 10");
  type("± within", "3");
  button("Line").click();
  EXPECT_FALSE(field("angle φ").isVisible());
  EXPECT_TRUE(says(QString::fromUtf8("grain, 1 in 10 ± 3 deg")));
  button("Line").click();
  EXPECT_TRUE(field("angle φ").isVisible());
}

TEST_F(GivenTest, saysItsKeys) {
  EXPECT_TRUE(panel.property("areaKeys").toString().contains("F8"));
}

} // namespace
} // namespace planewright

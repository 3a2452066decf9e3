// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/given/given_fixture.h"

#include "core/study/fibre_of_state.h"
#include "ui/given/section_group.h"
#include "ui/given/section_view.h"

#include <QMenu>
#include <QSignalSpy>
#include <QToolButton>

namespace planewright {
namespace {

struct SourcesTest : GivenTest {
  void choose(const QString& menuOf, const QString& words) {
    QMenu* menu = dynamic_cast<QToolButton&>(button(menuOf)).menu();
    Q_EMIT menu->aboutToShow();
    for (QAction* action : menu->actions())
      if (action->text().startsWith(words))
        return action->trigger();
    ADD_FAILURE() << words.toStdString() << " is not in the menu";
  }
  const Point& point() const { return desk.study().points.front(); }
  const ForceTexts& forces() const { return *point().stress.front().forces; }
  SectionView& view() { return *panel.findChild<SectionView*>(); }
  QPoint at(double y, double z) { return view().pointAt(y, z).value().toPoint(); }
};

TEST_F(SourcesTest, sectionForcesBringASectionAndAddToTheStresses) {
  choose("Add a source", "section forces");
  ASSERT_TRUE(point().fibre);
  ASSERT_TRUE(point().stress.front().forces);
  EXPECT_EQ(point().fibre->section, "section 1");
  EXPECT_EQ(point().fibre->y, "-100 mm");
  type("N", "40");
  type("Mz", "10");
  EXPECT_EQ(forces().N, "40 kN");
  EXPECT_EQ(forces().Mz, "10 kN*m");
  const double inertia = 100.0 * 200 * 200 * 200 / 12;
  EXPECT_NEAR(desk.readout().state().stress.sx, 40e3 / 20000 + 10e6 * 100 / inertia, 1e-9);
  EXPECT_TRUE(says("in all"));
  EXPECT_TRUE(says("bending"));
  EXPECT_EQ(field("σx").echoText(), "= 0.00 MPa");
  desk.undoStack()->undo();
  desk.undoStack()->undo();
  desk.undoStack()->undo();
  EXPECT_FALSE(point().fibre) << "section, fibre and forces came as one step";
}

TEST_F(SourcesTest, tabGoesFromTheSourcesThroughTheSectionToTheLine) {
  choose("Add a source", "section forces");
  QStringList names;
  for (int i = 0; i < 11; ++i) {
    names += QApplication::focusWidget()->accessibleName().section(',', 0, 0);
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
  }
  EXPECT_EQ(names.join("; "), QString::fromUtf8("N; Vy; Vz; T; My; Mz; b; h; y; z; angle φ"));
}

TEST_F(SourcesTest, theKeysStayInTheGroupWhereAFieldGoes) {
  choose("Add a source", "section forces");
  desk.request({Insert{{Spot::point, "P2", {}}, {}}}, desk.newCommand(), {});
  ASSERT_TRUE(field("N").edit().hasFocus());
  desk.show("P2", {});
  EXPECT_FALSE(field("N").isVisible());
  EXPECT_TRUE(field("σx").edit().hasFocus());
  desk.show("P1", {});
  field("y").edit().setFocus(Qt::TabFocusReason);
  desk.show("P2", {});
  EXPECT_TRUE(button("section of the point").hasFocus()) << "no field of another thing";
}

TEST_F(SourcesTest, typedStressesAreAPartOfTheirOwn) {
  choose("Add a source", "section forces");
  type("σx", "1");
  type("N", "40");
  EXPECT_TRUE(says("typed 1.000, axial 2.000, bending 0.000"));
}

TEST_F(SourcesTest, aSizeKeepsTheFibreAtItsReadyPlace) {
  choose("Add a source", "section forces");
  type("h", "600");
  EXPECT_EQ(desk.study().sections.front().sizes.back().text, "600 mm");
  EXPECT_EQ(point().fibre->y, "-300 mm");
  type("h", "-5");
  EXPECT_FALSE(field("h").complaintText().isEmpty());
  EXPECT_EQ(desk.study().sections.front().sizes.back().text, "600 mm");
}

TEST_F(SourcesTest, aShapeBringsItsOwnSizes) {
  choose("Add a source", "section forces");
  choose("shape of the section", "round tube");
  EXPECT_EQ(desk.study().sections.front().shape, SectionShape::tube);
  type("d", "300");
  EXPECT_EQ(desk.study().sections.front().sizes.front().text, "300 mm");
  EXPECT_EQ(point().fibre->y, "-150 mm");
  choose("shape of the section", "built of rectangles");
  button("Add a block").click();
  EXPECT_EQ(desk.study().sections.front().sizes.size(), 10U);
  button("Remove the last").click();
  EXPECT_EQ(desk.study().sections.front().sizes.size(), 5U);
}

TEST_F(SourcesTest, sizesAndPlacesSayWhatTheyComeTo) {
  choose("Add a source", "section forces");
  type("h", "2*120 mm");
  EXPECT_EQ(field("h").echoText(), "= 240.0 mm");
  type("h", "240");
  EXPECT_EQ(field("h").echoText(), "");
  choose("shape of the section", "tabled values");
  type("A", "2*1e4 mm^2");
  EXPECT_EQ(field("A").echoText(), "= 20000 mm^2");
}

TEST_F(SourcesTest, theMarkIsPulledThroughTheSectionAsOneStep) {
  choose("Add a source", "section forces");
  QCoreApplication::processEvents(); // the drawing gets its room
  const int steps = desk.undoStack()->count();
  QTest::mousePress(&view(), Qt::LeftButton, Qt::NoModifier, at(-100, 0));
  QTest::mouseMove(&view(), at(-60, 20));
  QTest::mouseMove(&view(), at(30, 10));
  QTest::mouseRelease(&view(), Qt::LeftButton, Qt::NoModifier, at(30, 10));
  EXPECT_EQ(desk.undoStack()->count(), steps + 1);
  const LoadedSection loaded = *loadedSectionOf(desk.study(), desk.readout(), desk.readout().state());
  EXPECT_NEAR(loaded.fibre.y, 30, 3);
  EXPECT_NEAR(loaded.fibre.z, 10, 3);
}

TEST_F(SourcesTest, theMarkMovesByKeysAndGoesToReadyPlaces) {
  choose("Add a source", "section forces");
  view().setFocus();
  QTest::keyClick(&view(), Qt::Key_Up);
  EXPECT_EQ(point().fibre->y, "-99 mm");
  QTest::keyClick(&view(), Qt::Key_Up, Qt::ControlModifier);
  EXPECT_EQ(point().fibre->y, "-89 mm");
  QTest::keyClick(&view(), Qt::Key_PageDown);
  EXPECT_EQ(point().fibre->y, "100 mm") << "the first ready place";
  choose("Ready places", "axis, middle");
  EXPECT_EQ(point().fibre->y, "0 mm");
}

TEST_F(SourcesTest, theMarkMovesInTheUnitOfTheStudy) {
  ASSERT_FALSE(desk.request({Type{{Spot::unitLength, {}, {}}, "in"}}, desk.newGesture(), "unit"));
  choose("Add a source", "section forces");
  type("h", "8 in");
  view().setFocus();
  EXPECT_EQ(point().fibre->y, "-4 in");
  QTest::keyClick(&view(), Qt::Key_Up);
  EXPECT_EQ(point().fibre->y, "-3.99 in");
  QTest::keyClick(&view(), Qt::Key_Up, Qt::ControlModifier);
  EXPECT_EQ(point().fibre->y, "-3.89 in");
  EXPECT_TRUE(view().accessibleDescription().startsWith(QString::fromUtf8("fibre at y = −3.890 in")))
      << view().accessibleDescription().toStdString();
}

TEST_F(SourcesTest, theWorstFibreIsNamedAndGoneTo) {
  choose("Add a source", "section forces");
  type("Mz", "10");
  choose("Ready places", "axis, middle");
  choose("Worst fibre", "greatest tension");
  EXPECT_EQ(point().fibre->y, "-100 mm");
}

TEST_F(SourcesTest, theWorstFibreIsWrittenAsItIsRead) {
  choose("Add a source", "section forces");
  choose("shape of the section", "T section");
  type("Mz", "10");
  type("Vy", "30");
  choose("Worst fibre", "greatest shear");
  EXPECT_LE(point().fibre->y.size(), std::string("-1234.567 mm").size()) << point().fibre->y;
}

TEST_F(SourcesTest, aSectionThatComesWithTheForcesIsTold) {
  QSignalSpy said(&desk, &Desk::said);
  choose("Add a source", "section forces");
  ASSERT_FALSE(said.isEmpty());
  EXPECT_TRUE(said.back().front().toString().contains("rectangle 100 mm × 200 mm"))
      << said.back().front().toString().toStdString();
}

TEST_F(SourcesTest, aFactoredCaseTakesNoRosette) {
  ASSERT_FALSE(
      desk.request({Insert{{Spot::combination, "1.35 G", {}}, {}}, Insert{{Spot::factor, "1.35 G", "G"}, {}},
                    Type{{Spot::factor, "1.35 G", "G"}, "1.35"}},
                   desk.newCommand(), {}));
  QSignalSpy said(&desk, &Desk::said);
  choose("Add a source", "strain rosette");
  ASSERT_EQ(said.count(), 1);
  EXPECT_TRUE(said.back().front().toString().contains("a case of its own"));
  EXPECT_FALSE(point().stress.front().rosette);
}

TEST_F(SourcesTest, theLimitsOfWhatIsTypedAreSaidWhereItDoesNotAct) {
  desk.request({Insert{{Spot::loadCase, "Q", {}}, {}}, Insert{{Spot::caseStress, "P1", "Q"}, {}},
                Insert{{Spot::pressure, "P1", "Q"}, {}}, Type{{Spot::pressureP, "P1", "Q"}, "1 MPa"},
                Type{{Spot::pressureT, "P1", "Q"}, "100 mm"}, Insert{{Spot::combination, "1 G", {}}, {}},
                Insert{{Spot::factor, "1 G", "G"}, {}}, Type{{Spot::factor, "1 G", "G"}, "1"}},
               desk.newCommand(), {});
  desk.show("P1", "1 G");
  EXPECT_FALSE(says("is below 10"));
  button("case Q").click();
  EXPECT_TRUE(says("is below 10"));
}

TEST_F(SourcesTest, whatTheoryDoesNotGiveIsSaidInPlace) {
  choose("Add a source", "section forces");
  type("T", "2");
  EXPECT_FALSE(field("T").complaintText().isEmpty());
  EXPECT_EQ(forces().T, "0 kN*m");
}

TEST_F(SourcesTest, aRosetteMakesItsCaseAMeasuredOne) {
  QSignalSpy said(&desk, &Desk::said);
  choose("Add a source", "strain rosette");
  EXPECT_EQ(said.count(), 1);
  EXPECT_TRUE(said.back().front().toString().startsWith("Case G is a measured one now"));
  EXPECT_EQ(desk.study().cases.front().nature, Nature::measured);
  type("εa", "100");
  EXPECT_EQ(point().stress.front().rosette->strainA, "100 ustrain");
  EXPECT_NE(desk.readout().state().stress.sx, 0);
  EXPECT_TRUE(field("E").isVisible());
  choose("material under the gauges", "with a line");
  EXPECT_FALSE(field("E").isVisible());
  EXPECT_TRUE(field("G").isVisible());
  button("remove strain rosette").click();
  EXPECT_FALSE(point().stress.front().rosette);
}

TEST_F(SourcesTest, pressureHasItsEndsAsAChoice) {
  choose("Add a source", "pressure in a thin wall");
  type("p", "2");
  EXPECT_NEAR(desk.readout().state().stress.sy, 2 * 500 / 10.0, 1e-9);
  choose("ends of the vessel", "open ends");
  EXPECT_EQ(desk.readout().state().stress.sx, 0);
}

TEST_F(SourcesTest, aFreeEdgeSaysWhatIsLeftThere) {
  type("σx", "10");
  button("Free edge").click();
  type("free edge at", "0");
  EXPECT_TRUE(says("carries nothing"));
  type("τxy", "2");
  EXPECT_TRUE(says("are left"));
}

} // namespace
} // namespace planewright

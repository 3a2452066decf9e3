// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/circle/panel.h"

#include "core/quantity/expression.h"
#include "core/table/table.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Angle degrees(double value) {
  return Angle::fromDegrees(value);
}

double valueOf(const std::string& typed) {
  return readEntry(typed, {dimension::stress, *readUnit("MPa", dimension::stress)})->value;
}

TEST(ReadingDrag, ABurstOfMovesEndsAtThePointer) {
  Panel panel(studyOf());
  panel.press(*panel.plot.handleAt(Handle::reading));
  for (int i = 1; i <= 10; ++i)
    panel.move(panel.markOf(degrees(25 + 2.6 * i)), Qt::ControlModifier);
  panel.release(panel.markOf(degrees(51)));
  EXPECT_NEAR(panel.reading(), 51, 0.06);
}

TEST(ReadingDrag, GoesTheWayOfThePointerInBothConventions) {
  for (const ShearAxis axis : {ShearAxis::tensorDown, ShearAxis::tensorUp}) {
    Study study = studyOf();
    study.convention.shearAxis = axis;
    Panel panel(study);
    for (const double normal : {-80.0, 3.4, 88.0}) {
      panel.press(*panel.plot.handleAt(Handle::reading));
      panel.move(panel.markOf(degrees(normal)), Qt::ControlModifier);
      panel.release({});
      EXPECT_NEAR(panel.reading(), normal, 0.06);
    }
  }
}

TEST(ReadingDrag, OnlyTheAngleOfThePointerCounts) {
  Panel panel(studyOf());
  const QPointF centre = panel.plot.round().centre;
  panel.press(*panel.plot.handleAt(Handle::reading));
  panel.move(centre + 0.3 * (panel.markOf(degrees(40.5)) - centre), Qt::ControlModifier);
  EXPECT_NEAR(panel.reading(), 40.5, 0.1);
  panel.move(centre + 3 * (panel.markOf(degrees(-33.5)) - centre), Qt::ControlModifier);
  EXPECT_NEAR(panel.reading(), -33.5, 0.1);
}

TEST(ReadingDrag, APressBesideTheMarkDoesNotMoveIt) {
  Panel panel(studyOf());
  const QPointF beside = *panel.plot.handleAt(Handle::reading) + QPointF(6, -5);
  panel.press(beside);
  panel.move(beside);
  panel.release(beside);
  EXPECT_EQ(panel.reading(), 25);
  EXPECT_EQ(panel.steps(), 0);
}

TEST(ReadingDrag, IsOneStepOfUndo) {
  Panel panel(studyOf());
  panel.press(*panel.plot.handleAt(Handle::reading));
  for (int i = 1; i <= 20; ++i)
    panel.move(panel.markOf(degrees(25 + i)));
  panel.release({});
  EXPECT_EQ(panel.steps(), 1);
  panel.drag(Handle::reading, panel.markOf(degrees(-10)));
  EXPECT_EQ(panel.steps(), 2);
  panel.desk.undoStack()->undo();
  panel.desk.undoStack()->undo();
  EXPECT_EQ(panel.desk.study(), studyOf());
}

TEST(ReadingDrag, SnapsToNamedDirectionsWithinSixPixelsOfArc) {
  Panel panel(studyOf());
  const double principal = panel.desk.readout().state().circle.theta1->value.degrees();
  const Round round = panel.plot.round();
  const double reach = round.turnAlong(6).degrees();
  panel.drag(Handle::reading, panel.markOf(degrees(principal - 0.8 * reach)));
  EXPECT_EQ(panel.reading(), principal);
  EXPECT_DOUBLE_EQ(panel.desk.readout().state().reading.tnt, 0);
  panel.drag(Handle::reading, panel.markOf(degrees(principal - 1.3 * reach)));
  EXPECT_NEAR(panel.reading(), principal - 1.3 * reach, 0.3);
  EXPECT_NE(panel.reading(), principal);
}

TEST(ReadingDrag, ControlIsFreeAndShiftATenth) {
  Panel panel(studyOf());
  panel.press(*panel.plot.handleAt(Handle::reading));
  panel.move(panel.markOf(degrees(30.3)), Qt::ControlModifier);
  EXPECT_NEAR(panel.reading(), 30.3, 0.06);
  panel.move(panel.markOf(degrees(40.3)), Qt::ShiftModifier);
  EXPECT_NEAR(panel.reading(), 31.3, 0.02);
}

TEST(ReadingDrag, EscapePutsBackTheTypedText) {
  Study study = studyOf();
  study.points.front().reading = "(50/2) deg";
  Panel panel(study);
  panel.press(*panel.plot.handleAt(Handle::reading));
  panel.move(panel.markOf(degrees(70)));
  panel.key(Qt::Key_Escape);
  EXPECT_FALSE(panel.plot.isDragging());
  EXPECT_EQ(panel.desk.study(), study);
  EXPECT_EQ(panel.steps(), 0);
  panel.move(panel.markOf(degrees(10)));
  EXPECT_EQ(panel.desk.study(), study) << "a move after Escape is not a drag";
}

TEST(ReadingDrag, EndsWhenTheReleaseWentElsewhere) {
  Panel panel(studyOf());
  panel.press(*panel.plot.handleAt(Handle::reading));
  panel.move(panel.markOf(degrees(40)));
  const double there = panel.reading();
  panel.hover(panel.markOf(degrees(70)));
  EXPECT_FALSE(panel.plot.isDragging());
  EXPECT_EQ(panel.reading(), there);
}

TEST(ReadingDrag, AStateWithoutACircleHasNothingToTurnBy) {
  Panel panel(studyOf("5 MPa", "5 MPa", "0 MPa"));
  panel.press(*panel.plot.handleAt(Handle::reading));
  EXPECT_FALSE(panel.plot.isDragging());
}

TEST(Ear, StandsOutsideTheXMarkAndNeverOnTheReadingMark) {
  Panel panel(studyOf("80 MPa", "20 MPa", "-30 MPa", "0 deg"));
  const QPointF ear = *panel.plot.handleAt(Handle::ear);
  const QPointF mark = panel.markOf(Angle());
  const QPointF centre = panel.plot.round().centre;
  EXPECT_GE(std::hypot(ear.x() - mark.x(), ear.y() - mark.y()), 13);
  EXPECT_GT(std::hypot(ear.x() - centre.x(), ear.y() - centre.y()), panel.plot.round().radius + 12);
  EXPECT_EQ(*panel.plot.handleAt(Handle::reading), mark);
}

TEST(Ear, EachPressMovesItsOwnHandleOnly) {
  for (const double reading : {0.0, 3.0, -3.0, 90.0}) {
    Panel panel(studyOf("80 MPa", "20 MPa", "-30 MPa", std::to_string(reading) + " deg"));
    panel.drag(Handle::ear, *panel.plot.handleAt(Handle::ear) + QPointF(20, 10));
    EXPECT_EQ(panel.reading(), reading);
    const CaseStress stress = panel.typed();
    EXPECT_NE(stress.sx, "80 MPa");
    panel.drag(Handle::reading, panel.markOf(degrees(reading + 20)));
    EXPECT_EQ(panel.typed(), stress);
    EXPECT_NE(panel.reading(), reading);
  }
}

TEST(Ear, BringsTheXMarkUnderThePointer) {
  for (const ShearAxis axis : {ShearAxis::tensorDown, ShearAxis::tensorUp}) {
    Study study = studyOf("160 kN/(2000 mm^2)", "20 MPa", "-30 MPa");
    study.convention.shearAxis = axis;
    Panel panel(study);
    const EqualScale scale = panel.plot.scale();
    const QPointF target = panel.markOf(Angle()) + QPointF(35, -22);
    const QPointF ear = *panel.plot.handleAt(Handle::ear);
    panel.press(ear);
    for (int i = 1; i <= 7; ++i)
      panel.move(ear + QPointF(5, -22.0 / 7) * i);
    EXPECT_EQ(panel.plot.scale(), scale) << "the axes stand still in a drag";
    const QPointF now = panel.markOf(Angle());
    EXPECT_NEAR(now.x(), target.x(), 0.5);
    EXPECT_NEAR(now.y(), target.y(), 0.5);
    panel.release({});
    EXPECT_EQ(panel.steps(), 1);
    EXPECT_EQ(panel.typed().sy, "20 MPa");
    panel.desk.undoStack()->undo();
    EXPECT_EQ(panel.typed().sx, "160 kN/(2000 mm^2)");
  }
}

TEST(Ear, TypesNumbersAsFineAsThePixelsInTheStudysUnit) {
  Study study = studyOf("11 ksi", "2 ksi", "-4 ksi");
  study.units.stress = "ksi";
  Panel panel(study);
  panel.drag(Handle::ear, *panel.plot.handleAt(Handle::ear) + QPointF(13, 17));
  EXPECT_TRUE(panel.typed().sx.ends_with(" ksi")) << panel.typed().sx;
  EXPECT_LE(panel.typed().sx.size(), std::string("11.34 ksi").size()) << panel.typed().sx;
  EXPECT_GT(valueOf(panel.typed().sx), valueOf("11 ksi"));
}

TEST(Ear, WhatStandsStillKeepsItsTypedText) {
  Panel panel(studyOf("160 kN/(2000 mm^2)", "20 MPa", "-30.0 MPa"));
  panel.drag(Handle::ear, *panel.plot.handleAt(Handle::ear) + QPointF(24, 0));
  EXPECT_NE(panel.typed().sx, "160 kN/(2000 mm^2)");
  EXPECT_EQ(panel.typed().txy, "-30.0 MPa");
}

TEST(Ear, AnUnsteadyClickChangesNothing) {
  const Study study = studyOf("160 kN/(2000 mm^2)", "20 MPa", "-30 MPa");
  Panel panel(study);
  const QPointF ear = *panel.plot.handleAt(Handle::ear);
  for (const QPointF slip : {QPointF(1, 0), QPointF(0, 3), QPointF(-2, 2)})
    panel.drag(Handle::ear, ear + slip);
  EXPECT_EQ(panel.desk.study(), study);
  panel.press(ear);
  panel.move(ear + QPointF(4, 0));
  EXPECT_NE(panel.desk.study(), study);
  panel.move(ear + QPointF(2, 0));
  EXPECT_NE(panel.desk.study(), study) << "a drag goes on also near its start";
  panel.move(ear);
  EXPECT_EQ(panel.desk.study(), study) << "at its start stands what was typed";
  panel.release(ear);
  EXPECT_EQ(panel.steps(), 0);
}

TEST(Ear, EscapeRestoresWhatWasTyped) {
  const Study study = studyOf("160 kN/(2000 mm^2)", "20 MPa", "-30 MPa");
  Panel panel(study);
  const EqualScale scale = panel.plot.scale();
  panel.press(*panel.plot.handleAt(Handle::ear));
  panel.move({30, 30});
  EXPECT_NE(panel.desk.study(), study);
  panel.key(Qt::Key_Escape);
  EXPECT_EQ(panel.desk.study(), study);
  EXPECT_EQ(panel.steps(), 0);
  EXPECT_EQ(panel.plot.scale(), scale);
}

TEST(Ear, TheAxesAreFittedAnewOnRelease) {
  Panel panel(studyOf());
  const EqualScale scale = panel.plot.scale();
  const QPointF far = *panel.plot.handleAt(Handle::ear) + QPointF(120, 200);
  panel.press(*panel.plot.handleAt(Handle::ear));
  panel.move(far);
  EXPECT_EQ(panel.plot.scale(), scale);
  panel.release(far);
  EXPECT_FALSE(panel.plot.scale() == scale);
}

TEST(Ear, ExistsForOneCaseWithFactorOneOnly) {
  Study study = studyOf();
  study.combinations.push_back({"1.0 G", {{study.cases.front().id, "1"}}, Basis::design});
  study.combinations.push_back({"1.35 G", {{study.cases.front().id, "1.35"}}, Basis::design});
  study.shown.combination = "1.0 G";
  Panel panel(study);
  EXPECT_TRUE(panel.plot.handleAt(Handle::ear));
  EXPECT_TRUE(panel.plot.tipAt(*panel.plot.handleAt(Handle::ear))
                  .contains(fromUtf8("case " + study.cases.front().id)));
  panel.desk.show("P1", "1.35 G");
  EXPECT_FALSE(panel.plot.handleAt(Handle::ear));
  EXPECT_TRUE(panel.plot.tipAt(panel.markOf(Angle())).contains("1.35 G"));
}

TEST(Ear, DrawsACircleOutOfZeroStress) {
  Panel panel(newStudy());
  ASSERT_TRUE(panel.plot.handleAt(Handle::ear));
  panel.drag(Handle::ear, *panel.plot.handleAt(Handle::ear) + QPointF(60, 0));
  EXPECT_GT(panel.plot.round().radius, 0);
  EXPECT_GT(panel.desk.readout().state().stress.sx, 0);
  EXPECT_EQ(panel.desk.readout().state().stress.txy, 0);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_model.h"

#include "planes_fixture.h"
#include "ui/look/look.h"

#include <QAbstractItemModelTester>
#include <QSignalSpy>

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

using Tester = QAbstractItemModelTester;

struct PlanesModelTest : testing::Test {
  Desk desk{planesStudy()};
  PlanesModel model{desk};
  Tester tester{&model, Tester::FailureReportingMode::Fatal};

  QModelIndex at(int row, PlaneColumn column) const { return model.index(row, static_cast<int>(column)); }
  QString words(int row, PlaneColumn column) const { return at(row, column).data().toString(); }
  bool enter(int row, PlaneColumn column, const char* typed) {
    return !model.enter(at(row, column), QString::fromUtf8(typed));
  }
  std::string kept(Spot spot, const std::string& item = {}) const {
    return textAt(desk.study(), {spot, "P1", item}).value_or("nothing");
  }
  QString note(int row = reading) const { return shown(model.noteOf(row).words); }
  const StateReading& state() const { return desk.readout().state(); }
};

TEST_F(PlanesModelTest, rowsStandInTheirFixedOrder) {
  ASSERT_EQ(model.rowCount(), 11);
  EXPECT_EQ(words(reading, PlaneColumn::plane), "Reading plane");
  EXPECT_EQ(words(s1, PlaneColumn::normal), QString::fromUtf8("−22.50°"));
  EXPECT_EQ(words(scarf, PlaneColumn::plane), "scarf");
  EXPECT_EQ(words(watch, PlaneColumn::plane), QString::fromUtf8("Watch a plane…"));
}

TEST_F(PlanesModelTest, unitsStandInTheHeadings) {
  EXPECT_EQ(model.headerData(3, Qt::Horizontal, Qt::DisplayRole).toString(), QString::fromUtf8("σn MPa"));
  desk.request({Type{{Spot::unitStress, {}, {}}, "psi"}}, desk.newGesture(), {});
  EXPECT_EQ(model.headerData(4, Qt::Horizontal, Qt::DisplayRole).toString(), QString::fromUtf8("τnt psi"));
}

TEST_F(PlanesModelTest, theTooltipHasFullDigits) {
  EXPECT_EQ(at(s2, PlaneColumn::sn).data(Qt::ToolTipRole).toString(),
            QString::fromUtf8("7.57359312880715 MPa"));
  EXPECT_EQ(at(s1, PlaneColumn::normal).data(Qt::ToolTipRole).toString(), QString::fromUtf8("−22.5°"));
}

TEST_F(PlanesModelTest, editableIsWhatAnEntryCanChange) {
  const auto editable = [this](int row) {
    QString columns;
    for (int column = 0; column < model.columnCount(); ++column)
      columns += model.index(row, column).flags() & Qt::ItemIsEditable ? 'e' : '-';
    return columns;
  };
  EXPECT_EQ(editable(reading), "-eeee");
  EXPECT_EQ(editable(x), "-----");
  EXPECT_EQ(editable(crossingLine), "-----");
  EXPECT_EQ(editable(scarf), "eee--");
  EXPECT_EQ(editable(watch), "eee--");
}

TEST_F(PlanesModelTest, theReadingPlaneIsTurnedByItsNormalOrItsCut) {
  EXPECT_TRUE(enter(reading, PlaneColumn::normal, "90/4"));
  EXPECT_EQ(kept(Spot::reading), "(90/4) deg");
  EXPECT_TRUE(enter(reading, PlaneColumn::cut, "30"));
  EXPECT_EQ(kept(Spot::reading), "-60 deg");
  EXPECT_TRUE(enter(reading, PlaneColumn::cut, "1 in 1"));
  EXPECT_EQ(kept(Spot::reading), "-45 deg");
}

TEST_F(PlanesModelTest, aNormalTakesNoSlopeAndTheRowSaysSo) {
  EXPECT_FALSE(enter(reading, PlaneColumn::normal, "1 in 10"));
  EXPECT_EQ(kept(Spot::reading), "30 deg");
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::wrong);
  EXPECT_FALSE(note().isEmpty());
  desk.request({Type{{Spot::reading, "P1", {}}, "31"}}, desk.newGesture(), {});
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::none);
}

TEST_F(PlanesModelTest, aStressTurnsToTheNearestPlaneAndOffersTheOther) {
  ASSERT_TRUE(enter(reading, PlaneColumn::sn, "65"));
  EXPECT_NEAR(state().reading.sn, 65, 1e-12);
  const double first = desk.readout().reading.value.degrees();
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::choice);
  EXPECT_TRUE(note().startsWith("also at ")) << note().toStdString();
  EXPECT_TRUE(model.swapSolution());
  EXPECT_NEAR(state().reading.sn, 65, 1e-12);
  EXPECT_GT(std::abs(desk.readout().reading.value.degrees() - first), 1);
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::choice);
  EXPECT_TRUE(model.swapSolution());
  EXPECT_NEAR(desk.readout().reading.value.degrees(), first, 1e-9);
  EXPECT_EQ(desk.undoStack()->count(), 3);
}

TEST_F(PlanesModelTest, theOfferGoesWhenTheReadingPlaneMovesOn) {
  ASSERT_TRUE(enter(reading, PlaneColumn::tnt, "12"));
  EXPECT_NEAR(state().reading.tnt, 12, 1e-12);
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::choice);
  desk.request({Type{{Spot::reading, "P1", {}}, "1"}}, desk.newGesture(), {});
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::none);
  EXPECT_FALSE(model.swapSolution());
}

TEST_F(PlanesModelTest, theOfferGoesWhenTheStateMovesOn) {
  ASSERT_TRUE(enter(reading, PlaneColumn::sn, "65"));
  desk.request({Type{{Spot::sx, "P1", "G"}, "81"}}, desk.newGesture(), {});
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::none);
}

TEST_F(PlanesModelTest, outOfReachIsSaidInTheRow) {
  EXPECT_FALSE(enter(reading, PlaneColumn::sn, "93"));
  EXPECT_EQ(note(), QString::fromUtf8("σn reaches only 7.57 to 92.43 MPa."));
  EXPECT_EQ(kept(Spot::reading), "30 deg");
}

TEST_F(PlanesModelTest, aPrincipalValueIsTouched) {
  ASSERT_TRUE(enter(reading, PlaneColumn::sn, "92.43"));
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::fact);
  EXPECT_TRUE(note().startsWith(QString::fromUtf8("touches the circle at σ1, ± "))) << note().toStdString();
  EXPECT_NEAR(desk.readout().reading.value.degrees(), -22.5, 1e-9);
}

TEST_F(PlanesModelTest, aDegenerateStateGivesNoFalseAngle) {
  desk.request({Type{{Spot::sy, "P1", "G"}, "80"}, Type{{Spot::txy, "P1", "G"}, "0"}}, desk.newGesture(), {});
  for (const int row : {s1, s2, shearMax, shearMin})
    EXPECT_EQ(words(row, PlaneColumn::normal), "every direction");
  ASSERT_TRUE(enter(reading, PlaneColumn::sn, "80"));
  EXPECT_EQ(note(), "every direction");
  EXPECT_EQ(desk.undoStack()->count(), 1);
}

TEST_F(PlanesModelTest, watchedPlanesAreNamedTurnedAndRemoved) {
  EXPECT_TRUE(enter(scarf, PlaneColumn::plane, "joint"));
  EXPECT_EQ(kept(Spot::planeNormal, "joint"), "55 deg");
  EXPECT_TRUE(enter(scarf, PlaneColumn::cut, "0"));
  EXPECT_EQ(kept(Spot::planeNormal, "joint"), "90 deg");
  EXPECT_FALSE(enter(scarf, PlaneColumn::plane, ""));
  EXPECT_EQ(words(scarf, PlaneColumn::plane), "joint");
  model.removeWatched(scarf);
  EXPECT_EQ(model.rowCount(), 10);
  model.removeWatched(x);
  EXPECT_EQ(model.rowCount(), 10);
  desk.undoStack()->undo();
  EXPECT_EQ(words(scarf, PlaneColumn::plane), "joint");
}

TEST_F(PlanesModelTest, theLastRowWatchesAnotherPlane) {
  EXPECT_TRUE(enter(watch, PlaneColumn::plane, "weld toe"));
  EXPECT_EQ(kept(Spot::planeNormal, "weld toe"), "30 deg");
  EXPECT_TRUE(enter(watch + 1, PlaneColumn::normal, "12"));
  EXPECT_EQ(kept(Spot::planeNormal, "plane 1"), "12 deg");
  EXPECT_TRUE(enter(watch + 2, PlaneColumn::cut, "12"));
  EXPECT_EQ(kept(Spot::planeNormal, "plane 2"), "-78 deg");
  EXPECT_FALSE(enter(watch + 3, PlaneColumn::plane, "scarf")) << "the name is taken";
  EXPECT_EQ(model.noteOf(watch + 3).kind, RowNote::Kind::wrong);
}

TEST_F(PlanesModelTest, aWatchedNormalTakesItsToleranceBehindASign) {
  EXPECT_TRUE(enter(scarf, PlaneColumn::normal, "55 ± 2"));
  EXPECT_EQ(kept(Spot::planeNormal, "scarf"), "55 deg");
  EXPECT_EQ(kept(Spot::planeTolerance, "scarf"), "2 deg");
  EXPECT_EQ(plain(model.noteOf(scarf).words), "± 2 deg");
  EXPECT_EQ(at(scarf, PlaneColumn::normal).data(Qt::EditRole).toString(),
            QString::fromUtf8("55 deg ± 2 deg"));
  EXPECT_TRUE(enter(scarf, PlaneColumn::cut, "10")) << "the cut alone keeps it";
  EXPECT_EQ(kept(Spot::planeTolerance, "scarf"), "2 deg");
  EXPECT_FALSE(enter(scarf, PlaneColumn::normal, "55 +/- -2"));
  EXPECT_TRUE(enter(scarf, PlaneColumn::normal, "55"));
  EXPECT_EQ(kept(Spot::planeTolerance, "scarf"), "");
}

TEST_F(PlanesModelTest, insertWatchesTheReadingPlane) {
  const int row = model.watchReading();
  EXPECT_EQ(row, scarf + 1);
  EXPECT_EQ(model.watchedIn(row), "plane 1");
  EXPECT_EQ(kept(Spot::planeNormal, "plane 1"), "30 deg");
  EXPECT_EQ(model.watchedIn(model.watchReading()), "plane 2");
}

TEST_F(PlanesModelTest, aTurnChangesDataAndNoRows) {
  QSignalSpy reset(&model, &QAbstractItemModel::modelReset);
  QSignalSpy data(&model, &QAbstractItemModel::dataChanged);
  desk.request({Type{{Spot::reading, "P1", {}}, "31"}}, desk.newGesture(), {});
  EXPECT_EQ(reset.count(), 0);
  EXPECT_GE(data.count(), 1);
}

TEST_F(PlanesModelTest, rowsComeAndGoWhereTheyBelong) {
  const QPersistentModelIndex last = at(scarf, PlaneColumn::plane);
  desk.request({Remove{{Spot::line, "P1", "grain"}}}, desk.newGesture(), {});
  EXPECT_EQ(model.rowCount(), 9);
  EXPECT_EQ(last.data().toString(), "scarf");
  desk.undoStack()->undo();
  EXPECT_EQ(last.data().toString(), "scarf");
  EXPECT_EQ(last.row(), scarf);
}

RC_GTEST_PROP(PlanesModel, anyStressInReachIsReadBack, (int typed)) {
  Desk desk(planesStudy());
  PlanesModel model(desk);
  const int tenths = std::abs(typed % 848); // within 7.58 to 92.42
  const QString text = QString::number(76 + tenths) + "/10";
  const QModelIndex cell = model.index(0, static_cast<int>(PlaneColumn::sn));
  RC_ASSERT(!model.enter(cell, text));
  RC_ASSERT(std::abs(desk.readout().state().reading.sn - (76 + tenths) / 10.0) < 1e-9);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// The columns over all combinations.
#include "planes_fixture.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/planes/plane_header.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_model.h"
#include "ui/planes/planes_page.h"
#include "ui/planes/planes_panel.h"
#include "ui/planes/quiet_tabs.h"
#include "ui/planes/sweep_page.h"

#include <QAbstractItemModelTester>
#include <QApplication>
#include <QClipboard>
#include <QLabel>
#include <QScrollBar>
#include <QSignalSpy>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

/// The combination `factor` times the one case.
Edits combination(const std::string& name, const std::string& factor) {
  return {Insert{{Spot::combination, name, {}}, {}}, Insert{{Spot::factor, name, "G"}, {}},
          Type{{Spot::factor, name, "G"}, factor}};
}

struct EnvelopeTest : testing::Test {
  Desk desk{planesStudy()};
  PlanesPanel panel{desk};
  PlaneTable& table = panel.planes().table();
  PlanesModel& model = panel.planes().model();

  EnvelopeTest() {
    panel.resize(1100, 300);
    panel.show();
    panel.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&panel));
    table.setFocus();
  }

  void ask(const Edits& edits) { ASSERT_FALSE(desk.request(edits, desk.newGesture(), {})); }
  /// The second one in a step of its own.
  void addTwo() {
    ask(combination("full", "1"));
    ask(combination("lifted", "-0.5"));
  }
  QModelIndex at(int row, PlaneColumn column) const { return model.index(row, static_cast<int>(column)); }
  QString shownAt(int row, PlaneColumn column) const { return at(row, column).data().toString(); }
  std::string shown() const { return desk.readout().state().combination; }
  DraftEdit* editor() { return qobject_cast<DraftEdit*>(QApplication::focusWidget()); }
};

TEST_F(EnvelopeTest, saysWhatARangeIsMadeOf) {
  addTwo();
  const auto tip = [&](PlaneColumn column) {
    return model.headerData(static_cast<int>(column), Qt::Horizontal, Qt::ToolTipRole).toString();
  };
  const auto foot = [&] {
    for (const QLabel* label : panel.findChildren<QLabel*>())
      if (label->isVisible() && label->text().contains("count 0 for"))
        return label->text();
    return QString();
  };
  EXPECT_TRUE(tip(PlaneColumn::leastSn).contains("single cases are not part"));
  EXPECT_EQ(tip(PlaneColumn::sn), "");
  EXPECT_EQ(foot(), "");
  ask({Insert{{Spot::loadCase, "M", {}}, {}}, Insert{{Spot::combination, "1 M", {}}, {}},
       Insert{{Spot::factor, "1 M", "M"}, {}}});
  EXPECT_TRUE(foot().contains("1 M"));
  EXPECT_TRUE(tip(PlaneColumn::leastSn).contains(foot()));
}

TEST_F(EnvelopeTest, columnsComeAndGoWithTheSecondCombination) {
  QAbstractItemModelTester tester(&model, QAbstractItemModelTester::FailureReportingMode::Fatal);
  EXPECT_EQ(model.columnCount(), 5);
  ask(combination("full", "1"));
  EXPECT_EQ(model.columnCount(), 5);
  ask(combination("lifted", "-0.5"));
  ASSERT_EQ(model.columnCount(), 8);
  EXPECT_EQ(shownAt(x, PlaneColumn::leastSn), QString::fromUtf8("−40.00"));
  EXPECT_EQ(shownAt(x, PlaneColumn::greatestSn), "80.00");
  EXPECT_EQ(shownAt(x, PlaneColumn::greatestShear), "30.00");
  desk.undoStack()->undo();
  EXPECT_EQ(model.columnCount(), 5);
}

TEST_F(EnvelopeTest, columnsAndRowsMayChangeAtOnce) {
  QAbstractItemModelTester tester(&model, QAbstractItemModelTester::FailureReportingMode::Fatal);
  Edits edits = combination("full", "1");
  for (const Edit& edit : combination("lifted", "-0.5"))
    edits.push_back(edit);
  edits.push_back(Remove{{Spot::plane, "P1", "scarf"}});
  ask(edits);
  EXPECT_EQ(model.columnCount(), 8);
  EXPECT_EQ(model.rowCount(), 10);
  desk.undoStack()->undo();
  EXPECT_EQ(model.columnCount(), 5);
  EXPECT_EQ(model.rowCount(), 11);
  EXPECT_EQ(shownAt(scarf, PlaneColumn::normal), QString::fromUtf8("55.00°"));
}

TEST_F(EnvelopeTest, theCursorStaysAndLeavesOnlyAColumnThatGoes) {
  table.setCurrentIndex(at(s1, PlaneColumn::sn));
  addTwo();
  EXPECT_EQ(table.currentIndex(), at(s1, PlaneColumn::sn));
  table.setCurrentIndex(at(s1, PlaneColumn::greatestShear));
  desk.undoStack()->undo();
  EXPECT_EQ(table.currentIndex(), at(s1, PlaneColumn::tnt));
}

TEST_F(EnvelopeTest, anOpenEditorKeepsItsDraft) {
  table.setCurrentIndex(at(scarf, PlaneColumn::normal));
  QTest::keyClick(&table, Qt::Key_F2);
  ASSERT_NE(editor(), nullptr);
  QTest::keyClicks(editor(), "41");
  addTwo();
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->text(), "41");
  desk.undoStack()->undo();
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->text(), "41");
  QTest::keyClick(editor(), Qt::Key_Return);
  EXPECT_EQ(textAt(desk.study(), {Spot::planeNormal, "P1", "scarf"}), "41 deg");
}

TEST_F(EnvelopeTest, enterAndADoubleClickShowTheCombinationOfAValue) {
  addTwo();
  const int steps = desk.undoStack()->count();
  table.setCurrentIndex(at(x, PlaneColumn::leastSn));
  QTest::keyClick(&table, Qt::Key_Return);
  EXPECT_EQ(shown(), "lifted");
  const QPoint middle = table.visualRect(at(y, PlaneColumn::greatestSn)).center();
  QTest::mouseClick(table.viewport(), Qt::LeftButton, {}, middle);
  QTest::mouseDClick(table.viewport(), Qt::LeftButton, {}, middle);
  EXPECT_EQ(shown(), "full");
  table.setCurrentIndex(at(reading, PlaneColumn::leastSn));
  QTest::keyClick(&table, Qt::Key_Enter);
  EXPECT_EQ(shown(), "lifted");
  EXPECT_EQ(desk.undoStack()->count(), steps) << "what is shown is no step of undo";
  EXPECT_EQ(textAt(desk.study(), {Spot::reading, "P1", {}}), "30 deg");
}

TEST_F(EnvelopeTest, theCombinationIsToldByTooltipAndToScreenReaders) {
  addTwo();
  EXPECT_EQ(at(x, PlaneColumn::leastSn).data(Qt::ToolTipRole).toString(),
            QString::fromUtf8("−40 MPa in lifted\nEnter shows this combination"));
  EXPECT_EQ(at(x, PlaneColumn::leastSn).data(Qt::AccessibleTextRole).toString(),
            QString::fromUtf8("−40.00 in lifted"));
  EXPECT_EQ(at(x, PlaneColumn::sn).data(Qt::AccessibleTextRole).toString(),
            at(x, PlaneColumn::sn).data().toString());
}

TEST_F(EnvelopeTest, valuesOfAllCombinationsAreNotTyped) {
  addTwo();
  for (const PlaneColumn column :
       {PlaneColumn::leastSn, PlaneColumn::greatestSn, PlaneColumn::greatestShear}) {
    EXPECT_FALSE(at(reading, column).flags() & Qt::ItemIsEditable);
    EXPECT_FALSE(at(scarf, column).flags() & Qt::ItemIsEditable);
  }
}

TEST_F(EnvelopeTest, copiesCarryThem) {
  addTwo();
  const QString headings = QString::fromUtf8("σn (MPa)\tτnt (MPa)\tleast σn (MPa)\tgreatest σn (MPa)\t"
                                             "greatest |τnt| (MPa)");
  table.copyAll();
  EXPECT_TRUE(QApplication::clipboard()->text().split('\n').front().endsWith(headings));
  panel.tabs().setCurrentIndex(1);
  panel.sweep().table().copyAll();
  EXPECT_TRUE(QApplication::clipboard()->text().split('\n').front().endsWith(headings));
}

TEST_F(EnvelopeTest, theSweepHasThemAndShowsTheirCombination) {
  panel.tabs().setCurrentIndex(1);
  addTwo();
  PlaneTable& sweep = panel.sweep().table();
  ASSERT_EQ(sweep.model()->columnCount(), 8);
  EXPECT_TRUE(sweep.isColumnHidden(0));
  sweep.setCurrentIndex(sweep.model()->index(17, static_cast<int>(PlaneColumn::leastSn)));
  QTest::keyClick(&sweep, Qt::Key_Return);
  EXPECT_EQ(shown(), "lifted");
}

TEST_F(EnvelopeTest, aNarrowTableBreaksItsHeadingsAndCutsNothing) {
  addTwo();
  auto& header = *static_cast<PlaneHeader*>(table.horizontalHeader());
  for (const int width : {1500, 1100, 940, 880, 760}) {
    panel.resize(width, 300);
    QCoreApplication::processEvents();
    EXPECT_FALSE(table.horizontalScrollBar()->isVisible()) << width;
    for (int column = 1; column < model.columnCount(); ++column) {
      const QString heading = model.headerData(column, Qt::Horizontal, Qt::DisplayRole).toString();
      EXPECT_GE(table.columnWidth(column), header.headingWidth(column, header.isBroken()) + 10)
          << width << heading.toStdString();
      for (int row = 0; row < model.rowCount(); ++row) {
        QFont bold = table.font();
        bold.setBold(true);
        const QString number = model.index(row, column).data().toString();
        EXPECT_GE(table.columnWidth(column), QFontMetrics(bold).horizontalAdvance(number) + 10) << width;
      }
    }
  }
  EXPECT_TRUE(header.isBroken());
  panel.resize(1500, 300);
  QCoreApplication::processEvents();
  EXPECT_FALSE(header.isBroken());
}

TEST_F(EnvelopeTest, headingsFollowTheUnit) {
  addTwo();
  QSignalSpy changed(&model, &QAbstractItemModel::headerDataChanged);
  ask({Type{{Spot::unitStress, {}, {}}, "kPa"}});
  EXPECT_EQ(changed.count(), 1);
}

} // namespace
} // namespace planewright

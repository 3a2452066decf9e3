// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_panel.h"

#include "planes_fixture.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_model.h"
#include "ui/planes/planes_page.h"
#include "ui/planes/quiet_tabs.h"

#include <QApplication>
#include <QClipboard>
#include <QMimeData>
#include <QScrollBar>
#include <QSignalSpy>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {
namespace {

struct PlanesPanelTest : testing::Test {
  Desk desk{planesStudy()};
  PlanesPanel panel{desk};
  PlaneTable& table = panel.planes().table();
  PlanesModel& model = panel.planes().model();

  PlanesPanelTest() {
    panel.resize(830, 300);
    panel.show();
    panel.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&panel));
    table.setFocus();
  }

  void stand(int row, PlaneColumn column) {
    table.setCurrentIndex(model.index(row, static_cast<int>(column)));
  }
  void press(Qt::Key key, Qt::KeyboardModifiers held = Qt::NoModifier) { QTest::keyClick(&table, key, held); }
  DraftEdit* editor() { return qobject_cast<DraftEdit*>(QApplication::focusWidget()); }
  void typeAndEnter(const char* text) {
    ASSERT_NE(editor(), nullptr);
    QTest::keyClicks(editor(), text);
    if (editor())
      QTest::keyClick(editor(), Qt::Key_Return);
  }
  std::string kept(Spot spot, const std::string& item = {}) const {
    return textAt(desk.study(), {spot, "P1", item}).value_or("nothing");
  }
  QPoint middleOf(int row, PlaneColumn column) {
    return table.visualRect(model.index(row, static_cast<int>(column))).center();
  }
};

TEST_F(PlanesPanelTest, enterBringsTheReadingPlaneToARow) {
  stand(s1, PlaneColumn::sn);
  press(Qt::Key_Return);
  EXPECT_EQ(kept(Spot::reading), "-22.5 deg");
  stand(scarf, PlaneColumn::plane);
  press(Qt::Key_Enter);
  EXPECT_EQ(kept(Spot::reading), "55 deg");
}

TEST_F(PlanesPanelTest, aDoubleClickDoesTheSame) {
  const QPoint at = middleOf(y, PlaneColumn::cut);
  QTest::mouseClick(table.viewport(), Qt::LeftButton, {}, at);
  QTest::mouseDClick(table.viewport(), Qt::LeftButton, {}, at);
  EXPECT_EQ(kept(Spot::reading), "90 deg");
}

TEST_F(PlanesPanelTest, f2EditsWithTheTypedText) {
  stand(scarf, PlaneColumn::normal);
  press(Qt::Key_F2);
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->text(), "55 deg");
  EXPECT_EQ(editor()->selectedText(), "55 deg");
  typeAndEnter("50");
  EXPECT_EQ(kept(Spot::planeNormal, "scarf"), "50 deg");
  EXPECT_TRUE(table.hasFocus());
}

TEST_F(PlanesPanelTest, typingEdits) {
  stand(reading, PlaneColumn::sn);
  QTest::keyClicks(&table, "6");
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->text(), "6");
  typeAndEnter("5");
  EXPECT_NEAR(desk.readout().state().reading.sn, 65, 1e-12);
}

TEST_F(PlanesPanelTest, anEditorThatWasNotTouchedIsNoEntry) {
  stand(reading, PlaneColumn::sn);
  press(Qt::Key_F2);
  typeAndEnter("");
  EXPECT_EQ(desk.undoStack()->count(), 0);
}

TEST_F(PlanesPanelTest, ctrlEnterSwapsToTheOtherPlane) {
  stand(reading, PlaneColumn::sn);
  QTest::keyClicks(&table, "6");
  typeAndEnter("5");
  const std::string first = kept(Spot::reading);
  press(Qt::Key_Return, Qt::ControlModifier);
  EXPECT_NE(kept(Spot::reading), first);
  EXPECT_NEAR(desk.readout().state().reading.sn, 65, 1e-9);
}

TEST_F(PlanesPanelTest, aClickOnTheChipSwapsToo) {
  stand(reading, PlaneColumn::sn);
  QTest::keyClicks(&table, "6");
  typeAndEnter("5");
  const std::string first = kept(Spot::reading);
  const QRect cell = table.visualRect(model.index(reading, 0));
  for (int x = cell.left() + 40; x < cell.right() && kept(Spot::reading) == first; x += 10)
    QTest::mouseClick(table.viewport(), Qt::LeftButton, {}, QPoint(x, cell.center().y()));
  EXPECT_NE(kept(Spot::reading), first);
}

TEST_F(PlanesPanelTest, anEntryThatIsNotTakenStaysOpen) {
  stand(reading, PlaneColumn::sn);
  QTest::keyClicks(&table, "9");
  typeAndEnter("9");
  ASSERT_NE(editor(), nullptr);
  EXPECT_TRUE(editor()->isWrong());
  EXPECT_EQ(editor()->selectedText(), "99");
  EXPECT_EQ(model.noteOf(reading).kind, RowNote::Kind::wrong);
  typeAndEnter("66");
  EXPECT_NEAR(desk.readout().state().reading.sn, 66, 1e-9);
  EXPECT_TRUE(table.hasFocus());
}

TEST_F(PlanesPanelTest, theOffendingPieceIsSelected) {
  stand(reading, PlaneColumn::normal);
  press(Qt::Key_F2);
  typeAndEnter("20 + 1,5");
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->selectedText(), "1,5");
}

TEST_F(PlanesPanelTest, whatTheRowTellsIsSaidToo) {
  QSignalSpy said(&desk, &Desk::said);
  model.enter(model.index(reading, 3), "93");
  model.enter(model.index(reading, 3), "65");
  ASSERT_EQ(said.count(), 2);
  EXPECT_TRUE(said.at(0).front().toString().contains("reaches only"));
  EXPECT_TRUE(said.at(1).front().toString().contains("also at"));
  EXPECT_TRUE(model.index(0, 0).data(Qt::AccessibleDescriptionRole).toString().contains("also at"));
}

TEST_F(PlanesPanelTest, escapeLeavesTheEditor) {
  stand(scarf, PlaneColumn::plane);
  press(Qt::Key_F2);
  QTest::keyClicks(editor(), "other");
  QTest::keyClick(editor(), Qt::Key_Escape);
  EXPECT_TRUE(table.hasFocus());
  EXPECT_EQ(desk.undoStack()->count(), 0);
}

TEST_F(PlanesPanelTest, aDraftSurvivesATurnMeanwhile) {
  stand(scarf, PlaneColumn::plane);
  press(Qt::Key_F2);
  QTest::keyClicks(editor(), "jo");
  desk.request({Type{{Spot::reading, "P1", {}}, "31"}}, desk.newGesture(), {});
  ASSERT_NE(editor(), nullptr);
  EXPECT_EQ(editor()->text(), "jo");
}

TEST_F(PlanesPanelTest, thePanelMayGoWhileACellIsTyped) {
  auto* other = new PlanesPanel(desk);
  other->show();
  other->activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(other));
  other->planes().table().setFocus();
  other->planes().table().setCurrentIndex(other->planes().model().index(reading, 1));
  QTest::keyClicks(&other->planes().table(), "7");
  ASSERT_NE(editor(), nullptr);
  delete other;
  EXPECT_EQ(model.rowCount(), 11);
}

TEST_F(PlanesPanelTest, insertAndDelete) {
  press(Qt::Key_Insert);
  EXPECT_EQ(kept(Spot::planeNormal, "plane 1"), "30 deg");
  EXPECT_EQ(model.watchedIn(table.currentIndex().row()), "plane 1");
  press(Qt::Key_Delete);
  EXPECT_EQ(kept(Spot::planeNormal, "plane 1"), "nothing");
  stand(x, PlaneColumn::plane);
  press(Qt::Key_Delete);
  EXPECT_EQ(model.rowCount(), 11);
}

TEST_F(PlanesPanelTest, theLastRowIsTypedInto) {
  stand(watch, PlaneColumn::plane);
  press(Qt::Key_Return);
  typeAndEnter("weld toe");
  EXPECT_EQ(kept(Spot::planeNormal, "weld toe"), "30 deg");
}

TEST_F(PlanesPanelTest, oneCellCopiesItsFullDigits) {
  stand(s2, PlaneColumn::sn);
  press(Qt::Key_C, Qt::ControlModifier);
  EXPECT_EQ(QApplication::clipboard()->text(), "7.57359312880715");
}

TEST_F(PlanesPanelTest, allIsCopiedAsTextAndAsATable) {
  table.selectAll();
  press(Qt::Key_C, Qt::ControlModifier);
  const QMimeData* data = QApplication::clipboard()->mimeData();
  const QStringList lines = data->text().split('\n', Qt::SkipEmptyParts);
  ASSERT_EQ(lines.size(), 11) << "headings and ten planes, without the row that is typed into";
  EXPECT_EQ(lines.front(), QString::fromUtf8("Plane\tnormal at\tcut at\tσn (MPa)\tτnt (MPa)"));
  EXPECT_TRUE(data->html().contains(QString::fromUtf8("σ<sub>n</sub>")));
  table.copyAll();
  EXPECT_EQ(QApplication::clipboard()->text().split('\n', Qt::SkipEmptyParts), lines);
}

TEST_F(PlanesPanelTest, theTableIsCopiedForDocuments) {
  table.copyMarkdown();
  EXPECT_TRUE(QApplication::clipboard()->text().startsWith(QStringLiteral("| Plane |")));
  table.copyLatex();
  EXPECT_TRUE(QApplication::clipboard()->text().contains(QStringLiteral("\\\\\n\\hline")));
}

TEST_F(PlanesPanelTest, tabLeavesTheTable) {
  press(Qt::Key_Tab);
  EXPECT_FALSE(table.hasFocus());
}

TEST_F(PlanesPanelTest, theRowToTypeIntoCanBeSeenWhole) {
  for (int planes = 2; planes < 8; ++planes) {
    model.watchReading();
    stand(watch + planes - 1, PlaneColumn::plane);
    for (int height = 240; height < 320; height += 7) {
      panel.resize(830, height);
      QCoreApplication::processEvents();
      table.scrollToBottom();
      const QRect last = table.visualRect(model.index(model.rowCount() - 1, 0));
      EXPECT_TRUE(table.viewport()->rect().contains(QRect(last.topLeft(), QSize(1, last.height()))))
          << planes << " planes, " << height << " px: " << last.top() << " to " << last.bottom() << " in "
          << table.viewport()->height();
    }
  }
}

TEST_F(PlanesPanelTest, theRowToTypeIntoIsShownWholeAsSoonAsAPlaneIsWatched) {
  for (int planes = 2; planes < 8; ++planes) {
    press(Qt::Key_Insert);
    QCoreApplication::processEvents();
    const QRect last = table.visualRect(model.index(model.rowCount() - 1, 0));
    EXPECT_TRUE(table.viewport()->rect().contains(QRect(last.topLeft(), QSize(1, last.height())))) << planes;
  }
}

TEST_F(PlanesPanelTest, noNumberIsCutAndEightRowsFit) {
  for (const int width : {760, 830, 1300}) {
    panel.resize(width, 300);
    QCoreApplication::processEvents();
    EXPECT_FALSE(table.horizontalScrollBar()->isVisible()) << width;
    for (int row = 0; row < model.rowCount(); ++row)
      for (int column = 1; column < model.columnCount(); ++column) {
        const QModelIndex cell = model.index(row, column);
        QFont bold = table.font();
        bold.setBold(true);
        EXPECT_GE(table.columnWidth(column),
                  QFontMetrics(bold).horizontalAdvance(cell.data().toString()) + 12);
      }
  }
  EXPECT_GE(table.viewport()->height() / table.rowHeight(0), 8);
}

TEST_F(PlanesPanelTest, columnsDoNotBreatheInATurn) {
  const int before = table.columnWidth(1);
  const Gesture drag = desk.newGesture();
  for (const char* angle : {"-89.99", "0", "5", "-12.345"}) {
    desk.request({Type{{Spot::reading, "P1", {}}, angle}}, drag, {});
    EXPECT_EQ(table.columnWidth(1), before);
  }
}

TEST_F(PlanesPanelTest, theReadingRowStandsOnTheSelectionGround) {
  for (const Palette palette : {Palette::light, Palette::dark}) {
    const QPalette before = QApplication::palette();
    QApplication::setPalette(paletteFor(Look{palette}));
    QCoreApplication::processEvents();
    const QImage grabbed = table.viewport()->grab().toImage();
    const Look look{palette};
    EXPECT_EQ(grabbed.pixelColor(middleOf(reading, PlaneColumn::plane)), look.colour(Role::selection));
    EXPECT_EQ(grabbed.pixelColor(middleOf(x, PlaneColumn::plane)), look.colour(Role::canvas));
    EXPECT_EQ(grabbed.pixelColor(grabbed.width() / 2, grabbed.height() - 1), look.colour(Role::canvas));
    QApplication::setPalette(before);
  }
}

TEST_F(PlanesPanelTest, saysTheKeysOfTheShownTable) {
  EXPECT_TRUE(panel.property("areaKeys").toString().contains("Ctrl+Enter"));
  panel.tabs().setCurrentIndex(1);
  EXPECT_FALSE(panel.property("areaKeys").toString().contains("Ctrl+Enter"));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "field_rig.h"

#include "core/study/verdict.h"
#include "ui/look/strip.h"
#include "ui/screen/histogram_view.h"

#include <QLabel>
#include <QSignalSpy>

#include <algorithm>

namespace planewright {
namespace {

class FieldResultsPage : public FieldRig {
protected:
  void arranged(const std::function<void()>& act) {
    QSignalSpy spy(&page(), &FieldPage::arranged);
    act();
    ASSERT_TRUE(spy.wait(10000));
  }
  void choose(int row) { page().table().setCurrentIndex(model().index(row, 0)); }
};

TEST_F(FieldResultsPage, sortsByEachColumn) {
  screen(threePoints);
  arranged([&] { page().table().sortByColumn(0, Qt::AscendingOrder); });
  EXPECT_EQ(column(FieldKey::point), (QStringList{"n1", "n2", "n10"}));
  choose(1);
  arranged([&] { page().table().sortByColumn(0, Qt::DescendingOrder); });
  EXPECT_EQ(column(FieldKey::point), (QStringList{"n10", "n2", "n1"}));
  arranged([&] { page().table().sortByColumn(model().columnOf(FieldKey::region), Qt::AscendingOrder); });
  EXPECT_EQ(column(FieldKey::point), (QStringList{"n2", "n1", "n10"}));
  EXPECT_EQ(page().table().currentIndex().row(), 0); // n2 is still the chosen one
}

TEST_F(FieldResultsPage, filters) {
  screen(threePoints);
  arranged([&] { QTest::keyClicks(&page().text(), "DEC"); });
  EXPECT_TRUE(QTest::qWaitFor([&] { return column(FieldKey::point) == QStringList({"n1", "n10"}); }));
  page().text().clear();
  arranged([&] { page().exceedsOnly().click(); });
  EXPECT_EQ(column(FieldKey::point), QStringList{"n2"});
  arranged([&] { page().exceedsOnly().click(); });
  arranged([&] { QTest::keyClicks(&page().from(), "9"); });
  EXPECT_EQ(model().rowCount(), 0);
  EXPECT_FALSE(page().open().isEnabled());
}

TEST_F(FieldResultsPage, aUtilisationThatDoesNotReadIsSaid) {
  screen(threePoints);
  arranged([&] { QTest::keyClick(&page().from(), Qt::Key_X); });
  EXPECT_EQ(model().rowCount(), 3);
  const auto labels = page().findChildren<QLabel*>();
  EXPECT_TRUE(std::ranges::any_of(labels, [](const QLabel* label) {
    return label->text() == QString::fromUtf8("“x” is no utilisation. Write a number with a point, as 0.8.");
  }));
}

TEST_F(FieldResultsPage, aBarShowsItsPointsAloneAndOnceMoreAll) {
  screen(threePoints);
  HistogramView& bars = page().histogram();
  int found = 0;
  for (std::size_t bin = 0; bin <= binEnds.size(); ++bin) {
    arranged([&] { QTest::mouseClick(&bars, Qt::LeftButton, {}, bars.rowOf(bin).center()); });
    EXPECT_EQ(bars.chosen(), bin);
    found += model().rowCount();
    for (int row = 0; row < model().rowCount(); ++row)
      EXPECT_EQ(column(FieldKey::point)[row] == QStringLiteral("n2"), bin >= 10) << "bin " << bin;
  }
  EXPECT_EQ(found, 3);
  arranged([&] { QTest::keyClick(&bars, Qt::Key_Space); });
  EXPECT_EQ(bars.chosen(), std::nullopt);
  EXPECT_EQ(model().rowCount(), 3);
  QTest::keyClick(&bars, Qt::Key_Up);
  arranged([&] { QTest::keyClick(&bars, Qt::Key_Space); });
  EXPECT_EQ(bars.chosen(), binEnds.size() - 1);
}

TEST_F(FieldResultsPage, opensARowAsAPointInOneStep) {
  screen(threePoints);
  QSignalSpy opened(&m_dialog, &ScreenDialog::opened);
  choose(0);
  QTest::keyClick(&page().table(), Qt::Key_Return);
  EXPECT_EQ(opened.count(), 1);
  EXPECT_EQ(m_desk.readout().point, "n2");
  EXPECT_EQ(m_desk.undoStack()->count(), 1);
  const Point* point = findPoint(m_desk.study(), "n2");
  ASSERT_TRUE(point);
  EXPECT_EQ(point->note, "From deck.csv, line 3.");
  EXPECT_EQ(point->stress[1].sx, "5 MPa");
  const Verdict verdict = verdictOf(m_desk.readout());
  EXPECT_EQ(m_desk.readout().state().combination, "1.35 G + 1.5 S");
  EXPECT_EQ(verdict.standing, Standing::exceeds);
  // The same once more takes a fresh name; results stay those of the study.
  EXPECT_TRUE(page().strip().isHidden());
  page().openCurrent();
  EXPECT_TRUE(findPoint(m_desk.study(), "n3"));
  m_desk.undoStack()->undo();
  m_desk.undoStack()->undo();
  EXPECT_EQ(m_desk.study(), study());
}

TEST_F(FieldResultsPage, saysThatTheStudyHasChangedAndOpensNoRow) {
  screen(threePoints);
  const Gesture gesture = m_desk.newCommand();
  ASSERT_FALSE(
      m_desk.request({Type{{Spot::lineTolerance, "P1", "grain"}, "5 deg"}}, gesture, QString("typing")));
  EXPECT_TRUE(page().strip().sentence().contains("has changed since"));
  EXPECT_FALSE(page().strip().isHidden());
  EXPECT_FALSE(page().open().isEnabled());
  page().openCurrent();
  EXPECT_EQ(m_desk.study().points.size(), 1U);
  m_desk.undoStack()->undo();
  EXPECT_TRUE(page().strip().isHidden());
  EXPECT_TRUE(page().open().isEnabled());
}

TEST_F(FieldResultsPage, savesWhatTheCommandWrites) {
  screen(threePoints);
  page().saveTo(path("out.csv"));
  EXPECT_TRUE(QTest::qWaitFor([&] { return page().strip().sentence().startsWith("Results written to"); }));
  const QByteArray bytes = bytesOf("out.csv");
  EXPECT_TRUE(bytes.startsWith("point,utilisation,load_multiplier,combination,check,mode,worst_angle\nn1,"));
  EXPECT_EQ(bytes.count('\n'), 4);
  page().saveTo(path("none/out.csv"));
  EXPECT_TRUE(QTest::qWaitFor([&] { return page().strip().sentence().contains("none/out.csv: "); }));
}

} // namespace
} // namespace planewright

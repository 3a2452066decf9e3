// SPDX-License-Identifier: GPL-3.0-or-later
#include "field_rig.h"

#include <string>

namespace planewright {
namespace {

using ScreenPoints = FieldRig;

TEST_F(ScreenPoints, showsTheWorstFirstWithWhatWasCounted) {
  screen(threePoints);
  ASSERT_TRUE(m_dialog.showsResults());
  EXPECT_EQ(column(FieldKey::point), (QStringList{"n2", "n1", "n10"}));
  EXPECT_EQ(column(FieldKey::region), (QStringList{"corner", "deck", "deck"}));
  EXPECT_TRUE(page().heading().contains("Points: 3, judged: 3"));
  EXPECT_TRUE(page().notes().toPlainText().startsWith("Judged by point P1, over "));
  EXPECT_TRUE(page().notes().toPlainText().contains("Caution: "));
  EXPECT_FALSE(page().notes().toPlainText().contains("Worst points"));
  EXPECT_FALSE(page().views().isTabVisible(0)); // no places, no map
}

TEST_F(ScreenPoints, mapsHeadingsThatDiffer) {
  m_dialog.setup().setTable(written("ID,case,SX,SY,T\nn1,G,1,0,0\nn1,S,1,0,0\n"));
  EXPECT_FALSE(m_dialog.setup().start().isEnabled());
  EXPECT_TRUE(m_dialog.setup().complaints().contains("No column is the point."));
  const auto choose = [&](int column, const QString& words) {
    QComboBox& list = m_dialog.setup().meaning(column);
    list.setCurrentText(words);
    ASSERT_EQ(list.currentText(), words);
    Q_EMIT list.activated(list.currentIndex());
  };
  choose(0, "the point");
  choose(4, QString::fromUtf8("τxy"));
  EXPECT_EQ(m_dialog.setup().complaints(), QString());
  run();
  EXPECT_EQ(column(FieldKey::point), QStringList{"n1"});
}

TEST_F(ScreenPoints, passesOverWhatIsChosenNotToBeRead) {
  m_dialog.setup().setTable(written("point,node,case,sx,sy,txy\na,7,G,1,0,0\na,7,S,1,0,0\n"));
  EXPECT_FALSE(m_dialog.setup().start().isEnabled());
  m_dialog.setup().meaning(1).setCurrentIndex(0);
  Q_EMIT m_dialog.setup().meaning(1).activated(0);
  EXPECT_TRUE(m_dialog.setup().start().isEnabled());
  run();
  EXPECT_EQ(column(FieldKey::point), QStringList{"a"});
}

TEST_F(ScreenPoints, faultsStopItUnlessTheyAreLeftOut) {
  const QByteArray table = QByteArray(threePoints) + "n4,deck,x,0,0,0,0,0\nn5,deck,nan,0,0,0,0,0\n";
  screen(table);
  EXPECT_FALSE(m_dialog.showsResults());
  EXPECT_TRUE(m_dialog.setup().complaints().contains("Rows with a fault: 2 of 5"));
  EXPECT_TRUE(m_dialog.setup().complaints().contains("line 5"));
  EXPECT_TRUE(m_dialog.setup().complaints().contains("line 6"));
  m_dialog.setup().leavesOut().setChecked(true);
  run();
  EXPECT_TRUE(m_dialog.showsResults());
  EXPECT_EQ(model().rowCount(), 3);
}

TEST_F(ScreenPoints, leavesRegionsOut) {
  m_dialog.setup().except().setText("cor*, n10");
  screen(threePoints);
  EXPECT_EQ(column(FieldKey::utilisation).filter("left out").size(), 2);
  EXPECT_TRUE(page().heading().contains("left out on request: 2"));
}

TEST_F(ScreenPoints, tellsOfWhatIsNoTable) {
  m_dialog.setup().setTable(path("none.csv"));
  EXPECT_TRUE(m_dialog.setup().complaints().contains("There is no such file."));
  EXPECT_FALSE(m_dialog.setup().start().isEnabled());
  m_dialog.setup().setTable(written("\xFF\xFE,a\n"));
  EXPECT_TRUE(m_dialog.setup().complaints().contains("UTF-8"));
  screen("point,case,sx,sy,txy\n");
  EXPECT_TRUE(m_dialog.setup().complaints().contains("no row"));
  m_dialog.setup().except().setText("nowhere");
  screen(threePoints);
  EXPECT_FALSE(m_dialog.showsResults());
  EXPECT_TRUE(m_dialog.setup().complaints().contains(QString::fromUtf8("no region “nowhere”")));
}

TEST_F(ScreenPoints, cancelLeavesNothing) {
  std::string table = "point,case,sx,sy,txy\n";
  for (int i = 0; i < 200000; ++i)
    for (const char* id : {",G", ",S"})
      table += "n" + std::to_string(i) + id + ",1.25,0.5,0.125\n";
  m_dialog.setup().setTable(written(QByteArray::fromStdString(table)));
  for (const int wait : {0, 20, 60, 150}) {
    m_dialog.setup().start().click();
    QTest::qWait(wait);
    if (m_dialog.isRunning())
      m_dialog.setup().cancel().click();
    QTest::qWait(100);
    EXPECT_FALSE(m_dialog.isRunning());
    if (m_dialog.showsResults())
      break; // a fast machine
    EXPECT_TRUE(m_dialog.setup().start().isEnabled());
    EXPECT_EQ(model().rowCount(), 0);
  }
  run();
  EXPECT_TRUE(m_dialog.showsResults());
  EXPECT_EQ(model().rowCount(), 200000);
}

TEST_F(ScreenPoints, endsWhileItRuns) {
  ScreenDialog dialog(m_desk);
  dialog.setup().setTable(written(threePoints));
  dialog.setup().start().click();
  EXPECT_TRUE(dialog.isRunning());
}

} // namespace
} // namespace planewright

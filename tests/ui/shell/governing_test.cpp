// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/governing.h"

#include "shell_test.h"
#include "ui/look/look.h"
#include "ui/shell/filter_list.h"
#include "ui/shell/main_window.h"
#include "ui/shell/picker.h"
#include "ui/shell/state_bar.h"

#include <QApplication>
#include <QLabel>
#include <QLineEdit>
#include <QSignalSpy>
#include <QTest>
#include <QTreeWidget>

namespace planewright {
namespace {

/// Two points; at the first "pull" has the greatest s1 and "press" the greatest shear, and P2 is worse still.
Study governedStudy() {
  Study study = newStudy();
  const std::string g = study.cases.front().id;
  study.cases.push_back({"Q", "Variable", Nature::variable, Duration::medium, {}});
  Point& point = study.points.front();
  point.stress = {{g, "5 MPa", "5 MPa", "0 MPa", "0 MPa"}, {"Q", "-20 MPa", "2 MPa", "0 MPa", "0 MPa"}};
  point.reading = "0 deg";
  Point other = point;
  other.name = "P2";
  other.stress.front().sx = "9 MPa";
  study.points.push_back(other);
  study.combinations = {{"middle", {{g, "0.5"}}, Basis::design},
                        {"pull", {{g, "1"}}, Basis::design},
                        {"press", {{g, "0.5"}, {"Q", "1"}}, Basis::design}};
  return study;
}

class GoverningTest : public ShellTest {
protected:
  GoverningTest() {
    m_window.desk().replace(governedStudy());
    m_window.resize(1400, 900);
    m_window.show();
    m_window.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&m_window));
  }
  void press(Qt::KeyboardModifiers held) { QTest::keyClick(QApplication::focusWidget(), Qt::Key_G, held); }
  std::string shown() {
    return m_window.desk().readout().point + ", " + m_window.desk().readout().state().combination;
  }
  QLabel& governsHere() { return m_window.stateBar().governsHere(); }

  MainWindow m_window{answers()};
};

TEST_F(GoverningTest, theStateBarSaysSoWhereTheShownCombinationGoverns) {
  EXPECT_FALSE(governsHere().isVisible());
  m_window.desk().show("P1", "pull");
  EXPECT_TRUE(governsHere().isVisible());
  EXPECT_EQ(governsHere().text(), "governs here");
  EXPECT_TRUE(governsHere().toolTip().contains(QStringLiteral("greatest σ1")));
  EXPECT_FALSE(governsHere().toolTip().contains(QStringLiteral("shear")));
  m_window.desk().show("P1", "press");
  EXPECT_TRUE(governsHere().isVisible());
  EXPECT_TRUE(governsHere().toolTip().contains(QStringLiteral("greatest shear")));
  EXPECT_EQ(governsHere().accessibleDescription(), governsHere().toolTip());
  m_window.resize(1024, 700);
  QCoreApplication::processEvents();
  EXPECT_FALSE(governsHere().isVisible()) << "a narrow bar has no room for it";
}

TEST_F(GoverningTest, aLoneCombinationGovernsNothing) {
  m_window.desk().replace(newStudy());
  EXPECT_FALSE(governsHere().isVisible());
}

TEST_F(GoverningTest, aKeyTakesTheGoverningCombinationAndThenTheOneWithTheGreatestShear) {
  press(Qt::ControlModifier);
  EXPECT_EQ(shown(), "P1, pull");
  press(Qt::ControlModifier);
  EXPECT_EQ(shown(), "P1, press");
  press(Qt::ControlModifier);
  EXPECT_EQ(shown(), "P1, pull");
  EXPECT_EQ(m_window.desk().undoStack()->count(), 0);
  EXPECT_FALSE(m_window.isWindowModified());
}

TEST_F(GoverningTest, withShiftItGoesToTheGoverningPoint) {
  QSignalSpy said(&m_window.desk(), &Desk::said);
  press(Qt::ControlModifier | Qt::ShiftModifier);
  EXPECT_EQ(shown(), "P2, pull");
  ASSERT_EQ(said.count(), 1);
  EXPECT_EQ(said.front().front().toString(), QString::fromUtf8("P2, pull: greatest σ1, 9.00 MPa"));
  m_window.desk().show("P1", "press");
  press(Qt::ControlModifier | Qt::ShiftModifier);
  EXPECT_EQ(shown(), "P2, pull");
}

TEST_F(GoverningTest, theListOfCombinationsHasTheirStressesAndSaysWhichGovern) {
  FilterList& list = *m_window.stateBar().combinations().openList();
  ASSERT_EQ(list.list().columnCount(), 3);
  const auto row = [&list](int at) {
    const QTreeWidgetItem* item = list.list().topLevelItem(at);
    return QStringList{item->text(0), item->text(1), item->text(2)};
  };
  EXPECT_EQ(row(0), (QStringList{"middle", "2.50", {}}));
  EXPECT_EQ(row(1), (QStringList{"pull", "5.00", QString::fromUtf8("governs by σ1")}));
  EXPECT_EQ(row(2), (QStringList{"press", QString::fromUtf8("−17.50"), "governs by shear"}));
  EXPECT_TRUE(list.list().headerItem()->text(1).startsWith(QString::fromUtf8("σn")));
  QTest::keyClicks(&list.filter(), QStringLiteral("p"));
  QTest::keyClick(&list.filter(), Qt::Key_Down);
  QTest::keyClick(&list.filter(), Qt::Key_Return);
  EXPECT_EQ(shown(), "P1, press");
}

TEST_F(GoverningTest, theListOfPointsHasTheirNamesOnly) {
  FilterList& list = *m_window.stateBar().points().openList();
  EXPECT_EQ(list.list().columnCount(), 1);
  EXPECT_TRUE(list.list().isHeaderHidden());
  list.close();
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/strength_panel.h"

#include "core/study/verdict.h"
#include "tests/support/judged_study.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/quiet_button.h"
#include "ui/strength/check_fields.h"
#include "ui/strength/check_list.h"
#include "ui/strength/side_by_side.h"
#include "ui/strength/utilisation_plot.h"
#include "ui/strength/verdict_block.h"

#include <QMenu>
#include <QSignalSpy>
#include <QTest>
#include <QTreeWidget>

#include <gtest/gtest.h>

namespace planewright {
namespace {

class StrengthPanelTest : public testing::Test {
protected:
  StrengthPanelTest() {
    m_panel.resize(340, 900);
    m_panel.show();
    EXPECT_TRUE(QTest::qWaitForWindowExposed(&m_panel));
  }
  void type(const Place& place, const std::string& text) {
    ASSERT_FALSE(m_desk.request({Type{place, text}}, m_desk.newGesture(), QStringLiteral("typing")));
  }
  QString utilisation(int row) { return m_panel.checks().topLevelItem(row)->text(1); }
  static QAction* actionOf(QuietButton& button, const QString& words) {
    emit button.menu()->aboutToShow();
    for (QAction* action : button.menu()->actions())
      if (action->text() == words)
        return action;
    return nullptr;
  }

  Desk m_desk{judgedStudy()};
  StrengthPanel m_panel{m_desk};
};

TEST_F(StrengthPanelTest, saysWhatTheReadoutSays) {
  const Verdict verdict = verdictOf(m_desk.readout());
  ASSERT_TRUE(verdict.governing);
  EXPECT_EQ(m_panel.checks().topLevelItemCount(), 2);
  EXPECT_TRUE(m_panel.verdict().sentences().contains(QStringLiteral("Stress at this point")));
  EXPECT_FALSE(m_panel.verdict().number().isEmpty());
  EXPECT_TRUE(m_panel.governs().contains(QStringLiteral("1.35 G + 1.5 S")));
  EXPECT_TRUE(m_panel.cautions().contains(QStringLiteral("licensed engineer")));
}

TEST_F(StrengthPanelTest, followsTheStudyLive) {
  const QString before = m_panel.verdict().number();
  type({Spot::sx, "P1", "S"}, "9 MPa");
  EXPECT_NE(m_panel.verdict().number(), before);
  EXPECT_EQ(m_panel.verdict().word(), QStringLiteral("exceeds"));
}

TEST_F(StrengthPanelTest, somethingUnjudgedIsSaidWithItsReason) {
  type({Spot::checkCriterion, "P1", "grain"}, "hankinson");
  EXPECT_EQ(m_panel.verdict().word(), QStringLiteral("not judged"));
  EXPECT_TRUE(m_panel.verdict().sentences().contains(QStringLiteral("uniaxial stress only")));
  EXPECT_TRUE(utilisation(0).contains(QStringLiteral("not judged")));
}

TEST_F(StrengthPanelTest, aCheckIsAddedChangedAndRemoved) {
  actionOf(m_panel.addButton(), QStringLiteral("C24"))->trigger();
  ASSERT_EQ(m_desk.readout().checks.size(), 3);
  EXPECT_EQ(m_panel.checks().selected(), 2);
  auto* criterion = qobject_cast<QuietButton*>(m_panel.fields().buttons()[1]);
  actionOf(*criterion, QStringLiteral("Tsai and Wu"))->trigger();
  EXPECT_EQ(m_desk.readout().checks[2].criterion, Criterion::tsaiWu);
  EXPECT_TRUE(m_panel.cautions().contains(QStringLiteral("25.96")));
  QTest::keyClick(&m_panel.checks(), Qt::Key_Delete);
  EXPECT_EQ(m_desk.readout().checks.size(), 2);
  m_desk.undoStack()->undo();
  EXPECT_EQ(m_desk.readout().checks.size(), 3);
}

TEST_F(StrengthPanelTest, parametersShowWithTheirCriterionOnly) {
  m_panel.checks().select("grain");
  QList<EntryField*> fields = m_panel.fields().fields();
  for (EntryField* field : fields)
    EXPECT_FALSE(field->isVisible());
  type({Spot::checkCriterion, "P1", "grain"}, "tsai-wu");
  EXPECT_TRUE(fields[1]->isVisible());
  EXPECT_FALSE(fields[0]->isVisible());
}

TEST_F(StrengthPanelTest, anEmptyParameterSaysWhatItCountsAs) {
  m_panel.checks().select("grain");
  type({Spot::checkCriterion, "P1", "grain"}, "hankinson");
  EntryField& n = *m_panel.fields().fields()[0];
  EXPECT_EQ(n.echoText(), QStringLiteral("= 2, usual"));
  QTest::keyClicks(&n.edit(), QStringLiteral("-1"));
  QTest::keyClick(&n.edit(), Qt::Key_Return);
  EXPECT_EQ(n.echoText(), QStringLiteral("still 2, usual"));
  EXPECT_TRUE(n.complaintText().startsWith(QStringLiteral("The parameter n is not greater than 0.")));
}

TEST_F(StrengthPanelTest, arrowsChooseTheCheckThatThePlotShows) {
  m_panel.checks().setFocus();
  m_panel.checks().select("grain");
  QTest::keyClick(&m_panel.checks(), Qt::Key_Down);
  EXPECT_EQ(m_panel.checks().selected(), 1);
  QTest::keyClick(&m_panel.checks(), Qt::Key_Up);
  EXPECT_EQ(m_panel.checks().selected(), 0);
}

TEST_F(StrengthPanelTest, withoutMaterialsItLeadsToThem) {
  m_desk.replace(newStudy());
  QSignalSpy wanted(&m_panel, &StrengthPanel::materialsWanted);
  EXPECT_EQ(m_panel.verdict().word(), QStringLiteral("not checked"));
  EXPECT_FALSE(m_panel.plot().isVisible());
  QTest::mouseClick(&m_panel.addButton(), Qt::LeftButton);
  EXPECT_EQ(wanted.count(), 1);
}

TEST_F(StrengthPanelTest, theRowInUseAmongAllCriteriaIsTheVerdict) {
  for (const std::string& shown : {std::string("1.35 G"), std::string("1.35 G + 1.5 S")}) {
    m_desk.show("P1", shown);
    SideBySideDialog dialog(m_desk, "grain", &m_panel);
    dialog.setAttribute(Qt::WA_DeleteOnClose, false);
    const QTreeWidgetItem& used = *dialog.table().topLevelItem(0);
    ASSERT_EQ(used.text(0), QStringLiteral("sum of squares"));
    EXPECT_EQ(used.text(2), utilisation(0).remove(QStringLiteral("▲ ")));
    EXPECT_EQ(used.text(3), QStringLiteral("1.35 G + 1.5 S"));
  }
}

TEST_F(StrengthPanelTest, aProblemOfAnotherCheckIsNamed) {
  type({Spot::checkCriterion, "P1", "grain"}, "hankinson");
  m_panel.checks().select("scarf");
  EXPECT_TRUE(m_panel.verdict().sentences().contains(
      QStringLiteral("Not judged: grain: C24, Hankinson, in 1.35 G.")));
}

TEST_F(StrengthPanelTest, aPointWithoutStressesIsNotPraised) {
  for (const char* name : {"G", "S"})
    for (const Spot spot : {Spot::sx, Spot::sy, Spot::txy})
      type({spot, "P1", name}, "0 MPa");
  EXPECT_TRUE(m_panel.verdict().sentences().contains(QStringLiteral("No stress is given at this point")));
  EXPECT_EQ(utilisation(0), QStringLiteral("no stress"));
}

TEST_F(StrengthPanelTest, allCriteriaStandSideBySide) {
  SideBySideDialog dialog(m_desk, "grain", &m_panel);
  dialog.setAttribute(Qt::WA_DeleteOnClose, false);
  EXPECT_EQ(dialog.table().topLevelItemCount(), static_cast<int>(criteriaFor(MaterialKind::timber).size()));
  type({Spot::sx, "P1", "G"}, "8 MPa");
  EXPECT_EQ(dialog.table().topLevelItemCount(), static_cast<int>(criteriaFor(MaterialKind::timber).size()));
  ASSERT_FALSE(m_desk.request({Remove{{Spot::check, "P1", "grain"}}}, m_desk.newGesture(), {}));
  EXPECT_EQ(dialog.table().topLevelItemCount(), 0);
}

} // namespace
} // namespace planewright

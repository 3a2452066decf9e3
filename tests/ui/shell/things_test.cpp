// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/section_edits.h"
#include "shell_test.h"
#include "ui/entry/draft_edit.h"
#include "ui/shell/build_dialog.h"
#include "ui/shell/things_dialog.h"

#include <QClipboard>
#include <QComboBox>
#include <QGuiApplication>
#include <QPushButton>
#include <QTableView>
#include <QTest>

namespace planewright {
namespace {

class ThingsTest : public ShellTest {
protected:
  static QString cell(const ThingsDialog& dialog, int row, int column) {
    return dialog.table().model()->index(row, column).data().toString();
  }
  static bool put(const ThingsDialog& dialog, int row, int column, const char* text) {
    QAbstractItemModel& model = *dialog.table().model();
    return model.setData(model.index(row, column), QString::fromUtf8(text), Qt::EditRole);
  }

  Desk m_desk{newStudy()};
};

TEST_F(ThingsTest, casesAreAddedNamedAndExcludedEachAsOneStep) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  EXPECT_EQ(cell(dialog, 0, 0), "G");
  dialog.add();
  dialog.add();
  ASSERT_EQ(m_desk.study().cases.size(), 3u);
  EXPECT_EQ(m_desk.study().cases[1].id, "Q");
  EXPECT_EQ(m_desk.study().cases[1].nature, Nature::variable);
  EXPECT_EQ(m_desk.undoStack()->count(), 2);
  EXPECT_TRUE(put(dialog, 1, 0, "W"));
  EXPECT_TRUE(put(dialog, 2, 4, "W"));
  EXPECT_TRUE(put(dialog, 2, 3, "short term"));
  EXPECT_EQ(m_desk.study().cases[2].excludes, std::vector<std::string>{"W"});
  EXPECT_EQ(m_desk.study().cases[2].duration, Duration::shortTerm);
  m_desk.undoStack()->undo();
  EXPECT_EQ(m_desk.study().cases[2].duration, Duration::medium);
}

TEST_F(ThingsTest, anotherStudyWithFewerThingsComesWhileTheLastRowIsChosen) {
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.show();
  for (int i = 0; i < 3; ++i)
    dialog.add();
  ASSERT_EQ(dialog.table().currentIndex().row(), 2);
  m_desk.replace(newStudy());
  EXPECT_EQ(dialog.table().model()->rowCount(), 0);
}

TEST_F(ThingsTest, whatIsNotTakenIsToldInTheWindow) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  dialog.show();
  dialog.add();
  EXPECT_FALSE(put(dialog, 1, 0, "G"));
  EXPECT_TRUE(dialog.complaint().contains("taken")) << dialog.complaint().toStdString();
  EXPECT_FALSE(put(dialog, 1, 4, "X"));
  EXPECT_TRUE(put(dialog, 1, 1, "Snow"));
  EXPECT_TRUE(dialog.complaint().isEmpty());
}

TEST_F(ThingsTest, whatWasRefusedIsForgottenWithTheNextRow) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  dialog.show();
  dialog.add();
  EXPECT_FALSE(put(dialog, 1, 0, "G"));
  dialog.table().setCurrentIndex(dialog.table().model()->index(0, 0));
  EXPECT_FALSE(dialog.complaint().isEmpty()) << "leaving the cell is what refused it";
  QCoreApplication::processEvents();
  dialog.table().setCurrentIndex(dialog.table().model()->index(1, 0));
  EXPECT_TRUE(dialog.complaint().isEmpty());
}

TEST_F(ThingsTest, theKeysAreInTheTableEachTimeItIsShown) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  for (int i = 0; i < 2; ++i) {
    dialog.show();
    dialog.activateWindow();
    ASSERT_TRUE(QTest::qWaitForWindowActive(&dialog));
    EXPECT_TRUE(dialog.table().hasFocus());
    dialog.findChildren<QPushButton*>().front()->setFocus();
    dialog.close();
  }
}

TEST_F(ThingsTest, aStepInAListNamesTheThing) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  EXPECT_TRUE(put(dialog, 0, 2, "variable"));
  EXPECT_EQ(m_desk.undoStack()->undoText(), "load case G: nature");
  EXPECT_TRUE(put(dialog, 0, 0, "D"));
  EXPECT_EQ(m_desk.undoStack()->undoText(), "load case G: name");
}

TEST_F(ThingsTest, aNameThatSaysOtherFactorsIsTold) {
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.add();
  EXPECT_TRUE(put(dialog, 0, 1, "1.35 G"));
  EXPECT_EQ(dialog.cautions(), "");
  EXPECT_TRUE(put(dialog, 0, 0, "1.5 G"));
  EXPECT_TRUE(dialog.cautions().contains("says other factors")) << dialog.cautions().toStdString();
}

TEST_F(ThingsTest, theLastCaseCannotGo) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  dialog.show();
  dialog.remove();
  EXPECT_EQ(m_desk.study().cases.size(), 1u);
  EXPECT_FALSE(dialog.complaint().isEmpty());
}

TEST_F(ThingsTest, combinationsAreTypedAsPeopleWriteThem) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.add();
  EXPECT_EQ(cell(dialog, 0, 0), "1 G + 1 Q");
  EXPECT_TRUE(put(dialog, 0, 1, "1.35 G + 1.5*0.7 Q"));
  EXPECT_EQ(cell(dialog, 0, 0), "1.35 G + 1.5*0.7 Q");
  EXPECT_TRUE(put(dialog, 0, 0, "snow leads"));
  EXPECT_FALSE(put(dialog, 0, 1, "1.35 G + 1.5 X"));
  EXPECT_EQ(m_desk.study().combinations[0].factors, (std::vector<Factor>{{"G", "1.35"}, {"Q", "1.5*0.7"}}));
}

TEST_F(ThingsTest, combinationsArePastedWholeOrNotAtAll) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.show();
  const int steps = m_desk.undoStack()->count();
  QGuiApplication::clipboard()->setText("1.35 G\r\n1.35 G + 1,5 Q\r\n");
  dialog.paste();
  EXPECT_TRUE(m_desk.study().combinations.empty());
  EXPECT_TRUE(dialog.complaint().startsWith("Line 2: ")) << dialog.complaint().toStdString();
  QGuiApplication::clipboard()->setText("1.35 G\r\nleading Q\t1.35 G + 1.5 Q\r\n");
  dialog.paste();
  EXPECT_EQ(cell(dialog, 0, 0), "1.35 G");
  EXPECT_EQ(cell(dialog, 1, 0), "leading Q");
  EXPECT_EQ(cell(dialog, 1, 1), "1.35 G + 1.5 Q");
  EXPECT_EQ(m_desk.undoStack()->count(), steps + 1);
  EXPECT_TRUE(dialog.complaint().isEmpty());
}

TEST_F(ThingsTest, combinationsGoByTheCasesThatAreThere) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.add();
  EXPECT_TRUE(put(cases, 1, 0, "W"));
  EXPECT_EQ(cell(dialog, 0, 0), "1 G + 1 W");
  cases.remove();
  EXPECT_EQ(cell(dialog, 0, 0), "1 G");
  EXPECT_EQ(m_desk.undoStack()->count(), 4);
}

TEST_F(ThingsTest, aNewCombinationLeavesOutWhatCannotBeInIt) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  cases.add();
  EXPECT_TRUE(put(cases, 2, 2, "measured"));
  EXPECT_TRUE(put(cases, 2, 4, "G, Q"));
  ThingsDialog dialog(m_desk, combinations(), nullptr);
  dialog.add();
  EXPECT_EQ(cell(dialog, 0, 0), "1 G + 1 Q");
  dialog.add();
  EXPECT_EQ(cell(dialog, 1, 0), "2 G + 2 Q");
}

TEST_F(ThingsTest, pointsAreDuplicatedAndMoved) {
  type(m_desk, Spot::sx, "8 MPa");
  ThingsDialog dialog(m_desk, points(), nullptr);
  dialog.copy();
  ASSERT_EQ(m_desk.study().points.size(), 2u);
  EXPECT_EQ(m_desk.study().points[1].name, "P2");
  EXPECT_EQ(m_desk.study().points[1].stress, m_desk.study().points[0].stress);
  EXPECT_TRUE(put(dialog, 1, 0, "heel"));
  dialog.moveUp();
  EXPECT_EQ(m_desk.study().points[0].name, "heel");
  EXPECT_EQ(dialog.table().currentIndex().row(), 0);
  dialog.remove();
  EXPECT_EQ(m_desk.study().points.size(), 1u);
  m_desk.undoStack()->undo();
  EXPECT_EQ(cell(dialog, 0, 0), "heel");
}

TEST_F(ThingsTest, sectionsAreNamedShapedCopiedAndKeptWhileAPointLiesInThem) {
  ThingsDialog dialog(m_desk, sections(), nullptr);
  dialog.show();
  dialog.add();
  ASSERT_EQ(m_desk.study().sections.size(), 1u);
  ASSERT_FALSE(
      m_desk.request(editsThatGiveFibre(m_desk.study(), "P1", "section 1"), m_desk.newGesture(), "fibre"));
  EXPECT_TRUE(put(dialog, 0, 0, "beam"));
  EXPECT_EQ(m_desk.study().points[0].fibre->section, "beam") << "its points follow";
  EXPECT_TRUE(put(dialog, 0, 1, "round tube"));
  EXPECT_EQ(m_desk.study().sections[0].shape, SectionShape::tube);
  EXPECT_EQ(cell(dialog, 0, 2), "d = 200 mm, t = 10 mm");
  EXPECT_EQ(cell(dialog, 0, 3), "P1");
  EXPECT_FALSE(put(dialog, 0, 3, "P2"));
  EXPECT_FALSE(
      dialog.table().model()->flags(dialog.table().model()->index(0, 2)).testFlag(Qt::ItemIsEditable));

  dialog.copy();
  ASSERT_EQ(m_desk.study().sections.size(), 2u);
  EXPECT_EQ(m_desk.study().sections[1].name, "beam 2");
  EXPECT_EQ(m_desk.study().sections[1].sizes, m_desk.study().sections[0].sizes);
  EXPECT_FALSE(put(dialog, 1, 0, "beam"));
  EXPECT_TRUE(dialog.complaint().contains("taken")) << dialog.complaint().toStdString();

  dialog.moveUp();
  EXPECT_EQ(m_desk.study().sections[1].name, "beam");
  dialog.moveDown();
  dialog.remove();
  EXPECT_EQ(m_desk.study().sections.size(), 1u) << "the copy holds no point";
  dialog.remove();
  EXPECT_EQ(m_desk.study().sections.size(), 1u);
  EXPECT_TRUE(dialog.complaint().contains("Points lie in the section “beam”: P1."))
      << dialog.complaint().toStdString();
}

TEST_F(ThingsTest, anEmptyListOfSectionsOffersOnlyANewOne) {
  ThingsDialog dialog(m_desk, sections(), nullptr);
  dialog.show();
  dialog.remove();
  dialog.copy();
  dialog.moveUp();
  EXPECT_EQ(m_desk.study(), newStudy());
}

TEST_F(ThingsTest, choicesAreMadeWithTheKeyboard) {
  ThingsDialog dialog(m_desk, loadCases(), nullptr);
  dialog.show();
  dialog.table().setCurrentIndex(dialog.table().model()->index(0, 2));
  dialog.table().edit(dialog.table().currentIndex());
  auto* list = dialog.table().findChild<QComboBox*>();
  ASSERT_NE(list, nullptr);
  EXPECT_EQ(list->currentText(), "permanent");
  QTest::keyClick(list, Qt::Key_Down);
  QTest::keyClick(list, Qt::Key_Return);
  EXPECT_EQ(m_desk.study().cases[0].nature, Nature::variable);
}

TEST_F(ThingsTest, builtCombinationsAreListedBeforeTheyAreTaken) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  BuildDialog dialog(m_desk, nullptr);
  EXPECT_EQ(dialog.count(), "4 combinations");
  EXPECT_EQ(dialog.listed(), "1.35 G\n1 G\n1.35 G + 1.5 Q\n1 G + 1.5 Q");
  EXPECT_TRUE(m_desk.study().combinations.empty());
  EXPECT_TRUE(dialog.notes().contains("nationally determined"));
  EXPECT_FALSE(dialog.notes().contains("in none of them"));
  EXPECT_TRUE(put(cases, 0, 2, "accidental"));
  EXPECT_TRUE(dialog.notes().endsWith("in none of them: G."));
  EXPECT_TRUE(put(cases, 0, 2, "permanent"));
  dialog.factor("variable").selectAll();
  QTest::keyClicks(&dialog.factor("variable"), "1.6");
  EXPECT_TRUE(dialog.listed().endsWith("1 G + 1.6 Q"));
  const int steps = m_desk.undoStack()->count();
  dialog.takeButton().click();
  EXPECT_EQ(m_desk.study().combinations.size(), 4u);
  EXPECT_EQ(m_desk.undoStack()->count(), steps + 1);
  EXPECT_FALSE(dialog.takeButton().isEnabled());
  EXPECT_EQ(dialog.count(), "4 combinations, 4 of them in the study already");
}

TEST_F(ThingsTest, buildingFollowsTheCasesWhileItsWindowIsOpen) {
  ThingsDialog cases(m_desk, loadCases(), nullptr);
  cases.add();
  BuildDialog dialog(m_desk, nullptr);
  dialog.factor("of Q").selectAll();
  QTest::keyClicks(&dialog.factor("of Q"), "0.8");
  cases.add();
  EXPECT_EQ(dialog.factor("of S").text(), "0.5");
  EXPECT_EQ(dialog.count(), "10 combinations") << dialog.complaint().toStdString();
  EXPECT_TRUE(dialog.listed().contains("1.2 Q + 1.5 S")) << "what was typed stays";
  EXPECT_TRUE(put(cases, 1, 0, "W"));
  EXPECT_EQ(dialog.factor("of W").text(), "0.6");
  EXPECT_THROW(dialog.factor("of Q"), std::out_of_range);
  EXPECT_TRUE(put(cases, 1, 2, "accidental"));
  EXPECT_EQ(dialog.count(), "4 combinations");
}

TEST_F(ThingsTest, aFactorThatDoesNotReadBuildsNothing) {
  BuildDialog dialog(m_desk, nullptr);
  dialog.factor("upper").selectAll();
  QTest::keyClicks(&dialog.factor("upper"), "1,35");
  EXPECT_EQ(dialog.count(), "Nothing is built.");
  EXPECT_TRUE(dialog.complaint().startsWith(QString::fromUtf8("γ of permanent, unfavourable: ")))
      << dialog.complaint().toStdString();
  EXPECT_FALSE(dialog.takeButton().isEnabled());
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/look/strip.h"
#include "ui/shell/main_window.h"
#include "ui/shell/paste_dialog.h"
#include "ui/shell/status_line.h"

#include <QApplication>
#include <QCheckBox>
#include <QClipboard>
#include <QComboBox>
#include <QFile>
#include <QMenuBar>
#include <QPointer>
#include <QPushButton>
#include <QSignalSpy>
#include <QTableView>
#include <QTest>

namespace planewright {
namespace {

class PasteDialogTest : public ShellTest {
protected:
  /// The dialog ends itself, as every window does that is closed.
  PasteDialog& show(const char* table) {
    m_dialog = new PasteDialog(m_desk, table, QStringLiteral("Paste a table"), nullptr);
    m_dialog->show();
    return *m_dialog;
  }
  ~PasteDialogTest() override { delete m_dialog; }

  static QString cell(const PasteDialog& dialog, int row, int column) {
    return dialog.table().model()->index(row, column).data().toString();
  }
  static void choose(const PasteDialog& dialog, int column, const QString& words) {
    QComboBox& list = dialog.meaning(column);
    list.setCurrentText(words);
    ASSERT_EQ(list.currentText(), words);
    Q_EMIT list.activated(list.currentIndex());
  }

  Desk m_desk{newStudy()};
  QPointer<PasteDialog> m_dialog;
};

TEST_F(PasteDialogTest, showsWhatWouldBeKeptAndTakesAllOfItInOneStep) {
  PasteDialog& dialog = show("point\tcase\tsx [kPa]\tsy\nP1\tG\t1500\t2\nP2\tQ\t-3\t4 psi\n");
  EXPECT_EQ(cell(dialog, 0, 2), "1500 kPa");
  EXPECT_EQ(cell(dialog, 1, 3), "4 psi");
  EXPECT_TRUE(dialog.header().isChecked());
  EXPECT_EQ(dialog.meaning(2).currentText(), QString::fromUtf8("σx"));
  EXPECT_TRUE(dialog.additions().contains("added: P2."));
  EXPECT_TRUE(dialog.additions().contains("as variable: Q."));
  EXPECT_TRUE(dialog.additions().contains("replaced: 2."));
  EXPECT_TRUE(dialog.cautions().contains("tension positive"));
  EXPECT_TRUE(dialog.complaint().isEmpty());
  EXPECT_EQ(m_desk.undoStack()->count(), 0);

  const Study before = m_desk.study();
  ASSERT_TRUE(dialog.takeButton().isEnabled());
  QTest::keyClick(&dialog, Qt::Key_Return);
  EXPECT_FALSE(dialog.isVisible());
  EXPECT_EQ(m_desk.undoStack()->count(), 1);
  EXPECT_EQ(m_desk.study().points.at(1).stress.at(0).sy, "4 psi");
  m_desk.undoStack()->undo();
  EXPECT_EQ(m_desk.study(), before);
}

TEST_F(PasteDialogTest, marksWrongRowsSaysWhyAndTakesNothing) {
  PasteDialog& dialog = show("case\tsx\tsy\nG\t1\t2\nQ\t12 kN\t2\nW\t1\t1,234\n");
  EXPECT_FALSE(dialog.takeButton().isEnabled());
  EXPECT_EQ(dialog.table().currentIndex().row(), 1);
  EXPECT_TRUE(dialog.complaint().startsWith("Line 3, column 2: This is a force"));
  EXPECT_TRUE(cell(dialog, 1, 3).startsWith(QString::fromUtf8("▲ This is a force")));
  EXPECT_TRUE(cell(dialog, 0, 3).isEmpty());
  EXPECT_EQ(dialog.table().columnViewportPosition(3), 0) << "what is wrong stands first";
  const QModelIndex wrong = dialog.table().model()->index(1, 1);
  EXPECT_TRUE(wrong.data(Qt::BackgroundRole).isValid());
  EXPECT_FALSE(wrong.siblingAtColumn(2).data(Qt::BackgroundRole).isValid());

  EXPECT_EQ(dialog.table().model()->headerData(1, Qt::Vertical).toString(), QString::fromUtf8("▲ 3"));

  dialog.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&dialog));
  QTest::keyClick(&dialog.table(), Qt::Key_F8);
  EXPECT_EQ(dialog.table().currentIndex(), dialog.table().model()->index(2, 2));
  EXPECT_TRUE(dialog.complaint().contains("can be 1234 or 1.2340"));
  dialog.nextWrongRow();
  EXPECT_EQ(dialog.table().currentIndex().row(), 1);

  QTest::keyClick(&dialog, Qt::Key_Return);
  EXPECT_TRUE(dialog.isVisible());
  QTest::keyClick(&dialog, Qt::Key_Escape);
  EXPECT_FALSE(dialog.isVisible());
  EXPECT_EQ(m_desk.study(), newStudy());
}

TEST_F(PasteDialogTest, theMeaningOfColumnsIsChosenAboveThem) {
  PasteDialog& dialog = show("Lastfall;Spannung [kPa];Nr\nG;2,5;1\n");
  EXPECT_FALSE(dialog.complaint().isEmpty());
  EXPECT_FALSE(dialog.header().isChecked());
  QTest::mouseClick(&dialog.header(), Qt::LeftButton, {}, {5, dialog.header().height() / 2});
  ASSERT_TRUE(dialog.header().isChecked());
  choose(dialog, 0, QStringLiteral("load case"));
  choose(dialog, 1, QString::fromUtf8("σx"));
  EXPECT_FALSE(dialog.takeButton().isEnabled());
  choose(dialog, 2, QStringLiteral("not used"));
  EXPECT_TRUE(dialog.takeButton().isEnabled()) << dialog.complaint().toStdString();
  EXPECT_EQ(cell(dialog, 0, 1), "2.5 kPa");
}

TEST_F(PasteDialogTest, aGuessStaysWhereOneOfItsColumnsIsChosenAnew) {
  PasteDialog& dialog = show("G\t1\t2\t3\n");
  EXPECT_TRUE(dialog.cautions().contains("count"));
  choose(dialog, 3, QString::fromUtf8("σz"));
  EXPECT_EQ(dialog.meaning(1).currentText(), QString::fromUtf8("σx"));
  EXPECT_TRUE(dialog.takeButton().isEnabled());
}

TEST_F(PasteDialogTest, followsTheStudyAndSaysWhereRowsGo) {
  ASSERT_FALSE(m_desk.request({Insert{{Spot::point, "P2", {}}, std::nullopt}}, m_desk.newGesture(), "point"));
  PasteDialog& dialog = show("case\tsx\nG\t1\n");
  EXPECT_TRUE(dialog.additions().contains("go to P1"));
  m_desk.show("P2", "");
  EXPECT_TRUE(dialog.additions().contains("go to P2"));
  dialog.takeButton().click();
  EXPECT_EQ(m_desk.study().points[1].stress[0].sx, "1 MPa");
  EXPECT_EQ(m_desk.study().points[0].stress[0].sx, "0 MPa");
}

TEST_F(PasteDialogTest, meaningsAreReachedByTab) {
  PasteDialog& dialog = show("case\tsx\nG\t1\n");
  dialog.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&dialog));
  dialog.header().setFocus();
  for (QWidget* next :
       std::initializer_list<QWidget*>{&dialog.meaning(0), &dialog.meaning(1), &dialog.table()}) {
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
    EXPECT_EQ(QApplication::focusWidget(), next);
  }
}

TEST_F(PasteDialogTest, nothingOnTheClipboardIsSaid) {
  PasteDialog& dialog = show("");
  EXPECT_TRUE(dialog.complaint().startsWith("There is no table"));
  EXPECT_FALSE(dialog.takeButton().isEnabled());
}

class TablesOfWindow : public ShellTest {
protected:
  static QAction* action(const MainWindow& window, const QString& words) {
    for (QAction* one : window.findChildren<QAction*>())
      if (one->text().remove('&') == words)
        return one;
    return nullptr;
  }
};

TEST_F(TablesOfWindow, whatIsCopiedIsPastedByItsKeys) {
  MainWindow window(answers());
  window.openWorkedExample();
  window.show();
  window.activateWindow();
  ASSERT_TRUE(QTest::qWaitForWindowActive(&window));
  action(window, "Copy stresses of all points")->trigger();
  EXPECT_TRUE(QApplication::clipboard()->text().startsWith("point\tnote\tsection\ty\tz\tview\tline"));
  EXPECT_TRUE(window.statusLine().words().contains("Not in the table: sizes of sections, second lines"))
      << window.statusLine().words().toStdString();
  const Study study = window.desk().study();

  QTest::keyClick(QApplication::focusWidget(), Qt::Key_V, Qt::ControlModifier | Qt::ShiftModifier);
  QPointer<PasteDialog> dialog = window.findChild<PasteDialog*>();
  ASSERT_NE(dialog, nullptr);
  EXPECT_TRUE(dialog->additions().contains("has all of this already"));
  EXPECT_FALSE(dialog->takeButton().isEnabled());
  dialog->close();
  EXPECT_EQ(window.desk().study(), study);
}

TEST_F(TablesOfWindow, pointsGoToAFileAndComeBack) {
  MainWindow window(answers());
  window.openWorkedExample();
  const Study study = window.desk().study();
  m_exportPath = m_importPath = file("points.csv");
  action(window, "Export points…")->trigger();
  ASSERT_TRUE(QFile::exists(m_exportPath));
  EXPECT_TRUE(window.statusLine().words().contains("Not in the table"));

  type(window.desk(), Spot::sx, "99 MPa");
  type(window.desk(), Spot::pointNote, "another");
  action(window, "Import points…")->trigger();
  QPointer<PasteDialog> dialog = window.findChild<PasteDialog*>();
  ASSERT_NE(dialog, nullptr);
  EXPECT_TRUE(dialog->windowTitle().contains("points.csv"));
  EXPECT_TRUE(dialog->additions().contains("replaced: 2."));
  ASSERT_TRUE(dialog->takeButton().isEnabled()) << dialog->complaint().toStdString();
  dialog->takeButton().click();
  EXPECT_EQ(window.desk().study(), study);
}

TEST_F(TablesOfWindow, aNewStudyTakesThePointsAsSoonAsItHasTheirSection) {
  MainWindow window(answers());
  window.openWorkedExample();
  const Study example = window.desk().study();
  m_exportPath = m_importPath = file("points.csv");
  action(window, "Export points…")->trigger();

  window.desk().replace(newStudy());
  action(window, "Import points…")->trigger();
  QPointer<PasteDialog> dialog = window.findChild<PasteDialog*>();
  ASSERT_NE(dialog, nullptr);
  EXPECT_TRUE(dialog->complaint().contains("This study has no section “ridge beam”"))
      << dialog->complaint().toStdString();
  ASSERT_FALSE(window.desk().request({Insert{{Spot::section, "ridge beam", {}}, std::nullopt},
                                      Type{{Spot::size, "ridge beam", "b"}, "140 mm"},
                                      Type{{Spot::size, "ridge beam", "h"}, "600 mm"}},
                                     window.desk().newGesture(), "section"));
  EXPECT_TRUE(dialog->additions().contains("as measured: M")) << dialog->complaint().toStdString();
  ASSERT_TRUE(dialog->takeButton().isEnabled());
  dialog->takeButton().click();
  for (const Point& point : example.points) {
    const Point* taken = findPoint(window.desk().study(), point.name);
    ASSERT_NE(taken, nullptr);
    EXPECT_EQ(taken->stress, point.stress);
    EXPECT_EQ(taken->fibre, point.fibre);
  }
}

TEST_F(TablesOfWindow, aFileThatIsNotThereIsToldInTheWindow) {
  MainWindow window(answers());
  m_importPath = file("missing.csv");
  action(window, "Import points…")->trigger();
  EXPECT_EQ(window.findChild<PasteDialog*>(), nullptr);
  EXPECT_FALSE(window.trouble().isHidden());
  m_importPath.clear();
  EXPECT_FALSE(window.filing().readTable());
}

} // namespace
} // namespace planewright

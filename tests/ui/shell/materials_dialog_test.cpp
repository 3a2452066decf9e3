// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/material_edits.h"
#include "shell_test.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/strip.h"
#include "ui/shell/main_window.h"
#include "ui/shell/material_fields.h"
#include "ui/shell/materials_dialog.h"
#include "ui/shell/materials_list.h"

#include <QComboBox>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QTest>
#include <QTreeWidget>

#include <algorithm>
#include <filesystem>
#include <fstream>
#include <memory>

namespace planewright {
namespace {

class MaterialsTest : public ShellTest {
protected:
  MaterialsTest() { show(); }

  std::string ownPath() const { return file(QStringLiteral("settings/materials.json")).toStdString(); }
  void show() {
    m_dialog = std::make_unique<MaterialsDialog>(m_desk, ownPath(), nullptr);
    m_dialog->show();
    m_dialog->activateWindow();
    ASSERT_TRUE(QTest::qWaitForWindowActive(m_dialog.get()));
  }

  const std::vector<Material>& materials() const { return m_desk.study().materials; }
  QTreeWidgetItem* item(const QString& name) const {
    return m_dialog->list().tree().findItems(name, Qt::MatchExactly | Qt::MatchRecursive).value(0);
  }
  bool isListed(const QString& name) const { return item(name) && !item(name)->isHidden(); }
  void click(const QString& name) {
    QTreeWidget& tree = m_dialog->list().tree();
    tree.scrollToItem(item(name));
    QTest::mouseClick(tree.viewport(), Qt::LeftButton, {}, tree.visualItemRect(item(name)).center());
  }
  QPushButton* button(const QString& words) const {
    for (auto* button : m_dialog->findChildren<QPushButton*>())
      if (button->text().remove(QLatin1Char('&')) == words)
        return button;
    return nullptr;
  }
  void press(const QString& words) {
    ASSERT_TRUE(button(words) && button(words)->isVisible()) << words.toStdString();
    QTest::mouseClick(button(words), Qt::LeftButton);
  }
  void type(Spot spot, const char* text) {
    DraftEdit& edit = m_dialog->fields().field(spot).edit();
    edit.setFocus(Qt::TabFocusReason);
    edit.selectAll();
    QTest::keyClicks(&edit, QString::fromUtf8(text));
    QTest::keyClick(&edit, Qt::Key_Return);
  }
  void choose(Spot spot, int row) {
    QComboBox& box = m_dialog->fields().choice(spot);
    box.setCurrentIndex(row);
    Q_EMIT box.activated(row);
  }
  /// A check of the point by this material.
  void judgeBy(const std::string& name) {
    Study study = m_desk.study();
    Check check;
    check.id = "along the grain";
    check.material = name;
    check.line = "grain";
    study.points.front().checks.push_back(check);
    ASSERT_TRUE(problemsIn(study).empty()) << plain(problemsIn(study).front());
    m_desk.replace(study);
  }

  Desk m_desk{newStudy()};
  std::unique_ptr<MaterialsDialog> m_dialog;
};

TEST_F(MaterialsTest, anotherServiceClassSaysThatItChangesNoFactorAndOffersThem) {
  click(QStringLiteral("C24"));
  press(QStringLiteral("Take into the study"));
  EXPECT_EQ(m_dialog->fields().classRemark(), QString());
  type(Spot::serviceClass, "3");
  EXPECT_TRUE(m_dialog->fields().classRemark().contains(QStringLiteral("not those of service class 3")));
  m_dialog->fields().classButton().click();
  EXPECT_EQ(materials().front().durations.permanent, "0.50");
  EXPECT_EQ(m_dialog->fields().classRemark(), QString());
  EXPECT_EQ(m_desk.undoStack()->count(), 3);
}

TEST_F(MaterialsTest, whatIsNotTakenIsSaidWhenTheWindowIsClosed) {
  click(QStringLiteral("C24"));
  press(QStringLiteral("Take into the study"));
  QString said;
  QObject::connect(&m_desk, &Desk::said, [&said](const QString& message) { said = message; });
  type(spotOf(StrengthKey::shear), "-4");
  m_dialog->close();
  EXPECT_EQ(said, QStringLiteral("“-4” for fv of C24 was not taken."));
}

TEST_F(MaterialsTest, aShippedMaterialIsReadWithItsTrustAndTakenAsOneStep) {
  click(QStringLiteral("GL24h"));
  EXPECT_TRUE(m_dialog->sheet().contains("read second-hand")) << m_dialog->sheet().toStdString();
  EXPECT_TRUE(m_dialog->sheet().contains("read it again in the standard before relying on it"));
  EXPECT_TRUE(m_dialog->sheet().contains("EN 14080:2013"));
  EXPECT_TRUE(m_dialog->sheet().contains("19.2 MPa"));
  EXPECT_TRUE(materials().empty());
  press(QStringLiteral("Take into the study"));
  ASSERT_EQ(materials().size(), 1u);
  EXPECT_EQ(materials().front().name, "GL24h");
  EXPECT_EQ(materials().front().durations.permanent, "0.60");
  EXPECT_EQ(m_desk.undoStack()->count(), 1);
  EXPECT_EQ(m_dialog->choice(), (MaterialChoice{MaterialOrigin::study, "GL24h"}));
  EXPECT_EQ(m_dialog->fields().field(Spot::alongTension).edit().text(), "19.2 MPa");
}

TEST_F(MaterialsTest, takenTwiceItGetsANameOfItsOwn) {
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  m_dialog->take();
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  m_dialog->take();
  ASSERT_EQ(materials().size(), 2u);
  EXPECT_EQ(materials()[1].name, "C24 2");
  EXPECT_TRUE(m_dialog->message().sentence().contains("C24 2"));
}

TEST_F(MaterialsTest, theServiceClassGivesTheFactorsThatAreTaken) {
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  QComboBox& box = m_dialog->serviceClass();
  ASSERT_TRUE(box.isVisible());
  box.setFocus();
  QTest::keyClick(&box, Qt::Key_End);
  EXPECT_EQ(box.currentText(), "3");
  EXPECT_TRUE(m_dialog->sheet().contains("0.50"));
  m_dialog->take();
  EXPECT_EQ(materials().front().serviceClass, "3");
  EXPECT_EQ(materials().front().durations.permanent, "0.50");
  m_dialog->choose({MaterialOrigin::shipped, "fillet weld, S235"});
  EXPECT_FALSE(box.isVisible());
}

TEST_F(MaterialsTest, itOpensAtTheTopOfTheList) {
  QTreeWidget& tree = m_dialog->list().tree();
  EXPECT_EQ(tree.itemAt(QPoint(40, 4)), item(QStringLiteral("In this study")));
  EXPECT_TRUE(tree.viewport()->rect().contains(tree.visualItemRect(item(QStringLiteral("C14")))));
}

TEST_F(MaterialsTest, byKeyboardAMaterialIsFoundTakenAndTyped) {
  QLineEdit& filter = m_dialog->list().filter();
  EXPECT_TRUE(filter.hasFocus());
  QTest::keyClicks(&filter, "gl2");
  EXPECT_FALSE(isListed(QStringLiteral("C24")));
  EXPECT_TRUE(isListed(QStringLiteral("GL28h")));
  EXPECT_EQ(m_dialog->choice().name, "GL20h");
  QTest::keyClicks(&filter, "4");
  EXPECT_EQ(m_dialog->choice().name, "GL24h");
  QTest::keyClick(&filter, Qt::Key_Backspace);
  EXPECT_EQ(m_dialog->choice().name, "GL24h");
  QTest::keyClick(&filter, Qt::Key_Up);
  EXPECT_EQ(m_dialog->choice().name, "GL20h");
  QTest::keyClick(&filter, Qt::Key_Down);
  EXPECT_EQ(m_dialog->choice().name, "GL24h");
  QTest::keyClick(&filter, Qt::Key_Return);
  ASSERT_EQ(materials().size(), 1u);
  EXPECT_EQ(materials().front().name, "GL24h");
  QTest::keyClick(&filter, Qt::Key_Return);
  auto* edit = qobject_cast<DraftEdit*>(m_dialog->focusWidget());
  ASSERT_EQ(edit, &m_dialog->fields().field(Spot::alongTension).edit());
  QTest::keyClicks(edit, "20");
  QTest::keyClick(edit, Qt::Key_Tab);
  EXPECT_EQ(materials().front().alongTension, "20 MPa");
  EXPECT_EQ(m_dialog->focusWidget(), &m_dialog->fields().field(Spot::alongCompression).edit());
}

TEST_F(MaterialsTest, undoWorksFromItsFields) {
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  m_dialog->take();
  type(Spot::strengthShear, "5 MPa");
  EXPECT_EQ(materials().front().shear, "5 MPa");
  QTest::keyClick(&m_dialog->fields().field(Spot::strengthShear).edit(), Qt::Key_Z, Qt::ControlModifier);
  EXPECT_EQ(materials().front().shear, "4.0 MPa");
}

TEST_F(MaterialsTest, whatDoesNotReadIsToldUnderItsField) {
  m_dialog->add(MaterialKind::timber);
  type(Spot::strengthShear, "4 kN");
  const EntryField& field = m_dialog->fields().field(Spot::strengthShear);
  EXPECT_FALSE(field.isTaken());
  EXPECT_FALSE(field.complaintText().isEmpty());
  type(Spot::strengthShear, "-4 MPa");
  EXPECT_TRUE(field.complaintText().contains("not greater than 0")) << field.complaintText().toStdString();
  type(Spot::strengthShear, "4*1.1 MPa");
  EXPECT_TRUE(field.isTaken());
  EXPECT_TRUE(field.echoText().contains("4.4")) << field.echoText().toStdString();
  EXPECT_EQ(materials().front().shear, "4*1.1 MPa");
}

TEST_F(MaterialsTest, aNewMaterialIsNamedAtOnce) {
  m_dialog->add(MaterialKind::coulomb);
  EXPECT_EQ(materials().front().name, "coulomb");
  auto* edit = qobject_cast<DraftEdit*>(m_dialog->focusWidget());
  ASSERT_EQ(edit, &m_dialog->fields().name().edit());
  QTest::keyClicks(edit, "joint");
  QTest::keyClick(edit, Qt::Key_Return);
  EXPECT_EQ(materials().front().name, "joint");
  EXPECT_EQ(m_dialog->choice().name, "joint");
  type(Spot::friction, "32 deg");
  EXPECT_EQ(materials().front().friction, "32 deg");
  EXPECT_FALSE(m_dialog->fields().choice(Spot::seam).isVisible());
  m_desk.undoStack()->undo();
  m_desk.undoStack()->undo();
  EXPECT_EQ(m_dialog->choice().name, "coulomb");
}

TEST_F(MaterialsTest, aNameThatIsTakenIsRefusedUnderTheField) {
  m_dialog->add(MaterialKind::bond);
  m_dialog->add(MaterialKind::bond);
  DraftEdit& edit = m_dialog->fields().name().edit();
  QTest::keyClicks(&edit, "bond");
  QTest::keyClick(&edit, Qt::Key_Return);
  EXPECT_TRUE(m_dialog->fields().name().complaintText().contains("taken"));
  EXPECT_EQ(materials()[1].name, "bond 2");
}

TEST_F(MaterialsTest, aFilterLeavesNoHeadingAlone) {
  QLineEdit& filter = m_dialog->list().filter();
  QTest::keyClicks(&filter, "epoxy");
  EXPECT_TRUE(isListed(QStringLiteral("AS4/3501-6 carbon/epoxy")));
  EXPECT_TRUE(item(QStringLiteral("Glulam"))->isHidden());
  EXPECT_TRUE(item(QStringLiteral("In this study"))->isHidden());
  QTest::keyClicks(&filter, "x");
  EXPECT_TRUE(item(QStringLiteral("Laminae"))->isHidden());
  filter.clear();
  EXPECT_TRUE(isListed(QStringLiteral("C14")));
  EXPECT_TRUE(isListed(QStringLiteral("none yet")));
}

TEST_F(MaterialsTest, whatIsRenamedIsSeenThoughItFitsTheFilterNoMore) {
  QTest::keyClicks(&m_dialog->list().filter(), "C24");
  QTest::keyClick(&m_dialog->list().filter(), Qt::Key_Return);
  DraftEdit& edit = m_dialog->fields().name().edit();
  edit.setFocus(Qt::TabFocusReason);
  edit.selectAll();
  QTest::keyClicks(&edit, "spruce");
  QTest::keyClick(&edit, Qt::Key_Return);
  EXPECT_EQ(materials().front().name, "spruce");
  EXPECT_TRUE(isListed(QStringLiteral("spruce")));
  EXPECT_EQ(m_dialog->list().tree().currentItem(), item(QStringLiteral("spruce")));
}

TEST_F(MaterialsTest, f2RenamesWhatTheListStandsOn) {
  m_dialog->add(MaterialKind::bond);
  m_dialog->list().tree().setFocus();
  QTest::keyClick(&m_dialog->list().tree(), Qt::Key_F2);
  EXPECT_EQ(m_dialog->focusWidget(), &m_dialog->fields().name().edit());
}

TEST_F(MaterialsTest, anotherKindTakesWhatItHasNotAway) {
  m_dialog->choose({MaterialOrigin::shipped, "fillet weld, S235"});
  m_dialog->take();
  EXPECT_TRUE(m_dialog->fields().choice(Spot::seam).isVisible());
  EXPECT_FALSE(m_dialog->fields().field(Spot::partialFactor).isVisible());
  choose(Spot::seam, 1);
  EXPECT_EQ(materials().front().seam, Seam::butt);
  choose(Spot::materialKind, static_cast<int>(MaterialKind::timber));
  EXPECT_EQ(materials().front().fu, "");
  EXPECT_EQ(materials().front().seam, Seam::fillet);
  EXPECT_TRUE(m_dialog->fields().field(Spot::alongBending).isVisible());
  EXPECT_TRUE(m_dialog->fields().field(Spot::partialFactor).isVisible());
  m_desk.undoStack()->undo();
  EXPECT_EQ(materials().front().fu, "360 MPa");
}

TEST_F(MaterialsTest, aKindThatItsChecksCannotJudgeIsToldAndNotTaken) {
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  m_dialog->take();
  judgeBy("C24");
  choose(Spot::materialKind, static_cast<int>(MaterialKind::bond));
  EXPECT_EQ(materials().front().kind, MaterialKind::timber);
  EXPECT_EQ(m_dialog->fields().choice(Spot::materialKind).currentIndex(), 0);
  EXPECT_TRUE(m_dialog->fields().complaint().contains("does not judge"))
      << m_dialog->fields().complaint().toStdString();
}

TEST_F(MaterialsTest, removingTellsTheChecksThatGoAndCanBeUndone) {
  m_dialog->choose({MaterialOrigin::shipped, "C24"});
  m_dialog->take();
  judgeBy("C24");
  const auto labels = m_dialog->fields().findChildren<QLabel*>();
  EXPECT_TRUE(std::ranges::any_of(labels, [](const QLabel* label) {
    return label->isVisible() && label->text().contains(QStringLiteral("“along the grain” of P1"));
  }));
  press(QStringLiteral("Remove from the study"));
  EXPECT_TRUE(materials().empty());
  EXPECT_TRUE(m_desk.study().points.front().checks.empty());
  EXPECT_TRUE(m_dialog->message().sentence().contains("the check by it"));
  m_dialog->message().follow(QStringLiteral("Undo"));
  EXPECT_EQ(m_desk.study().points.front().checks.size(), 1u);
  EXPECT_TRUE(m_dialog->message().isHidden());
}

TEST_F(MaterialsTest, whatIsKeptIsThereInAnotherStudy) {
  m_dialog->add(MaterialKind::timber);
  type(Spot::strengthShear, "9 MPa");
  type(Spot::materialTrust, "measured here");
  press(QStringLiteral("Keep in own library"));
  EXPECT_TRUE(m_dialog->message().sentence().contains("in your library"));
  press(QStringLiteral("Keep in own library"));
  EXPECT_TRUE(m_dialog->message().sentence().contains("already"));
  m_desk.replace(newStudy());
  show();
  m_dialog->choose({MaterialOrigin::own, "timber"});
  EXPECT_TRUE(m_dialog->sheet().contains("measured here"));
  press(QStringLiteral("Take into the study"));
  EXPECT_EQ(materials().front().shear, "9 MPa");
  m_dialog->choose({MaterialOrigin::own, "timber"});
  press(QStringLiteral("Remove from own library"));
  EXPECT_FALSE(
      m_dialog->list().tree().findItems("none kept yet", Qt::MatchExactly | Qt::MatchRecursive).isEmpty());
  m_dialog->message().follow(QStringLiteral("Put it back"));
  EXPECT_EQ(m_dialog->choice(), (MaterialChoice{MaterialOrigin::own, "timber"}));
  EXPECT_TRUE(m_dialog->sheet().contains("9 MPa"));
}

TEST_F(MaterialsTest, aDamagedLibraryIsToldAndLeftAsItIs) {
  std::filesystem::create_directories(std::filesystem::path(ownPath()).parent_path());
  const std::string damaged = "{\"format\": \"planewright-materials\", ";
  std::ofstream(ownPath()) << damaged;
  show();
  EXPECT_TRUE(m_dialog->message().isVisible());
  EXPECT_TRUE(m_dialog->message().sentence().contains("line 1"))
      << m_dialog->message().sentence().toStdString();
  EXPECT_TRUE(isListed(QStringLiteral("not read, see above")));
  m_dialog->add(MaterialKind::timber);
  EXPECT_TRUE(m_dialog->message().isVisible());
  m_dialog->keep();
  EXPECT_TRUE(m_dialog->message().sentence().contains("nothing is written"));
  EXPECT_EQ(std::filesystem::file_size(ownPath()), damaged.size());
}

TEST_F(MaterialsTest, anotherStudyLeavesNothingOfTheOldOne) {
  m_dialog->add(MaterialKind::timber);
  m_desk.replace(newStudy());
  EXPECT_TRUE(m_dialog->choice().name.empty());
  EXPECT_FALSE(button(QStringLiteral("Remove from the study"))->isVisible());
  EXPECT_FALSE(isListed(QStringLiteral("timber")));
}

TEST_F(MaterialsTest, whatHappenedWhileItWasClosedIsSeenWhenItOpens) {
  m_dialog->add(MaterialKind::timber);
  m_dialog->close();
  ASSERT_FALSE(m_desk.request({Rename{{Spot::material, "timber", {}}, "oak"}}, m_desk.newGesture(), {}));
  m_dialog->show();
  EXPECT_EQ(m_dialog->choice().name, "oak");
  EXPECT_EQ(m_dialog->fields().name().edit().text(), "oak");
  EXPECT_TRUE(isListed(QStringLiteral("oak")));
}

TEST_F(MaterialsTest, theMenuOpensItOverTheFileAmongTheSettings) {
  const QByteArray before = qgetenv("XDG_CONFIG_HOME");
  qputenv("XDG_CONFIG_HOME", file(QStringLiteral("settings")).toUtf8());
  EXPECT_TRUE(ownMaterialsPath().starts_with(file(QStringLiteral("settings")).toStdString()));
  MainWindow window(answers());
  window.show();
  for (QAction* action : window.findChildren<QAction*>())
    if (action->text() == QStringLiteral("Mate&rials…"))
      action->trigger();
  auto* dialog = window.findChild<MaterialsDialog*>();
  ASSERT_NE(dialog, nullptr);
  EXPECT_TRUE(dialog->isVisible());
  dialog->take();
  dialog->keep();
  EXPECT_EQ(OwnMaterials(ownMaterialsPath()).all(), window.desk().study().materials);
  EXPECT_EQ(window.desk().study().materials.size(), 1u);
  qputenv("XDG_CONFIG_HOME", before);
}

TEST_F(MaterialsTest, theSmallestWindowHoldsIt) {
  EXPECT_LE(m_dialog->minimumSizeHint().width(), 1000);
  EXPECT_LE(m_dialog->minimumSizeHint().height(), 640);
  m_dialog->add(MaterialKind::timber);
  m_dialog->resize(m_dialog->minimumSizeHint());
  QCoreApplication::processEvents();
  const EntryField& field = m_dialog->fields().field(Spot::durationInstantaneous);
  EXPECT_LE(field.mapTo(&m_dialog->fields(), QPoint(field.width(), 0)).x(), m_dialog->fields().width());
}

} // namespace
} // namespace planewright

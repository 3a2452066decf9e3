// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/preferences_dialog.h"

#include "shell_test.h"
#include "ui/files/folders.h"
#include "ui/look/language.h"
#include "ui/look/printed_numbers.h"
#include "ui/shell/main_window.h"

#include <QApplication>
#include <QComboBox>
#include <QDialogButtonBox>
#include <QLineEdit>
#include <QPushButton>
#include <QSignalSpy>

namespace planewright {
namespace {

class PreferencesTest : public ShellTest {
protected:
  ~PreferencesTest() override {
    QSettings().clear();
    dressApplication();
  }
  static QComboBox& list(const PreferencesDialog& dialog, const QString& name) {
    for (QComboBox* one : dialog.findChildren<QComboBox*>())
      if (one->accessibleName() == name)
        return *one;
    ADD_FAILURE() << "no list " << name.toStdString();
    std::abort();
  }
  static QLineEdit& text(const PreferencesDialog& dialog, const QString& name) {
    for (QLineEdit* one : dialog.findChildren<QLineEdit*>())
      if (one->accessibleName() == name)
        return *one;
    ADD_FAILURE() << "no text " << name.toStdString();
    std::abort();
  }
};

TEST_F(PreferencesTest, withoutAnyTheProgramIsAsItComes) {
  EXPECT_EQ(preferences(), Preferences());
  EXPECT_EQ(preferredStudy(), newStudy());
  prefer(Preferences());
  EXPECT_EQ(preferences(), Preferences());
}

TEST_F(PreferencesTest, whatIsChosenIsKeptAndCounts) {
  PreferencesDialog dialog;
  QSignalSpy kept(&dialog, &PreferencesDialog::kept);
  list(dialog, "language (from the next start)").setCurrentText("Deutsch");
  list(dialog, "appearance").setCurrentText("high contrast");
  list(dialog, "size of text").setCurrentText("130 %");
  list(dialog, "stress in").setCurrentText("psi");
  list(dialog, "moment in").setCurrentText("kip*ft");
  list(dialog, "positive normal stress").setCurrentIndex(1);
  list(dialog, "stresses with").setCurrentIndex(3);
  list(dialog, "paper of sheets").setCurrentIndex(1);
  list(dialog, "decimal sign").setCurrentIndex(1);
  text(dialog, "project").setText("  Boat sheds ");
  text(dialog, "folder of studies").setText(file(""));
  const Preferences chosen = dialog.chosen();
  dialog.accept();
  ASSERT_EQ(kept.count(), 1);
  EXPECT_TRUE(kept[0][0].toBool());
  EXPECT_EQ(preferences(), chosen);
  EXPECT_EQ(languageOfWindow(), "de");
  EXPECT_EQ(QApplication::palette().color(QPalette::Window), QColor(Qt::black));
  EXPECT_EQ(rememberedSheet(QSettings()).paper, Paper::letter);
  EXPECT_EQ(chosenDecimalSign(), DecimalSign::comma);
  EXPECT_EQ(chosenFolder(Folder::studies), file(""));

  MainWindow window(answers());
  const Study& study = window.desk().study();
  EXPECT_EQ(study, preferredStudy());
  EXPECT_EQ(study.units.stress, "psi");
  EXPECT_EQ(study.points[0].stress[0].sx, "0 psi");
  EXPECT_EQ(study.units.moment, "kip*ft");
  EXPECT_EQ(study.convention.positive, Positive::compression);
  EXPECT_EQ(study.convention.digits, Digits::six);
  EXPECT_EQ(study.title.project, "Boat sheds");
}

TEST_F(PreferencesTest, cancelKeepsNothingAndDefaultsComeBack) {
  Preferences other;
  other.textPercent = 150;
  other.units.stress = "ksi";
  other.outputsFolder = file("");
  prefer(other);
  PreferencesDialog dialog;
  EXPECT_EQ(dialog.chosen(), other);
  dialog.findChild<QDialogButtonBox*>()->button(QDialogButtonBox::RestoreDefaults)->click();
  EXPECT_EQ(dialog.chosen(), Preferences());
  dialog.reject();
  EXPECT_EQ(preferences(), other);
  dialog.accept();
  EXPECT_EQ(preferences(), Preferences());
}

TEST_F(PreferencesTest, whatIsNoneOfThemInTheSettingsIsPassedOver) {
  QSettings settings;
  settings.setValue("new/stress", "furlong");
  settings.setValue("new/positive", "neither");
  settings.setValue("textPercent", 7000);
  settings.setValue("language", "xx");
  settings.setValue("folders/studies", "/no/such/folder");
  EXPECT_EQ(preferredStudy(), newStudy());
  const Preferences read = preferences();
  EXPECT_EQ(read.textPercent, 100);
  EXPECT_EQ(read.language, "");
  EXPECT_EQ(read.studiesFolder, "");
  EXPECT_EQ(read.convention, Convention());
}

TEST_F(PreferencesTest, theOutputsFolderComesBeforeThatOfTheStudy) {
  EXPECT_EQ(outputFolder("/job/beam.planewright"), "/job");
  chooseFolder(Folder::outputs, file(""));
  EXPECT_EQ(outputFolder("/job/beam.planewright"), file(""));
}

} // namespace
} // namespace planewright

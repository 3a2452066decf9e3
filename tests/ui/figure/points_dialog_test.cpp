// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/points_dialog.h"

#include "core/study/edit.h"
#include "tests/support/judged_study.h"

#include <QDir>
#include <QFile>
#include <QLabel>
#include <QListWidget>
#include <QPlainTextEdit>
#include <QProgressBar>
#include <QPushButton>
#include <QRadioButton>
#include <QTemporaryDir>
#include <QTest>

#include <gtest/gtest.h>

#include <stdexcept>

namespace planewright {
namespace {

/// The judged study with more points like its first.
Study manyPoints(int count) {
  Study study = judgedStudy();
  const Point first = study.points.front();
  for (int i = 2; i <= count; ++i) {
    study.points.push_back(first);
    study.points.back().name = "P" + std::to_string(i);
  }
  return study;
}

template <class Button>
Button& button(const QWidget& dialog, const QString& words) {
  for (Button* one : dialog.findChildren<Button*>())
    if (one->text().startsWith(words))
      return *one;
  throw std::runtime_error(words.toStdString());
}

bool says(const QWidget& dialog, const QString& words) {
  for (const QLabel* label : dialog.findChildren<QLabel*>())
    if (label->text().contains(words))
      return true;
  return false;
}

class AllPoints : public testing::Test {
protected:
  FigureBatch arranged(const Desk& desk) const {
    FigureBatch batch;
    batch.study = desk.study();
    batch.settings.width = 90;
    batch.studyFile = m_folder.filePath(QStringLiteral("tie.planewright"));
    return batch;
  }
  QStringList files() const { return QDir(m_folder.path()).entryList(QDir::Files, QDir::Name); }
  QString path(const char* name) const { return m_folder.filePath(QString::fromUtf8(name)); }
  QByteArray contents(const char* name) const {
    QFile file(path(name));
    return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
  }
  void put(const char* name) const {
    QFile file(path(name));
    EXPECT_TRUE(file.open(QIODevice::WriteOnly));
    file.write("mine");
  }
  static void write(PointsDialog& dialog) {
    dialog.show();
    button<QPushButton>(dialog, "Write the figures").click();
    ASSERT_TRUE(QTest::qWaitFor([&] { return !dialog.isRunning(); }, 60000));
  }
  /// Answers always the same and counts.
  AskExisting answering(Existing answer) {
    return [this, answer](QWidget&, const QString&, int existing, int all) {
      ++asked;
      existingSeen = existing;
      allSeen = all;
      return answer;
    };
  }

  int asked = 0;
  int existingSeen = 0;
  int allSeen = 0;

private:
  QTemporaryDir m_folder;
};

TEST_F(AllPoints, writesAFigureForEachBesideTheStudy) {
  Desk desk(manyPoints(3));
  QString said;
  QObject::connect(&desk, &Desk::said, &desk, [&](const QString& message) { said = message; });
  PointsDialog dialog(desk, arranged(desk), answering(Existing::stop));
  EXPECT_TRUE(says(dialog, "Figures: 3, with the study inside each, named like tie-P1-1.35-G+1.5-S.svg."));
  write(dialog);
  EXPECT_EQ(files(),
            (QStringList{"tie-P1-1.35-G+1.5-S.svg", "tie-P2-1.35-G+1.5-S.svg", "tie-P3-1.35-G+1.5-S.svg"}));
  EXPECT_TRUE(contents("tie-P2-1.35-G+1.5-S.svg").contains("<metadata>"));
  EXPECT_TRUE(contents("tie-P2-1.35-G+1.5-S.svg").contains("P2"));
  EXPECT_TRUE(says(dialog, "Figures written: 3 of 3, to "));
  EXPECT_TRUE(said.startsWith("Figures written: 3 of 3"));
  EXPECT_EQ(asked, 0);
}

TEST_F(AllPoints, writesOnlyTheChosenInTheShownCombinationWithoutTheStudy) {
  Desk desk(manyPoints(3));
  FigureBatch batch = arranged(desk);
  batch.settings.carriesStudy = false;
  batch.settings.format = FigureFormat::pdf;
  PointsDialog dialog(desk, batch, answering(Existing::stop));
  dialog.points().item(1)->setCheckState(Qt::Unchecked);
  button<QRadioButton>(dialog, "The shown one: 1.35 G").setChecked(true);
  EXPECT_TRUE(says(dialog, "Figures: 2, without the study, named like tie-P1-1.35-G.pdf."));
  write(dialog);
  EXPECT_EQ(files(), (QStringList{"tie-P1-1.35-G.pdf", "tie-P3-1.35-G.pdf"}));
  EXPECT_FALSE(contents("tie-P1-1.35-G.pdf").contains("planewright-study"));
}

TEST_F(AllPoints, hasNothingToWriteWithoutAPointOrAFolder) {
  Desk desk(manyPoints(2));
  PointsDialog dialog(desk, arranged(desk), answering(Existing::stop));
  button<QPushButton>(dialog, "None").click();
  EXPECT_FALSE(button<QPushButton>(dialog, "Write").isEnabled());
  EXPECT_TRUE(says(dialog, "No point is chosen."));
  button<QPushButton>(dialog, "All").click();
  EXPECT_TRUE(button<QPushButton>(dialog, "Write").isEnabled());
  dialog.setFolder(" ");
  EXPECT_FALSE(button<QPushButton>(dialog, "Write").isEnabled());
}

TEST_F(AllPoints, asksOnceAboutFilesThatExist) {
  Desk desk(manyPoints(4));
  put("tie-P1-1.35-G+1.5-S.svg");
  put("tie-P3-1.35-G+1.5-S.svg");
  {
    PointsDialog dialog(desk, arranged(desk), answering(Existing::stop));
    write(dialog);
    EXPECT_EQ(files().size(), 2);
  }
  EXPECT_EQ(asked, 1);
  EXPECT_EQ(existingSeen, 2);
  EXPECT_EQ(allSeen, 4);
  {
    PointsDialog dialog(desk, arranged(desk), answering(Existing::keep));
    write(dialog);
    EXPECT_EQ(files().size(), 4);
    EXPECT_EQ(contents("tie-P3-1.35-G+1.5-S.svg"), "mine");
    EXPECT_TRUE(says(dialog, "Figures written: 2 of 2"));
    EXPECT_TRUE(says(dialog, "Left as they were: 2."));
  }
  PointsDialog dialog(desk, arranged(desk), answering(Existing::replace));
  write(dialog);
  EXPECT_TRUE(contents("tie-P3-1.35-G+1.5-S.svg").startsWith("<?xml"));
  EXPECT_EQ(asked, 3);
}

TEST_F(AllPoints, canBeStoppedAndLeavesOnlyWholeFiles) {
  Desk desk(manyPoints(200));
  FigureBatch batch = arranged(desk);
  batch.settings.format = FigureFormat::pdf;
  PointsDialog dialog(desk, batch, answering(Existing::stop));
  dialog.show();
  button<QPushButton>(dialog, "Write the figures").click();
  EXPECT_FALSE(dialog.points().isEnabled());
  auto* progress = dialog.findChild<QProgressBar*>();
  ASSERT_TRUE(QTest::qWaitFor([&] { return progress->value() > 2; }, 60000));
  QTest::keyClick(&dialog, Qt::Key_Escape);
  EXPECT_TRUE(dialog.isVisible()) << "it stays to tell what was written";
  ASSERT_TRUE(QTest::qWaitFor([&] { return !dialog.isRunning(); }, 60000));
  EXPECT_TRUE(says(dialog, "Stopped. Figures written: "));
  EXPECT_LT(files().size(), 200);
  EXPECT_TRUE(says(dialog, QStringLiteral("written: %1 of 200").arg(files().size())));
  for (const QString& file : files())
    EXPECT_TRUE(contents(file.toUtf8()).endsWith("%%EOF\n")) << file.toStdString();
  EXPECT_TRUE(dialog.points().isEnabled());
  QTest::keyClick(&dialog, Qt::Key_Escape);
  EXPECT_FALSE(dialog.isVisible());
}

TEST_F(AllPoints, endsWithTheWindowWhileItWrites) {
  Desk desk(manyPoints(200));
  {
    PointsDialog dialog(desk, arranged(desk), answering(Existing::stop));
    dialog.show();
    button<QPushButton>(dialog, "Write the figures").click();
  }
  EXPECT_LT(files().size(), 200);
}

TEST_F(AllPoints, tellsOfEachThatFailedAndWritesTheOthers) {
  Desk desk(manyPoints(3));
  ASSERT_TRUE(QDir(path("")).mkdir("tie-P2-1.35-G+1.5-S.svg")); // a folder cannot become a file
  PointsDialog dialog(desk, arranged(desk), answering(Existing::replace));
  write(dialog);
  EXPECT_EQ(files(), (QStringList{"tie-P1-1.35-G+1.5-S.svg", "tie-P3-1.35-G+1.5-S.svg"}));
  EXPECT_TRUE(says(dialog, "Figures written: 2 of 3"));
  EXPECT_TRUE(says(dialog, "Not written: 1."));
  const auto* problems = dialog.findChild<QPlainTextEdit*>();
  EXPECT_TRUE(problems->isVisible());
  EXPECT_TRUE(problems->toPlainText().contains("tie-P2")) << problems->toPlainText().toStdString();
}

TEST_F(AllPoints, saysWhichPointsAFigureFails) {
  Desk desk(manyPoints(2));
  FigureBatch batch = arranged(desk);
  batch.settings.arrangement = Arrangement::beside;
  PointsDialog dialog(desk, batch, answering(Existing::stop));
  write(dialog);
  EXPECT_EQ(files().size(), 0);
  const QString problems = dialog.findChild<QPlainTextEdit*>()->toPlainText();
  EXPECT_TRUE(problems.startsWith("P1: A width of 90 mm does not hold"));
  EXPECT_TRUE(problems.contains("\nP2: A width of 90 mm"));
}

TEST_F(AllPoints, makesTheFolderOrSaysThatItCannot) {
  Desk desk(manyPoints(1));
  PointsDialog dialog(desk, arranged(desk), answering(Existing::stop));
  dialog.setFolder(path("new/one"));
  write(dialog);
  EXPECT_TRUE(QFile::exists(path("new/one/tie-P1-1.35-G+1.5-S.svg")));
  put("taken");
  dialog.setFolder(path("taken"));
  write(dialog);
  EXPECT_TRUE(says(dialog, "cannot be made. Choose another one."));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/recovery.h"

#include "core/record/study_file.h"
#include "core/study/edit.h"
#include "shell_test.h"
#include "ui/files/file_bytes.h"
#include "ui/shell/unsaved_dialog.h"

#include <QElapsedTimer>
#include <QFile>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QSignalSpy>
#include <QTest>
#include <QTreeWidget>

#include <filesystem>

#include <sys/wait.h>
#include <unistd.h>

namespace planewright {
namespace {

class RecoveryTest : public ShellTest {
protected:
  struct Window {
    Window(FileQuestions questions, const std::string& folder)
        : filing(desk, std::move(questions)), recovery(desk, filing, folder) {}
    Desk desk{newStudy()};
    Filing filing;
    Recovery recovery;
  };
  std::unique_ptr<Window> window() { return std::make_unique<Window>(answers(), m_folder); }

  std::vector<std::string> files(const std::string& folder, const std::string& ending) const {
    std::vector<std::string> found;
    std::error_code failed;
    for (const auto& entry : std::filesystem::directory_iterator(folder, failed))
      if (entry.path().extension() == ending)
        found.push_back(entry.path().string());
    return found;
  }
  /// The sx of the one study that is kept; empty when there is none.
  std::string keptSx() const {
    const std::vector<std::string> kept = files(m_folder, ".study");
    if (kept.size() != 1)
      return {};
    const Results<UnsavedStudy> study = readUnsaved(bytesOf(kept.front(), 1 << 20).value_or(""));
    return study ? study->study.points[0].stress[0].sx : "unreadable";
  }
  /// A window that ends without an answer, as after a kill, with this stress typed.
  void endWith(const std::string& sx, const QString& saved = {}) {
    const auto ending = window();
    if (!saved.isEmpty()) {
      m_savePath = saved;
      ASSERT_TRUE(ending->filing.saveAs());
    }
    type(ending->desk, Spot::sx, sx);
  }

  const std::string m_folder = file("unsaved").toStdString();
};

TEST_F(RecoveryTest, anEditIsOnTheDiskWithinASecond) {
  const auto one = window();
  for (const char* sx : {"1 MPa", "2 MPa", "3 MPa"}) {
    type(one->desk, Spot::sx, sx);
    EXPECT_TRUE(QTest::qWaitFor([&] { return keptSx() == sx; }, 1000)) << sx;
  }
}

TEST_F(RecoveryTest, editsThatNeverPauseAreKeptToo) {
  const auto one = window();
  QElapsedTimer timer;
  timer.start();
  int edits = 0;
  while (keptSx().empty() && timer.elapsed() < 5000) {
    type(one->desk, Spot::sx, std::to_string(++edits) + " MPa");
    QTest::qWait(10);
  }
  EXPECT_NE(keptSx(), "");
}

TEST_F(RecoveryTest, nothingIsKeptOfWhatIsSavedOrWasNeverChanged) {
  const auto one = window();
  QTest::qWait(400);
  EXPECT_FALSE(std::filesystem::exists(m_folder));
  type(one->desk, Spot::sx, "1 MPa");
  EXPECT_TRUE(QTest::qWaitFor([&] { return keptSx() == "1 MPa"; }));
  m_savePath = file("beam.planewright");
  ASSERT_TRUE(one->filing.save());
  EXPECT_TRUE(QTest::qWaitFor([&] { return files(m_folder, ".study").empty(); }));
  one->desk.undoStack()->undo();
  EXPECT_TRUE(QTest::qWaitFor([&] { return !keptSx().empty(); })) << "undone is changed too";
  one->desk.undoStack()->redo();
  EXPECT_TRUE(QTest::qWaitFor([&] { return files(m_folder, ".study").empty(); }));
}

TEST_F(RecoveryTest, theNextStartFindsItWithItsFileAndItsChanges) {
  const QString path = file("beam.planewright");
  endWith("4 MPa", path);
  EXPECT_TRUE(files(m_folder, ".lock").empty());
  const auto next = window();
  const std::vector<LeftStudy> left = next->recovery.left();
  ASSERT_EQ(left.size(), 1U);
  ASSERT_TRUE(left[0].study);
  EXPECT_EQ(left[0].study->file, path.toStdString());
  EXPECT_EQ(studyBefore(*left[0].study), readStudy(bytesOf(path.toStdString(), 1 << 20).value()).value());

  ASSERT_TRUE(next->recovery.open(left[0]));
  EXPECT_EQ(next->desk.study().points[0].stress[0].sx, "4 MPa");
  EXPECT_EQ(next->filing.path(), path);
  EXPECT_TRUE(next->filing.hasChanges());
  EXPECT_TRUE(next->recovery.left().empty());
  EXPECT_EQ(keptSx(), "4 MPa") << "it is kept on";
  ASSERT_TRUE(next->filing.save());
  EXPECT_TRUE(m_obstacles.empty());
  EXPECT_TRUE(QTest::qWaitFor([&] { return files(m_folder, ".study").empty(); }));
}

TEST_F(RecoveryTest, aFileThatOthersChangedMeanwhileIsNoticed) {
  const QString path = file("beam.planewright");
  endWith("4 MPa", path);
  Study theirs = newStudy();
  theirs.title.project = "Somebody else's";
  ASSERT_TRUE(writeAside(path.toStdString(), writeStudy(theirs)));
  const auto next = window();
  ASSERT_TRUE(next->recovery.open(next->recovery.left()[0]));
  EXPECT_FALSE(next->filing.save());
  EXPECT_EQ(m_obstacles, std::vector{Obstacle::changedOnDisk});
}

TEST_F(RecoveryTest, changesThatAreLetGoAreAmongTheDiscarded) {
  {
    const auto one = window();
    type(one->desk, Spot::sx, "5 MPa");
    m_unsaved = Unsaved::drop;
    ASSERT_TRUE(one->filing.mayLeave()); // as when the window closes
  }
  const auto next = window();
  EXPECT_TRUE(next->recovery.left().empty());
  const std::vector<LeftStudy> discarded = next->recovery.discarded();
  ASSERT_EQ(discarded.size(), 1U);
  ASSERT_TRUE(next->recovery.open(discarded[0]));
  EXPECT_EQ(next->desk.study().points[0].stress[0].sx, "5 MPa");
}

TEST_F(RecoveryTest, aNewStudyAfterADiscardedOneStartsAnew) {
  const auto one = window();
  type(one->desk, Spot::sx, "5 MPa");
  m_unsaved = Unsaved::drop;
  ASSERT_TRUE(one->filing.begin());
  type(one->desk, Spot::sx, "6 MPa");
  EXPECT_TRUE(QTest::qWaitFor([&] { return keptSx() == "6 MPa"; }));
  EXPECT_EQ(one->recovery.discarded().size(), 1U);
}

TEST_F(RecoveryTest, whatIsOnTheDeskIsAskedAboutFirst) {
  endWith("4 MPa");
  const auto next = window();
  type(next->desk, Spot::sx, "8 MPa");
  EXPECT_FALSE(next->recovery.open(next->recovery.left()[0])) << "the answer was to stay";
  EXPECT_EQ(next->desk.study().points[0].stress[0].sx, "8 MPa");
  EXPECT_EQ(next->recovery.left().size(), 1U);
}

TEST_F(RecoveryTest, aFolderThatTakesNothingIsToldOnce) {
  ASSERT_TRUE(writeAside(m_folder, "a file where the folder should be"));
  const auto one = window();
  QSignalSpy troubled(&one->recovery, &Recovery::troubled);
  type(one->desk, Spot::sx, "1 MPa");
  EXPECT_TRUE(troubled.wait(2000));
  type(one->desk, Spot::sx, "2 MPa");
  QTest::qWait(500);
  EXPECT_EQ(troubled.count(), 1);
  ASSERT_TRUE(QFile::remove(QString::fromStdString(m_folder)));
  type(one->desk, Spot::sx, "3 MPa");
  EXPECT_TRUE(QTest::qWaitFor([&] { return keptSx() == "3 MPa"; }));
}

TEST_F(RecoveryTest, theDialogTellsWhatChangedAndOpensOrDiscards) {
  endWith("4 MPa", file("beam.planewright"));
  endWith("7 MPa");
  const auto next = window();
  ASSERT_TRUE(writeAside(m_folder + "/1-1-0.study", "{"));
  UnsavedDialog dialog(next->recovery);
  dialog.show();
  EXPECT_EQ(dialog.left(), 3);
  QTreeWidgetItem* group = dialog.studies().topLevelItem(0);
  const auto choose = [&](const QString& name) {
    for (int i = 0; i < group->childCount(); ++i)
      if (group->child(i)->text(0) == name)
        dialog.studies().setCurrentItem(group->child(i));
    EXPECT_EQ(dialog.studies().currentItem()->text(0), name);
  };
  choose("not readable");
  EXPECT_FALSE(dialog.openButton().isEnabled());
  EXPECT_TRUE(dialog.discardButton().isEnabled());
  choose("beam");
  EXPECT_TRUE(dialog.changes().toPlainText().contains("4 MPa"))
      << dialog.changes().toPlainText().toStdString();
  choose("New study");
  EXPECT_TRUE(dialog.changes().toPlainText().contains("7 MPa"));
  dialog.discardButton().click();
  EXPECT_EQ(dialog.left(), 2);
  EXPECT_EQ(dialog.studies().topLevelItemCount(), 2);
  group = dialog.studies().topLevelItem(1);
  choose("New study");
  EXPECT_FALSE(dialog.discardButton().isEnabled()) << "it is";
  group = dialog.studies().topLevelItem(0);
  choose("beam");
  dialog.openButton().click();
  EXPECT_FALSE(dialog.isVisible());
  EXPECT_EQ(next->filing.name(), "beam");
}

} // namespace
} // namespace planewright

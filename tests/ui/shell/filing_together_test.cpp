// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/study_file.h"
#include "shell_test.h"
#include "ui/files/file_bytes.h"

#include <QDir>
#include <QFile>

namespace planewright {
namespace {

/// Two windows, or another program, that work on one file.
class FilingTogether : public ShellTest {
protected:
  FilingTogether() {
    QObject::connect(&m_filing, &Filing::refused,
                     [this](const QString&, const Problems& problems) { m_problems = problems; });
    m_savePath = m_path;
    type(m_desk, Spot::sx, "1 MPa");
    EXPECT_TRUE(m_filing.save());
  }
  std::string onDisk() const { return bytesOf(m_path.toStdString(), 1 << 20).value_or("unread"); }
  std::string sxOnDisk() const { return readStudy(onDisk()).value().points[0].stress[0].sx; }
  /// Somebody else saves the file, with its bytes as another program would put them.
  void othersWrite(const std::string& sx) {
    Desk other{newStudy()};
    type(other, Spot::sx, sx);
    ASSERT_TRUE(writeAside(m_path.toStdString(), writeStudy(other.study())));
  }
  struct Window {
    explicit Window(FileQuestions questions) : filing(desk, std::move(questions)) {}
    Desk desk{newStudy()};
    Filing filing;
  };

  const QString m_path = file("beam.planewright");
  Desk m_desk{newStudy()};
  Filing m_filing{m_desk, answers()};
  Problems m_problems;
};

TEST_F(FilingTogether, theVersionBeforeIsKept) {
  type(m_desk, Spot::sx, "2 MPa");
  ASSERT_TRUE(m_filing.save());
  EXPECT_EQ(sxOnDisk(), "2 MPa");
  const std::string before = bytesOf(m_path.toStdString() + "~", 1 << 20).value_or("unread");
  EXPECT_EQ(readStudy(before).value().points[0].stress[0].sx, "1 MPa");
}

TEST_F(FilingTogether, aFileThatOthersChangedIsNotSavedOverUnasked) {
  othersWrite("7 MPa");
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_FALSE(m_filing.save());
  EXPECT_EQ(m_obstacles, std::vector{Obstacle::changedOnDisk});
  EXPECT_EQ(sxOnDisk(), "7 MPa");
  EXPECT_TRUE(m_filing.hasChanges());

  m_overwrite = Overwrite::saveAs;
  m_savePath = file("mine.planewright");
  ASSERT_TRUE(m_filing.save());
  EXPECT_EQ(sxOnDisk(), "7 MPa");
  EXPECT_EQ(m_filing.path(), file("mine.planewright"));
  type(m_desk, Spot::sx, "3 MPa");
  EXPECT_TRUE(m_filing.save()) << "that file is as it was saved";
  EXPECT_EQ(m_obstacles.size(), 2U);
}

TEST_F(FilingTogether, whatIsSavedOverOnRequestStaysBeside) {
  othersWrite("7 MPa");
  type(m_desk, Spot::sx, "2 MPa");
  m_overwrite = Overwrite::replace;
  ASSERT_TRUE(m_filing.save());
  EXPECT_EQ(sxOnDisk(), "2 MPa");
  EXPECT_NE(bytesOf(m_path.toStdString() + "~", 1 << 20).value_or("").find("7 MPa"), std::string::npos);
  type(m_desk, Spot::sx, "3 MPa");
  EXPECT_TRUE(m_filing.save());
  EXPECT_EQ(m_obstacles.size(), 1U);
}

TEST_F(FilingTogether, aFileThatVanishedIsWrittenAgain) {
  ASSERT_TRUE(QFile::remove(m_path));
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_TRUE(m_filing.save());
  EXPECT_EQ(sxOnDisk(), "2 MPa");
  EXPECT_TRUE(m_obstacles.empty());
}

TEST_F(FilingTogether, aFolderThatVanishedIsToldAndNothingIsLost) {
  ASSERT_TRUE(QDir().mkdir(file("job")));
  m_savePath = file("job/beam.planewright");
  ASSERT_TRUE(m_filing.saveAs());
  ASSERT_TRUE(QDir(file("job")).removeRecursively());
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_FALSE(m_filing.save());
  ASSERT_EQ(m_problems.size(), 1U);
  EXPECT_EQ(plain(m_problems.front().what), "This could not be written: there is no such file or folder.");
  EXPECT_TRUE(m_filing.hasChanges());
}

TEST_F(FilingTogether, aStudyThatIsOpenElsewhereIsAskedAbout) {
  Window second(answers());
  EXPECT_FALSE(second.filing.open(m_path)) << "the answer was to stay";
  EXPECT_EQ(m_askedElsewhere, 1);
  EXPECT_TRUE(second.filing.path().isEmpty());

  m_elsewhere = Elsewhere::readOnly;
  ASSERT_TRUE(second.filing.open(m_path));
  EXPECT_TRUE(second.filing.isReadOnly());
  type(second.desk, Spot::sx, "9 MPa");
  EXPECT_FALSE(second.filing.save()) << "the answer was to stay";
  EXPECT_EQ(m_obstacles, std::vector{Obstacle::openElsewhere});
  EXPECT_EQ(sxOnDisk(), "1 MPa");
  // The first window is not disturbed.
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_TRUE(m_filing.save());
  EXPECT_EQ(m_obstacles.size(), 1U);
}

TEST_F(FilingTogether, whoIsTakenOverIsAskedBeforeSaving) {
  Window second(answers());
  m_elsewhere = Elsewhere::takeOver;
  ASSERT_TRUE(second.filing.open(m_path));
  EXPECT_FALSE(second.filing.isReadOnly());
  type(second.desk, Spot::sx, "9 MPa");
  ASSERT_TRUE(second.filing.save());
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_FALSE(m_filing.save());
  EXPECT_EQ(sxOnDisk(), "9 MPa");
  EXPECT_FALSE(m_obstacles.empty());
}

TEST_F(FilingTogether, aReadOnlyWindowCanTakeOverLater) {
  Window second(answers());
  m_elsewhere = Elsewhere::readOnly;
  ASSERT_TRUE(second.filing.open(m_path));
  second.filing.takeOver();
  EXPECT_FALSE(second.filing.isReadOnly());
  type(second.desk, Spot::sx, "9 MPa");
  EXPECT_TRUE(second.filing.save());
  EXPECT_TRUE(m_obstacles.empty());
}

TEST_F(FilingTogether, theLockGoesWithTheStudy) {
  const QString lock = file(".beam.planewright.open");
  EXPECT_TRUE(QFile::exists(lock));
  ASSERT_TRUE(m_filing.open(m_path)) << "again in the same window";
  EXPECT_EQ(m_askedElsewhere, 0);
  EXPECT_TRUE(QFile::exists(lock));
  ASSERT_TRUE(m_filing.begin());
  EXPECT_FALSE(QFile::exists(lock));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/embedded_study.h"
#include "core/record/study_file.h"
#include "shell_test.h"
#include "ui/shell/recent_files.h"
#include "ui/shell/worked_example.h"

#include <QFile>
#include <QSignalSpy>

namespace planewright {
namespace {

class FilingTest : public ShellTest {
protected:
  FilingTest() {
    QObject::connect(&m_filing, &Filing::refused,
                     [this](const QString&, const Problems& problems) { m_problems = problems; });
  }
  std::string bytesIn(const QString& path) {
    QFile opened(path);
    EXPECT_TRUE(opened.open(QIODevice::ReadOnly));
    return opened.readAll().toStdString();
  }
  void write(const QString& path, const std::string& bytes) {
    QFile opened(path);
    ASSERT_TRUE(opened.open(QIODevice::WriteOnly));
    opened.write(QByteArray::fromStdString(bytes));
  }

  Desk m_desk{newStudy()};
  Filing m_filing{m_desk, answers()};
  Problems m_problems;
};

TEST_F(FilingTest, savingAsksForANameOnceAndReadsBackEqual) {
  type(m_desk, Spot::sx, "-18.6 kN/(90 mm*240 mm)");
  m_savePath = file("beam.planewright");
  QSignalSpy said(&m_desk, &Desk::said);
  ASSERT_TRUE(m_filing.save());
  EXPECT_EQ(said.last().first().toString(), "Saved as beam.planewright.");
  EXPECT_EQ(m_filing.path(), m_savePath);
  EXPECT_EQ(m_filing.name(), "beam");
  EXPECT_FALSE(m_filing.hasChanges());
  EXPECT_EQ(readStudy(bytesIn(m_savePath)).value(), m_desk.study());

  m_savePath = file("elsewhere.planewright");
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_TRUE(m_filing.hasChanges());
  ASSERT_TRUE(m_filing.save());
  EXPECT_FALSE(QFile::exists(file("elsewhere.planewright")));
  EXPECT_EQ(readStudy(bytesIn(file("beam.planewright"))).value(), m_desk.study());
}

TEST_F(FilingTest, nothingIsLostWithoutAsking) {
  type(m_desk, Spot::sx, "1 MPa");
  const Study typed = m_desk.study();
  EXPECT_FALSE(m_filing.begin()) << "the answer was to stay";
  EXPECT_EQ(m_desk.study(), typed);

  m_unsaved = Unsaved::save;
  EXPECT_FALSE(m_filing.begin()) << "no name was given to save under";
  EXPECT_EQ(m_desk.study(), typed);

  m_savePath = file("kept.planewright");
  EXPECT_TRUE(m_filing.begin());
  EXPECT_EQ(m_desk.study(), newStudy());
  EXPECT_EQ(readStudy(bytesIn(m_savePath)).value(), typed);
  EXPECT_EQ(m_askedUnsaved, 3);

  type(m_desk, Spot::sx, "1 MPa");
  m_unsaved = Unsaved::drop;
  EXPECT_TRUE(m_filing.begin());
  EXPECT_TRUE(m_filing.path().isEmpty());
}

TEST_F(FilingTest, openingTheFileThatWasJustSavedShowsWhatWasSaved) {
  m_savePath = file("beam.planewright");
  ASSERT_TRUE(m_filing.save());
  type(m_desk, Spot::sx, "8 MPa");
  const Study typed = m_desk.study();
  m_unsaved = Unsaved::save;
  ASSERT_TRUE(m_filing.open(m_savePath));
  EXPECT_EQ(m_askedUnsaved, 1);
  EXPECT_EQ(m_desk.study(), typed);
}

TEST_F(FilingTest, aStudyThatAFigureCarriesBelongsToNoFileAndIsUnsaved) {
  const QString figure = file("beam-P1-G.svg");
  const std::string bytes = svgWithStudy("<svg></svg>", writeStudy(workedExample())).value();
  write(figure, bytes);
  ASSERT_TRUE(m_filing.open(figure));
  EXPECT_EQ(m_desk.study(), workedExample());
  EXPECT_TRUE(m_filing.path().isEmpty());
  EXPECT_EQ(m_filing.restoredFrom(), figure);
  EXPECT_EQ(m_filing.name(), "Study from beam-P1-G.svg");
  EXPECT_TRUE(m_filing.hasChanges());
  EXPECT_FALSE(m_filing.begin()) << "the answer was to stay";
  EXPECT_EQ(m_askedUnsaved, 1);

  type(m_desk, Spot::reading, "3 deg");
  m_desk.undoStack()->undo();
  EXPECT_TRUE(m_filing.hasChanges()) << "it is in no file yet";

  m_savePath = file("again.planewright");
  ASSERT_TRUE(m_filing.save());
  EXPECT_EQ(m_proposedPath, file("beam-P1-G.planewright"));
  EXPECT_FALSE(m_filing.hasChanges());
  EXPECT_TRUE(m_filing.restoredFrom().isEmpty());
  EXPECT_EQ(m_filing.name(), "again");
  EXPECT_EQ(bytesIn(figure), bytes) << "the figure stays as it was";
}

TEST_F(FilingTest, aFigureWithoutAStudyLeavesTheStudyAndSaysSo) {
  write(file("a.svg"), "<svg></svg>");
  EXPECT_FALSE(m_filing.open(file("a.svg")));
  ASSERT_EQ(m_problems.size(), 1U);
  EXPECT_EQ(plain(m_problems.front().what), "This file carries no study.");
  EXPECT_TRUE(m_filing.restoredFrom().isEmpty());
}

TEST_F(FilingTest, readsFilesUpToTheSizeThatCoreReads) {
  std::string bytes = writeStudy(workedExample());
  bytes.resize(greatestStudyFile, '\n');
  write(file("large.planewright"), bytes);
  EXPECT_TRUE(m_filing.open(file("large.planewright")));
  write(file("large.planewright"), bytes + '\n');
  EXPECT_FALSE(m_filing.open(file("large.planewright")));
}

TEST_F(FilingTest, whatIsShownIsNotAskedAbout) {
  ASSERT_TRUE(m_filing.openUnnamed(workedExample()));
  m_desk.show(m_desk.study().points.front().name, m_desk.readout().states.back().combination);
  EXPECT_FALSE(m_filing.hasChanges());
  EXPECT_TRUE(m_filing.mayLeave());
  EXPECT_EQ(m_askedUnsaved, 0);
}

TEST_F(FilingTest, undoneToTheSavedStateIsUnchanged) {
  type(m_desk, Spot::sx, "1 MPa");
  m_savePath = file("beam.planewright");
  ASSERT_TRUE(m_filing.save());
  type(m_desk, Spot::sx, "2 MPa");
  EXPECT_TRUE(m_filing.hasChanges());
  m_desk.undoStack()->undo();
  EXPECT_FALSE(m_filing.hasChanges());
}

TEST_F(FilingTest, aFileThatDoesNotReadLeavesTheStudyAndSaysWhere) {
  type(m_desk, Spot::sx, "1 MPa");
  const Study typed = m_desk.study();
  write(file("bad.planewright"), "{\"format\":\"planewright-study\",\n\"version\":1,\n\"pionts\":[]}");
  EXPECT_FALSE(m_filing.open(file("bad.planewright")));
  ASSERT_FALSE(m_problems.empty());
  EXPECT_EQ(m_problems.front().line, 3);
  EXPECT_EQ(m_desk.study(), typed);
  EXPECT_EQ(m_askedUnsaved, 0) << "a file that cannot be read is no reason to ask";

  EXPECT_FALSE(m_filing.open(file("missing.planewright")));
  EXPECT_EQ(m_desk.study(), typed);
}

TEST_F(FilingTest, aFileThatCannotBeWrittenKeepsTheChanges) {
  type(m_desk, Spot::sx, "1 MPa");
  m_savePath = file("no such folder/beam.planewright");
  EXPECT_FALSE(m_filing.save());
  ASSERT_EQ(m_problems.size(), 1U);
  EXPECT_TRUE(m_filing.hasChanges());
  EXPECT_TRUE(m_filing.path().isEmpty());
}

TEST_F(FilingTest, theWorkedExampleReadsAndSaysThatItIsInvented) {
  EXPECT_NE(workedExample().title.project.find("invented"), std::string::npos);
  EXPECT_NE(workedExample().title.subject.find("invented"), std::string::npos);
  EXPECT_TRUE(isWorkedExample(workedExample()));
  EXPECT_FALSE(isWorkedExample(newStudy()));
}

TEST_F(FilingTest, tenRecentFilesNewestFirstAndOnlyThoseThatExist) {
  for (int i = 0; i < 12; ++i) {
    const QString path = file(QStringLiteral("%1.planewright").arg(i));
    write(path, "{}");
    rememberFile(path);
  }
  rememberFile(file("5.planewright"));
  ASSERT_EQ(recentFiles().size(), 10);
  EXPECT_EQ(recentFiles().front(), file("5.planewright"));
  EXPECT_EQ(recentFiles().count(file("5.planewright")), 1);
  EXPECT_EQ(recentFiles().back(), file("2.planewright"));
  QFile::remove(file("11.planewright"));
  EXPECT_EQ(recentFiles().size(), 9);
}

} // namespace
} // namespace planewright

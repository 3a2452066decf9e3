// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/recovery_folder.h"

#include "core/record/study_file.h"
#include "core/study/edit.h"
#include "tests/ui/files/folder_test.h"

#include <sys/wait.h>
#include <unistd.h>

namespace planewright {
namespace {

namespace fs = std::filesystem;

class RecoveryFolderTest : public FolderTest {
protected:
  std::string folder() const { return path("unsaved"); }

  static UnsavedStudy named(const std::string& project) {
    UnsavedStudy unsaved;
    unsaved.study = newStudy();
    unsaved.study.title.project = project;
    unsaved.written = "2026-12-03T07:00:00Z";
    return unsaved;
  }
  static void write(const RecoveryPlace& place, const std::string& project) {
    ASSERT_TRUE(writeAside(place.path(), writeUnsaved(named(project))));
  }
  /// What another process leaves that dies at once after it has written a study.
  void dieWith(const std::string& project) const {
    const pid_t child = ::fork();
    ASSERT_GE(child, 0);
    if (child == 0) {
      const Result<RecoveryPlace> place = RecoveryPlace::in(folder());
      if (place)
        write(*place, project);
      writeHalf(*place);
      ::_exit(0);
    }
    int status = 0;
    ::waitpid(child, &status, 0);
  }
  static void writeHalf(const RecoveryPlace& place) {
    const fs::path at = place.path();
    static_cast<void>(
        writeAside((at.parent_path() / ("." + at.filename().string() + ".1-0")).string(), "half a st"));
  }
  std::vector<std::string> projects(const std::vector<LeftStudy>& studies) const {
    std::vector<std::string> names;
    for (const LeftStudy& one : studies)
      names.push_back(one.study ? one.study->study.title.project : "unreadable");
    return names;
  }
  std::size_t filesIn(const std::string& folder) const {
    return static_cast<std::size_t>(std::distance(fs::directory_iterator(folder), {}));
  }
  using Names = std::vector<std::string>;
};

TEST_F(RecoveryFolderTest, aFolderThatIsNotThereHasNothing) {
  EXPECT_TRUE(leftStudies(folder()).empty());
  EXPECT_TRUE(discardedStudies(folder()).empty());
}

TEST_F(RecoveryFolderTest, whatAWindowHoldsIsNotLeft) {
  {
    const Result<RecoveryPlace> place = RecoveryPlace::in(folder());
    ASSERT_TRUE(place);
    write(*place, "held");
    EXPECT_EQ(projects(leftStudies(folder())), Names{});
    EXPECT_EQ(filesIn(folder()), 2U);
  }
  EXPECT_EQ(projects(leftStudies(folder())), Names{"held"});
  const Result<RecoveryPlace> next = RecoveryPlace::in(folder());
  ASSERT_TRUE(next);
  write(*next, "next");
  EXPECT_EQ(projects(leftStudies(folder())), Names{"held"});
}

TEST_F(RecoveryFolderTest, whatAProcessLeftThatDiedIsFoundAndNothingElseStays) {
  dieWith("first");
  EXPECT_EQ(filesIn(folder()), 3U);
  EXPECT_EQ(projects(leftStudies(folder())), Names{"first"});
  EXPECT_EQ(filesIn(folder()), 1U);
  dieWith("second");
  EXPECT_EQ(leftStudies(folder()).size(), 2U);
}

TEST_F(RecoveryFolderTest, aStudyIsTakenByOneWindowOnly) {
  dieWith("left");
  const std::string left = leftStudies(folder()).front().path;
  const Result<RecoveryPlace> one = RecoveryPlace::in(folder()), other = RecoveryPlace::in(folder());
  ASSERT_TRUE(one && other);
  EXPECT_NE(one->path(), other->path());
  EXPECT_TRUE(takeStudy(left, *one));
  EXPECT_FALSE(takeStudy(left, *other));
  EXPECT_TRUE(leftStudies(folder()).empty());
}

TEST_F(RecoveryFolderTest, whatIsDiscardedIsFoundForThirtyDays) {
  using namespace std::chrono_literals;
  const auto now = std::chrono::system_clock::now();
  const auto discardOne = [&](const std::string& project, std::chrono::system_clock::time_point when) {
    dieWith(project);
    ASSERT_TRUE(discard(folder(), leftStudies(folder()).front().path, when));
  };
  discardOne("first", now - 40 * 24h);
  EXPECT_EQ(projects(discardedStudies(folder())), Names{"first"});
  discardOne("second", now - 29 * 24h);
  EXPECT_EQ(projects(discardedStudies(folder())), (Names{"second", "first"}));
  discardOne("third", now);
  EXPECT_EQ(projects(discardedStudies(folder())), (Names{"third", "second"}));
  // A clock that was set back removes nothing.
  discardOne("fourth", now - 365 * 24h);
  EXPECT_EQ(discardedStudies(folder()).size(), 3U);
  EXPECT_TRUE(discard(folder(), path("nothing")));
  // It can be taken back.
  const Result<RecoveryPlace> place = RecoveryPlace::in(folder());
  ASSERT_TRUE(takeStudy(discardedStudies(folder()).front().path, *place));
  EXPECT_EQ(projects(discardedStudies(folder())), (Names{"second", "fourth"}));
}

TEST_F(RecoveryFolderTest, whatIsInItsFileAsItIsWasNotLeft) {
  UnsavedStudy unsaved = named("saved");
  unsaved.file = path("beam.planewright");
  const Result<RecoveryPlace> place = RecoveryPlace::in(folder());
  for (const bool isSaved : {false, true}) {
    ASSERT_TRUE(writeAside(unsaved.file, writeStudy(isSaved ? unsaved.study : newStudy())));
    ASSERT_TRUE(writeAside(folder() + "/1-1-0.study", writeUnsaved(unsaved)));
    EXPECT_EQ(leftStudies(folder()).empty(), isSaved);
  }
}

TEST_F(RecoveryFolderTest, whatDoesNotReadIsToldOf) {
  const Result<RecoveryPlace> place = RecoveryPlace::in(folder());
  ASSERT_TRUE(writeAside(folder() + "/1-1-0.study", "{"));
  const std::vector<LeftStudy> left = leftStudies(folder());
  ASSERT_EQ(left.size(), 1U);
  EXPECT_FALSE(left.front().study);
}

TEST_F(RecoveryFolderTest, aFolderThatCannotBeMadeIsAProblem) {
  ASSERT_TRUE(writeAside(path("file"), "no folder"));
  const Result<RecoveryPlace> place = RecoveryPlace::in(path("file") + "/unsaved");
  ASSERT_FALSE(place);
  EXPECT_NE(plain(place.error().what), "");
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/files/folder_test.h"
#include "ui/files/descriptor.h"

#include <gtest/gtest.h>

#include <array>
#include <atomic>
#include <csignal>
#include <filesystem>
#include <optional>
#include <thread>

#include <fcntl.h>
#include <sys/resource.h>
#include <sys/stat.h>
#include <unistd.h>

namespace planewright {
namespace {

namespace fs = std::filesystem;

class FileBytes : public FolderTest {};

mode_t modeOf(const std::string& file) {
  struct stat status {};
  EXPECT_EQ(::stat(file.c_str(), &status), 0);
  return status.st_mode & 07777;
}

TEST_F(FileBytes, ComeBackAsTheyWereWritten) {
  const std::string bytes("a\0b\n\xFF", 5);
  ASSERT_TRUE(writeAside(path("a"), bytes));
  EXPECT_EQ(read(path("a")), bytes);
  EXPECT_EQ(filesInFolder(), 1U);
}

TEST_F(FileBytes, ReplaceAnOlderFileAndKeepItsPermissions) {
  ASSERT_TRUE(writeAside(path("a"), "old and longer"));
  ASSERT_EQ(::chmod(path("a").c_str(), 0640), 0);
  ASSERT_TRUE(writeAside(path("a"), "new"));
  EXPECT_EQ(read(path("a")), "new");
  EXPECT_EQ(modeOf(path("a")), 0640U);
  EXPECT_EQ(filesInFolder(), 1U);
}

/// The mode of the file that stands aside while bytes are written in the place of `target`, as soon as it is
/// seen there; none when it came and went unseen.
std::optional<mode_t> modeWhileReplacing(const fs::path& target, const std::string& bytes) {
  std::atomic<bool> done = false;
  std::thread writer([&] {
    EXPECT_TRUE(writeAside(target.string(), bytes));
    done = true;
  });
  std::optional<mode_t> seen;
  while (!done && !seen)
    for (const fs::directory_entry& entry : fs::directory_iterator(target.parent_path())) {
      struct stat status {};
      if (entry.path() != target && ::stat(entry.path().c_str(), &status) == 0)
        seen = status.st_mode & 0777;
    }
  writer.join();
  return seen;
}

TEST_F(FileBytes, AreNotShownToOthersWhileAPrivateFileIsReplaced) {
  ASSERT_TRUE(writeAside(path("a"), "old"));
  ASSERT_EQ(::chmod(path("a").c_str(), 0600), 0);
  const std::string bytes(std::size_t{8} << 20, 'x');
  std::optional<mode_t> mode;
  for (int i = 0; i < 100 && !mode; ++i)
    mode = modeWhileReplacing(path("a"), bytes);
  EXPECT_EQ(mode, std::optional<mode_t>(0600));
}

TEST_F(FileBytes, OfANewFileFollowTheUsersMask) {
  const mode_t before = ::umask(027);
  ASSERT_TRUE(writeAside(path("a"), "x"));
  ::umask(before);
  EXPECT_EQ(modeOf(path("a")), 0640U);
}

TEST_F(FileBytes, GoWhereALinkLeads) {
  ASSERT_TRUE(writeAside(path("target"), "old"));
  fs::create_symlink("target", path("link"));
  ASSERT_TRUE(writeAside(path("link"), "new"));
  EXPECT_TRUE(fs::is_symlink(path("link")));
  EXPECT_EQ(read(path("target")), "new");
}

TEST_F(FileBytes, ThatFindNoRoomLeaveADeviceInPlace) {
  const Result<void> written = writeAside("/dev/full", "x");
  ASSERT_FALSE(written);
  EXPECT_EQ(written.error().place, "/dev/full");
  EXPECT_EQ(plain(written.error().what), "This could not be written: the disk is full.");
  EXPECT_TRUE(fs::is_character_file("/dev/full"));
}

TEST_F(FileBytes, ThatFindNoRoomLeaveTheOldFileAndNothingElse) {
  ASSERT_TRUE(writeAside(path("a"), "old"));
  const auto handler = std::signal(SIGXFSZ, SIG_IGN);
  struct rlimit before {};
  ASSERT_EQ(::getrlimit(RLIMIT_FSIZE, &before), 0);
  struct rlimit small = before;
  small.rlim_cur = 4096;
  ASSERT_EQ(::setrlimit(RLIMIT_FSIZE, &small), 0);
  const Result<void> written = writeAside(path("a"), std::string(100000, 'x'));
  ASSERT_EQ(::setrlimit(RLIMIT_FSIZE, &before), 0);
  std::signal(SIGXFSZ, handler);
  EXPECT_FALSE(written);
  EXPECT_EQ(read(path("a")), "old");
  EXPECT_EQ(filesInFolder(), 1U);
}

TEST_F(FileBytes, AreRefusedByAFolderAndAMissingFolder) {
  fs::create_directory(path("folder"));
  EXPECT_EQ(plain(writeAside(path("folder"), "x").error().what),
            "This could not be written: it is a folder.");
  EXPECT_EQ(plain(writeAside(path("none/a"), "x").error().what),
            "This could not be written: there is no such file or folder.");
  EXPECT_FALSE(bytesOf(path("folder"), 10));
  EXPECT_EQ(plain(bytesOf(path("none"), 10).error().what),
            "This cannot be read: there is no such file or folder.");
}

TEST_F(FileBytes, AreReadNoFurtherThanAsked) {
  ASSERT_TRUE(writeAside(path("a"), std::string(100, 'x')));
  EXPECT_EQ(bytesOf(path("a"), 10)->size(), 11U);
  EXPECT_EQ(bytesOf("/dev/zero", 200000)->size(), 200001U);
}

TEST_F(FileBytes, ToAPipeWhoseReaderHasGoneAreAProblem) {
  std::array<int, 2> ends{};
  ASSERT_EQ(::pipe(ends.data()), 0);
  const auto handler = std::signal(SIGPIPE, SIG_IGN);
  { const Descriptor reader(ends[0]); }
  const Descriptor writer(ends[1]);
  const Result<void> written = writeTo(writer.number(), "x", "standard output");
  std::signal(SIGPIPE, handler);
  ASSERT_FALSE(written);
  EXPECT_EQ(plain(written.error()), "standard output: This could not be written: its reader has gone.");
}

TEST_F(FileBytes, KnowsOneFileByTwoPaths) {
  ASSERT_TRUE(writeAside(path("a"), "x"));
  ASSERT_TRUE(writeAside(path("b"), "x"));
  fs::create_symlink("a", path("link"));
  EXPECT_TRUE(isSameFile(path("a"), path("link")));
  EXPECT_FALSE(isSameFile(path("a"), path("b")));
  EXPECT_FALSE(isSameFile(path("a"), path("none")));
}

} // namespace
} // namespace planewright

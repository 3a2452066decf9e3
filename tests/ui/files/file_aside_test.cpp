// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_aside.h"

#include "tests/ui/files/folder_test.h"
#include "ui/files/file_pieces.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

class FileAsideTest : public FolderTest {};

TEST_F(FileAsideTest, TakesTheOldPlaceOnlyWhenFinished) {
  ASSERT_TRUE(writeAside(path("a"), "old"));
  Result<FileAside> file = FileAside::to(path("a"));
  ASSERT_TRUE(file);
  ASSERT_TRUE(file->write("new "));
  ASSERT_TRUE(file->write("bytes"));
  EXPECT_EQ(read(path("a")), "old");
  ASSERT_TRUE(file->finish());
  EXPECT_EQ(read(path("a")), "new bytes");
  EXPECT_EQ(filesInFolder(), 1U);
}

TEST_F(FileAsideTest, keepsThePreviousVersionWhereItIsAsked) {
  ASSERT_TRUE(writeKeepingPrevious(path("a"), "first"));
  EXPECT_EQ(filesInFolder(), 1U);
  ASSERT_TRUE(writeKeepingPrevious(path("a"), "second"));
  ASSERT_TRUE(writeKeepingPrevious(path("a"), "third"));
  EXPECT_EQ(read(path("a")), "third");
  EXPECT_EQ(read(path("a~")), "second");
  ASSERT_TRUE(writeAside(path("a"), "fourth"));
  EXPECT_EQ(read(path("a~")), "second");
  EXPECT_EQ(filesInFolder(), 2U);
}

TEST_F(FileAsideTest, IsGoneWhenItIsGivenUp) {
  ASSERT_TRUE(writeAside(path("a"), "old"));
  for (const char* name : {"a", "b"}) {
    Result<FileAside> file = FileAside::to(path(name));
    ASSERT_TRUE(file);
    ASSERT_TRUE(file->write("half"));
    const FileAside moved = *std::move(file);
  }
  EXPECT_EQ(read(path("a")), "old");
  EXPECT_EQ(filesInFolder(), 1U);
}

TEST(FilePieces, GiveAFileOnePieceAfterAnother) {
  const QTemporaryDir folder;
  const std::string path = folder.filePath(QStringLiteral("a")).toStdString();
  const std::string bytes((std::size_t{5} << 20) / 2, 'x');
  ASSERT_TRUE(writeAside(path, bytes));
  Result<FilePieces> file = FilePieces::of(path);
  ASSERT_TRUE(file);
  EXPECT_EQ(file->size(), bytes.size());
  std::string read;
  for (;;) {
    const Result<std::string_view> piece = file->next([] { return true; });
    ASSERT_TRUE(piece);
    if (piece->empty())
      break;
    read += *piece;
  }
  EXPECT_TRUE(read == bytes);
  EXPECT_EQ(plain(FilePieces::of(path + "none").error().what),
            "This cannot be read: there is no such file or folder.");
  EXPECT_FALSE(FilePieces::of(folder.path().toStdString())->next([] { return true; }));
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_names.h"

#include <QFile>
#include <QTemporaryDir>

#include <gtest/gtest.h>

namespace planewright {
namespace {

using Names = std::vector<QString>;

TEST(FileNames, joinWhatEveryFileSystemTakes) {
  EXPECT_EQ(joinedName({"roof: 1", "P1", "1.35 G + 1.5 S"}), "roof-1-P1-1.35-G+1.5-S");
  EXPECT_EQ(joinedName({"", "a/b\\c", "../x"}), "a-b-c-x");
  EXPECT_EQ(joinedName({"P 2", "", "..."}), "P-2");
}

TEST(FileNames, areShortEnoughForADiskInAnyLetters) {
  for (const char* letter : {"x", "σ", "部", "\xF0\x9D\x9C\x8E"}) {
    std::string name;
    for (int i = 0; i < 300; ++i)
      name += letter;
    const QString joined = joinedName({name, name, name}) + "-2.svg";
    const QTemporaryDir folder;
    QFile file(folder.filePath(joined));
    EXPECT_TRUE(file.open(QIODevice::WriteOnly)) << letter << ": " << file.errorString().toStdString();
    EXPECT_FALSE(joined.contains(QChar::ReplacementCharacter)) << letter;
  }
}

TEST(FileNames, differAlsoWhereCaseIsNotToldApart) {
  EXPECT_EQ(distinctNames({"a", "b"}), (Names{"a", "b"}));
  EXPECT_EQ(distinctNames({"P1", "p1", "P1"}), (Names{"P1", "p1-2", "P1-3"}));
  EXPECT_EQ(distinctNames({"P1-2", "P1", "P1"}), (Names{"P1-2", "P1", "P1-3"})) << "one is taken already";
}

} // namespace
} // namespace planewright

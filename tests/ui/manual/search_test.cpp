// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual_search.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

const ManualSearch& english() {
  static const ManualSearch search(QStringLiteral("en"));
  return search;
}

bool isFound(const char* words, const char* page) {
  return std::ranges::any_of(
      english().find(searchedWords(QString::fromUtf8(words))),
      [&](const FoundPage& one) { return one.page == QLatin1String(page) && one.count > 0; });
}

TEST(ManualSearch, findsWordsWithoutRegardToCase) {
  EXPECT_TRUE(isFound("ROSETTE", "given"));
  EXPECT_TRUE(isFound("rosette", "given"));
  EXPECT_FALSE(isFound("rosette", "screening"));
}

TEST(ManualSearch, findsPagesWithAllWords) {
  EXPECT_TRUE(isFound("exit disk", "command-line"));
  EXPECT_FALSE(isFound("exit rosette", "command-line"));
}

TEST(ManualSearch, findsWhatTheProgramFillsIn) {
  EXPECT_TRUE(isFound("Hoffman 1967", "criteria"));
}

TEST(ManualSearch, findsNothingWithoutAWord) {
  EXPECT_TRUE(english().find(searchedWords(QStringLiteral("  "))).empty());
}

} // namespace
} // namespace planewright

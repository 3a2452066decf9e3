// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

#include <regex>
#include <set>

namespace planewright {
namespace {

using testing::HasSubstr;

class Manual : public ProgramTest {
protected:
  /// What the first group of a pattern finds in a text.
  static std::set<std::string> all(const std::string& text, const char* pattern) {
    const std::regex expression(pattern);
    std::set<std::string> found;
    for (std::sregex_iterator match(text.begin(), text.end(), expression), end; match != end; ++match)
      found.insert((*match)[1]);
    return found;
  }
};

TEST_F(Manual, isWrittenIntoAFolderAndTellsWhereItBegins) {
  const Ran ran = run("manual -o new/handbook");
  EXPECT_EQ(ran.exit, 0) << ran.err;
  EXPECT_EQ(ran.out, "new/handbook/index.html\n");
  EXPECT_EQ(ran.err, "");
  for (const std::string& file : all(contents("new/handbook/index.html"), "href=\"([^\"#]*)"))
    EXPECT_NE(contents("new/handbook/" + file), "") << file;
}

TEST_F(Manual, hasLinksAndPicturesThatAreOnTheDisk) {
  ASSERT_EQ(run("manual -o book").exit, 0);
  for (const std::string& page : all(contents("book/index.html"), "href=\"([^\"#]*[.]html)")) {
    const std::string html = contents("book/" + page);
    for (const std::string& file : all(html, "src=\"([^\"]*)\""))
      EXPECT_NE(contents("book/" + file), "") << file << " on " << page;
    for (const std::string& file : all(html, "href=\"([^\"#]+)"))
      EXPECT_NE(contents("book/" + file), "") << file << " on " << page;
  }
}

TEST_F(Manual, namesEveryCommandAndOption) {
  ASSERT_EQ(run("manual -o book").exit, 0);
  const std::string page = contents("book/command-line.html");
  for (const char* command : {"resolve", "figure", "sheet", "screen", "compare", "validate", "manual"}) {
    EXPECT_THAT(page, HasSubstr("id=\"" + std::string(command) + "\""));
    for (const std::string& option : all(run(std::string(command) + " --help").out, "(--[a-z][a-z-]+)"))
      EXPECT_THAT(page, HasSubstr(option)) << command;
  }
}

TEST_F(Manual, replacesFilesOnlyOnRequest) {
  ASSERT_EQ(run("manual -o book").exit, 0);
  put("book/cautions.html", "mine");
  expectWrongUse(run("manual -o book"), "--replace");
  EXPECT_EQ(contents("book/cautions.html"), "mine");
  EXPECT_EQ(run("manual -o book --replace").exit, 0);
  EXPECT_NE(contents("book/cautions.html"), "mine");
}

TEST_F(Manual, writesNothingWhenItIsUsedWrongly) {
  expectWrongUse(run("manual"), "-o FOLDER");
  expectWrongUse(run("manual -o -"), "-o FOLDER");
  expectWrongUse(run("manual book"), "book");
  expectWrongUse(run("manual -o book --language tlh"), "tlh");
  EXPECT_EQ(files(), 0U);
}

TEST_F(Manual, saysWhenTheFolderCannotBeMade) {
  put("book", "a file");
  const Ran ran = run("manual -o book");
  EXPECT_EQ(ran.exit, 3);
  EXPECT_THAT(ran.err, HasSubstr("book"));
  EXPECT_EQ(contents("book"), "a file");
}

} // namespace
} // namespace planewright

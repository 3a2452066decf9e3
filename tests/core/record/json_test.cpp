// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/json.h"

#include "core/record/json_text.h"
#include "core/record/study_file.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace planewright {
namespace {

using testing::ElementsAre;
using testing::HasSubstr;
using namespace std::string_literals;

/// "line:column quoted" of each Problem.
std::vector<std::string> faultsOf(std::string_view bytes) {
  FileProblems problems(bytes);
  readJson(problems);
  std::vector<std::string> faults;
  for (const Problem& problem : problems.taken())
    faults.push_back(std::to_string(problem.line) + ":" + std::to_string(problem.column) + " " +
                     problem.quoted);
  return faults;
}

std::string whatOf(std::string_view bytes) {
  FileProblems problems(bytes);
  readJson(problems);
  const Problems found = problems.taken();
  return found.size() == 1 ? plain(found.front().what) : std::to_string(found.size()) + " problems";
}

Json treeOf(std::string_view bytes) {
  FileProblems problems(bytes);
  std::optional<Json> json = readJson(problems);
  EXPECT_TRUE(json && problems.empty()) << bytes;
  return json.value_or(Json{});
}

TEST(Json, everyValueAndKeyKnowsWhereItStands) {
  const std::string bytes = "{ \"a\" : [1, -2.5e3,\n \"x\\\"y\", true , null],\n\t\"ä\":{}\n}";
  const Json root = treeOf(bytes);
  ASSERT_EQ(root.members.size(), 2u);
  const auto at = [&](std::size_t offset) { return lineColumnOf(bytes, offset); };
  EXPECT_EQ(at(root.members[0].keyOffset), (LineColumn{1, 3}));
  const Json& list = root.members[0].value;
  EXPECT_EQ(list.kind, Json::Kind::list);
  EXPECT_EQ(at(list.offset), (LineColumn{1, 9}));
  EXPECT_EQ(list.members[1].value.text, "-2.5e3");
  EXPECT_EQ(at(list.members[1].value.offset), (LineColumn{1, 13}));
  EXPECT_EQ(list.members[2].value.text, "x\"y");
  EXPECT_EQ(at(list.members[2].value.offset), (LineColumn{2, 2}));
  EXPECT_EQ(list.members[3].value.kind, Json::Kind::boolean);
  EXPECT_EQ(at(list.members[4].value.offset), (LineColumn{2, 17}));
  EXPECT_EQ(root.members[1].key, "ä");
  EXPECT_EQ(at(root.members[1].keyOffset), (LineColumn{3, 2}));
  EXPECT_EQ(at(root.members[1].value.offset), (LineColumn{3, 6}));
}

TEST(Json, columnsAreCountedInCodePointsAndAByteOrderMarkHasNone) {
  const std::string bytes = "\xEF\xBB\xBF[\"σ𝜎\", 7]";
  const Json root = treeOf(bytes);
  EXPECT_EQ(lineColumnOf(bytes, root.offset), (LineColumn{1, 1}));
  EXPECT_EQ(lineColumnOf(bytes, root.members[1].value.offset), (LineColumn{1, 8}));
}

TEST(Json, charactersOfATextAreFoundBehindEscapes) {
  const std::string bytes = R"("a\n\u03c3\ud835\udf0e\"b")";
  const auto found = [&](std::size_t index) { return bytes.substr(offsetInText(bytes, 0, index), 2); };
  EXPECT_EQ(found(1), "\\n");
  EXPECT_EQ(found(2), "\\u");
  EXPECT_EQ(offsetInText(bytes, 0, 3), 10u);
  EXPECT_EQ(found(4), "\\\"");
  EXPECT_EQ(found(5), "b\"");
  EXPECT_EQ(offsetInText(bytes, 0, 99), bytes.size() - 1);
}

TEST(Json, brokenGrammarIsShownWhereItBreaks) {
  EXPECT_THAT(faultsOf(R"({"a":1 "b":2})"), ElementsAre("1:8 b"));
  EXPECT_THAT(faultsOf("[1,,2]"), ElementsAre("1:4 ,"));
  EXPECT_THAT(faultsOf("[1,]"), ElementsAre("1:4 ]"));
  EXPECT_THAT(faultsOf("{\"a\":}"), ElementsAre("1:6 }"));
  EXPECT_THAT(faultsOf("{\"a\" 5}"), ElementsAre("1:6 5"));
  EXPECT_THAT(faultsOf("{a:1}"), ElementsAre("1:2 a"));
  EXPECT_THAT(faultsOf("[tru]"), ElementsAre("1:2 tru"));
  EXPECT_THAT(faultsOf("[1.]"), ElementsAre("1:2 1."));
  EXPECT_THAT(faultsOf("[01]"), ElementsAre("1:3 1"));
  EXPECT_THAT(faultsOf("[1] [2]"), ElementsAre("1:5 ["));
  EXPECT_THAT(faultsOf("// x\n[]"), ElementsAre("1:1 //"));
  EXPECT_THAT(faultsOf("[NaN]"), ElementsAre("1:2 NaN"));
}

TEST(Json, brokenTextsAreShownAtTheCharacterThatBreaksThem) {
  EXPECT_THAT(faultsOf("[\"ab\n\"]"), ElementsAre("1:5 ab"));
  EXPECT_THAT(faultsOf(R"(["a\x"])"), ElementsAre(R"(1:5 a\x)"));
  EXPECT_THAT(faultsOf(R"(["\ud835x"])"), ElementsAre(R"(1:9 \ud835x)"));
  EXPECT_THAT(faultsOf(R"(["\udf0e"])"), ElementsAre(R"(1:8 \udf0e)"));
  EXPECT_THAT(whatOf("[\"ab\n\"]"), HasSubstr("“ab” breaks off"));
}

TEST(Json, cutOffFilesSaySo) {
  for (const char* bytes :
       {"", " ", "{", "{\"a", "{\"a\"", "{\"a\":", "{\"a\":1", "{\"a\":1,", "[1", "[\"x\\", "tr"})
    EXPECT_EQ(whatOf(bytes), "The file ends too early.") << bytes;
}

TEST(Json, zeroBytesAreNoEnd) {
  EXPECT_EQ(whatOf("[1]\0"s), "The file goes on after its end.");
  EXPECT_EQ(whatOf("[1]\0[2]"s), "The file goes on after its end.");
  EXPECT_THAT(faultsOf("[1,\0]"s), testing::SizeIs(1));
  EXPECT_EQ(whatOf(R"(["a\u0000b"])"), "This text has control characters.");
  EXPECT_EQ(whatOf(R"({"a\u001b[2J":1})"), "This text has control characters.");
}

TEST(Json, onlyUtf8IsRead) {
  EXPECT_THAT(faultsOf("[\"a\xFF\"]"), ElementsAre("1:4 "));
  EXPECT_EQ(whatOf("[\"\xC3(\"]"), "The file is not UTF-8 from here on.");
  EXPECT_EQ(whatOf("[\"\xED\xA0\x80\"]"), "The file is not UTF-8 from here on.");
  EXPECT_EQ(whatOf("\xFF\xFE[\0]\0"s), "The file is not UTF-8 from here on.");
}

TEST(Json, aDoubledKeyIsAProblemAndTheFirstStands) {
  const std::string bytes = R"({"a":1,"b":2,"\u0061":3,"c":{"a":4,"b":5,"b":6}})";
  FileProblems problems(bytes);
  const std::optional<Json> json = readJson(problems);
  ASSERT_TRUE(json);
  EXPECT_EQ(member(*json, "a")->value.text, "1");
  const Problems found = problems.taken();
  ASSERT_EQ(found.size(), 2u);
  EXPECT_EQ(found[0].column, 14);
  EXPECT_EQ(found[1].quoted, "b");
  EXPECT_EQ(found[1].column, 42);
}

TEST(Json, hugeNumbersAreRefusedOrKeptAsWritten) {
  EXPECT_EQ(whatOf("[1e999]"), "The number “1e999” is too large.");
  EXPECT_EQ(treeOf("[123456789012345678901234567890]").members[0].value.text,
            "123456789012345678901234567890");
  EXPECT_EQ(treeOf("[" + std::string(100000, '9') + ".5e-100000]").members.size(), 1u);
}

TEST(Json, depthAndSizeAreBounded) {
  const auto nested = [](std::size_t depth) { return std::string(depth, '[') + std::string(depth, ']'); };
  EXPECT_EQ(treeOf(nested(deepestJson)).kind, Json::Kind::list);
  EXPECT_EQ(whatOf(nested(deepestJson + 1)), "The brackets are nested more than 64 deep.");
  EXPECT_EQ(whatOf(std::string(5'000'000, '[')), "The brackets are nested more than 64 deep.");
  std::string objects;
  for (int i = 0; i < 100000; ++i)
    objects += "{\"a\":";
  EXPECT_EQ(whatOf(objects), "The brackets are nested more than 64 deep.");
  EXPECT_EQ(whatOf(std::string(greatestStudyFile + 1, ' ')), "The file is larger than 16 MB.");
  std::string many = "[0";
  while (many.size() < 2 * mostJsonValues + 2)
    many += ",0";
  EXPECT_EQ(whatOf(many + "]"), "The file has more than a million values.");
}

TEST(Json, atMostAHundredProblemsAreTold) {
  std::string doubled = "{\"k\":0";
  for (int i = 0; i < 1000; ++i)
    doubled += ",\"k\":0";
  EXPECT_EQ(faultsOf(doubled + "}").size(), 100u);
}

TEST(Json, longPiecesAreCutWhenTheyAreQuoted) {
  EXPECT_EQ(pieceAt("\"" + std::string(10000, 'x') + "\"", 0), std::string(60, 'x') + "…");
  EXPECT_EQ(pieceAt("\"short\"", 0), "short");
}

} // namespace
} // namespace planewright

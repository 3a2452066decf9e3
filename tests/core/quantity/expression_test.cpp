// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/approved.h"
#include "tests/support/expression_corpus.h"

#include "core/words/utf8.h"

#include <charconv>
#include <cmath>

namespace planewright {
namespace {

/// The rows of a corpus file, without remarks and with the text they were cut from.
struct Corpus {
  std::string bytes;
  std::vector<std::vector<std::string_view>> rows;
};

Corpus corpus(const std::string& name) {
  std::ifstream file(std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "corpus/expression" / name,
                     std::ios::binary);
  Corpus result{{std::istreambuf_iterator<char>(file), {}}, {}};
  EXPECT_FALSE(result.bytes.empty()) << name;
  for (const std::string_view line : parts(result.bytes, '\n'))
    if (!line.empty() && line.front() != '#')
      result.rows.push_back(parts(line, '\t'));
  return result;
}

double number(std::string_view text) {
  double value = 0;
  EXPECT_EQ(std::from_chars(text.data(), text.data() + text.size(), value).ptr, text.data() + text.size());
  return value;
}

std::string complaint(std::string_view text, std::string_view field) {
  const auto entry = readEntry(text, *fieldOf(field));
  return entry ? "read as " + entry->text : plain(entry.error());
}

TEST(Expression, goodTextsHaveTheirValueWidthAndKeptText) {
  const Corpus good = corpus("good.txt");
  ASSERT_GT(good.rows.size(), 100u);
  for (const auto& row : good.rows) {
    ASSERT_EQ(row.size(), 5u) << row[1];
    const auto entry = readEntry(row[1], *fieldOf(row[0]));
    ASSERT_TRUE(entry) << row[0] << ": " << row[1] << ": " << plain(entry.error());
    EXPECT_NEAR(entry->value, number(row[2]), 4e-16 * std::abs(number(row[2]))) << row[1];
    EXPECT_NEAR(entry->halfWidth, number(row[3]), 1e-15 * number(row[3])) << row[1];
    EXPECT_EQ(entry->text, row[4]) << row[1];
  }
}

TEST(Expression, keptTextsReadBackTheSame) {
  for (const auto& row : corpus("good.txt").rows) {
    const auto entry = readEntry(row[1], *fieldOf(row[0]));
    ASSERT_TRUE(entry) << row[1];
    EXPECT_EQ(readEntry(entry->text, *fieldOf(row[0])), entry) << row[1];
  }
}

TEST(Expression, badTextsPointAtTheOffendingPiece) {
  const Corpus bad = corpus("bad.txt");
  ASSERT_GT(bad.rows.size(), 90u);
  for (const auto& row : bad.rows) {
    ASSERT_EQ(row.size(), 4u) << row[1];
    const auto entry = readEntry(row[1], *fieldOf(row[0]));
    ASSERT_FALSE(entry) << row[1] << " was read as " << entry->text;
    const Problem& problem = entry.error();
    EXPECT_EQ(problem.column, number(row[2])) << row[1] << ": " << plain(problem);
    EXPECT_EQ(problem.quoted, row[3]) << row[1] << ": " << plain(problem);
    EXPECT_FALSE(problem.what.empty()) << row[1];
    EXPECT_FALSE(problem.mend.empty()) << row[1];
  }
}

TEST(Expression, badTextsAreAnsweredInApprovedWords) {
  std::string words;
  for (const auto& row : corpus("bad.txt").rows)
    words += std::string(row[0]) + " | " + std::string(row[1]) + " | " + complaint(row[1], row[0]) + "\n";
  EXPECT_TRUE(matchesApproved("quantity/complaints.txt", words));
}

TEST(Expression, aForceForAStressSaysHowToMendIt) {
  EXPECT_EQ(complaint("12 kN", "stress"),
            "column 1: This is a force (12 kN); a stress is needed: divide by an "
            "area. Write for example 12 kN/(90 mm*240 mm).");
}

TEST(Expression, theMendOfAUnitOnAnExponentIsRead) {
  EXPECT_NE(complaint("2^3 MPa", "stress").find("Write (2^3) MPa."), std::string::npos);
  EXPECT_EQ(readEntry("(2^3) MPa", *fieldOf("stress"))->value, 8);
}

TEST(Expression, columnsCountCodePoints) {
  const auto entry = readEntry("−2·3 + €", *fieldOf("stress"));
  ASSERT_FALSE(entry);
  EXPECT_EQ(entry.error().column, 8);
  EXPECT_EQ(entry.error().quoted, "€");
}

TEST(Expression, columnsCountTheBlanksBeforeTheText) {
  EXPECT_EQ(readEntry("   12 kN", *fieldOf("stress")).error().column, 4);
  EXPECT_EQ(readEntry("   8 kPaa", *fieldOf("stress")).error().column, 6);
}

TEST(Expression, bytesThatAreNotUtf8AreNamed) {
  EXPECT_EQ(complaint("8 \xFF", "stress"),
            "column 3: The byte FF is not UTF-8. Type the text again, or save its file as UTF-8.");
  for (const std::string_view bytes : {"\xC0\xAF", "\xED\xA0\x80", "\xF4\x90\x80\x80", "\xE2\x88", "\x80"})
    EXPECT_NE(complaint(bytes, "stress").find("not UTF-8"), std::string::npos);
}

TEST(Expression, controlCharactersAreNamedAndNeverPrinted) {
  EXPECT_EQ(complaint("8\x1B[1m", "stress").find('\x1B'), std::string::npos);
  EXPECT_NE(complaint("8\x1B[1m", "stress").find("U+001B"), std::string::npos);
  EXPECT_NE(complaint("8\t9", "stress").find("U+0009"), std::string::npos);
  EXPECT_NE(complaint("8\u202E9", "stress").find("U+202E"), std::string::npos);
}

TEST(Expression, endsOfLinesRoundPastedTextAreDropped) {
  EXPECT_EQ(readEntry("\t80 MPa\r\n", *fieldOf("stress"))->text, "80 MPa");
  EXPECT_EQ(readEntry("80\u00A0MPa", *fieldOf("stress"))->value, 80);
}

std::string repeated(std::string_view piece, int times) {
  std::string result;
  for (int i = 0; i < times; ++i)
    result += piece;
  return result;
}

TEST(Expression, fourThousandAndNinetySixCharactersAreRead) {
  const EntryKind number = *fieldOf("number");
  EXPECT_TRUE(readEntry("1" + repeated("+1", 2047) + " ", number));
  const auto longer = readEntry("1" + repeated("+1", 2048), number);
  ASSERT_FALSE(longer);
  EXPECT_EQ(longer.error().column, 4097);
  EXPECT_TRUE(readEntry("1" + repeated("·1", 2047), number));
  // The unit that completes a text must find room too, so that what is kept can be read again.
  EXPECT_FALSE(readEntry("1" + repeated("+1", 2047), *fieldOf("stress")));
}

TEST(Expression, twoHundredLevelsAreRead) {
  const EntryKind number = *fieldOf("number");
  EXPECT_TRUE(readEntry(repeated("(", 200) + "1" + repeated(")", 200), number));
  const auto deeper = readEntry(repeated("(", 201) + "1" + repeated(")", 201), number);
  ASSERT_FALSE(deeper);
  EXPECT_EQ(deeper.error().column, 201);
  EXPECT_FALSE(readEntry(repeated("-", 201) + "1", number));
  EXPECT_FALSE(readEntry(repeated("2^", 201) + "1", number));
  EXPECT_FALSE(readEntry(repeated("sqrt(", 201) + "1" + repeated(")", 201), number));
  EXPECT_TRUE(readEntry(repeated("(", 200) + "1" + repeated(")", 200), *fieldOf("stress")));
  EXPECT_FALSE(readEntry("1+" + repeated("(", 200) + "1" + repeated(")", 200), *fieldOf("stress")));
}

TEST(Expression, aUnitThatWentIntoTheDivisorIsExplained) {
  const auto entry = readEntry("pi/6 rad", {dimension::angle, *findUnit("deg"), Slopes::none});
  ASSERT_FALSE(entry);
  EXPECT_NE(plain(entry.error()).find("write (1/2) deg"), std::string::npos) << plain(entry.error());
}

TEST(Expression, aCompletedTextThatOverflowsPointsAtWhatWasTyped) {
  const EntryKind giga{dimension::stress, *findUnit("GPa"), Slopes::none};
  const auto entry = readEntry(" 1e308", giga);
  ASSERT_FALSE(entry);
  EXPECT_EQ(entry.error().column, 2);
  EXPECT_EQ(entry.error().quoted, "1e308");
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// A table of a million rows with faults planted at known lines: each is found, and no other.
#include "tests/support/dice.h"
#include "tests/support/field_reading.h"

#include <gmock/gmock.h>

#include <array>
#include <charconv>
#include <map>
#include <set>

namespace planewright {
namespace {

constexpr std::size_t points = 500'000;

struct Planted {
  const char* row; ///< instead of the right one
  const char* says;
  bool isNotFinite = false;
};

const std::map<std::size_t, Planted>& planted() {
  // By the line in the file; line 2k is the row of case G of point k - 1, line 2k + 1 that of S.
  static const std::map<std::size_t, Planted> faults = {
      {2, {"0,G,nan,0,0", "“nan” is no finite number", true}},
      {4097, {"2047,S,1,-inf,0", "“-inf” is no finite number", true}},
      {70001, {"34999,S,1,2", "fewer cells"}},
      {70002, {"35000,G,1,2,3,4", "more cells"}},
      {222222, {"111110,G,1,5,3,2", "more cells"}},
      {333333, {"166665,X,1,2,3", "no case “X”"}},
      {444444, {"444444 is no row", "fewer cells"}},
      {500000, {"0,S,1,2,3", "a second time"}},
      {777777, {"388887,S,1,,3", "number is missing"}},
      {900001, {"449999,S,1,1e400,3", "beyond 1e100"}},
      {1000001, {"499999,S,1.2.3,0,0", "“1.2.3” is no number"}}};
  return faults;
}

void addNumber(std::string& text, double value) {
  std::array<char, 32> buffer{};
  text.append(
      buffer.data(),
      std::to_chars(buffer.data(), buffer.data() + buffer.size(), value, std::chars_format::general, 6).ptr);
}

/// The table in pieces, as a file is read.
Results<FieldReading> readBigTable(const Study& study) {
  FieldReader reader(study, {true, true});
  Dice dice(5);
  std::string piece = "point,case,sx,sy,txy\n";
  for (std::size_t line = 2; line < 2 * points + 2; ++line) {
    const auto fault = planted().find(line);
    if (fault != planted().end()) {
      piece += fault->second.row;
    } else {
      addNumber(piece, static_cast<double>(line / 2 - 1));
      piece += line % 2 ? ",S" : ",G";
      for (int component = 0; component < 3; ++component) {
        piece += ',';
        addNumber(piece, dice.between(-10, 10));
      }
    }
    piece += '\n';
    if (piece.size() > 100'000) {
      EXPECT_TRUE(reader.take(piece));
      piece.clear();
    }
  }
  EXPECT_TRUE(reader.take(piece));
  return reader.finish();
}

TEST(BigField, everyPlantedFaultIsFoundAndNoOther) {
  const Study study = readingStudy();
  const Results<FieldReading> reading = readBigTable(study);
  ASSERT_TRUE(reading);
  EXPECT_EQ(reading->rows, 2 * points);
  EXPECT_EQ(reading->faultyRows, planted().size());
  EXPECT_EQ(reading->notFinite, 2U);
  for (const auto& [line, fault] : planted()) {
    const auto told = std::ranges::find(reading->faults, static_cast<int>(line), &Problem::line);
    ASSERT_NE(told, reading->faults.end()) << line;
    EXPECT_THAT(plain(*told), testing::HasSubstr(fault.says));
  }
  // Each leaves its point without a case but the doubled row, which takes the place of another as well; the
  // first point has lost its G and has its S twice.
  std::set<std::string> incomplete;
  for (std::size_t i = 0; i < reading->field.size(); ++i)
    if (reading->field.standingOf(i) == PointStanding::incomplete)
      incomplete.insert(std::string(reading->field.nameOf(i)));
  EXPECT_EQ(incomplete.size(), planted().size());
  EXPECT_EQ(reading->incompletePoints, incomplete.size());
  EXPECT_TRUE(incomplete.contains("0"));
  EXPECT_TRUE(incomplete.contains("249999"));
  EXPECT_TRUE(incomplete.contains("222221"));
}

} // namespace
} // namespace planewright

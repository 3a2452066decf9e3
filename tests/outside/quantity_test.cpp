// SPDX-License-Identifier: GPL-3.0-or-later
// Factors of units and angles of slopes against outside sources. "From memory" is said where it is so.
#include "core/quantity/expression.h"
#include "core/record/csv.h"

#include <gtest/gtest.h>

#include <charconv>
#include <cmath>
#include <fstream>

namespace planewright {
namespace {

double number(const std::string& text) {
  double value = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
  EXPECT_TRUE(error == std::errc() && end == text.data() + text.size()) << text;
  return value;
}

struct PrintedFactor {
  const char* typed;
  double printed; ///< in N, mm, N/mm2 or N*mm
  double digit;   ///< unit of its last printed digit
  Dimension dimension;
};

// NIST Special Publication 811 (2008), appendix B, all from memory; there in SI units with seven digits,
// exact factors in bold.
const PrintedFactor nist[] = {
    {"1 psi", 6.894757e-3, 1e-9, dimension::stress},   {"1 ksi", 6.894757, 1e-6, dimension::stress},
    {"1 psf", 4.788026e-5, 1e-11, dimension::stress},  {"1 bar", 0.1, 1e-15, dimension::stress},
    {"1 kgf/mm^2", 9.80665, 1e-14, dimension::stress}, {"1 kgf/cm^2", 9.80665e-2, 1e-16, dimension::stress},
    {"1 lbf", 4.448222, 1e-6, dimension::force},       {"1 kip", 4.448222e3, 1e-3, dimension::force},
    {"1 kgf", 9.80665, 1e-14, dimension::force},       {"1 in", 25.4, 1e-13, dimension::length},
    {"1 ft", 304.8, 1e-12, dimension::length},         {"1 lbf*in", 1.129848e2, 1e-4, dimension::moment},
    {"1 lbf*ft", 1.355818e3, 1e-3, dimension::moment},
};

TEST(OutsideUnits, factorsAreThoseOfNist) {
  for (const PrintedFactor& factor : nist) {
    const auto entry = readEntry(factor.typed, {factor.dimension, {}, Slopes::none});
    ASSERT_TRUE(entry) << factor.typed << ": " << plain(entry.error());
    EXPECT_NEAR(entry->value, factor.printed, factor.digit / 2) << factor.typed;
  }
}

// The same bodies as they are printed: 1 lb = 0.45359237 kg and 1 yd = 0.9144 m (international yard and pound
// agreement, 1959), g_n = 9.80665 m/s2 (3rd CGPM, 1901); both from memory.
TEST(OutsideUnits, factorsFollowFromTheDefinitions) {
  const auto value = [](const char* typed, Dimension dimension) {
    return readEntry(typed, {dimension, {}, Slopes::none}).value().value;
  };
  EXPECT_DOUBLE_EQ(value("1 lbf", dimension::force), 0.45359237 * 9.80665);
  EXPECT_DOUBLE_EQ(value("3 ft", dimension::length), 914.4);
  EXPECT_DOUBLE_EQ(value("1 tf", dimension::force), 9806.65);
  EXPECT_DOUBLE_EQ(value("1 psi", dimension::stress), 0.45359237 * 9.80665 / (25.4 * 25.4));
  EXPECT_DOUBLE_EQ(value("144 psf", dimension::stress), value("1 psi", dimension::stress));
}

TEST(OutsideSlopes, everyRowOfTheFileHasItsAngle) {
  std::ifstream file(std::string(PLANEWRIGHT_TESTS_DIR) + "/../resources/checks/slope_angles.csv");
  std::string line;
  ASSERT_TRUE(std::getline(file, line));
  ASSERT_EQ(line, "slope,angle_deg,tol,source,locator,basis");
  int count = 0;
  for (; std::getline(file, line); ++count) {
    const std::vector<std::string> row = csvFields(line);
    ASSERT_EQ(row.size(), 6u) << line;
    EXPECT_FALSE(row[3].empty() || row[4].empty() || row[5].empty()) << line;
    const auto entry = readEntry(row[0], {dimension::angle, degreeUnit(), Slopes::line});
    ASSERT_TRUE(entry) << line << ": " << plain(entry.error());
    EXPECT_NEAR(entry->value, number(row[1]), number(row[2])) << line;
  }
  EXPECT_EQ(count, 11);
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// Values printed in textbooks, each named with its place and basis in resources/checks.
#include "core/evidence/evidence.h"
#include "core/record/csv.h"

#include <gtest/gtest.h>

#include <cmath>
#include <fstream>
#include <map>

namespace planewright {
namespace {

std::vector<std::string> linesOf(const std::string& name) {
  std::ifstream file(std::string(PLANEWRIGHT_TESTS_DIR) + "/../resources/checks/" + name);
  std::vector<std::string> lines;
  for (std::string line; std::getline(file, line);)
    lines.push_back(line);
  return lines;
}

std::vector<CheckResult> results() {
  auto checks = publishedChecks();
  EXPECT_TRUE(checks) << (checks ? "" : plain(checks.error().front()));
  return checks ? *std::move(checks) : std::vector<CheckResult>{};
}

/// The rows of every file without their headings, in the order of the results.
std::vector<std::string> rowsOfAllFiles() {
  std::vector<std::string> rows;
  for (const ShippedChecks& file : shippedChecks()) {
    const std::vector<std::string> lines = linesOf(file.name);
    EXPECT_GE(lines.size(), 25u) << file.name;
    rows.insert(rows.end(), lines.begin() + 1, lines.end());
  }
  return rows;
}

TEST(Published, everyRowOfEveryFileIsRecomputedInItsOrder) {
  const std::vector<std::string> rows = rowsOfAllFiles();
  const std::vector<CheckResult> checks = results();
  ASSERT_GE(rows.size(), 320u);
  ASSERT_EQ(checks.size(), rows.size());
  for (std::size_t i = 0; i < checks.size(); ++i)
    EXPECT_EQ(checks[i].id, rows[i].substr(0, rows[i].find(',')));
}

TEST(Published, everyValueAgrees) {
  for (const CheckResult& check : results())
    EXPECT_TRUE(check.agrees) << check.id << " " << check.quantity << " printed " << check.printed.value_or(0)
                              << ", computed " << check.computed << " (" << check.source << ", "
                              << check.locator << "; " << check.basis << ")";
}

TEST(Published, rowsAreJudgedAsTheirStatusSays) {
  const std::map<std::string, CheckStatus> words = {{"OK", CheckStatus::ok},
                                                    {"LAST_DIGIT", CheckStatus::lastDigit},
                                                    {"SIGN", CheckStatus::sign},
                                                    {"NO_PRINTED_VALUE", CheckStatus::noPrintedValue}};
  const std::vector<std::string> rows = rowsOfAllFiles();
  const std::vector<CheckResult> checks = results();
  ASSERT_EQ(checks.size(), rows.size());
  for (std::size_t i = 0; i < checks.size(); ++i) {
    const std::vector<std::string> fields = csvFields(rows[i]);
    EXPECT_EQ(checks[i].status, words.at(fields.at(9))) << rows[i];
    EXPECT_EQ(checks[i].printed.has_value(), !fields.at(6).empty()) << rows[i];
  }
}

// The rows that invite a mistake of sign: here the conventions of this program give the other one.
TEST(Published, whereASourceHasAnotherSignOursIsTheOpposite) {
  for (const CheckResult& check : results())
    if (check.status == CheckStatus::sign) {
      EXPECT_LT(check.computed * check.printed.value(), 0) << check.id;
    }
}

TEST(Published, ownArithmeticBesideEveryRowAgreesToItsDigits) {
  for (const CheckResult& check : results())
    EXPECT_NEAR(check.computed, check.recomputed, 1e-9 * std::max(1.0, std::abs(check.recomputed)))
        << check.id << " " << check.quantity;
}

TEST(Published, everyRowNamesSourcePlaceAndBasis) {
  for (const CheckResult& check : results())
    EXPECT_FALSE(check.source.empty() || check.locator.empty() || check.basis.empty()) << check.id;
}

} // namespace
} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/check_words.h"

#include <gtest/gtest.h>

#include <limits>

namespace planewright {
namespace {

std::string sentence(double utilisation, std::optional<double> multiplier) {
  CheckReading reading;
  reading.worst.utilisation = utilisation;
  reading.worst.unstressed = utilisation == 0;
  if (multiplier)
    reading.first = {*multiplier, Angle()};
  return plain(multiplierSentence(reading));
}

TEST(MultiplierSentence, isThatOfTheBandWhateverTheWorstDirectionSays) {
  EXPECT_EQ(sentence(0.522, 17.8), "All loads could be multiplied by 17.80.");
  EXPECT_EQ(sentence(0.522, std::nullopt), "No multiple of all loads reaches the limit.");
  EXPECT_EQ(sentence(2, 0.5), "All loads must be multiplied by 0.50.");
  EXPECT_EQ(sentence(0, std::nullopt), "No stress acts.");
}

TEST(MultiplierSentence, goesByTheLimitOfTheVerdict) {
  EXPECT_EQ(sentence(1 + 5e-10, 1 - 5e-10), "All loads could be multiplied by 1.00.");
  EXPECT_EQ(sentence(1 + 1e-8, 1 - 1e-8), "All loads must be multiplied by 0.99.");
}

TEST(MultiplierSentence, ofAPlaneThatTakesNothingNamesNoNumber) {
  constexpr double none = std::numeric_limits<double>::infinity();
  EXPECT_EQ(sentence(none, 0), "No multiple of all loads is within the limit.");
  EXPECT_EQ(sentence(none, std::nullopt), "No multiple of all loads is within the limit.");
}

} // namespace
} // namespace planewright

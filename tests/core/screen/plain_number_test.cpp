// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/plain_number.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <bit>
#include <charconv>

namespace planewright {
namespace {

std::string digitsOf(int count) {
  std::string digits;
  for (int i = 0; i < count; ++i)
    digits += *rc::gen::inRange('0', static_cast<char>('9' + 1));
  return digits;
}

// Bit for bit what the library reads: short decimals are read without it.
RC_GTEST_PROP(PlainNumber, isWhatTheLibraryReads, ()) {
  std::string text = *rc::gen::element<std::string>("", "-");
  text += digitsOf(*rc::gen::inRange(0, 12));
  if (*rc::gen::arbitrary<bool>())
    text += "." + digitsOf(*rc::gen::inRange(0, 12));
  text += *rc::gen::element<std::string>("", "", "", "e3", "E-2", "x");
  double expected = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), expected);
  const bool reads = error == std::errc() && end == text.data() + text.size();
  const std::string row = text + ";rest";
  std::string_view rest = row;
  double value = 0;
  bool isLast = true;
  RC_ASSERT(takeNumber(rest, ';', value, isLast) == reads);
  if (reads) {
    RC_ASSERT(std::bit_cast<std::uint64_t>(value) == std::bit_cast<std::uint64_t>(expected));
    RC_ASSERT(rest == "rest" && !isLast);
  } else {
    RC_ASSERT(rest == row);
  }
}

TEST(PlainNumber, takesTheLastCellAndBlanksAroundIt) {
  std::string_view rest = "  -0.25  ";
  double value = 0;
  bool isLast = false;
  EXPECT_TRUE(takeNumber(rest, ',', value, isLast));
  EXPECT_EQ(value, -0.25);
  EXPECT_TRUE(isLast);
  EXPECT_TRUE(rest.empty());
}

} // namespace
} // namespace planewright

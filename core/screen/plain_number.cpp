// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/plain_number.h"

#include <array>
#include <charconv>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <system_error>

namespace planewright {

namespace {

bool isDigit(char c) {
  return c >= '0' && c <= '9';
}

bool isDigitOrPoint(char c) {
  return isDigit(c) || c == '.';
}

/// Of a number that no double holds, whether it is too small for one.
bool isTiny(std::string_view text) {
  const std::size_t exponent = text.find_first_of("eE");
  if (exponent != std::string_view::npos)
    return text.substr(exponent + 1).starts_with('-');
  return text.find('.') < text.find_first_of("123456789");
}

/// A decimal without exponent whose digits and power of ten are doubles each: one division rounds it right.
/// False for any other text, and where none begins; moves `at` behind it. It takes the time out of reading
/// that the library's general way needs; the library reads the rest.
bool takeShortDecimal(const char*& at, const char* end, double& value) {
  static constexpr std::array powers = {1e0, 1e1, 1e2,  1e3,  1e4,  1e5,  1e6,  1e7,
                                        1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15};
  constexpr std::ptrdiff_t mostDigits = 15; // all below 2^53
  const bool isNegative = at < end && *at == '-';
  const char* p = at + (isNegative ? 1 : 0);
  const char* const first = p;
  std::uint64_t digits = 0;
  for (; p < end && isDigit(*p); ++p)
    digits = digits * 10 + static_cast<std::uint64_t>(*p - '0');
  std::ptrdiff_t count = p - first;
  std::ptrdiff_t decimals = 0;
  if (p < end && *p == '.') {
    const char* const behindPoint = ++p;
    for (; p < end && isDigit(*p); ++p)
      digits = digits * 10 + static_cast<std::uint64_t>(*p - '0');
    decimals = p - behindPoint;
    count += decimals;
  }
  if (count == 0 || count > mostDigits || (p < end && (*p == 'e' || *p == 'E')))
    return false;
  const double size = static_cast<double>(digits) / powers[static_cast<std::size_t>(decimals)];
  value = isNegative ? -size : size;
  at = p;
  return true;
}

} // namespace

tl::expected<double, NumberFault> plainNumber(std::string_view text) {
  if (text.empty())
    return tl::unexpected(NumberFault::empty);
  if (text.size() > 1 && text[0] == '+' && isDigitOrPoint(text[1]))
    text.remove_prefix(1);
  double value = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
  if (error == std::errc::result_out_of_range && end == text.data() + text.size()) {
    if (isTiny(text))
      return 0.0;
    return tl::unexpected(NumberFault::tooGreat);
  }
  if (error != std::errc() || end != text.data() + text.size())
    return tl::unexpected(NumberFault::noNumber);
  if (!std::isfinite(value))
    return tl::unexpected(NumberFault::notFinite);
  return value;
}

bool takeNumber(std::string_view& rest, char separator, double& value, bool& isLast) {
  const char* at = rest.data();
  const char* const end = at + rest.size();
  while (at < end && *at == ' ')
    ++at;
  if (at < end && *at == '+' && at + 1 < end && isDigitOrPoint(at[1]))
    ++at;
  if (!takeShortDecimal(at, end, value)) {
    const auto [behind, error] = std::from_chars(at, end, value);
    if (error != std::errc() || !std::isfinite(value))
      return false;
    at = behind;
  }
  while (at < end && *at == ' ')
    ++at;
  if (at < end && *at != separator)
    return false;
  isLast = at == end;
  rest.remove_prefix(static_cast<std::size_t>(at - rest.data()) + (isLast ? 0 : 1));
  return true;
}

} // namespace planewright

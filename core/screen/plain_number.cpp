// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/plain_number.h"

#include <charconv>
#include <cmath>
#include <system_error>

namespace planewright {

namespace {

bool isDigitOrPoint(char c) {
  return (c >= '0' && c <= '9') || c == '.';
}

/// Of a number that no double holds, whether it is too small for one.
bool isTiny(std::string_view text) {
  const std::size_t exponent = text.find_first_of("eE");
  if (exponent != std::string_view::npos)
    return text.substr(exponent + 1).starts_with('-');
  return text.find('.') < text.find_first_of("123456789");
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
  const auto [behind, error] = std::from_chars(at, end, value);
  if (error != std::errc() || !std::isfinite(value))
    return false;
  at = behind;
  while (at < end && *at == ' ')
    ++at;
  if (at < end && *at != separator)
    return false;
  isLast = at == end;
  rest.remove_prefix(static_cast<std::size_t>(at - rest.data()) + (isLast ? 0 : 1));
  return true;
}

} // namespace planewright

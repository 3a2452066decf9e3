// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"

#include "core/words/decimal_sign.h"

#include <algorithm>
#include <array>
#include <cassert>
#include <charconv>
#include <cmath>

namespace planewright {

namespace {

constexpr int mostDigits = 15;
/// Digits that tell every double from the next.
constexpr int allDigits = 17;

template <class... How>
std::string written(double value, How... how) {
  std::array<char, 400> buffer{};
  const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), value, how...);
  assert(end.ec == std::errc{});
  return {buffer.data(), end.ptr};
}

/// A number as its significant digits and the power of ten of the first.
struct Decimal {
  std::string digits; ///< without trailing zeros, at least one
  int exponent = 0;
};

Decimal decimalOf(const std::string& scientific) {
  const std::size_t e = scientific.find('e');
  Decimal result;
  for (const char c : scientific.substr(0, e))
    if (c != '.')
      result.digits += c;
  result.digits.erase(std::max<std::size_t>(result.digits.find_last_not_of('0') + 1, 1));
  const std::size_t sign = scientific[e + 1] == '+' ? 2 : 1;
  std::from_chars(scientific.data() + e + sign, scientific.data() + scientific.size(), result.exponent);
  return result;
}

/// The shortest digits that read back, or the nearest of `digits` significant ones.
Decimal decimalOf(double magnitude, int digits) {
  Decimal shortest = decimalOf(written(magnitude, std::chars_format::scientific));
  if (static_cast<int>(shortest.digits.size()) <= digits)
    return shortest;
  return decimalOf(written(magnitude, std::chars_format::scientific, digits - 1));
}

std::string zeros(int count) {
  return std::string(static_cast<std::size_t>(count), '0');
}

std::string fixed(const Decimal& number) {
  const int after = static_cast<int>(number.digits.size()) - 1 - number.exponent;
  if (number.exponent < 0)
    return "0." + zeros(-1 - number.exponent) + number.digits;
  if (after <= 0)
    return number.digits + zeros(-after);
  const std::size_t point = number.digits.size() - static_cast<std::size_t>(after);
  return number.digits.substr(0, point) + "." + number.digits.substr(point);
}

std::string scientific(const Decimal& number) {
  std::string result = number.digits.substr(0, 1);
  if (number.digits.size() > 1)
    result += "." + number.digits.substr(1);
  return result + "e" + written(number.exponent);
}

std::string withTrueMinus(const std::string& text) {
  std::string result;
  for (const char c : text)
    if (c == '-')
      result += "−";
    else
      result += c;
  return result;
}

bool isZero(const std::string& text) {
  return text.find_first_of("123456789") == std::string::npos;
}

std::string numberWith(int digits, double value) {
  assert(std::isfinite(value));
  if (value == 0)
    return "0";
  const Decimal number = decimalOf(std::abs(value), digits);
  const bool plain = number.exponent >= -5 && number.exponent < mostDigits;
  const std::string text = plain ? fixed(number) : scientific(number);
  return value < 0 ? "-" + text : text;
}

} // namespace

std::string exactNumber(double value) {
  return numberWith(mostDigits, value);
}

std::string shortestNumber(double value) {
  return numberWith(allDigits, value);
}

std::string shownNumber(double value, int decimals) {
  assert(std::isfinite(value));
  if (decimals > mostDigits && std::abs(value) <= 0.5 * std::pow(10.0, -decimals))
    return "0";
  if (decimals < 0 || decimals > mostDigits || std::abs(value) >= 1e15)
    return withDecimalSign(withTrueMinus(written(value + 0.0, std::chars_format::scientific, 3)));
  const std::string digits = withDecimalSign(written(std::abs(value), std::chars_format::fixed, decimals));
  return value < 0 && !isZero(digits) ? "−" + digits : digits;
}

int decimalsFor(double largest, int significant) {
  assert(std::isfinite(largest) && significant > 0);
  constexpr int most = 12;
  if (largest == 0)
    return std::min(significant - 1, most);
  // The exponent after rounding: 9.9996 shows as 10.00.
  const Decimal rounded =
      decimalOf(written(std::abs(largest), std::chars_format::scientific, significant - 1));
  const int decimals = std::max(significant - 1 - rounded.exponent, 0);
  return decimals <= most ? decimals : std::max(decimals, mostDigits + 1);
}

std::string shownDegrees(Angle angle, int decimals) {
  return shownNumber(angle.degrees(), decimals) + "°";
}

std::string shownSlope(Angle angle) {
  const double degrees = std::abs(angle.degrees());
  if (degrees == 0 || degrees > 45)
    return {};
  const CosSin both = cosSin(Angle::fromDegrees(degrees));
  const double run = both.cos / both.sin;
  if (!std::isfinite(run))
    return {};
  const Decimal number = decimalOf(run, 3);
  const std::string text = number.exponent < mostDigits ? fixed(number) : scientific(number);
  return (angle.degrees() < 0 ? "−1 in " : "1 in ") + withDecimalSign(text);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/value.h"

#include "core/quantity/value_problems.h"

#include <algorithm>
#include <charconv>
#include <cmath>
#include <limits>
#include <optional>

namespace planewright {

namespace {

bool tooGreat(Dimension d) {
  return std::max({std::abs(d.force), std::abs(d.length), std::abs(d.angle)}) > greatestExponent;
}

Result<Value> checked(double number, Dimension dimension, bool hasUnit, const Piece& whole) {
  if (!std::isfinite(number))
    return tl::unexpected(notFinite(whole));
  if (tooGreat(dimension))
    return tl::unexpected(dimensionTooGreat(whole));
  Value result;
  result.number = number + 0.0;
  result.dimension = dimension;
  result.hasUnit = hasUnit;
  result.piece = whole;
  return result;
}

/// times * exponent where it is whole; none otherwise.
std::optional<int> wholeProduct(int exponent, double times) {
  const double product = exponent * times;
  if (product != std::floor(product) || std::abs(product) > greatestExponent)
    return std::nullopt;
  return static_cast<int>(product);
}

std::optional<Dimension> raised(Dimension base, double exponent) {
  const auto force = wholeProduct(base.force, exponent);
  const auto length = wholeProduct(base.length, exponent);
  const auto angle = wholeProduct(base.angle, exponent);
  if (!force || !length || !angle)
    return std::nullopt;
  return Dimension{*force, *length, *angle};
}

/// A power of ten that counts digits: how far the last digit of a number's text stands from the point.
int placeOfLastDigit(std::string_view digits) {
  const std::size_t e = digits.find_first_of("eE");
  const std::string_view mantissa = digits.substr(0, e);
  int place = 0;
  if (e != std::string_view::npos) {
    const std::size_t start = e + (digits[e + 1] == '+' ? 2 : 1);
    constexpr int farOff = 100000;
    if (std::from_chars(digits.data() + start, digits.data() + digits.size(), place).ec != std::errc{})
      place = digits[start] == '-' ? -farOff : farOff;
    place = std::clamp(place, -farOff, farOff);
  }
  const std::size_t point = mantissa.find('.');
  return point == std::string_view::npos ? place : place - static_cast<int>(mantissa.size() - point - 1);
}

/// 5 * 10^(place - 1), 0 or the greatest double where that is out of range.
double halfDigit(int place) {
  std::string text = "5e";
  char buffer[16];
  text.append(buffer, std::to_chars(buffer, buffer + sizeof buffer, place - 1).ptr);
  double half = 0;
  if (std::from_chars(text.data(), text.data() + text.size(), half).ec != std::errc{})
    return place > 0 ? std::numeric_limits<double>::max() : 0;
  return half;
}

} // namespace

Result<Value> sumOf(const Value& a, const Value& b, const Piece& whole) {
  if (a.dimension != b.dimension)
    return tl::unexpected(unlikeTerms(a, b));
  return checked(a.number + b.number, a.dimension, a.hasUnit || b.hasUnit, whole);
}

Result<Value> differenceOf(const Value& a, const Value& b, const Piece& whole) {
  return sumOf(a, negated(b, b.piece), whole);
}

Result<Value> productOf(const Value& a, const Value& b, const Piece& whole) {
  return checked(a.number * b.number, a.dimension + b.dimension, a.hasUnit || b.hasUnit, whole);
}

Result<Value> quotientOf(const Value& a, const Value& b, const Piece& whole) {
  if (b.number == 0)
    return tl::unexpected(divisionByZero(b.piece));
  return checked(a.number / b.number, a.dimension + -1 * b.dimension, a.hasUnit || b.hasUnit, whole);
}

Result<Value> powerOf(const Value& base, const Value& exponent, const Piece& whole) {
  if (exponent.dimension != dimension::none)
    return tl::unexpected(exponentWithDimension(exponent));
  const auto dimension = raised(base.dimension, exponent.number);
  if (!dimension)
    return tl::unexpected(brokenDimension(base, exponent.piece));
  if (base.number == 0 && exponent.number < 0)
    return tl::unexpected(divisionByZero(base.piece));
  if (base.number < 0 && exponent.number != std::floor(exponent.number))
    return tl::unexpected(rootOfNegative(base.piece));
  return checked(std::pow(base.number, exponent.number), *dimension, base.hasUnit || exponent.hasUnit, whole);
}

Value negated(Value value, const Piece& whole) {
  value.number = 0.0 - value.number;
  value.piece = whole;
  return value;
}

Result<Value> withUnit(Value value, const Unit& unit, const Piece& whole) {
  const double number = unit.toBase(value.number);
  if (!std::isfinite(number))
    return tl::unexpected(notFinite(whole));
  value.number = number + 0.0;
  value.half = std::min(unit.toBase(value.half), std::numeric_limits<double>::max());
  value.dimension = unit.dimension;
  value.hasUnit = true;
  value.piece = whole;
  return value;
}

Result<Value> numberOf(const Piece& piece) {
  std::string digits(piece.text);
  if (const std::size_t sign = digits.find("−"); sign != std::string::npos)
    digits.replace(sign, std::string_view("−").size(), "-");
  Value value;
  const auto read = std::from_chars(digits.data(), digits.data() + digits.size(), value.number);
  if (read.ec != std::errc{} || read.ptr != digits.data() + digits.size())
    return tl::unexpected(outOfRange(piece));
  value.form = Form::plainNumber;
  value.half = halfDigit(placeOfLastDigit(digits));
  value.piece = piece;
  return value;
}

} // namespace planewright

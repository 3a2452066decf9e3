// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/unit_reader.h"

#include "core/quantity/writing_problems.h"

#include <algorithm>
#include <charconv>
#include <cmath>

namespace planewright {

namespace {

using Kind = Token::Kind;

/// The exponent in a token of two digits at most.
std::optional<int> smallWhole(std::string_view digits) {
  int value = 0;
  const auto read = std::from_chars(digits.data(), digits.data() + digits.size(), value);
  if (read.ec != std::errc{} || read.ptr != digits.data() + digits.size() || digits.size() > 2)
    return std::nullopt;
  return value;
}

/// Takes what raises a unit; 1 where nothing does.
Result<int> exponentAt(Cursor& cursor) {
  const std::size_t start = cursor.at();
  int exponent = 1;
  if (cursor.next(Kind::superscript)) {
    exponent = cursor.peek().text == "²" ? 2 : 3;
    cursor.take();
  } else if (cursor.next(Kind::power)) {
    cursor.take();
    const bool negative = cursor.next(Kind::minus);
    if (negative)
      cursor.take();
    if (!cursor.next(Kind::number))
      return tl::unexpected(unitExponent(cursor.since(start)));
    const auto whole = smallWhole(cursor.peek().text);
    cursor.take();
    if (!whole)
      return tl::unexpected(unitExponent(cursor.since(start)));
    exponent = negative ? -*whole : *whole;
  }
  if (cursor.next(Kind::superscript) || cursor.next(Kind::power))
    return tl::unexpected(unitExponent(cursor.here()));
  return exponent;
}

double raisedTo(double base, int exponent) {
  double result = 1;
  for (int i = 0; i < exponent; ++i)
    result *= base;
  return result;
}

/// Multiplies `unit` by an atom raised to a power of either sign.
void extend(Unit& unit, const Unit& atom, int exponent) {
  unit.dimension = unit.dimension + exponent * atom.dimension;
  unit.numerator *= raisedTo(exponent > 0 ? atom.numerator : atom.denominator, std::abs(exponent));
  unit.denominator *= raisedTo(exponent > 0 ? atom.denominator : atom.numerator, std::abs(exponent));
}

bool isUsable(const Unit& unit) {
  const Dimension d = unit.dimension;
  return std::max({std::abs(d.force), std::abs(d.length), std::abs(d.angle)}) <= greatestExponent &&
         std::isfinite(unit.numerator) && std::isfinite(unit.denominator);
}

} // namespace

bool unitFollows(const Cursor& cursor, std::size_t ahead) {
  return cursor.peek(ahead).is(Kind::name) && findUnit(cursor.peek(ahead).text) &&
         !cursor.peek(ahead + 1).is(Kind::open);
}

Result<Unit> readUnitAt(Cursor& cursor, Slopes slopes) {
  const std::size_t start = cursor.at();
  Unit unit{"", dimension::none, 1, 1};
  for (int sign = 1;;) {
    const std::string_view name = cursor.peek().text;
    if ((name == "in" && slopes != Slopes::none) || (name == "%" && slopes == Slopes::line))
      return tl::unexpected(slopeStandsAlone(cursor.here()));
    cursor.take();
    const auto exponent = exponentAt(cursor);
    if (!exponent)
      return tl::unexpected(exponent.error());
    extend(unit, *findUnit(name), sign * *exponent);
    if (!isUsable(unit))
      return tl::unexpected(dimensionTooGreat(cursor.since(start)));
    if (!(cursor.next(Kind::times) || cursor.next(Kind::divide)) || !unitFollows(cursor, 1))
      break;
    sign = cursor.next(Kind::divide) ? -1 : 1;
    cursor.take();
  }
  unit.name = cursor.since(start).text;
  return unit;
}

Result<Unit> readUnit(std::string_view text, Dimension wanted) {
  if (const auto wrong = unreadableText(text))
    return tl::unexpected(*wrong);
  const Tokens tokens = tokensOf(text);
  Cursor cursor(text, tokens);
  if (cursor.next(Kind::end))
    return tl::unexpected(emptyUnit());
  if (!unitFollows(cursor))
    return tl::unexpected(unknownUnit(cursor.here()));
  auto unit = readUnitAt(cursor, Slopes::none);
  if (!unit)
    return unit;
  if (!cursor.next(Kind::end))
    return tl::unexpected(unitGoesOn(cursor.here()));
  if (unit->dimension != wanted)
    return tl::unexpected(otherDimension(cursor.since(0), unit->dimension, wanted));
  return unit;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/stray.h"

#include "core/quantity/unit_reader.h"
#include "core/quantity/writing_problems.h"

#include <algorithm>
#include <optional>

namespace planewright {

namespace {

using Kind = Token::Kind;

Piece pieceOf(const Token& token) {
  return {token.text, token.column};
}

bool touch(const Token& first, const Token& second) {
  return first.offset + first.text.size() == second.offset;
}

bool isUnitName(const Token& token) {
  return token.is(Kind::name) && findUnit(token.text);
}

bool isNotANumber(std::string_view name) {
  std::string lower(name);
  for (char& c : lower)
    c = c >= 'A' && c <= 'Z' ? static_cast<char>(c + 32) : c;
  return lower == "nan" || lower == "inf" || lower == "infinity";
}

/// "[MPa]" or "(MPa)" at the cursor.
std::optional<Problem> bracketedUnit(Cursor cursor) {
  const std::size_t start = cursor.at();
  const std::string_view closing = cursor.peek().text == "[" ? "]" : ")";
  cursor.take();
  if (!unitFollows(cursor))
    return std::nullopt;
  const auto unit = readUnitAt(cursor, Slopes::none);
  if (!unit || cursor.peek().text != closing)
    return std::nullopt;
  cursor.take();
  return bracketsRoundUnit(cursor.since(start), unit->name);
}

std::string without(std::string_view text, char sign) {
  std::string result(text);
  result.erase(std::remove(result.begin(), result.end(), sign), result.end());
  return result;
}

/// Of "1,234.5" and "1,234,567": the last sign of two kinds is the decimal one; a sign that is repeated parts
/// thousands.
bool partsThousands(std::string_view typed) {
  const std::size_t comma = typed.rfind(',');
  const std::size_t point = typed.rfind('.');
  return typed.find(',') != comma || (point != std::string_view::npos && point > comma);
}

/// "2,1", "1.234,5" with the point where it was meant.
std::string withPoint(std::string_view typed) {
  const std::size_t comma = typed.rfind(',');
  const std::string whole = without(typed.substr(0, comma), '.');
  return (whole.empty() ? "0" : whole) + "." + std::string(typed.substr(comma + 1));
}

/// A comma between digits, with the whole number it stands in; `first` is the token that starts it.
std::optional<Problem> commaInNumber(Cursor cursor, const Token& first) {
  const std::size_t start = first.offset;
  const Token* last = nullptr;
  while (cursor.next(Kind::comma) && cursor.peek(1).is(Kind::number) &&
         touch(cursor.peek(), cursor.peek(1))) {
    last = &cursor.peek(1);
    cursor.take();
    cursor.take();
  }
  if (!last)
    return std::nullopt;
  const std::string_view typed(first.text.data(), last->offset + last->text.size() - start);
  const Piece piece{typed, first.column};
  return partsThousands(typed) ? thousandsComma(piece, without(typed, ','))
                               : decimalComma(piece, withPoint(typed));
}

/// The unit that ends just before the cursor: back to its last name.
std::string_view unitBefore(const Cursor& cursor) {
  std::size_t back = 1;
  while (!cursor.taken(back).is(Kind::name))
    ++back;
  return cursor.since(cursor.at() - back).text;
}

Problem strayName(const Cursor& cursor, const Token& before) {
  const Token& name = cursor.peek();
  const bool known = findUnit(name.text) != nullptr;
  if (isNotANumber(name.text))
    return notANumber(cursor.here());
  if (known && cursor.peek(1).is(Kind::open))
    return operatorMissing(cursor.here(), pieceOf(cursor.peek(1)));
  if (known)
    return unitAfterUnit(cursor.here(), unitBefore(cursor));
  if (name.text == "pi" || cursor.peek(1).is(Kind::open))
    return operatorMissing(pieceOf(before), cursor.here());
  return unknownUnit(cursor.here());
}

Problem strayNumber(const Cursor& cursor, const Token& before) {
  const Token& number = cursor.peek();
  if (isUnitName(before) && touch(before, number))
    return unitThenNumber(cursor.upTo(cursor.at() - 1, cursor.at() + 1), before.text, number.text);
  if (before.is(Kind::number) && touch(before, number))
    return brokenNumber(cursor.upTo(cursor.at() - 1, cursor.at() + 1));
  return operatorMissing(pieceOf(before), cursor.here());
}

/// Whether a unit and then * or / stand before the cursor.
bool goesOnWithUnit(const Cursor& cursor) {
  if (cursor.at() < 3 || !(cursor.taken().is(Kind::times) || cursor.taken().is(Kind::divide)))
    return false;
  const Token& last = cursor.taken(2);
  if (last.is(Kind::number) && cursor.at() >= 4 && cursor.taken(3).is(Kind::power))
    return isUnitName(cursor.taken(4));
  return isUnitName(last.is(Kind::superscript) ? cursor.taken(3) : last);
}

} // namespace

Problem strayForValue(const Cursor& cursor) {
  const Token& token = cursor.peek();
  if (token.is(Kind::name)) {
    if (isNotANumber(token.text))
      return notANumber(cursor.here());
    if (unitFollows(cursor))
      return unitWithoutNumber(cursor.here());
    return goesOnWithUnit(cursor) ? unknownUnit(cursor.here()) : unknownWord(cursor.here());
  }
  if (token.is(Kind::comma))
    if (const auto comma = commaInNumber(cursor, token))
      return *comma;
  if (token.text == "=")
    return leadingEquals(cursor.here());
  if (token.is(Kind::other))
    return strangeCharacter(cursor.here());
  return valueMissing(cursor.here());
}

Problem strayCall(const Cursor& cursor) {
  if (isUnitName(cursor.peek()))
    return operatorMissing(cursor.here(), pieceOf(cursor.peek(1)));
  return unknownFunction(cursor.here());
}

Problem strayAfterValue(const Cursor& cursor, Slopes slopes) {
  const Token& token = cursor.peek();
  const Token& before = cursor.taken();
  if (token.is(Kind::name))
    return strayName(cursor, before);
  if (token.is(Kind::number))
    return strayNumber(cursor, before);
  if (token.is(Kind::close))
    return closedTwice(cursor.here());
  if (token.is(Kind::open) || token.text == "[")
    if (const auto bracketed = bracketedUnit(cursor))
      return *bracketed;
  if (token.is(Kind::open))
    return operatorMissing(pieceOf(before), cursor.here());
  if (token.is(Kind::comma)) {
    if (const auto comma =
            before.is(Kind::number) && touch(before, token) ? commaInNumber(cursor, before) : std::nullopt)
      return *comma;
    return strayComma(cursor.here());
  }
  if (token.is(Kind::colon) && slopes != Slopes::none)
    return slopeStandsAlone(cursor.here());
  if (token.text == "." && touch(before, token))
    return brokenNumber(cursor.upTo(cursor.at() - 1, cursor.at() + 1));
  if (token.text == "=")
    return leadingEquals(cursor.here());
  return strangeCharacter(cursor.here());
}

} // namespace planewright

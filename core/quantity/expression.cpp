// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/expression.h"

#include "core/quantity/parser.h"
#include "core/quantity/slopes.h"
#include "core/quantity/writing_problems.h"

#include <cmath>

namespace planewright {

namespace {

/// An expression stands for its value within this part of it.
constexpr double expressionWidth = 1e-12;

double halfWidthOf(const Value& value) {
  return value.form == Form::plainNumber ? value.half : expressionWidth * std::abs(value.number);
}

Result<Entry> entryOf(const Value& value, std::string_view text, const EntryKind& kind) {
  if (value.dimension != kind.dimension)
    return tl::unexpected(otherQuantity(value, kind));
  if (kind.slopes == Slopes::tolerance && value.number < 0)
    return tl::unexpected(negativeTolerance(value.piece));
  return Entry{value.number, std::string(trimmed(text)), halfWidthOf(value)};
}

/// A text without any unit, completed with the field's: read again as it will be printed, so that value and
/// text agree for good. A Problem points at the typed text, not at the completed one.
Result<Entry> completed(const Value& value, std::string_view text, const EntryKind& kind) {
  // Told by what was typed, since the Problem quotes it.
  if (kind.slopes == Slopes::tolerance && value.number < 0)
    return tl::unexpected(negativeTolerance(value.piece));
  const std::string typed(trimmed(text));
  const std::string group = value.form == Form::compound ? "(" + typed + ")" : typed;
  const std::string whole = group + " " + kind.unit.name;
  const auto wrong = unreadableText(whole);
  const auto again = wrong ? tl::unexpected(*wrong) : readExpression(whole, tokensOf(whole), kind.slopes);
  auto entry = again ? entryOf(*again, whole, kind) : tl::unexpected(again.error());
  if (!entry) {
    entry.error().quoted = value.piece.text;
    entry.error().column = value.piece.column;
  }
  return entry;
}

} // namespace

Result<Entry> readEntry(std::string_view text, const EntryKind& kind) {
  if (const auto wrong = unreadableText(text))
    return tl::unexpected(*wrong);
  if (trimmed(text).empty())
    return tl::unexpected(emptyEntry(kind));
  const Tokens tokens = tokensOf(text);
  if (kind.dimension == dimension::angle)
    if (const auto slope = readSlope(text, tokens, kind.slopes)) {
      if (!*slope)
        return tl::unexpected(slope->error());
      Value value;
      value.number = **slope;
      value.dimension = dimension::angle;
      value.hasUnit = true;
      value.piece = {trimmed(text), tokens.front().column};
      return entryOf(value, text, kind);
    }
  const auto value = readExpression(text, tokens, kind.slopes);
  if (!value)
    return tl::unexpected(value.error());
  if (value->hasUnit || kind.unit.name.empty())
    return entryOf(*value, text, kind);
  return completed(*value, text, kind);
}

} // namespace planewright

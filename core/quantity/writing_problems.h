// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"
#include "core/quantity/value_problems.h"

#include <optional>

namespace planewright {

/// Too long a text (more than 4096 code points) or one that is not UTF-8; none when it can be read.
std::optional<Problem> unreadableText(std::string_view text);

// What can be wrong with the way an expression or a unit is written.
Problem emptyEntry(const EntryKind& kind);
Problem tooDeep(const Piece& piece);
Problem notClosed(const Piece& open);
Problem closedTwice(const Piece& close);
Problem valueMissing(const Piece& piece);
Problem operatorMissing(const Piece& first, const Piece& second);
Problem brokenNumber(const Piece& piece);
Problem decimalComma(const Piece& piece, std::string_view mended);
Problem thousandsComma(const Piece& piece, std::string_view mended);
Problem strayComma(const Piece& comma);
Problem leadingEquals(const Piece& piece);
Problem bracketsRoundUnit(const Piece& piece, std::string_view unit);
Problem notANumber(const Piece& piece);
Problem strangeCharacter(const Piece& piece);
Problem unknownFunction(const Piece& name);
Problem unknownWord(const Piece& name);

Problem emptyUnit();
Problem unknownUnit(const Piece& name);
Problem unitGoesOn(const Piece& piece);
Problem unitExponent(const Piece& piece);
Problem unitWithoutNumber(const Piece& unit);
Problem unitAfterUnit(const Piece& second, std::string_view first);
Problem unitAfterQuantity(const Piece& unit, const Value& quantity);
Problem unitThenNumber(const Piece& piece, std::string_view unit, std::string_view number);
Problem unitOnExponent(const Piece& power, const Piece& plainPower, const Piece& unit);
Problem superscriptRow(const Piece& piece);

Problem slopeStandsAlone(const Piece& piece);
Problem slopeForNormal(const Piece& slope);
Problem slopeOverNothing(const Piece& run);
Problem signBehindSlope(const Piece& run, std::string_view mended);
Problem negativeTolerance(const Piece& piece);

/// A unit of another dimension than the one wanted.
Problem otherDimension(const Piece& piece, Dimension is, Dimension wanted);
/// A value of another dimension than the field's: "this is a force (12 kN); a stress is needed: ...".
Problem otherQuantity(const Value& value, const EntryKind& kind);

} // namespace planewright

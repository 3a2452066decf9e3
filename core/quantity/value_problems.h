// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/value.h"

namespace planewright {

/// A Problem that quotes `piece` and points at its column.
Problem problemAt(const Piece& piece, Text what, Text mend);
/// The piece for a sentence: cut at 40 code points, with an ellipsis.
Text shortened(std::string_view text);

// What can be wrong with the values in an expression.
Problem notFinite(const Piece& piece);
Problem outOfRange(const Piece& number);
Problem dimensionTooGreat(const Piece& piece);
Problem divisionByZero(const Piece& divisor);
Problem rootOfNegative(const Piece& piece);
Problem oddRoot(const Value& value);
Problem brokenDimension(const Value& base, const Piece& exponent);
Problem exponentWithDimension(const Value& exponent);
Problem unlikeTerms(const Value& a, const Value& b);
Problem angleWanted(std::string_view function, const Value& value);
Problem countOfArguments(std::string_view function, bool several, const Piece& call);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/cursor.h"

namespace planewright {

/// How a value is written, its signs aside.
enum class Form {
  plainNumber, ///< a number, perhaps with a unit
  primary,     ///< a constant, call or group, perhaps with a unit: a unit may follow it
  compound     ///< anything else: a unit would bind to its last part only
};

/// A part of an expression and its value in the base (N, mm, deg).
struct Value {
  double number = 0;
  Dimension dimension;
  bool hasUnit = false; ///< a unit stands anywhere in it
  Form form = Form::compound;
  double half = 0;        ///< of a plain number: half its last digit, in the base
  std::size_t unitAt = 0; ///< token at which the unit that ends it starts; 0: it does not end with a unit
  Piece piece;            ///< as typed
};

/// Arithmetic with dimensions. `piece` of the result is `whole`; a Problem quotes the part that is wrong.
Result<Value> sumOf(const Value& a, const Value& b, const Piece& whole);
Result<Value> differenceOf(const Value& a, const Value& b, const Piece& whole);
Result<Value> productOf(const Value& a, const Value& b, const Piece& whole);
Result<Value> quotientOf(const Value& a, const Value& b, const Piece& whole);
Result<Value> powerOf(const Value& base, const Value& exponent, const Piece& whole);
Value negated(Value value, const Piece& whole);
Result<Value> withUnit(Value value, const Unit& unit, const Piece& whole);

/// The value of a number's text, and half its last digit.
Result<Value> numberOf(const Piece& piece);

/// Names of the functions: sqrt abs min max sin cos tan.
const std::vector<std::string_view>& functionNames();
/// The value of a call of one of them; a Problem for a wrong count, dimension or range of arguments.
Result<Value> callOf(std::string_view function, const std::vector<Value>& arguments, const Piece& whole);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"
#include "core/quantity/value.h"

namespace planewright {

/// Reads and evaluates a whole expression:
///   sum = product {("+" | "-") product}; product = signed {("*" | "/") signed}; signed = {"-"} power;
///   power = primary [superscript | "^" signed]; primary = (number | constant | call | "(" sum ")") [unit].
Result<Value> readExpression(std::string_view text, const Tokens& tokens, Slopes slopes);

} // namespace planewright

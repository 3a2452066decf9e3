// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/angle.h"
#include "core/quantity/value_problems.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

Value primary(double number, Dimension dimension, const Value& like, const Piece& whole) {
  Value result;
  result.number = number + 0.0;
  result.dimension = dimension;
  result.hasUnit = like.hasUnit;
  result.form = Form::primary;
  result.piece = whole;
  return result;
}

Result<Value> rootOf(const Value& value, const Piece& whole) {
  const Dimension d = value.dimension;
  if (value.number < 0)
    return tl::unexpected(rootOfNegative(value.piece));
  if (d.force % 2 != 0 || d.length % 2 != 0 || d.angle % 2 != 0)
    return tl::unexpected(oddRoot(value));
  return primary(std::sqrt(value.number), {d.force / 2, d.length / 2, d.angle / 2}, value, whole);
}

Result<Value> ratioOf(std::string_view function, const Value& value, const Piece& whole) {
  if (value.dimension != dimension::angle)
    return tl::unexpected(angleWanted(function, value));
  const CosSin both = cosSin(Angle::fromDegrees(value.number));
  if (function == "tan" && both.cos == 0)
    return tl::unexpected(notFinite(whole));
  const double ratio = function == "sin" ? both.sin : function == "cos" ? both.cos : both.sin / both.cos;
  return primary(ratio, dimension::none, value, whole);
}

Result<Value> extremeOf(bool greatest, const std::vector<Value>& values, const Piece& whole) {
  Value result = primary(values[0].number, values[0].dimension, values[0], whole);
  for (const Value& value : values) {
    if (value.dimension != result.dimension)
      return tl::unexpected(unlikeTerms(values[0], value));
    result.number = greatest ? std::max(result.number, value.number) : std::min(result.number, value.number);
    result.hasUnit = result.hasUnit || value.hasUnit;
  }
  return result;
}

} // namespace

const std::vector<std::string_view>& functionNames() {
  static const std::vector<std::string_view> names = {"sqrt", "abs", "min", "max", "sin", "cos", "tan"};
  return names;
}

Result<Value> callOf(std::string_view function, const std::vector<Value>& arguments, const Piece& whole) {
  const bool extreme = function == "min" || function == "max";
  if (extreme ? arguments.size() < 2 : arguments.size() != 1)
    return tl::unexpected(countOfArguments(function, extreme, whole));
  if (extreme)
    return extremeOf(function == "max", arguments, whole);
  const Value& value = arguments[0];
  if (function == "sqrt")
    return rootOf(value, whole);
  if (function == "abs")
    return primary(std::abs(value.number), value.dimension, value, whole);
  return ratioOf(function, value, whole);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/written_units.h"

#include "core/quantity/format.h"

#include <array>
#include <cassert>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

struct WrittenUnit {
  std::string name;
  double scale = 1; ///< of one of it in N, mm, MPa
};

/// Products as people write them: "kN·m", "N/mm²".
std::string nameForPeople(const std::string& name) {
  std::string result;
  for (std::size_t i = 0; i < name.size(); ++i) {
    if (name[i] == '*')
      result += "·";
    else if (name.compare(i, 2, "^2") == 0 || name.compare(i, 2, "^3") == 0)
      result += name[++i] == '2' ? "²" : "³";
    else
      result += name[i];
  }
  return result;
}

WrittenUnit ofUnit(const Unit& unit) {
  return {nameForPeople(unit.name), unit.toBase(1)};
}

/// "mm⁴", or "10⁶ mm⁴" where the number is large.
WrittenUnit powerOf(const Unit& length, int power, double value) {
  constexpr std::array<const char*, 7> powers = {"", "", "²", "³", "⁴", "⁵", "⁶"};
  assert(power >= 1 && power < static_cast<int>(powers.size()));
  WrittenUnit unit{length.name + powers[static_cast<std::size_t>(power)], std::pow(length.toBase(1), power)};
  const double size = std::abs(value) / unit.scale;
  if (power < 2 || size < 1e4)
    return unit;
  const bool millions = size >= 1e6;
  return {(millions ? "10⁶ " : "10³ ") + unit.name, unit.scale * (millions ? 1e6 : 1e3)};
}

/// "MPa⁻²", "(N/mm²)⁻²".
WrittenUnit inverseSquareOf(const Unit& unit) {
  const WrittenUnit one = ofUnit(unit);
  const bool isQuotient = one.name.find('/') != std::string::npos;
  return {(isQuotient ? "(" + one.name + ")" : one.name) + "⁻²", 1 / (one.scale * one.scale)};
}

WrittenUnit unitFor(const WrittenUnits& units, double value, Dimension dimension) {
  if (dimension == dimension::none)
    return {};
  if (dimension == dimension::angle)
    return {"°"};
  if (dimension == dimension::stress)
    return ofUnit(units.stress);
  if (dimension == dimension::inverseSquareStress)
    return inverseSquareOf(units.stress);
  if (dimension == dimension::force)
    return ofUnit(units.force);
  if (dimension == dimension::moment)
    return ofUnit(units.moment);
  assert(dimension.force == 0 && dimension.angle == 0 && dimension.length > 0);
  return powerOf(units.length, dimension.length, value);
}

/// Five significant digits, without zeros that say nothing.
int decimalsPutIn(double value) {
  int decimals = decimalsFor(std::abs(value), 5);
  const auto isWhole = [&](int count) {
    const double scaled = value * std::pow(10, count);
    return std::abs(scaled - std::round(scaled)) <= 1e-9 * std::abs(scaled);
  };
  while (decimals > 0 && isWhole(decimals - 1))
    --decimals;
  return decimals;
}

} // namespace

NumberPutIn WrittenUnits::put(std::string_view symbol, double value, Dimension dimension) const {
  if (dimension == dimension::angle)
    return angle(symbol, value);
  const WrittenUnit unit = unitFor(*this, value, dimension);
  return {std::string(symbol), value, decimalsPutIn(value / unit.scale), false, unit.name, unit.scale};
}

NumberPutIn WrittenUnits::plainNumber(std::string_view symbol, double value) {
  return {std::string(symbol), value, decimalsPutIn(value)};
}

NumberPutIn WrittenUnits::angle(std::string_view symbol, double degrees) {
  return {std::string(symbol), degrees, 2, true};
}

NumberPutIn WrittenUnits::pi() {
  return {"π", std::numbers::pi, 4};
}

Step WrittenUnits::step(Text name, std::string_view symbolOf, Formula formula, NumbersPutIn numbers,
                        double result, Dimension dimension, Text source) const {
  const WrittenUnit unit = unitFor(*this, result, dimension);
  numbers = namedBy(formula, std::move(numbers));
  return {std::move(name),
          symbol(symbolOf),
          std::move(formula),
          std::move(numbers),
          result,
          decimalsFor(std::abs(result) / unit.scale),
          unit.name,
          std::move(source),
          unit.scale};
}

std::string WrittenUnits::shown(double value, Dimension dimension) const {
  const WrittenUnit unit = unitFor(*this, value, dimension);
  return shownNumber(value / unit.scale, decimalsFor(std::abs(value) / unit.scale)) + " " + unit.name;
}

} // namespace planewright

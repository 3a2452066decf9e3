// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// Exponents of the three kinds of thing that a point calculation is made of. Stress is force 1, length -2.
struct Dimension {
  int force = 0;
  int length = 0;
  int angle = 0;
  constexpr bool operator==(const Dimension&) const = default;
};
constexpr Dimension operator+(Dimension a, Dimension b) {
  return {a.force + b.force, a.length + b.length, a.angle + b.angle};
}
/// Exponents times `times`: the dimension of a power.
constexpr Dimension operator*(int times, Dimension a) {
  return {times * a.force, times * a.length, times * a.angle};
}

/// Exponents beyond this are refused: nothing of the trade needs them, and sums stay far from overflow.
inline constexpr int greatestExponent = 100;

namespace dimension {
inline constexpr Dimension none{};
inline constexpr Dimension force{1, 0, 0};
inline constexpr Dimension length{0, 1, 0};
inline constexpr Dimension angle{0, 0, 1};
inline constexpr Dimension stress{1, -2, 0};
inline constexpr Dimension moment{1, 1, 0};
} // namespace dimension

/// What a dimension is called: "a force", "a stress", "a plain number", "force^2 * length".
Text nameOf(Dimension dimension);

/// A unit: value in the base (N, mm, deg; so a stress in MPa) = value * numerator / denominator, each exactly
/// the nearest double of the exact factor.
struct Unit {
  std::string name;
  Dimension dimension;
  double numerator = 1;
  double denominator = 1;

  /// Relative error at most two roundings; finite wherever the result is.
  double toBase(double value) const { return isBase() ? value : scaledToBase(value); }
  double fromBase(double value) const;
  bool operator==(const Unit&) const = default;

private:
  bool isBase() const { return numerator == 1 && denominator == 1; }
  double scaledToBase(double value) const;
};

/// One row of the table of units, with the source of its factor.
struct UnitRow {
  Unit unit;
  const char* source;
};
/// Every unit that an expression can name (contract of the expressions: Pa ... %, see README).
const std::vector<UnitRow>& unitTable();
/// The degree: the base of angles, and the unit of a bare number in every field of an angle.
const Unit& degreeUnit();
/// The unit of this name, also "°" for deg; null for any other word.
const Unit* findUnit(std::string_view name);
/// The name in the table that a mistyped one most likely means: differing case counts least, then a missing
/// or surplus letter, then a wrong one. Empty when it is like none.
std::string_view nearestUnitName(std::string_view name);

/// The way in which expressions write a unit that tables head as "kNm" or "N/mm2": "kN*m", "N/mm^2". Empty
/// where nothing is to be changed, or it is none.
std::string spelledUnit(std::string_view written);

/// Reads a unit as a study names it ("MPa", "kN*m", "N/mm^2"); a Problem when it is unknown or its dimension
/// differs from `wanted`.
Result<Unit> readUnit(std::string_view text, Dimension wanted);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/unit.h"

#include "core/quantity/lexer.h"
#include "core/quantity/nearest.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

// 1 lbf = 0.45359237 kg * 9.80665 m/s2 = 4.4482216152605 N exactly; as quotients of whole numbers that
// doubles hold exactly. 1 in2 = 645.16 mm2, 1 ft2 = 92903.04 mm2.
constexpr double poundForce = 44482216152605;
constexpr double inTrillions = 1e13;

constexpr auto si = "decimal multiple of the unit of the SI";
constexpr auto pascal = "1 Pa = 1 N/m2, SI";
constexpr auto inch = "1 in = 0.0254 m, international yard and pound agreement 1959";
constexpr auto foot = "1 ft = 12 in, international yard and pound agreement 1959";
constexpr auto lbf = "1 lb = 0.45359237 kg, international yard and pound agreement 1959; "
                     "g_n = 9.80665 m/s2, 3rd CGPM 1901";
constexpr auto lbfPerArea = "pound-force and inch as above; the name is common practice, no source";
constexpr auto kgf = "g_n = 9.80665 m/s2, 3rd CGPM 1901";
constexpr auto barOfPascals = "1 bar = 100 kPa, common practice, no source";
constexpr auto base = "the base";
constexpr auto radian = "180 deg = pi rad";
constexpr auto part = "a plain number, common practice, no source";

double scaled(double value, double numerator, double denominator) {
  const double product = value * numerator;
  return std::isfinite(product) ? product / denominator : value / denominator * numerator;
}

} // namespace

double Unit::scaledToBase(double value) const {
  return scaled(value, numerator, denominator);
}
double Unit::fromBase(double value) const {
  return scaled(value, denominator, numerator);
}

const std::vector<UnitRow>& unitTable() {
  using namespace dimension;
  static const std::vector<UnitRow> rows = {
      {{"Pa", stress, 1, 1e6}, pascal},
      {{"kPa", stress, 1, 1e3}, pascal},
      {{"MPa", stress, 1, 1}, pascal},
      {{"GPa", stress, 1e3, 1}, pascal},
      {{"psi", stress, poundForce, 645.16e13}, lbfPerArea},
      {{"ksi", stress, poundForce, 645.16e10}, lbfPerArea},
      {{"psf", stress, poundForce, 92903.04e13}, lbfPerArea},
      {{"bar", stress, 1, 10}, barOfPascals},
      {{"N", force, 1, 1}, base},
      {{"kN", force, 1e3, 1}, si},
      {{"MN", force, 1e6, 1}, si},
      {{"lbf", force, poundForce, inTrillions}, lbf},
      {{"kip", force, poundForce, 1e10}, lbf},
      {{"kgf", force, 980665, 1e5}, kgf},
      {{"tf", force, 980665, 1e2}, kgf},
      {{"um", length, 1, 1e3}, si},
      {{"mm", length, 1, 1}, base},
      {{"cm", length, 10, 1}, si},
      {{"m", length, 1e3, 1}, si},
      {{"in", length, 254, 10}, inch},
      {{"ft", length, 3048, 10}, foot},
      {{"deg", angle, 1, 1}, base},
      {{"rad", angle, 180, std::numbers::pi}, radian},
      {{"ustrain", none, 1, 1e6}, part},
      {{"%", none, 1, 100}, part},
  };
  return rows;
}

const Unit& degreeUnit() {
  static const Unit degree = *findUnit("deg");
  return degree;
}

const Unit* findUnit(std::string_view name) {
  if (name == "°")
    name = "deg";
  const auto& rows = unitTable();
  const auto row =
      std::find_if(rows.begin(), rows.end(), [&](const UnitRow& r) { return r.unit.name == name; });
  return row == rows.end() ? nullptr : &row->unit;
}

std::string_view nearestUnitName(std::string_view name) {
  std::vector<std::string_view> names;
  for (const UnitRow& row : unitTable())
    names.push_back(row.unit.name);
  std::string typed(name);
  for (const std::string_view micro : {"\u00B5", "\u03BC"})
    if (const std::size_t at = typed.find(micro); at != std::string::npos)
      typed.replace(at, micro.size(), 1, 'u');
  return nearestOf(names, typed);
}

namespace {

/// "mm2" is "mm^2", "kNm" is "kN*m"; a name of the table stays. Empty for anything else.
std::string spelledAtom(std::string_view atom) {
  if (findUnit(atom))
    return std::string(atom);
  if (atom.find('^') != std::string_view::npos) {
    const std::string_view name = atom.substr(0, atom.find('^'));
    return findUnit(name) ? std::string(atom) : std::string();
  }
  if (atom.size() > 1 && atom.back() >= '2' && atom.back() <= '4') {
    const std::string_view name = atom.substr(0, atom.size() - 1);
    return findUnit(name) ? std::string(name) + "^" + atom.back() : std::string();
  }
  for (std::size_t i = 1; i < atom.size(); ++i) {
    const Unit* force = findUnit(atom.substr(0, i));
    const Unit* length = findUnit(atom.substr(i));
    if (force && length && force->dimension == dimension::force && length->dimension == dimension::length)
      return force->name + "*" + length->name;
  }
  return {};
}

} // namespace

std::string spelledUnit(std::string_view written) {
  std::string spelled;
  std::size_t start = 0;
  for (std::size_t i = 0; i <= written.size(); ++i) {
    const bool isEnd = i == written.size();
    if (!isEnd && written[i] != '*' && written[i] != '/')
      continue;
    const std::string atom = spelledAtom(trimmed(written.substr(start, i - start)));
    // Behind a stroke a product would need parentheses.
    if (atom.empty() || (start > 0 && written[start - 1] == '/' && atom.find('*') != std::string::npos))
      return {};
    spelled += atom;
    if (!isEnd)
      spelled += written[i];
    start = i + 1;
  }
  return spelled == written ? std::string() : spelled;
}

} // namespace planewright

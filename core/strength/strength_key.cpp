// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/strength_key.h"

#include <algorithm>
#include <cassert>

namespace planewright {

template <>
const std::vector<Named<MaterialKind>>& namesOf() {
  static const std::vector<Named<MaterialKind>> names = {
      {MaterialKind::timber, "timber", PW_TEXT("Strength", "timber")},
      {MaterialKind::lamina, "lamina", PW_TEXT("Strength", "fibre-reinforced lamina")},
      {MaterialKind::generic, "generic", PW_TEXT("Strength", "other material with a line")},
      {MaterialKind::isotropic, "isotropic", PW_TEXT("Strength", "the same in all directions")},
      {MaterialKind::coulomb, "coulomb", PW_TEXT("Strength", "plane with friction and cohesion")},
      {MaterialKind::throat, "throat", PW_TEXT("Strength", "throat of a weld")},
      {MaterialKind::bond, "bond", PW_TEXT("Strength", "bonded plane")}};
  return names;
}

template <>
const std::vector<Named<StrengthBasis>>& namesOf() {
  static const std::vector<Named<StrengthBasis>> names = {
      {StrengthBasis::characteristic, "characteristic", PW_TEXT("Strength", "characteristic")},
      {StrengthBasis::design, "design", PW_TEXT("Strength", "design")},
      {StrengthBasis::allowable, "allowable", PW_TEXT("Strength", "allowable")},
      {StrengthBasis::testMean, "test-mean", PW_TEXT("Strength", "mean of tests")}};
  return names;
}

template <>
const std::vector<Named<Seam>>& namesOf() {
  static const std::vector<Named<Seam>> names = {{Seam::fillet, "fillet", PW_TEXT("Strength", "fillet weld")},
                                                 {Seam::butt, "butt", PW_TEXT("Strength", "butt weld")}};
  return names;
}

const StrengthRow& rowOf(StrengthKey key) {
  using enum StrengthKey;
  const auto& stress = dimension::stress;
  static const std::vector<StrengthRow> table = {{alongTension, "along_tension", stress},
                                                 {alongCompression, "along_compression", stress},
                                                 {alongBending, "along_bending", stress},
                                                 {acrossTension, "across_tension", stress},
                                                 {acrossCompression, "across_compression", stress},
                                                 {shear, "shear", stress},
                                                 {tension, "tension", stress},
                                                 {compression, "compression", stress},
                                                 {cohesion, "cohesion", stress, true},
                                                 {friction, "friction", dimension::angle, true, false},
                                                 {cutoff, "cutoff", stress, true},
                                                 {fu, "fu", stress, false, false},
                                                 {betaW, "beta_w", dimension::none, false, false},
                                                 {gammaM2, "gamma_M2", dimension::none, false, false}};
  const StrengthRow& row = table[static_cast<std::size_t>(key)];
  assert(row.key == key);
  return row;
}

const std::vector<StrengthKey>& keysOf(MaterialKind kind) {
  using enum StrengthKey;
  using Keys = std::vector<StrengthKey>;
  static const Keys timber = {alongTension,  alongCompression,  alongBending,
                              acrossTension, acrossCompression, shear};
  static const Keys line = {alongTension, alongCompression, acrossTension, acrossCompression, shear};
  static const Keys isotropic = {tension, compression, cohesion, friction};
  static const Keys coulomb = {cohesion, friction, cutoff};
  static const Keys throat = {fu, betaW, gammaM2};
  static const Keys bond = {tension, shear};
  switch (kind) {
  case MaterialKind::timber:
    return timber;
  case MaterialKind::lamina:
  case MaterialKind::generic:
    return line;
  case MaterialKind::isotropic:
    return isotropic;
  case MaterialKind::coulomb:
    return coulomb;
  case MaterialKind::throat:
    return throat;
  case MaterialKind::bond:
    break;
  }
  return bond;
}

bool has(MaterialKind kind, StrengthKey key) {
  return std::ranges::find(keysOf(kind), key) != keysOf(kind).end();
}

namespace {

using Symbols = std::vector<Text>; ///< in the order of StrengthKey

const Symbols& timberSymbols() {
  static const Symbols symbols = {symbol("f_{t,0}"),  symbol("f_{c,0}"),  symbol("f_{m}"),
                                  symbol("f_{t,90}"), symbol("f_{c,90}"), symbol("f_{v}")};
  return symbols;
}

const Symbols& otherSymbols() {
  static const Symbols symbols = {symbol("X_{t}"), symbol("X_{c}"), symbol("X_{m}"), symbol("Y_{t}"),
                                  symbol("Y_{c}"), symbol("S"),     symbol("f_{t}"), symbol("f_{c}"),
                                  symbol("c"),     symbol("φ"),     symbol("σ_{t}"), symbol("f_{u}"),
                                  symbol("β_{w}"), symbol("γ_{M2}")};
  return symbols;
}

} // namespace

const Text& labelOf(MaterialKind kind, StrengthKey key) {
  static const Text bondTension = symbol("f_{n}");
  static const Text bondShear = symbol("f_{s}");
  if (kind == MaterialKind::bond)
    return key == StrengthKey::shear ? bondShear : bondTension;
  const auto at = static_cast<std::size_t>(key);
  return kind == MaterialKind::timber ? timberSymbols()[at] : otherSymbols()[at];
}

bool isPlaneKind(MaterialKind kind) {
  return kind == MaterialKind::coulomb || kind == MaterialKind::throat || kind == MaterialKind::bond;
}

bool isLineKind(MaterialKind kind) {
  return kind == MaterialKind::timber || kind == MaterialKind::lamina || kind == MaterialKind::generic;
}

} // namespace planewright

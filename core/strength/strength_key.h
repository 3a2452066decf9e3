// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/unit.h"
#include "core/words/names.h"

namespace planewright {

/// What a set of strengths describes: a body with a line (timber, lamina, generic), a body without one
/// (isotropic), or a plane (a Coulomb plane, the throat of a weld, a bond).
enum class MaterialKind { timber, lamina, generic, isotropic, coulomb, throat, bond };
template <>
const std::vector<Named<MaterialKind>>& namesOf<MaterialKind>();

/// What a strength was made for, which decides what it may be compared with.
enum class StrengthBasis { characteristic, design, allowable, testMean };
template <>
const std::vector<Named<StrengthBasis>>& namesOf<StrengthBasis>();

/// The seam whose throat is judged.
enum class Seam { fillet, butt };
template <>
const std::vector<Named<Seam>>& namesOf<Seam>();

/// One number of a set of strengths.
enum class StrengthKey {
  alongTension,
  alongCompression,
  alongBending,
  acrossTension,
  acrossCompression,
  shear,
  tension,
  compression,
  cohesion,
  friction, ///< an angle
  cutoff,   ///< greatest tension across a Coulomb plane
  fu,
  betaW,
  gammaM2
};
inline constexpr std::size_t strengthKeys = 14;

struct StrengthRow {
  StrengthKey key;
  const char* word; ///< in files: "along_tension"
  Dimension dimension;
  bool mayBeZero = false;
  bool isScaled = true; ///< multiplied by the factor of a combination
};
const StrengthRow& rowOf(StrengthKey key);

/// The keys that a kind has, in the order in which they are asked for.
const std::vector<StrengthKey>& keysOf(MaterialKind kind);
bool has(MaterialKind kind, StrengthKey key);

/// "f_{t,0}" for timber, "X_{t}" for a lamina.
const Text& labelOf(MaterialKind kind, StrengthKey key);

/// Kinds whose strengths are those of planes; kinds that have a line.
bool isPlaneKind(MaterialKind kind);
bool isLineKind(MaterialKind kind);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/judge.h"
#include "core/strength/written_strengths.h"

namespace planewright {

/// The symbols of the stresses that a criterion is a function of; their numbers, tension positive, are put
/// into the steps before it is written.
namespace stress_symbol {
inline constexpr const char* along = "σ_{φ}";
inline constexpr const char* across = "σ_{φ+90°}";
inline constexpr const char* shear = "τ_{φ}";
inline constexpr const char* normal = "σ_{n}"; ///< on a plane
inline constexpr const char* planeShear = "τ_{nt}";
inline constexpr const char* uniaxial = "σ_{α}"; ///< the one principal stress
inline constexpr const char* toLine = "α";       ///< angle of its axis to the line, 0 to 90 deg
inline constexpr const char* greatest = "σ_{I}"; ///< of the three principal stresses
inline constexpr const char* middle = "σ_{II}";
inline constexpr const char* least = "σ_{III}";
} // namespace stress_symbol

/// Whether a criterion is written with the one principal stress and its angle to the line.
bool isOfUniaxialStress(Criterion criterion);

/// Whether it needs nothing but that, and not the stresses along and across the line.
bool hasAngleForm(Criterion criterion);
/// Whether its strength along the line is that of the mix of axial and bending parts.
bool hasMixedStrength(Criterion criterion);

/// A criterion at one direction of a judged state.
struct WrittenCriterion {
  Criterion criterion;
  const Parameters& parameters;
  const Judge& judge;
  Angle direction;
  Judgement judgement; ///< there

  /// The published form with the strengths of the signs that act, down to the utilisation "u". Where that is
  /// no finite number, only what shows why.
  void addUtilisation(CheckSteps& steps, WrittenStrengths& strengths) const;
  /// The multiplier on all loads "R", where there is one, after addUtilisation.
  void addMultiplier(CheckSteps& steps, WrittenStrengths& strengths) const;
};

} // namespace planewright

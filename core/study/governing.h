// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// A state that is worse than all others by one measure, and its value there, N/mm2.
struct Governing {
  std::string point;
  std::size_t state = 0; ///< in the Readout of the point
  std::string combination;
  double stress = 0;
  bool operator==(const Governing&) const = default;
};

/// What governs where no strength is given: the greatest s1 in the study's sign, and the greatest shear in
/// the plane (the radius of the circle). Only states that are judged; of equals the first.
struct GoverningStates {
  Governing principal;
  Governing shear;
  bool operator==(const GoverningStates&) const = default;
};

/// Of one point, and of several. None where nothing is judged.
std::optional<GoverningStates> governingOf(const Readout& readout);
std::optional<GoverningStates> governingOf(const std::vector<Readout>& points);

/// Whether a judged state governs its point by either measure; one that only equals the state named does too.
/// Never where fewer than two states are judged.
struct Governs {
  bool principal = false;
  bool shear = false;
  explicit operator bool() const { return principal || shear; }
  bool operator==(const Governs&) const = default;
};
Governs governs(const Readout& readout, const StateReading& state);

} // namespace planewright

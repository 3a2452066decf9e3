// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// A direction that a handle snaps to, PageUp and PageDown step through and "Go to" lists.
struct NamedDirection {
  Angle angle; ///< folded
  Text name;   ///< "σ_{1}", "greatest shear", "crossing the grain", "15°"
  bool byName; ///< false for the plain multiples of 15 deg
};

/// Directions for the reading plane's normal, ascending; coinciding ones both stand.
std::vector<NamedDirection> directionsForNormal(const Readout& readout);
/// Directions for the line: principal axes, x, y, every 15 deg.
std::vector<NamedDirection> directionsForLine(const Readout& readout);

} // namespace planewright

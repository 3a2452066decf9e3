// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>

namespace planewright {

/// A utilisation for people, rounded so that it never reassures: two decimals, upwards (1.0004 shows 1.01); a
/// value below 1 that would show 1.00 gains decimals until it does not. What exceeds 1 by no more than the
/// rounding of its inputs (exceedingFrom) shows 1.00, an infinite one "∞".
std::string shownUtilisation(double utilisation);

/// A load multiplier for people, two decimals downwards; below 0.1 two significant digits.
std::string shownMultiplier(double multiplier);

} // namespace planewright

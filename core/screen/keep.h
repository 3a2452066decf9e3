// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace planewright {

// For sources of kernels alone: these are compiled with each of them. What is not a number stays, so that a
// wrong value is never passed over for a right one.

/// Keeps a value that is greater than the best so far, or not a number, with its number.
static inline void keep(double value, double number, double& best, double& which) {
  const bool isNoLess = !(value <= best);
  const bool isBestANumber = best == best;
  const bool isKept = isNoLess & isBestANumber;
  best = isKept ? value : best;
  which = isKept ? number : which;
}

/// The greater of two; of a value that is not a number it must be the first.
static inline double greater(double first, double second) {
  return second > first ? second : first;
}

/// What is below 0 by rounding alone is 0.
static inline double notBelowZero(double value) {
  return value < 0 ? 0 : value;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/region.h"

#include <cmath>
#include <numbers>

namespace planewright {

/// Sums `part(y, span, thickness)` over thin level strips of the material above `from`, in bands between the
/// levels at which the outline changes, so that no strip straddles a junction. The strips get thinner towards
/// the ends of a band, where a round outline runs level.
template <class Part>
double overStrips(const Region& region, double from, Part part, int stripsOfABand = 200) {
  double sum = 0;
  std::vector<double> levels = levelsOf(region);
  std::erase_if(levels, [&](double level) { return level <= from; });
  const double step = std::numbers::pi / stripsOfABand;
  for (double low = from; const double high : levels) {
    for (int i = 0; i < stripsOfABand; ++i) {
      const double angle = (i + 0.5) * step;
      const double y = low + (high - low) * (1 - std::cos(angle)) / 2;
      for (const Span& span : spansAt(region, y, Side::above))
        sum += part(y, span, (high - low) / 2 * std::sin(angle) * step);
    }
    low = high;
  }
  return sum;
}

} // namespace planewright

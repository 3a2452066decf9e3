// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"

#include <array>

namespace planewright {

/// Utilisations are counted in steps of a tenth up to 1, and above that as the ends say; the last bin has no
/// end. A bin has its upper end, 1 with the rounding that the verdict allows.
inline constexpr std::array<double, 13> binEnds = {0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7,
                                                   0.8, 0.9, 1,   1.2, 1.5, 2};
using Histogram = std::array<std::size_t, binEnds.size() + 1>;
/// The bin that a utilisation falls into.
std::size_t binOf(double utilisation);

/// What all points of a field come to.
struct FieldSummary {
  std::size_t points = 0;
  std::size_t judged = 0;
  std::size_t incomplete = 0;
  std::size_t leftOut = 0;
  std::size_t exceeding = 0;
  /// The utilisation that 99.9 % of the judged points do not exceed: where the greatest is far above it, it
  /// stands for few points, as a singular corner does.
  double nearlyAll = 0;
  Histogram histogram{};
};
FieldSummary summaryOf(const Field& field, const FieldResults& results);

/// The judged points by falling utilisation, equals in the order of the field; at most `most`.
std::vector<std::uint32_t> worstOf(const FieldResults& results, std::size_t most);

} // namespace planewright

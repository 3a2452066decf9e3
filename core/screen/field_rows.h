// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"

#include <functional>

namespace planewright {

/// What the rows of a field can be sorted by. Combinations, checks, modes and layers go in their own order,
/// names and regions so that the numbers in them count: "P2" before "P10".
enum class FieldKey {
  point,
  layer,
  region,
  utilisation,
  multiplier,
  combination,
  check,
  mode,
  worstAngle,
  x,
  y
};

struct FieldSort {
  FieldKey key = FieldKey::utilisation;
  bool isFalling = true;
  bool operator==(const FieldSort&) const = default;
};

/// Which points of a field are wanted: those that meet all of it.
struct FieldFilter {
  std::string text; ///< that the name or the region holds; capitals of ASCII are as small letters
  bool exceedingOnly = false;
  std::optional<double> from; ///< the least utilisation
  std::optional<std::size_t> combination;
  std::optional<std::size_t> bin; ///< of the histogram
  bool operator==(const FieldFilter&) const = default;
};

/// Asked now and then in a long work; false ends it.
using GoesOn = std::function<bool()>;

/// The points that a filter lets through, sorted; equals stand in the order of the field, and what has no
/// value (a point that is not judged, a place that is not given) stands last either way. None where it was
/// ended, which takes milliseconds at any size.
std::optional<std::vector<std::uint32_t>> fieldRowsOf(const Field& field, const FieldResults& results,
                                                      const FieldFilter& filter, const FieldSort& sort,
                                                      const GoesOn& goesOn);

} // namespace planewright

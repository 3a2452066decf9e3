// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/strength_key.h"

#include <array>
#include <optional>

namespace planewright {

/// The strengths of one material as they count in one combination: MPa, deg and plain numbers. What is not
/// given is none, never infinite.
struct Strengths {
  MaterialKind kind = MaterialKind::timber;
  std::array<std::optional<double>, strengthKeys> values{};
  Seam seam = Seam::fillet;

  std::optional<double>& operator[](StrengthKey key) { return values[static_cast<std::size_t>(key)]; }
  const std::optional<double>& operator[](StrengthKey key) const {
    return values[static_cast<std::size_t>(key)];
  }
  bool operator==(const Strengths&) const = default;
};

/// Every strength that is scaled, times a factor: duration factor over partial factor, or an explicit one.
Strengths operator*(double factor, Strengths strengths);

} // namespace planewright

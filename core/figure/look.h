// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

#include <cstdint>

namespace planewright {

/// A colour as 0xRRGGBB.
struct Colour {
  std::uint32_t rgb = 0;
  bool operator==(const Colour&) const = default;
};

/// Paper is the light set on white; contrast is for eyes that need much of it, on black.
enum class Palette { light, dark, mono, paper, contrast };

/// The colour of a role in a palette. Figures use paper or mono, whatever the window wears.
Colour colourOf(Role role, Palette palette);

} // namespace planewright

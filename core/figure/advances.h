// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <span>

namespace planewright {

/// Advance widths of one character in units of the font.
struct Advance {
  char32_t code;
  int regular;
  int bold;
};

/// Units of the font in one em.
inline constexpr double unitsPerEm = 2048;

/// The table of resources/font/advances.txt, ascending by code.
std::span<const Advance> advanceTable();
/// The row of a character, null when the table lacks it.
const Advance* advanceOf(char32_t code);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

namespace planewright {

/// Advance width of runs set in Liberation Sans without kerning, in units of `size`; lowered runs at 0.7.
/// A character that the font lacks is taken as one em wide.
double textWidth(const Runs& runs, double size, bool bold);
/// Height of capitals and depth of descenders of the font, as parts of its em.
inline constexpr double capHeight = 0.729;
inline constexpr double ascent = 0.905;
inline constexpr double descent = 0.212;
/// Lowered runs: size and drop as parts of the em.
inline constexpr double loweredSize = 0.7;
inline constexpr double loweredDrop = 0.22;

} // namespace planewright

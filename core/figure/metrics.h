// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// Advance width of runs set in Liberation Sans without kerning, in units of `size`; lowered runs at 0.7.
/// A character that the table lacks is taken as one em wide. Source of the widths: resources/font.
double textWidth(const Runs& runs, double size, bool bold);

/// Height of capitals and figures, of ascenders and depth of descenders of the font, as parts of its em.
inline constexpr double capHeight = 0.688;
inline constexpr double ascent = 0.905;
inline constexpr double descent = 0.212;
/// Lowered runs: size and drop as parts of the em.
inline constexpr double loweredSize = 0.7;
inline constexpr double loweredDrop = 0.22;

/// The rectangle of a label: what its opaque ground covers and what nothing else may touch.
struct Box {
  double left = 0;
  double top = 0;
  double right = 0;
  double bottom = 0;
  bool operator==(const Box&) const = default;
};

/// From 0.76 em over the base line to 0.24 em, with an index 0.38 em, under it, and 0.12 em at both sides.
Box boxOf(const Label& label);
inline constexpr double boxOver = 0.76;
inline constexpr double boxUnder = 0.24;
inline constexpr double boxUnderIndex = 0.38;
inline constexpr double boxSide = 0.12;

/// True when the insides of two rectangles meet.
bool overlap(const Box& a, const Box& b);

} // namespace planewright

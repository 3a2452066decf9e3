// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/quantity/angle.h"

namespace planewright {

/// Radii of an element as parts of its outer radius R: three zones (arrows, bars, knob), so that nothing lies
/// on a handle.
namespace part {
inline constexpr double halfSide = 0.38; ///< of both squares
inline constexpr double shear = 0.425;   ///< shear arrows, 0.045 off their face
inline constexpr double arrowFrom = 0.46;
inline constexpr double arrowFull = 0.25; ///< length of the largest stress on any plane
inline constexpr double arrowLeast = 0.13;
inline constexpr double barFrom = 0.73;
inline constexpr double lineEnd = 0.80; ///< also the band and the arc of phi
inline constexpr double barTo = 0.87;
inline constexpr double barHalfWidth = 0.034;
inline constexpr double parting = 0.88; ///< presses beyond it are the knob's, inside it the bars'
inline constexpr double knob = 0.955;   ///< its centre; it reaches from 0.89 to 1.02
inline constexpr double knobRadius = 0.065;
inline constexpr double axisEnd = 0.86; ///< of axes and theta without handles; with handles they end at R
} // namespace part

/// Where the axes of an element lie in a picture: angles run counter-clockwise from its x axis, which is
/// itself inclined by `axes`; y of the picture points down.
struct ElementFrame {
  Vec centre;
  double outer = 1;
  Angle axes;

  /// The place at `radius` (a part of R) in a direction from the x axis.
  Vec at(Angle direction, double radius) const { return in(direction, radius, 0); }
  /// The place at `along` in a direction and `left` of it (turned by +90 deg), both parts of R.
  Vec in(Angle direction, double along, double left) const;
};

} // namespace planewright

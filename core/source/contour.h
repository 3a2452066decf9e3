// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <vector>

namespace planewright {

/// A place in a cross section in mm: y up, z to the right as seen in the direction of +x.
struct SectionPoint {
  double y = 0;
  double z = 0;
  bool operator==(const SectionPoint&) const = default;
};

/// One piece of an outline: straight, or an arc of at most a quarter circle between two neighbouring points
/// of the compass, so that it rises or falls throughout.
struct Edge {
  SectionPoint from;
  SectionPoint to;
  SectionPoint centre = {};
  double radius = 0; ///< 0: straight
  bool operator==(const Edge&) const = default;
};

/// Closed outlines of one body, counter-clockwise with z to the right and y up; those of holes clockwise.
using Contour = std::vector<Edge>;

/// Integrals over an area about the origin of its axes.
struct AreaMoments {
  double area = 0;
  double y = 0;  ///< of y dA
  double z = 0;  ///< of z dA
  double yy = 0; ///< of y^2 dA: I_z
  double zz = 0; ///< of z^2 dA: I_y
  double yz = 0; ///< of y z dA: I_yz
};
AreaMoments operator+(const AreaMoments& a, const AreaMoments& b);
AreaMoments operator-(const AreaMoments& a, const AreaMoments& b);

/// The moments of the area inside the contour by Green's theorem, exact up to rounding for straight edges and
/// for arcs. Formula: common practice, no source.
AreaMoments momentsOf(const Contour& contour);
/// The same of the part above the level y, which needs no clipped outline: along a level cut dy = 0.
AreaMoments momentsAbove(const Contour& contour, double y);

/// A stretch of a level line, along z.
struct Span {
  double from = 0;
  double to = 0;
  double length() const { return to - from; }
  bool operator==(const Span&) const = default;
};
/// Where a level is looked at that edges may lie in.
enum class Side { below, above };
/// The stretches of material just below or just above the level y, from left to right.
std::vector<Span> spansAt(const Contour& contour, double y, Side side);

/// The outline moved by the offsets.
Contour moved(const Contour& contour, double y, double z);
/// The outline with y and z exchanged, again counter-clockwise: its levels are the upright lines of the old.
Contour transposed(const Contour& contour);

/// Straight edges from point to point and back to the first.
Contour polygon(const std::vector<SectionPoint>& points);
/// A circle about the origin, counter-clockwise.
Contour circle(double radius);
/// The same outline run the other way, for a hole.
Contour reversed(const Contour& contour);

} // namespace planewright

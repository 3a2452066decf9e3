// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section.h"

namespace planewright {

/// One of the bodies that a section is composed of; they touch and do not overlap.
struct Piece {
  enum class Kind { plate, fillet, other };
  Text name; ///< "web"
  Contour contour;
  Kind kind = Kind::other; ///< plate: a rectangle with edges along y and z
  double yLow = 0, yHigh = 0, zLow = 0, zHigh = 0;

  double height() const { return yHigh - yLow; }
  double width() const { return zHigh - zLow; }
};

/// The material of a section in axes through its centroid.
struct Region {
  std::vector<Piece> pieces;
  AreaMoments moments; ///< about the centroid
  double yLow = 0, yHigh = 0, zLow = 0, zHigh = 0;
  bool upright = false; ///< composed of plates and root fillets alone

  double slack() const; ///< places nearer than this are one place: 1e-9 of the larger extent
};

/// The region of a section without problems that is not tabled.
Region regionOf(const Section& section);
/// The region with y and z exchanged.
Region transposed(const Region& region);

/// The distinct heights at which some piece begins or ends, from the bottom up: edges, junctions, extremes.
std::vector<double> levelsOf(const Region& region);
/// `y`, or the level that it means.
double nearestLevelOr(const Region& region, double y);
/// The stretches of material just below or above the level y, those of touching pieces joined.
std::vector<Span> spansAt(const Region& region, double y, Side side);
/// The stretch that holds z, its ends included.
std::optional<Span> spanHolding(const Region& region, double y, double z, Side side);
/// Whether the place lies in the material or on its edge.
bool contains(const Region& region, double y, double z);
/// Whether the region is its own mirror image about the y axis.
bool isMirrored(const Region& region);

/// Outlines for drawing, in axes through the centroid: one closed contour for a shape, another for its hole,
/// one for each block of a built section.
std::vector<Contour> outlineOf(const Section& section);

} // namespace planewright

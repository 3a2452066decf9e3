// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/screen/field_rows.h"

#include <array>

namespace planewright {

/// How a point of a field stands in its map. Of two that lie on one spot the later in this order is seen.
enum class MapClass : std::uint8_t {
  empty,     ///< no point
  notWanted, ///< a filter keeps it back
  notJudged, ///< incomplete or left out
  upTo50,    ///< a utilisation of 0 to 0.5
  upTo80,    ///< above that to 0.8
  upTo95,    ///< above that to 0.95
  upTo100,   ///< above that to 1, with the rounding that the verdict allows
  exceeding
};
/// Upper ends of the classes from upTo50 to upTo100.
inline constexpr std::array<double, 4> mapClassEnds = {0.5, 0.8, 0.95, 1};
/// The class of a point that is wanted; `utilisation` is NaN where it is not judged.
MapClass mapClassOf(double utilisation);

/// Whether a point has both x and y.
bool isPlaced(const Field& field, std::size_t point);

/// The values of x and y that the placed points of a field span, mm.
struct FieldExtent {
  double lowX = 0, lowY = 0, highX = 0, highY = 0;
  std::size_t points = 0;
};
/// None where no point has a place.
std::optional<FieldExtent> extentOf(const Field& field);

/// A way to go from a point of a map, y upwards.
enum class MapWay { left, right, up, down };
/// Of the points of `among` that lie within 45 degrees of a way from (x, y) mm, the nearest; of equals
/// the first in `among`. None where none lies there.
std::optional<std::uint32_t> neighbourOf(const Field& field, const std::vector<std::uint32_t>& among,
                                         double x, double y, MapWay way);

/// What part of the plane a map of `width` by `height` pixels shows; x to the right, y upwards, one scale.
struct MapView {
  int width = 0, height = 0;       ///< pixels
  double centreX = 0, centreY = 0; ///< mm
  double scale = 1;                ///< pixels for a mm

  Vec pixelOf(double x, double y) const;
  /// The place in mm that lies at a pixel.
  Vec placeAt(Vec pixel) const;
  bool operator==(const MapView&) const = default;
};
/// Shows all of an extent, `margin` pixels from the sides; one point alone lies in the middle.
MapView wholeOf(const FieldExtent& extent, int width, int height, int margin);
/// The side of the square that stands for a point, in pixels: so that evenly spread points just touch, and
/// within least and most.
int markSize(const FieldExtent& extent, const MapView& view, int least, int most);

/// A map as pixels: which point is seen on each, and how it stands. Where marks overlap the one that stands
/// worse is on top, of equals the first in the field.
struct FieldMapPixels {
  static constexpr std::uint32_t noPoint = 0xFFFFFFFF;
  int width = 0, height = 0;
  std::vector<std::uint32_t> points;
  std::vector<MapClass> classes;

  /// Where a pixel of the map stands in both.
  std::size_t indexOf(int x, int y) const {
    return static_cast<std::size_t>(y) * static_cast<std::size_t>(width) + static_cast<std::size_t>(x);
  }
  /// The point that is seen at a pixel, or else the one seen nearest to it within `reach` pixels; none
  /// outside.
  std::optional<std::uint32_t> pointNear(int x, int y, int reach) const;
};

/// Draws all placed points of a field; those that are not among `wanted` keep back. None where it was ended,
/// which takes milliseconds at any size.
std::optional<FieldMapPixels> fieldMapPixels(const Field& field, const FieldResults& results,
                                             const std::vector<std::uint32_t>& wanted, const MapView& view,
                                             int markSize, const GoesOn& goesOn);

} // namespace planewright

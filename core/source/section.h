// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"
#include "core/source/contour.h"
#include "core/source/section_shape.h"

#include <functional>
#include <map>

namespace planewright {

/// A cross section: its shape and sizes in mm (mm^2, mm^3, mm^4 of a tabled one; turns of blocks in deg).
struct Section {
  SectionShape shape = SectionShape::rectangle;
  std::map<std::string, double, std::less<>> sizes;

  /// The size of this key, which must be there.
  double size(std::string_view key) const;
  bool operator==(const Section&) const = default;
};

/// A rectangle of a built section, its middle at (y, z), turned from +z towards +y about its middle.
struct Block {
  double b = 0; ///< along z before it is turned
  double h = 0; ///< along y before it is turned
  double y = 0;
  double z = 0;
  Angle turn;
};
/// The blocks of a built section in the order of their numbers.
std::vector<Block> blocksOf(const Section& section);
/// Its corners, counter-clockwise from the one at the lower left before it is turned.
std::vector<SectionPoint> cornersOf(const Block& block);

/// Everything that keeps the sizes from being a section: sizes that are missing, unknown, zero or negative,
/// walls that do not fit, blocks that overlap or do not hang together. Each place is the key of a size.
Problems problemsOf(const Section& section);

} // namespace planewright

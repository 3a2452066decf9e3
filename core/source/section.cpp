// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section.h"

#include <cassert>

namespace planewright {

double Section::size(std::string_view key) const {
  const auto row = sizes.find(key);
  assert(row != sizes.end());
  return row->second;
}

std::vector<Block> blocksOf(const Section& section) {
  std::vector<Block> blocks;
  for (int n = 1; section.sizes.contains(blockKey(n, "b")); ++n)
    blocks.push_back({section.size(blockKey(n, "b")), section.size(blockKey(n, "h")),
                      section.size(blockKey(n, "y")), section.size(blockKey(n, "z")),
                      Angle::fromDegrees(section.size(blockKey(n, "turn")))});
  return blocks;
}

std::vector<SectionPoint> cornersOf(const Block& block) {
  const auto [cos, sin] = cosSin(block.turn);
  std::vector<SectionPoint> corners;
  for (const auto& [z, y] : {std::pair{-0.5, -0.5}, {0.5, -0.5}, {0.5, 0.5}, {-0.5, 0.5}})
    corners.push_back(
        {block.y + z * block.b * sin + y * block.h * cos, block.z + z * block.b * cos - y * block.h * sin});
  return corners;
}

} // namespace planewright

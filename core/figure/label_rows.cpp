// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/label_rows.h"

#include <algorithm>
#include <cstddef>

namespace planewright {

namespace {

/// Rows pooled to one value.
struct Block {
  double sum = 0;
  double weight = 0;
  std::size_t count = 0;
  double mean() const { return sum / weight; }
};

double side(Vec from, Vec to, Vec point) {
  return (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
}

} // namespace

std::vector<double> spacedHeights(const std::vector<WishedHeight>& wished, double pitch, double lowest,
                                  double highest) {
  std::vector<Block> blocks;
  for (std::size_t i = 0; i < wished.size(); ++i) {
    const double level = wished[i].height - static_cast<double>(i) * pitch;
    blocks.push_back({wished[i].weight * level, wished[i].weight, 1});
    while (blocks.size() > 1 && blocks[blocks.size() - 2].mean() >= blocks.back().mean()) {
      const Block last = blocks.back();
      blocks.pop_back();
      blocks.back().sum += last.sum;
      blocks.back().weight += last.weight;
      blocks.back().count += last.count;
    }
  }
  const double greatest =
      std::max(lowest, highest - pitch * static_cast<double>(std::max<std::size_t>(wished.size(), 1) - 1));
  std::vector<double> heights;
  for (const Block& block : blocks)
    for (std::size_t i = 0; i < block.count; ++i)
      heights.push_back(std::clamp(block.mean(), lowest, greatest) +
                        static_cast<double>(heights.size()) * pitch);
  return heights;
}

bool segmentsCross(Vec fromA, Vec toA, Vec fromB, Vec toB) {
  const double a = side(fromA, toA, fromB) * side(fromA, toA, toB);
  const double b = side(fromB, toB, fromA) * side(fromB, toB, toA);
  return a < 0 && b < 0;
}

} // namespace planewright

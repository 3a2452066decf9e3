// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/block_contact.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

struct Reach {
  double low = 0;
  double high = 0;
};

/// Of the corners along the direction from +z towards +y.
Reach reachOf(const std::vector<SectionPoint>& corners, const CosSin& direction) {
  Reach reach{1e300, -1e300};
  for (const SectionPoint& corner : corners) {
    const double along = corner.z * direction.cos + corner.y * direction.sin;
    reach = {std::min(reach.low, along), std::max(reach.high, along)};
  }
  return reach;
}

/// Edges of the one run along edges of the other.
bool areParallel(Angle a, Angle b) {
  return std::abs(std::remainder((a - b).degrees(), 90)) <= 1e-9;
}

double overlap(const Reach& a, const Reach& b) {
  return std::min(a.high, b.high) - std::max(a.low, b.low);
}

} // namespace

Contact contactOf(const Block& a, const Block& b) {
  const std::vector<SectionPoint> first = cornersOf(a);
  const std::vector<SectionPoint> second = cornersOf(b);
  const double slack = 1e-9 * std::max({a.b, a.h, b.b, b.h});
  bool touches = false;
  for (const Angle turn :
       {a.turn, a.turn + Angle::fromDegrees(90), b.turn, b.turn + Angle::fromDegrees(90)}) {
    const CosSin across = cosSin(turn);
    const double depth = overlap(reachOf(first, across), reachOf(second, across));
    if (depth < -slack)
      return Contact::apart;
    if (depth > slack)
      continue;
    // They meet across this direction; it must be in more than a point.
    const CosSin along = cosSin(turn + Angle::fromDegrees(90));
    if (!areParallel(a.turn, b.turn) || overlap(reachOf(first, along), reachOf(second, along)) <= slack)
      return Contact::apart;
    touches = true;
  }
  return touches ? Contact::touching : Contact::overlapping;
}

std::vector<int> looseBlocks(const std::vector<Block>& blocks) {
  std::vector<bool> held(blocks.size(), false);
  std::vector<std::size_t> reached = {0};
  if (!blocks.empty())
    held[0] = true;
  for (std::size_t next = 0; next < reached.size() && !blocks.empty(); ++next)
    for (std::size_t i = 0; i < blocks.size(); ++i)
      if (!held[i] && contactOf(blocks[reached[next]], blocks[i]) != Contact::apart) {
        held[i] = true;
        reached.push_back(i);
      }
  std::vector<int> loose;
  for (std::size_t i = 0; i < held.size(); ++i)
    if (!held[i])
      loose.push_back(static_cast<int>(i) + 1);
  return loose;
}

} // namespace planewright

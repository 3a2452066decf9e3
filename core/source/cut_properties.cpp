// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/cut_properties.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

double lengthOf(const std::vector<Span>& spans) {
  double length = 0;
  for (const Span& span : spans)
    length += span.length();
  return length;
}

/// The side of a level on which less material is cut, but some.
struct ThinSide {
  Side side = Side::above;
  double width = 0;
  double wider = 0;
};

ThinSide thinnerOf(double below, double above, double slack) {
  if (above <= slack || (below > slack && below < above - slack))
    return {Side::below, below, above > slack ? above : below};
  return {Side::above, above, below > above + slack ? below : above};
}

/// Moments of the part beyond, without what cancelling terms leave.
Cut cutOf(const Region& region, const AreaMoments& beyond, const ThinSide& thin, std::size_t walls) {
  const double least = 1e-11 * region.moments.area;
  const auto cleared = [&](double first, double extent) {
    return std::abs(first) <= least * extent ? 0 : first;
  };
  return {cleared(beyond.y, region.yHigh - region.yLow),
          cleared(beyond.z, region.zHigh - region.zLow),
          beyond.area,
          thin.width,
          thin.wider,
          static_cast<int>(walls)};
}

double overlap(double lowA, double highA, double lowB, double highB) {
  return std::min(highA, highB) - std::max(lowA, lowB);
}

/// Follows the material from one side of a cut through a wall to wherever it hangs together. The parts of the
/// pieces above the level are numbered from 0, those below it from the count of pieces.
class Parting {
public:
  Parting(const Region& region, double y, const Span& wall)
      : m_region(region), m_y(y), m_wall(wall), m_reached(2 * region.pieces.size(), false) {}

  /// The moments of what the cut takes off on its upper side; none where that hangs together with the rest.
  std::optional<AreaMoments> beyond() {
    const std::size_t count = m_region.pieces.size();
    for (std::size_t i = 0; i < count; ++i)
      if (holds(i, true) && m_region.pieces[i].yLow <= m_y && isInWall(i))
        reach(i);
    for (std::size_t next = 0; next < m_queue.size(); ++next)
      spreadFrom(m_queue[next]);
    AreaMoments sum;
    for (const std::size_t part : m_queue) {
      const Piece& piece = m_region.pieces[part % count];
      const AreaMoments above = momentsAbove(piece.contour, m_y);
      if (part >= count && piece.yHigh >= m_y && isInWall(part % count))
        return std::nullopt;
      sum = sum + (part < count ? above : momentsOf(piece.contour) - above);
    }
    return sum;
  }

private:
  bool holds(std::size_t piece, bool above) const {
    return above ? m_region.pieces[piece].yHigh > m_y : m_region.pieces[piece].yLow < m_y;
  }
  bool isInWall(std::size_t i) const { return isInWall(m_region.pieces[i].zLow, m_region.pieces[i].zHigh); }
  bool isInWall(double from, double to) const {
    return overlap(from, to, m_wall.from, m_wall.to) > m_region.slack();
  }

  void reach(std::size_t part) {
    if (m_reached[part])
      return;
    m_reached[part] = true;
    m_queue.push_back(part);
  }

  void spreadFrom(std::size_t part) {
    const std::size_t count = m_region.pieces.size();
    const bool above = part < count;
    const std::size_t own = part % count;
    const Piece& piece = m_region.pieces[own];
    if (holds(own, !above) && !isInWall(own))
      reach(above ? own + count : own);
    for (std::size_t i = 0; i < count; ++i) {
      const Piece& other = m_region.pieces[i];
      if (meetUpright(piece, other) && holds(own, above) && sharesSide(piece, other, above))
        reach(above ? i : i + count);
      if (const std::optional<double> level = meetLevel(piece, other))
        spreadOver(*level, piece, i, above);
    }
  }

  /// To a piece that meets `piece` at a level, on this side of the cut or through the uncut part of it.
  void spreadOver(double level, const Piece& piece, std::size_t i, bool above) {
    const std::size_t count = m_region.pieces.size();
    const Piece& other = m_region.pieces[i];
    if (level != m_y) {
      if ((level > m_y) == above)
        reach(above ? i : i + count);
    } else if (!isInWall(std::max(piece.zLow, other.zLow), std::min(piece.zHigh, other.zHigh))) {
      reach(above ? i + count : i);
    }
  }

  bool meetUpright(const Piece& a, const Piece& b) const {
    const double slack = m_region.slack();
    return (std::abs(a.zHigh - b.zLow) <= slack || std::abs(b.zHigh - a.zLow) <= slack) &&
           overlap(a.yLow, a.yHigh, b.yLow, b.yHigh) > slack;
  }
  bool sharesSide(const Piece& a, const Piece& b, bool above) const {
    const double slack = m_region.slack();
    return above ? std::min(a.yHigh, b.yHigh) > std::max({a.yLow, b.yLow, m_y}) + slack
                 : std::min({a.yHigh, b.yHigh, m_y}) > std::max(a.yLow, b.yLow) + slack;
  }
  std::optional<double> meetLevel(const Piece& a, const Piece& b) const {
    const double slack = m_region.slack();
    if (overlap(a.zLow, a.zHigh, b.zLow, b.zHigh) <= slack)
      return std::nullopt;
    if (std::abs(a.yHigh - b.yLow) <= slack)
      return a.yHigh;
    if (std::abs(b.yHigh - a.yLow) <= slack)
      return a.yLow;
    return std::nullopt;
  }

  const Region& m_region;
  double m_y;
  Span m_wall;
  std::vector<bool> m_reached;
  std::vector<std::size_t> m_queue;
};

} // namespace

Cut cutAt(const Region& region, double y) {
  const double level = nearestLevelOr(region, y);
  const std::vector<Span> below = spansAt(region, level, Side::below);
  const std::vector<Span> above = spansAt(region, level, Side::above);
  const ThinSide thin = thinnerOf(lengthOf(below), lengthOf(above), region.slack());
  AreaMoments beyond;
  for (const Piece& piece : region.pieces)
    beyond = beyond + momentsAbove(piece.contour, level);
  return cutOf(region, beyond, thin, (thin.side == Side::above ? above : below).size());
}

std::optional<Cut> wallCutAt(const Region& region, double y, double z) {
  const double level = nearestLevelOr(region, y);
  const std::optional<Span> below = spanHolding(region, level, z, Side::below);
  const std::optional<Span> above = spanHolding(region, level, z, Side::above);
  if (!below && !above)
    return std::nullopt;
  const ThinSide thin = thinnerOf(below ? below->length() : 0, above ? above->length() : 0, region.slack());
  if (spansAt(region, level, thin.side).size() == 1)
    return cutAt(region, y);
  if (!region.upright)
    return std::nullopt;
  const std::optional<AreaMoments> beyond =
      Parting(region, level, thin.side == Side::above ? *above : *below).beyond();
  return beyond ? std::optional(cutOf(region, *beyond, thin, 1)) : std::nullopt;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/strokes.h"

#include "core/quantity/angle.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// Whether a straight line meets the inside of the box: what both sides of the box leave of it is not empty.
bool meets(Vec from, Vec to, const Box& box) {
  double least = 0;
  double most = 1;
  const auto cut = [&](double start, double change, double low, double high) {
    if (change == 0)
      return start > low && start < high;
    const double a = (low - start) / change;
    const double b = (high - start) / change;
    least = std::max(least, std::min(a, b));
    most = std::min(most, std::max(a, b));
    return true;
  };
  return cut(from.x, to.x - from.x, box.left, box.right) && cut(from.y, to.y - from.y, box.top, box.bottom) &&
         least < most;
}

int countUnder(const Path& path, const Box& box) {
  int count = 0;
  for (std::size_t i = 1; i < path.points.size(); ++i)
    count += meets(path.points[i - 1], path.points[i], box) ? 1 : 0;
  if (path.closed && path.points.size() > 1)
    count += meets(path.points.back(), path.points.front(), box) ? 1 : 0;
  return count;
}

constexpr int pieces = 90;

/// Whether the whole circle of an arc misses the box: the box lies outside it, or inside the chords of its
/// pieces.
bool misses(const Arc& arc, const Box& box) {
  const double left = box.left - arc.centre.x;
  const double right = box.right - arc.centre.x;
  const double top = box.top - arc.centre.y;
  const double bottom = box.bottom - arc.centre.y;
  const double nearest = std::hypot(std::max({left, -right, 0.0}), std::max({top, -bottom, 0.0}));
  const double farthest = std::hypot(std::max(-left, right), std::max(-top, bottom));
  constexpr double chord = 0.999; // the middle of a piece of 4 deg lies at cos 2 deg
  return nearest >= arc.radius || farthest <= chord * arc.radius;
}

int countUnder(const Arc& arc, const Box& box) {
  if (misses(arc, box))
    return 0;
  const auto at = [&](int i) {
    const CosSin d = cosSin(Angle::fromDegrees(arc.start + arc.sweep * i / pieces));
    return arc.centre + arc.radius * Vec{d.cos, -d.sin};
  };
  Vec from = at(0);
  for (int i = 1; i <= pieces; ++i) {
    const Vec to = at(i);
    if (meets(from, to, box))
      return 1;
    from = to;
  }
  return 0;
}

int countUnder(const Label&, const Box&) {
  return 0;
}

} // namespace

int strokesUnder(const Picture& picture, const Box& box) {
  int count = 0;
  for (const auto& part : picture.parts)
    count += std::visit([&](const auto& shape) { return countUnder(shape, box); }, part);
  return count;
}

} // namespace planewright

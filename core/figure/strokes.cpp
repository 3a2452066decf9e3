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

int countUnder(const Arc& arc, const Box& box) {
  constexpr int pieces = 90;
  if (!overlap(box, {arc.centre.x - arc.radius, arc.centre.y - arc.radius, arc.centre.x + arc.radius,
                     arc.centre.y + arc.radius}))
    return 0;
  const auto at = [&](int i) {
    const CosSin d = cosSin(Angle::fromDegrees(arc.start + arc.sweep * i / pieces));
    return arc.centre + arc.radius * Vec{d.cos, -d.sin};
  };
  for (int i = 0; i < pieces; ++i)
    if (meets(at(i), at(i + 1), box))
      return 1;
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

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/extent.h"

#include "core/quantity/angle.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

Box boxOf(const Path& path) {
  Box box{path.points.front().x, path.points.front().y, path.points.front().x, path.points.front().y};
  for (const Vec point : path.points)
    box = {std::min(box.left, point.x), std::min(box.top, point.y), std::max(box.right, point.x),
           std::max(box.bottom, point.y)};
  return box;
}

/// Its ends and what of its four extreme points it runs through.
Box boxOf(const Arc& arc) {
  const double from = std::min(arc.start, arc.start + arc.sweep);
  const double to = from + std::min(std::abs(arc.sweep), 360.0);
  Path path;
  const auto add = [&](double degrees) {
    const CosSin d = cosSin(Angle::fromDegrees(degrees));
    path.points.push_back(arc.centre + arc.radius * Vec{d.cos, -d.sin});
  };
  add(from);
  add(to);
  for (double quarter = 90 * std::ceil(from / 90); quarter <= to; quarter += 90)
    add(quarter);
  return boxOf(path);
}

} // namespace

Box extentOf(const Picture& picture) {
  Box extent;
  bool first = true;
  for (const auto& part : picture.parts) {
    const Box box = std::visit([](const auto& shape) { return boxOf(shape); }, part);
    extent = first ? box
                   : Box{std::min(extent.left, box.left), std::min(extent.top, box.top),
                         std::max(extent.right, box.right), std::max(extent.bottom, box.bottom)};
    first = false;
  }
  return extent;
}

} // namespace planewright

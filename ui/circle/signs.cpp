// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/signs.h"

namespace planewright {

namespace {

constexpr double stroke = 1.5;

double sizeOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return 13;
  case PlaneKind::crossing:
  case PlaneKind::following:
    return 12;
  case PlaneKind::watched:
    return 8;
  default:
    return 9;
  }
}

} // namespace

void drawSign(Picture& picture, PlaneKind kind, Vec at) {
  drawSign(picture, signOf(kind), roleOf(kind), at, sizeOf(kind), kind == PlaneKind::watched ? 1 : stroke);
}

void drawSign(Picture& picture, Sign sign, Role role, Vec at, double size, double width) {
  const SignShape shape = shapeOf(sign, size);
  const Pen pen{role, width, Dash::solid};
  const Role fill = shape.filled ? role : Role::canvas;
  if (shape.round) {
    picture.parts.push_back(Arc{at, size / 2, 0, 360, pen, fill});
    return;
  }
  Path path{shape.outline, shape.outline.size() > 2, pen, std::nullopt};
  if (path.closed)
    path.fill = fill;
  for (Vec& point : path.points)
    point = point + at;
  picture.parts.push_back(path);
}

void drawStroke(Picture& picture, Vec from, Vec to, const Pen& pen) {
  picture.parts.push_back(Path{{from, to}, false, pen, std::nullopt});
}

void drawHead(Picture& picture, Vec tip, Angle direction, double length, Role role) {
  const CosSin d = cosSin(direction);
  const Vec along{d.cos, -d.sin};
  const Vec across{0.4 * along.y, -0.4 * along.x};
  const Vec base = tip - length * along;
  picture.parts.push_back(
      Path{{tip, base + length * across, base - length * across}, true, std::nullopt, role});
}

} // namespace planewright

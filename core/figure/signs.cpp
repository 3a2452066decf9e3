// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/signs.h"

#include "core/quantity/angle.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double halo = 0.15; // mm kept free round a sign

/// Points along the outline of a sign, evenly spaced.
std::vector<Vec> outlineOf(const PlacedSign& sign) {
  constexpr int count = 48;
  const SignShape shape = shapeOf(sign.sign, sign.size);
  std::vector<Vec> points;
  if (shape.round) {
    for (int i = 0; i < count; ++i) {
      const CosSin d = cosSin(Angle::fromDegrees(360.0 * i / count));
      points.push_back(sign.at + sign.size / 2 * Vec{d.cos, d.sin});
    }
    return points;
  }
  double around = 0;
  const std::size_t corners = shape.outline.size();
  const auto edge = [&](std::size_t i) { return shape.outline[(i + 1) % corners] - shape.outline[i]; };
  for (std::size_t i = 0; i < corners; ++i)
    around += std::hypot(edge(i).x, edge(i).y);
  for (std::size_t i = 0; i < corners; ++i) {
    const int steps = 1 + static_cast<int>(count * std::hypot(edge(i).x, edge(i).y) / around);
    for (int j = 0; j < steps; ++j)
      points.push_back(sign.at + shape.outline[i] + (j + 0.5) / steps * edge(i));
  }
  return points;
}

bool covers(const PlacedSign& sign, Vec point) {
  const Vec at = point - sign.at;
  const double size = sign.size + 2 * halo;
  const SignShape shape = shapeOf(sign.sign, size);
  if (shape.round)
    return std::hypot(at.x, at.y) < size / 2;
  for (std::size_t i = 0; i < shape.outline.size(); ++i) {
    const Vec from = shape.outline[i];
    const Vec along = shape.outline[(i + 1) % shape.outline.size()] - from;
    if (along.x * (at.y - from.y) - along.y * (at.x - from.x) < 0)
      return false;
  }
  return true;
}

bool areNear(const PlacedSign& a, const PlacedSign& b) {
  return std::hypot(a.at.x - b.at.x, a.at.y - b.at.y) < a.size + b.size;
}

double visibleShare(const std::vector<PlacedSign>& signs, std::size_t which) {
  const std::vector<Vec> outline = outlineOf(signs[which]);
  std::vector<const PlacedSign*> above;
  for (std::size_t i = which + 1; i < signs.size(); ++i)
    if (signs[i].sign != signs[which].sign && areNear(signs[i], signs[which]))
      above.push_back(&signs[i]);
  const auto seen = std::count_if(outline.begin(), outline.end(), [&](Vec point) {
    return std::none_of(above.begin(), above.end(),
                        [&](const PlacedSign* sign) { return covers(*sign, point); });
  });
  return static_cast<double>(seen) / static_cast<double>(outline.size());
}

} // namespace

void showHidden(std::vector<PlacedSign>& signs) {
  constexpr double least = 0.6;
  constexpr double growth = 1.08;
  constexpr double most = 3;
  for (std::size_t i = signs.size(); i-- > 0;) {
    const double greatest = most * signs[i].size;
    while (visibleShare(signs, i) < least && signs[i].size * growth <= greatest)
      signs[i].size *= growth;
  }
}

void drawSign(Picture& picture, const PlacedSign& sign) {
  const SignShape shape = shapeOf(sign.sign, sign.size);
  const std::optional<Role> fill = shape.filled ? sign.role : Role::canvas;
  const Pen pen{sign.role, sign.stroke, Dash::solid};
  if (shape.round) {
    picture.parts.push_back(Arc{sign.at, sign.size / 2 + halo, 0, 360, {}, Role::canvas});
    picture.parts.push_back(Arc{sign.at, sign.size / 2 - sign.stroke / 2, 0, 360,
                                shape.filled ? std::nullopt : std::optional(pen), fill});
    return;
  }
  std::vector<Vec> outline = shape.outline;
  for (Vec& point : outline)
    point = sign.at + point;
  const bool isTick = sign.sign == Sign::uprightTick || sign.sign == Sign::levelTick;
  if (!isTick)
    picture.parts.push_back(
        Path{outline, true, Pen{Role::canvas, 2 * halo + sign.stroke, Dash::solid}, Role::canvas});
  picture.parts.push_back(Path{outline, true, shape.filled ? std::nullopt : std::optional(pen), fill});
}

} // namespace planewright

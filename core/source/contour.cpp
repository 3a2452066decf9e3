// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/contour.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <optional>

namespace planewright {

namespace {

/// Integrals of z^p y^q dy along an edge: z, zy, zy^2, z^2, z^2 y, z^3.
struct EdgeIntegrals {
  double z = 0, zy = 0, zyy = 0, zz = 0, zzy = 0, zzz = 0;
};

/// Two points of Gauss are exact for cubic integrands.
EdgeIntegrals alongLine(const SectionPoint& from, const SectionPoint& to) {
  EdgeIntegrals sum;
  const double half = (to.y - from.y) / 2;
  for (const double at : {-1 / std::sqrt(3.0), 1 / std::sqrt(3.0)}) {
    const double y = (from.y + to.y) / 2 + at * half;
    const double z = (from.z + to.z) / 2 + at * (to.z - from.z) / 2;
    sum.z += half * z;
    sum.zy += half * z * y;
    sum.zyy += half * z * y * y;
    sum.zz += half * z * z;
    sum.zzy += half * z * z * y;
    sum.zzz += half * z * z * z;
  }
  return sum;
}

/// Antiderivatives at the angle phi from +z of z^p y^q dy about the centre of an arc, y = r sin phi.
struct ArcPowers {
  double one, y, yy, z, zy, zyy, zz, zzy, zzz;
};

ArcPowers arcPowersAt(double phi, double r) {
  const double c = std::cos(phi);
  const double s = std::sin(phi);
  const double r2 = r * r;
  const double r3 = r2 * r;
  const double r4 = r2 * r2;
  return {r * s,
          r2 * s * s / 2,
          r3 * s * s * s / 3,
          r2 * (phi + s * c) / 2,
          -r3 * c * c * c / 3,
          r4 * (phi / 8 - std::sin(4 * phi) / 32),
          r3 * (s - s * s * s / 3),
          -r4 * c * c * c * c / 4,
          r4 * (3 * phi / 8 + std::sin(2 * phi) / 4 + std::sin(4 * phi) / 32)};
}

EdgeIntegrals alongArc(const Edge& edge) {
  const double first = std::atan2(edge.from.y - edge.centre.y, edge.from.z - edge.centre.z);
  const double last = std::atan2(edge.to.y - edge.centre.y, edge.to.z - edge.centre.z);
  constexpr double turn = 6.283185307179586476925286766559;
  const ArcPowers a = arcPowersAt(first, edge.radius);
  const ArcPowers b = arcPowersAt(first + std::remainder(last - first, turn), edge.radius);
  const ArcPowers p = {b.one - a.one, b.y - a.y,   b.yy - a.yy,   b.z - a.z,    b.zy - a.zy,
                       b.zyy - a.zyy, b.zz - a.zz, b.zzy - a.zzy, b.zzz - a.zzz};
  const double y = edge.centre.y;
  const double z = edge.centre.z;
  return {z * p.one + p.z,
          z * (y * p.one + p.y) + y * p.z + p.zy,
          z * (y * y * p.one + 2 * y * p.y + p.yy) + y * y * p.z + 2 * y * p.zy + p.zyy,
          z * z * p.one + 2 * z * p.z + p.zz,
          z * z * (y * p.one + p.y) + 2 * z * (y * p.z + p.zy) + y * p.zz + p.zzy,
          z * z * z * p.one + 3 * z * z * p.z + 3 * z * p.zz + p.zzz};
}

/// Of the edge's point at the level y, which lies between its ends.
double zAt(const Edge& edge, double y) {
  if (y == edge.from.y)
    return edge.from.z;
  if (y == edge.to.y)
    return edge.to.z;
  if (edge.radius == 0)
    return edge.from.z + (edge.to.z - edge.from.z) * ((y - edge.from.y) / (edge.to.y - edge.from.y));
  const double up = y - edge.centre.y;
  const double out = std::sqrt(std::max(0.0, (edge.radius - up) * (edge.radius + up)));
  return edge.from.z + edge.to.z < 2 * edge.centre.z ? edge.centre.z - out : edge.centre.z + out;
}

std::optional<Edge> above(Edge edge, double y) {
  if (edge.from.y <= y && edge.to.y <= y)
    return std::nullopt;
  const SectionPoint crossing{y, edge.from.y < y || edge.to.y < y ? zAt(edge, y) : 0};
  if (edge.from.y < y)
    edge.from = crossing;
  else if (edge.to.y < y)
    edge.to = crossing;
  return edge;
}

} // namespace

AreaMoments operator+(const AreaMoments& a, const AreaMoments& b) {
  return {a.area + b.area, a.y + b.y, a.z + b.z, a.yy + b.yy, a.zz + b.zz, a.yz + b.yz};
}

AreaMoments operator-(const AreaMoments& a, const AreaMoments& b) {
  return {a.area - b.area, a.y - b.y, a.z - b.z, a.yy - b.yy, a.zz - b.zz, a.yz - b.yz};
}

AreaMoments momentsOf(const Contour& contour) {
  return momentsAbove(contour, -std::numeric_limits<double>::infinity());
}

AreaMoments momentsAbove(const Contour& contour, double y) {
  AreaMoments sum;
  for (const Edge& whole : contour)
    if (const std::optional<Edge> edge = above(whole, y)) {
      const EdgeIntegrals part = edge->radius == 0 ? alongLine(edge->from, edge->to) : alongArc(*edge);
      sum = sum + AreaMoments{part.z, part.zy, part.zz / 2, part.zyy, part.zzz / 3, part.zzy / 2};
    }
  return sum;
}

std::vector<Span> spansAt(const Contour& contour, double y, Side side) {
  std::vector<double> crossings;
  for (const Edge& edge : contour) {
    const auto [low, high] = std::minmax({edge.from.y, edge.to.y});
    if (side == Side::above ? low <= y && y < high : low < y && y <= high)
      crossings.push_back(zAt(edge, y));
  }
  std::ranges::sort(crossings);
  std::vector<Span> spans;
  for (std::size_t i = 0; i + 1 < crossings.size(); i += 2)
    spans.push_back({crossings[i], crossings[i + 1]});
  return spans;
}

Contour moved(const Contour& contour, double y, double z) {
  Contour result = contour;
  for (Edge& edge : result)
    for (SectionPoint* point : {&edge.from, &edge.to, &edge.centre}) {
      point->y += y;
      point->z += z;
    }
  return result;
}

Contour transposed(const Contour& contour) {
  Contour result = reversed(contour);
  for (Edge& edge : result)
    for (SectionPoint* point : {&edge.from, &edge.to, &edge.centre})
      std::swap(point->y, point->z);
  return result;
}

Contour polygon(const std::vector<SectionPoint>& points) {
  Contour contour;
  for (std::size_t i = 0; i < points.size(); ++i)
    contour.push_back({points[i], points[(i + 1) % points.size()]});
  return contour;
}

Contour circle(double radius) {
  const std::array<SectionPoint, 4> compass = {{{0, radius}, {radius, 0}, {0, -radius}, {-radius, 0}}};
  Contour contour;
  for (std::size_t i = 0; i < compass.size(); ++i)
    contour.push_back({compass[i], compass[(i + 1) % compass.size()], {0, 0}, radius});
  return contour;
}

Contour reversed(const Contour& contour) {
  Contour result(contour.rbegin(), contour.rend());
  for (Edge& edge : result)
    std::swap(edge.from, edge.to);
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/inverse.h"

#include <algorithm>
#include <cmath>
#include <utility>

namespace planewright {

namespace {

/// acos in degrees of a ratio that may lie a rounding outside [-1, 1].
double halfAcosDegrees(double ratio) {
  return Angle::fromRadians(std::acos(std::clamp(ratio, -1.0, 1.0))).degrees() / 2;
}

NormalAngle turnedFrom(NormalAngle start, double degrees) {
  return {folded(start.value + Angle::fromDegrees(degrees))};
}

/// Planes whose distances differ by less are equally near; the rest is rounding.
constexpr double sameDistance = 1e-12 * 180;

PlanesOfValue ordered(PlanesOfValue planes, NormalAngle near) {
  const double farther =
      (apart(planes.first.value, near.value) - apart(planes.second.value, near.value)).degrees();
  const bool tie = std::abs(farther) <= sameDistance;
  if (tie ? planes.second < planes.first : farther > 0)
    std::swap(planes.first, planes.second);
  return planes;
}

} // namespace

// Both components are a cosine about the plane of their greatest value: sn about theta1, tnt about
// theta1 - 45 deg.
PlanesOfValue planesOf(const Circle& circle, Component component, const Target& target, NormalAngle near) {
  using Kind = PlanesOfValue::Kind;
  const double centre = component == Component::sn ? circle.mean : 0;
  PlanesOfValue planes;
  planes.least = centre - circle.radius;
  planes.greatest = centre + circle.radius;
  const double low = target.value - target.halfWidth;
  const double high = target.value + target.halfWidth;
  if (!circle.theta1) {
    planes.kind = low <= centre && centre <= high ? Kind::every : Kind::outOfReach;
    planes.first = planes.second = near;
    return planes;
  }
  if (low > planes.greatest || high < planes.least)
    return planes;
  const NormalAngle top = component == Component::sn ? *circle.theta1 : *circle.thetaTauMax;
  if (low <= planes.greatest && planes.greatest <= high) {
    planes.kind = Kind::touching;
    planes.first = planes.second = top;
    planes.spread = Angle::fromDegrees(halfAcosDegrees((low - centre) / circle.radius));
    return planes;
  }
  if (low <= planes.least && planes.least <= high) {
    planes.kind = Kind::touching;
    planes.first = planes.second = turnedFrom(top, 90);
    planes.spread = Angle::fromDegrees(90 - halfAcosDegrees((high - centre) / circle.radius));
    return planes;
  }
  planes.kind = Kind::two;
  const double off = halfAcosDegrees((target.value - centre) / circle.radius);
  planes.first = turnedFrom(top, off);
  planes.second = turnedFrom(top, -off);
  return ordered(planes, near);
}

} // namespace planewright

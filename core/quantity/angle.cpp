// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/angle.h"

#include <cmath>
#include <numbers>

namespace planewright {

namespace {

constexpr double radiansPerDegree = std::numbers::pi / 180;

/// Reduces to [-45, 45] deg exactly, so that multiples of 90 deg keep exact zeros and ones.
CosSin cosSinOfDegrees(double degrees) {
  int quarter = 0;
  const double rest = std::remquo(degrees, 90.0, &quarter);
  CosSin base{};
  if (std::abs(rest) == 45)
    base = {std::numbers::sqrt2 / 2, std::copysign(std::numbers::sqrt2 / 2, rest)};
  else
    base = {std::cos(rest * radiansPerDegree), std::sin(rest * radiansPerDegree)};
  switch (quarter & 3) {
  case 0:
    return {base.cos, base.sin + 0.0};
  case 1:
    return {0.0 - base.sin, base.cos};
  case 2:
    return {-base.cos, 0.0 - base.sin};
  default:
    return {base.sin + 0.0, -base.cos};
  }
}

} // namespace

Angle Angle::fromRadians(double radians) {
  return Angle(
      static_cast<double>(static_cast<long double>(radians) * 180 / std::numbers::pi_v<long double>));
}

double Angle::radians() const {
  return static_cast<double>(static_cast<long double>(m_degrees) * std::numbers::pi_v<long double> / 180);
}

CosSin cosSin(Angle angle) {
  return cosSinOfDegrees(angle.degrees());
}

CosSin cosSinOfDouble(Angle angle) {
  return cosSinOfDegrees(2 * angle.degrees());
}

Angle folded(Angle angle) {
  const double rest = std::remainder(angle.degrees(), 180.0);
  if (rest <= -90)
    return Angle::fromDegrees(90);
  return Angle::fromDegrees(rest + 0.0);
}

Angle apart(Angle a, Angle b) {
  return Angle::fromDegrees(std::abs(std::remainder(a.degrees() - b.degrees(), 180.0)));
}

bool coincide(Angle a, Angle b) {
  return apart(a, b) < coinciding;
}

namespace {
constexpr Angle rightAngle = Angle::fromDegrees(90);
}

NormalAngle crossing(LineAngle line) {
  return {folded(line.value)};
}
NormalAngle following(LineAngle line) {
  return {folded(line.value + rightAngle)};
}
LineAngle cutOf(NormalAngle normal) {
  return {folded(normal.value + rightAngle)};
}
NormalAngle normalOf(LineAngle cut) {
  return {folded(cut.value - rightAngle)};
}

} // namespace planewright

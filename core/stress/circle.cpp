// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/circle.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

std::optional<NormalAngle> turned(std::optional<NormalAngle> from, double degrees) {
  if (!from)
    return std::nullopt;
  return NormalAngle{folded(from->value + Angle::fromDegrees(degrees))};
}

} // namespace

std::optional<NormalAngle> Circle::theta2() const {
  return turned(theta1, 90);
}
std::optional<NormalAngle> Circle::thetaTauMin() const {
  return turned(theta1, 45);
}

Circle circleOf(const PlaneStress& stress, double scale, double s3) {
  Circle circle;
  const double half = stress.sx / 2 - stress.sy / 2;
  circle.mean = stress.sx / 2 + stress.sy / 2;
  circle.radius = std::hypot(half, stress.txy);
  if (isRounding(circle.radius, scale)) {
    circle.radius = 0;
  } else {
    const double twice = Angle::fromRadians(std::atan2(stress.txy, half)).degrees();
    circle.theta1 = NormalAngle{folded(Angle::fromDegrees(twice / 2))};
    circle.thetaTauMax = turned(circle.theta1, -45);
  }
  circle.s1 = circle.mean + circle.radius;
  circle.s2 = circle.mean - circle.radius;
  const auto [least, greatest] = std::minmax({circle.s1, circle.s2, s3});
  circle.tauAbsMax = greatest / 2 - least / 2;
  return circle;
}

Circle circleOf(const PlaneStress& stress) {
  return circleOf(stress, scaleOf(stress));
}

bool isRounding(double value, double scale) {
  return std::abs(value) <= 8 * std::numeric_limits<double>::epsilon() * scale;
}

double withoutRounding(double value, double scale) {
  return isRounding(value, scale) ? 0 : value;
}

PlaneStress withoutRounding(PlaneStress sum, double scale) {
  for (double* component : {&sum.sx, &sum.sy, &sum.txy})
    *component = withoutRounding(*component, scale);
  if (circleOf(sum, scale).theta1)
    return sum;
  const double mean = sum.sx / 2 + sum.sy / 2;
  return {mean, mean, 0};
}

double scaleOf(const PlaneStress& stress) {
  return std::max({std::abs(stress.sx), std::abs(stress.sy), std::abs(stress.txy)});
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
// The circle and the rotation against the same formulas in more digits and against another library's
// eigenvalues, from 1e-300 to 1e300 and where the principal values nearly coincide.
#include "core/stress/circle.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <Eigen/Dense>

#include <cmath>
#include <cstdint>
#include <limits>
#include <numbers>

namespace planewright {
namespace {

using Long = long double;
static_assert(std::numeric_limits<Long>::digits >= 64, "the reference needs more digits than a double");

constexpr double radiusBound = 4e-16;    // of the radius
constexpr double principalBound = 5e-16; // of the larger principal value
constexpr double angleBound = 5e-14;     // deg
constexpr double rotationBound = 1e-15;  // of |mean| + |half| + |txy|

/// A number from -1 to 1 of all 53 bits.
rc::Gen<double> anyMantissa() {
  constexpr std::int64_t top = std::int64_t(1) << 53;
  return rc::gen::map(rc::gen::resize(rc::kNominalSize, rc::gen::inRange(-top, top + 1)),
                      [](std::int64_t bits) { return std::ldexp(static_cast<double>(bits), -53); });
}

rc::Gen<PlaneStress> anyMantissas() {
  return rc::gen::apply(
      [](double a, double b, double c) {
        return PlaneStress{a, b, c};
      },
      anyMantissa(), anyMantissa(), anyMantissa());
}

/// Components of one size, of very different sizes, and nearly hydrostatic ones; some with zeros.
rc::Gen<PlaneStress> anyShape() {
  const auto spread = rc::gen::apply(
      [](const PlaneStress& m, int a, int b) {
        return PlaneStress{m.sx, std::ldexp(m.sy, -a), std::ldexp(m.txy, -b)};
      },
      anyMantissas(), rc::gen::inRange(0, 60), rc::gen::inRange(0, 60));
  const auto nearlyEqual = rc::gen::apply(
      [](const PlaneStress& m, int gap, int shear) {
        return PlaneStress{m.sx, m.sx + std::ldexp(m.sy, -gap), std::ldexp(m.txy, -shear)};
      },
      anyMantissas(), rc::gen::inRange(10, 52), rc::gen::inRange(10, 60));
  const auto withZeros = rc::gen::apply(
      [](const PlaneStress& m, int mask) {
        return PlaneStress{mask & 1 ? m.sx : 0, mask & 2 ? m.sy : 0, mask & 4 ? m.txy : 0};
      },
      anyMantissas(), rc::gen::inRange(0, 8));
  return rc::gen::oneOf(anyMantissas(), spread, nearlyEqual, withZeros);
}

/// The shape with its greatest component moved to between 2^(exponent - 1) and 2^exponent.
PlaneStress scaled(const PlaneStress& shape, int exponent) {
  int own = 0;
  std::frexp(scaleOf(shape), &own);
  const int by = exponent - own;
  return {std::ldexp(shape.sx, by), std::ldexp(shape.sy, by), std::ldexp(shape.txy, by)};
}

/// Of ordinary size, and of all sizes from 1e-300 (2^-996) to 1e300 (2^996).
rc::Gen<PlaneStress> anyState() {
  return rc::gen::apply(scaled, anyShape(),
                        rc::gen::oneOf(rc::gen::inRange(-4, 12), rc::gen::inRange(-995, 997)));
}

struct Reference {
  Long mean, half, radius, s1, s2;
};

Reference referenceOf(const PlaneStress& stress) {
  const Long sx = stress.sx;
  const Long sy = stress.sy;
  const Long half = (sx - sy) / 2;
  const Long mean = (sx + sy) / 2;
  const Long radius = std::hypot(half, Long(stress.txy));
  return {mean, half, radius, mean + radius, mean - radius};
}

/// Distance of two directions in degrees, taken in the long type.
Long apartDegrees(Long a, Long b) {
  return std::abs(std::remainder(a - b, Long(180)));
}

Long off(Long a, Long b) {
  return std::abs(a - b);
}

/// A difference of denormal numbers has no relative error to speak of.
constexpr Long least = std::numeric_limits<double>::denorm_min();

RC_GTEST_PROP(Reference, theCircleHasAllItsDigits, ()) {
  const PlaneStress state = *anyState();
  const Circle circle = circleOf(state);
  const Reference exact = referenceOf(state);
  const Long larger = std::max(std::abs(exact.s1), std::abs(exact.s2));
  if (!circle.theta1) {
    RC_ASSERT(exact.radius <= 8.1L * std::numeric_limits<double>::epsilon() * scaleOf(state) + least);
    return;
  }
  RC_ASSERT(off(circle.radius, exact.radius) <= radiusBound * exact.radius + least);
  RC_ASSERT(off(circle.s1, exact.s1) <= principalBound * larger + least);
  RC_ASSERT(off(circle.s2, exact.s2) <= principalBound * larger + least);
  const Long theta1 = std::atan2(Long(state.txy), exact.half) / 2 * 180 / std::numbers::pi_v<Long>;
  RC_ASSERT(apartDegrees(circle.theta1->value.degrees(), theta1) <= angleBound);
  RC_ASSERT(apartDegrees(circle.thetaTauMax->value.degrees(), theta1 - 45) <= angleBound);
  RC_ASSERT(apartDegrees(circle.theta2()->value.degrees(), theta1 + 90) <= angleBound);
}

RC_GTEST_PROP(Reference, theRotationHasAllItsDigits, ()) {
  const PlaneStress state = *anyState();
  const double degrees =
      *rc::gen::map(rc::gen::inRange(-720'000'000, 720'000'001), [](int n) { return n / 1e6; });
  const Reference exact = referenceOf(state);
  // Turned back by whole half turns first, so that the reference keeps its digits.
  const Long twice = std::remainder(2 * Long(degrees), Long(360)) * std::numbers::pi_v<Long> / 180;
  const Long sn = exact.mean + exact.half * std::cos(twice) + Long(state.txy) * std::sin(twice);
  const Long tnt = Long(state.txy) * std::cos(twice) - exact.half * std::sin(twice);
  const Traction traction = tractionOn(state, {Angle::fromDegrees(degrees)});
  const Long size = std::abs(exact.mean) + std::abs(exact.half) + std::abs(Long(state.txy));
  RC_ASSERT(off(traction.sn, sn) <= rotationBound * size + 4 * least);
  RC_ASSERT(off(traction.tnt, tnt) <= rotationBound * size + 4 * least);
}

RC_GTEST_PROP(Reference, principalValuesAndAxesAreThoseOfTheEigenSolver, ()) {
  const PlaneStress state = *anyState();
  const Circle circle = circleOf(state);
  Eigen::Matrix2d matrix;
  matrix << state.sx, state.txy, state.txy, state.sy;
  const Eigen::SelfAdjointEigenSolver<Eigen::Matrix2d> solver(matrix);
  RC_ASSERT(solver.info() == Eigen::Success);
  const double scale = scaleOf(state);
  // The solver is good to some units in the last place of the largest component, no better.
  const double bound = 16 * std::numeric_limits<double>::epsilon() * scale + 4 * static_cast<double>(least);
  RC_ASSERT(std::abs(solver.eigenvalues()[1] - circle.s1) <= bound);
  RC_ASSERT(std::abs(solver.eigenvalues()[0] - circle.s2) <= bound);
  if (circle.radius <= 1e-3 * scale)
    return; // its axes lose their digits as the values meet
  const Eigen::Vector2d axis = solver.eigenvectors().col(1);
  const Angle angle = Angle::fromRadians(std::atan2(axis.y(), axis.x()));
  RC_ASSERT(apart(angle, circle.theta1.value().value).degrees() <= 1e-9);
}

// Where trace and determinant give a radius of 0 and the eigenvalues half their digits.
TEST(Reference, principalValuesThatNearlyCoincideKeepTheirRadius) {
  const PlaneStress state{10, 10 - 1e-7, 1e-8};
  const Circle circle = circleOf(state);
  const Long radius = referenceOf(state).radius;
  EXPECT_NEAR(circle.radius, 5.099e-8, 1e-11);
  EXPECT_LE(static_cast<double>(off(circle.radius, radius) / radius), radiusBound);
  const double trace = state.sx + state.sy;
  const double determinant = state.sx * state.sy - state.txy * state.txy;
  EXPECT_GT(std::abs(std::sqrt(std::abs(trace * trace / 4 - determinant)) - circle.radius), 1e-9);
}

} // namespace
} // namespace planewright

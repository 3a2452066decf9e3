// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/plane_stress.h"

#include <rapidcheck.h>

namespace planewright {

/// Components from -1000 to 1000 by thousandths, with zeros, equal values and sign changes often among them.
inline rc::Gen<double> anyComponent() {
  return rc::gen::oneOf(rc::gen::just(0.0), rc::gen::element(1.0, -1.0, 80.0, -80.0, 0.001),
                        rc::gen::map(rc::gen::inRange(-1000000, 1000001), [](int n) { return n / 1000.0; }));
}

inline rc::Gen<PlaneStress> anyStress() {
  return rc::gen::apply(
      [](double sx, double sy, double txy) {
        return PlaneStress{sx, sy, txy};
      },
      anyComponent(), anyComponent(), anyComponent());
}

/// Angles from -90 to 90 deg by thousandths, with the multiples of 15 often among them.
inline rc::Gen<Angle> anyAngle() {
  return rc::gen::map(
      rc::gen::oneOf(rc::gen::map(rc::gen::inRange(-6, 7), [](int n) { return 15.0 * n; }),
                     rc::gen::map(rc::gen::inRange(-90000, 90001), [](int n) { return n / 1000.0; })),
      [](double degrees) { return Angle::fromDegrees(degrees); });
}

} // namespace planewright

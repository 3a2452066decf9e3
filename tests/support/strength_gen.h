// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/judge.h"
#include "tests/support/stress_gen.h"

namespace planewright {

inline Strengths lineStrengths(MaterialKind kind, double Xt, double Xc, double Yt, double Yc, double S) {
  using enum StrengthKey;
  Strengths f;
  f.kind = kind;
  f[alongTension] = Xt;
  f[alongCompression] = Xc;
  f[acrossTension] = Yt;
  f[acrossCompression] = Yc;
  f[shear] = S;
  return f;
}

/// C24 of EN 338:2016 (from memory), without its bending strength.
inline Strengths c24() {
  return lineStrengths(MaterialKind::timber, 14.5, 21, 0.4, 2.5, 4);
}

/// T300/5208 as published by Kaw, table 2.1 (quoted second-hand).
inline Strengths graphiteEpoxy() {
  return lineStrengths(MaterialKind::lamina, 1500, 1500, 40, 246, 68);
}

inline Demand demandOf(const PlaneStress& stress) {
  return {stress, 0, scaleOf(stress), 0};
}

/// Strengths with a closed surface for every criterion: across at most along, in either sense.
inline rc::Gen<Strengths> anyLineStrengths() {
  const auto number = [](int from, int to) {
    return rc::gen::map(rc::gen::inRange(from, to), [](int n) { return n / 100.0; });
  };
  return rc::gen::apply(
      [](double Xt, double Xc, double shareT, double shareC, double S) {
        return lineStrengths(MaterialKind::generic, Xt, Xc, shareT * std::min(Xt, Xc),
                             shareC * std::min(Xt, Xc), S);
      },
      number(100, 20000), number(100, 20000), number(1, 101), number(1, 101), number(10, 10000));
}

inline rc::Gen<Criterion> anyLineCriterion() {
  using enum Criterion;
  return rc::gen::element(maximumStress, sumOfSquares, norrisPlane, norrisThreePlane, azziTsai,
                          azziTsaiTwoSign, hoffman, tsaiWu, linearSum);
}

/// Uniaxial stress `size` along `axis`.
inline PlaneStress uniaxial(double size, Angle axis) {
  return inTurnedAxes({size, 0, 0}, -axis);
}

} // namespace planewright

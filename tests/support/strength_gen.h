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

inline rc::Gen<Criterion> anyCriterion() {
  return rc::gen::map(rc::gen::inRange<std::size_t>(0, namesOf<Criterion>().size()),
                      [](std::size_t i) { return namesOf<Criterion>()[i].value; });
}

/// The edge of every tapered edge below.
inline constexpr Angle someEdge = Angle::fromDegrees(20);

/// Strengths that a criterion can judge by. Cohesion and cut-off are often 0, the cut-off often not given.
inline Strengths anyStrengthsFor(Criterion criterion) {
  using enum StrengthKey;
  Strengths f;
  for (const Named<MaterialKind>& kind : namesOf<MaterialKind>())
    if (applies(criterion, kind.value))
      f.kind = kind.value;
  if (isLineKind(f.kind)) {
    const MaterialKind kind = f.kind;
    f = *anyLineStrengths();
    f.kind = kind;
    f[alongBending] = 1.5 * *f[alongTension];
    return f;
  }
  for (const StrengthKey key : keysOf(f.kind))
    f[key] = *rc::gen::inRange(10, 5000) / 10.0;
  if (has(f.kind, friction))
    f[friction] = *rc::gen::inRange(1, 60);
  if (has(f.kind, cohesion) && *rc::gen::inRange(0, 3) == 0)
    f[cohesion] = 0;
  if (has(f.kind, cutoff))
    f[cutoff] = *rc::gen::element<std::optional<double>>(std::nullopt, 0.0, 0.5, 5.0, 100.0);
  if (has(f.kind, gammaM2))
    f[betaW] = f[gammaM2] = 1.1;
  return f;
}

/// A state that a criterion was published for.
inline PlaneStress anyStressWithin(Criterion criterion) {
  const PlaneStress any = *anyStress();
  switch (criterion) {
  case Criterion::hankinson:
    return uniaxial(any.sx, *anyAngle());
  case Criterion::compressionAtAngle:
    return uniaxial(-std::abs(any.sx), *anyAngle());
  case Criterion::taperedEdge:
    return uniaxial(any.sx, someEdge);
  default:
    return any;
  }
}

/// The judges of one to four combinations by one of all criteria, on small and great states.
inline std::vector<Judge> anyJudges(Criterion criterion = *anyCriterion()) {
  const Strengths f = anyStrengthsFor(criterion);
  Parameters parameters;
  parameters.edge = someEdge;
  if (criterion == Criterion::hankinson)
    parameters.n = *rc::gen::element(1.5, 2.0, 2.5);
  const int count = *rc::gen::inRange(1, 5);
  std::vector<Judge> judges;
  for (int i = 0; i < count; ++i)
    judges.push_back(*Judge::of(criterion, f, parameters,
                                demandOf(*rc::gen::element(0.02, 0.2, 1.0) * anyStressWithin(criterion))));
  return judges;
}

} // namespace planewright

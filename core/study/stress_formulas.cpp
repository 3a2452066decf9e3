// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/stress_formulas.h"

namespace planewright {

namespace {

const Formula sx = Formula::symbol("σ_{x}");
const Formula sy = Formula::symbol("σ_{y}");
const Formula txy = Formula::symbol("τ_{xy}");

} // namespace

Formula normalStressAt(const Formula& angle, int turned) {
  const Formula ofDifference = (sx - sy) / 2 * cosine(2 * angle);
  const Formula ofShear = txy * sine(2 * angle);
  const Formula half = (sx + sy) / 2;
  return turned > 0 ? half + ofDifference + ofShear : half - ofDifference - ofShear;
}

Formula shearStressAt(const Formula& angle) {
  return -((sx - sy) / 2 * sine(2 * angle)) + txy * cosine(2 * angle);
}

} // namespace planewright

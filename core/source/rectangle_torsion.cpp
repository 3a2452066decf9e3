// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/rectangle_torsion.h"

#include <cassert>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

constexpr double pi = std::numbers::pi;
// The series are taken as their limits for long rectangles less what converges fast.
constexpr double catalan = 0.91596559417721901505;                // sum (-1)^k / (2k+1)^2
const double oddFifthPowers = 31.0 / 32 * 1.03692775514336992633; // sum 1/(2k+1)^5 by zeta(5)

} // namespace

RectangleTorsion rectangleTorsion(double ratio) {
  assert(ratio >= 1);
  double overCosh = 0;
  double lack = 0;            // sum (1 - tanh)/n^5
  double alternatingLack = 0; // sum (-1)^k (1 - tanh)/n^2
  for (int k = 0; k < 20; ++k) {
    const double n = 2 * k + 1;
    const double decay = std::exp(-n * pi * ratio);
    const double lackOfTanh = 2 * decay / (1 + decay); // 1 - tanh(n pi ratio/2)
    overCosh += 2 * std::exp(-n * pi * ratio / 2) / (1 + decay) / (n * n);
    lack += lackOfTanh / (n * n * n * n * n);
    alternatingLack += (k % 2 == 0 ? lackOfTanh : -lackOfTanh) / (n * n);
  }
  RectangleTorsion torsion;
  torsion.c2 = 1.0 / 3 - 64 / (std::pow(pi, 5) * ratio) * (oddFifthPowers - lack);
  torsion.c1 = torsion.c2 / (1 - 8 / (pi * pi) * overCosh);
  torsion.c3 = torsion.c2 / (8 / (pi * pi) * (catalan - alternatingLack));
  return torsion;
}

} // namespace planewright

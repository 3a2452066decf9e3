// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>

namespace planewright {

// The arithmetic of very many points, a lane of them at a time. Plain loops over plain arrays, in sources of
// their own that include nothing else with code in it: they are compiled for several levels of processors
// (clones.h), and code of a template from elsewhere would come out in several kinds. Every operation is one
// of IEEE arithmetic in a fixed order and nothing is fused, so that all levels give the same bits.
//
// Nothing overflows or vanishes: whoever calls sees to it that sizes keep within the bounds below, and takes
// the core's way for one point elsewhere.

/// Points of a lane. What a lane needs stays in the nearest cache, and no loop has a remainder.
inline constexpr std::size_t laneSize = 128;

/// Sizes, apart from 0, that kernels bear: of stresses, of factors and of strengths.
struct Bounds {
  double least, greatest;
};
inline constexpr Bounds bornStresses{1e-60, 1e60};
inline constexpr Bounds bornFactors{1e-10, 1e10};
inline constexpr Bounds bornStrengths{1e-15, 1e15};

/// Rows of a lane of states in the axes of a line, laneSize values each: the mean of the normal stresses,
/// half of along less across, the shear.
inline constexpr std::size_t stateRows = 3;
inline constexpr std::size_t stateSize = stateRows * laneSize;

/// States into the axes of lines: `cos2` and `sin2` of twice each line's angle.
void resolveLane(const double* sx, const double* sy, const double* txy, const double* cos2,
                 const double* sin2, double* state);

/// Widens `bounds` to the least and greatest size, apart from 0, of `count` values, a multiple of laneSize.
void widenBounds(const double* values, std::size_t count, Bounds& bounds);

/// The sum of `count` states, each times its factor, from left to right.
void combineLane(const double* const* states, const double* factors, std::size_t count, double* sum);

// Forms as the kernels take them; [0] for stresses from 0 on, [1] for those below, first along then across.

/// a11 s1^2 + a12 s1 s2 + a22 s2^2 + a66 t^2.
struct SquaresForm {
  double a11[2];
  double a22[2];
  double a12[2][2];
  double a66;
  bool hasProducts; ///< any a12 is not 0
};

/// The same for all signs, with b1 s1 + b2 s2: its utilisation u has u^2 = a + b u.
struct LinearForm {
  double a11, a12, a22, a66, b1, b2;
};

/// The greatest of |s1|/X, |s2|/Y, |t|/S by their inverses; 0 leaves one out.
struct RatiosForm {
  double along[2];
  double across[2];
  double shear;
};

/// |s1|/X + |s2|/Y + |t|/S by the inverses.
struct SumForm {
  double along[2];
  double across[2];
  double shear;
};

/// cos and sin of twice the tolerance of a line, 0 to 90 deg.
struct HalfBand {
  double cos2;
  double sin2;
};

// Each of these keeps, for every point of the lane, the square of the greatest utilisation so far in `best`
// and in `which` the number of what gave it; of equals the first, and for good what is not a number. Those
// with a band take the worst direction of it, exact: all that is asked depends on the direction by X, half of
// along less across, and a band of directions is an interval of X. A form is greatest at an end of it, where
// it stands still, or at a corner where a stress changes its sign.

void keepSquares(const double* state, const SquaresForm& form, double number, double* best, double* which);
void keepLinear(const double* state, const LinearForm& form, double number, double* best, double* which);
void keepRatios(const double* state, const RatiosForm& form, double number, double* best, double* which);
void keepSum(const double* state, const SumForm& form, double number, double* best, double* which);

void keepSquaresInBand(const double* state, const SquaresForm& form, const HalfBand& band, double number,
                       double* best, double* which);
void keepLinearInBand(const double* state, const LinearForm& form, const HalfBand& band, double number,
                      double* best, double* which);
void keepRatiosInBand(const double* state, const RatiosForm& form, const HalfBand& band, double number,
                      double* best, double* which);
void keepSumInBand(const double* state, const SumForm& form, const HalfBand& band, double number,
                   double* best, double* which);

/// Principal values, the greatest shear in the plane and the direction of the first in degrees, (-90, 90];
/// 0 where there is none.
void principalLane(const double* sx, const double* sy, const double* txy, double* s1, double* s2,
                   double* radius, double* theta1);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/check_inputs.h"
#include "core/words/problem.h"

namespace planewright {

/// A quantity of a check as the program computes it.
struct Quantity {
  double value = 0;
  bool isAngle = false; ///< compared modulo 180 deg
  double scale = 0;     ///< size of the terms behind it, against which own arithmetic is judged
};

/// Of a state of plane stress and an angle: sxp syp txyp s1 s2 tmax tabs savg thp1 thp2 ths txy.
Result<Quantity> quantityOfState(const CheckInputs& inputs, std::string_view word);

/// Of a section and its forces: A Iz Iy Wz Wpl ys J Wt S S_flange, and sx txy s1 s2 at a fibre. Inputs are
/// the shape and its sizes, N Vy Vz T My Mz, the fibre's y and z or "at" (bottom, junction: the highest one),
/// and its view. Lengths and forces may be in any units that belong together; `unit` names that of the
/// result, from which sizes in mm are known where it is another.
Result<Quantity> quantityOfSection(const CheckInputs& inputs, std::string_view word, std::string_view unit);

/// Of three gauges (a ea b eb c ec) or strains in axes (ex ey gxy, turned by theta), microstrain and degrees:
/// ex ey gxy e1 e2 e3 gabs thp1 thp2 exp_x exp_y gxpyp; with E in GPa and nu the stresses s1 s2 tmax in MPa.
Result<Quantity> quantityOfStrain(const CheckInputs& inputs, std::string_view word);

/// Of a state (or of sn and tnt on a plane) and strengths, by the inputs criterion, theta (of the line or the
/// plane's normal) and Xt Xc Yt Yc S, f, cohesion friction cutoff, fu beta_w gamma_M2: u, factor (the load
/// multiplier), sigma_eq (the utilisation times f). Any one unit of stress.
Result<Quantity> quantityOfStrength(const CheckInputs& inputs, std::string_view word);

/// Of a text as a user types it ("typed"), with its unit or as a slope: stress force length moment (in MPa,
/// N, mm and N mm), angle (of a line, deg).
Result<Quantity> quantityOfTyped(const CheckInputs& inputs, std::string_view word);

} // namespace planewright

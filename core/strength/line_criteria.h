// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/judge.h"

namespace planewright {

/// The strength along the line in tension (`pulls`) or compression: of timber that of the mix of axial and
/// bending parts of the demand where it has that sign.
Result<double> alongStrengthOf(const Strengths& strengths, const Demand& demand, bool pulls);
/// The strengths of a body with a line, or the Problem that names what is missing.
Result<LineStrengths> lineStrengthsOf(const Strengths& strengths, const Demand& demand);

/// What the shear strength counts with at a tapered edge in tension (`pulls`) or compression along it: EN
/// 1995-1-1, equations (6.39) and (6.40).
double taperShearFactor(bool pulls);

/// The parts of a criterion of the stresses in the line's axes.
Result<std::vector<Branch>> lineBranchesOf(Criterion criterion, const Strengths& strengths,
                                           const Parameters& parameters, const Demand& demand);

/// The parts of a criterion of the normal and shear stress on a plane.
Result<std::vector<Branch>> planeBranchesOf(Criterion criterion, const Strengths& strengths);

/// The three principal stresses of a demand, greatest first; what is only rounding of terms that cancel is
/// 0.
std::array<double, 3> principalsOf(const Demand& demand);
/// The equivalent stress of von Mises.
double misesOf(const std::array<double, 3>& principals);
/// The radius of a circle with the mean of the greatest and the least that touches the line of failure of
/// Mohr and Coulomb, `friction` in degrees.
double radiusAtFailure(double cohesion, double friction, const std::array<double, 3>& principals);
/// A criterion of the three principal stresses, which knows no direction.
Result<Judgement> judgementOfPrincipals(Criterion criterion, const Strengths& strengths,
                                        const Demand& demand);

/// The strength, or the Problem that says which one the criterion needs.
Result<double> needed(const Strengths& strengths, StrengthKey key);

} // namespace planewright

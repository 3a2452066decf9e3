// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"
#include "core/source/strain.h"
#include "core/stress/plane_stress.h"

#include <variant>

namespace planewright {

/// A material that is the same in all directions. E in MPa; -1 < nu <= 0.5.
struct Isotropic {
  double E = 0;
  double nu = 0;
  double G() const { return E / (2 * (1 + nu)); }
};

/// A material with a line: E along and across it, Poisson's ratio nu12 (contraction across it when stressed
/// along it), shear modulus G; MPa. nu12^2 < E_along/E_across, or the material would give energy away.
struct Orthotropic {
  double along = 0;
  double across = 0;
  double nu12 = 0;
  double G = 0;
  Angle line;
  double nu21() const { return nu12 * across / along; }
};

using Elastic = std::variant<Isotropic, Orthotropic>;

/// Everything that keeps the constants from being a material; each place is the key of one.
Problems problemsOf(const Elastic& elastic);

/// Plane stress of a strained surface. Isotropic: sx = E/(1-nu^2) (ex + nu ey), txy = G gxy (Hooke's law).
/// Orthotropic: the strains in the axes of the line, the reduced stiffnesses Q11 = E_along/(1 - nu12 nu21),
/// Q12 = nu12 E_across/(1 - nu12 nu21), Q22 = E_across/(1 - nu12 nu21), Q66 = G, and the stresses turned
/// back. Common practice, no source.
PlaneStress stressOf(const PlaneStrain& strain, const Elastic& elastic);

} // namespace planewright

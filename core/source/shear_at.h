// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/cut_properties.h"
#include "core/source/fibre.h"

namespace planewright {

/// d(sx)/dx = y' y + z' z per unit length, from the shear forces and equilibrium of moments.
struct Gradient {
  double y = 0;
  double z = 0;
  bool isZero() const { return y == 0 && z == 0; }
};
/// y' = (Vy Iy - Vz Iyz)/D, z' = (Vz Iz - Vy Iyz)/D, D = Iy Iz - Iyz^2, Vy upwards on the +x face.
Gradient gradientOf(const SectionProperties& properties, double VyUpwards, double Vz);

/// How the shear of V at a fibre follows.
enum class ShearPath {
  none,     ///< no V
  freeEdge, ///< the fibre lies on a free edge across the shear: 0
  wall,     ///< V S/(I b) of the cut through the fibre's wall
  mean,     ///< V S/(I b) of the cut through all walls of a closed section
  tabled    ///< V S/(I b) of tabled values
};

/// Shear of V at a fibre, positive towards +y seen from the side and towards +z seen from the top.
struct ShearOfV {
  double value = 0;
  ShearPath path = ShearPath::none;
  Cut cut;
  /// In a straight wall of a closed section with two axes of symmetry, wall middle at w_m: the force across
  /// the view shears the wall as well, by -(d(sx)/dx at w_m) v, since the strip from -v to v balances itself.
  double alongWall = 0;
  double wallMiddle = 0;
  std::vector<Text> cautions;
};
/// The fibre must lie in the section.
Result<ShearOfV> shearAt(const SectionModel& model, const Gradient& gradient, const Fibre& fibre);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/fibre.h"
#include "core/source/rectangle_torsion.h"

namespace planewright {

/// Which theory gives the shear of torsion.
enum class TorsionRule {
  circular,  ///< solid or hollow circle: T r/J, exact
  closed,    ///< thin closed wall: T/(2 A_m t) (Bredt)
  open,      ///< thin open walls: J = sum b t^3/3, T t/J at the faces of a wall, approximate
  rectangle, ///< solid rectangle: Saint-Venant's series
  tabled     ///< T r/J with a given J
};

struct TorsionConstant {
  TorsionRule rule = TorsionRule::circular;
  double J = 0;                 ///< mm^4
  double cell = 0;              ///< A_m, the area inside the middle line, of `closed`
  RectangleTorsion ofRectangle; ///< of `rectangle`
};
/// J of a section. A Problem where no theory here gives it: blocks that are turned or enclose a cell, a
/// tabled section without J.
Result<TorsionConstant> torsionConstantOf(const SectionModel& model);

/// The shear of torsion at a fibre, in the axes of its view, T right-handed about +x: on the face that looks
/// at the viewer txy = -T r/J, on the one that looks away +.
struct TorsionShear {
  TorsionConstant constant;
  double txy = 0;
  double at = 0;   ///< distance from the axis, or from the middle of an open wall, towards the viewer; mm
  double wall = 0; ///< thickness of the wall, mm
  double c = 0;    ///< coefficient of the rectangle: T/(c a t^2); 0 at its corners
  std::vector<Text> cautions;
};
/// A Problem where theory gives no shear here, or one that does not lie in the plane of the view.
Result<TorsionShear> torsionAt(const SectionModel& model, double T, const Fibre& fibre);

} // namespace planewright

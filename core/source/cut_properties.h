// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/region.h"

namespace planewright {

/// What V S/(I b) needs of a level cut, about axes through the centroid. The part beyond is the one above.
/// Of transposed(region) the same is an upright cut: y and z change their roles, and beyond is to the right.
struct Cut {
  double S = 0;      ///< of y dA over the part beyond, mm^3; exactly 0 at the extreme fibres
  double across = 0; ///< of z dA over the part beyond, mm^3; 0 where the section is its own mirror image
  double area = 0;   ///< of the part beyond, mm^2
  double width = 0;  ///< b: of the material that is cut, mm; at a junction on its thinner side
  double wider = 0;  ///< at a junction: the width on its other side; else equal to width
  int walls = 0;     ///< stretches of material that the line cuts

  bool isAtJunction() const { return wider != width; }
};

/// The cut along the whole line at the height y, through every wall that it meets.
Cut cutAt(const Region& region, double y);

/// The cut at the height y through the one wall that holds z. The part beyond is what this cut alone takes
/// off. None where it takes nothing off, because the section is closed, or where there is no material.
std::optional<Cut> wallCutAt(const Region& region, double y, double z);

} // namespace planewright

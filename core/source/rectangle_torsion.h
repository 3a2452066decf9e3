// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace planewright {

/// Torsion of a solid rectangle with the sides a >= t: J = c2 a t^3, and the shear at the middle of the long
/// sides T/(c1 a t^2), at the middle of the short sides T/(c3 a t^2); 0 at the corners.
struct RectangleTorsion {
  double c1 = 0;
  double c2 = 0;
  double c3 = 0;
};

/// By Saint-Venant's series (from memory), summed to full accuracy: relative error below 1e-14. The tables of
/// handbooks print three digits of the same numbers. `ratio` is a/t >= 1.
RectangleTorsion rectangleTorsion(double ratio);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"

namespace planewright {

/// From where the plane of stress at a fibre is seen. From the side: the x-y plane, seen from +z. From the
/// top: the x-z plane, seen from +y, with x to the right and -z as its second axis, so that counter-clockwise
/// angles stay counter-clockwise.
enum class View { side, top };

/// The sense of V. Upward: V_y is positive in +y on the +x face, so txy = +V S/(I b) and dM_z/dx = -V_y.
/// Slope: V_y = dM_z/dx, so txy = -V S/(I b). V_z is positive in +z on the +x face by either rule, since
/// with the signs of M_y that is dM_y/dx already.
enum class ShearRule { upward, slope };

template <>
const std::vector<Named<View>>& namesOf<View>();
template <>
const std::vector<Named<ShearRule>>& namesOf<ShearRule>();

} // namespace planewright

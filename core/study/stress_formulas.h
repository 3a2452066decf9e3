// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/working/formula.h"

namespace planewright {

/// sn on the plane with normal at `angle`, from σ_{x}, σ_{y} and τ_{xy}; `turned` +1 for that plane, -1 for
/// the one at right angles to it.
Formula normalStressAt(const Formula& angle, int turned = 1);
/// tnt on the plane with normal at `angle`.
Formula shearStressAt(const Formula& angle);

} // namespace planewright

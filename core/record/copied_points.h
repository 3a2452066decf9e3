// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

namespace planewright {

/// The stresses of points as a table: point, note, case, sx, sy, txy, sz and, where a case of theirs has
/// section forces, N to M_z; texts as they are typed, cells parted by tabs for the clipboard or commas for a
/// file. A point without stresses has a row of its own. What is pasted from it is what was copied; pressure
/// and measured strains are not in it.
std::string copiedPoints(const std::vector<Point>& points, char separator);

} // namespace planewright

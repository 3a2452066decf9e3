// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/text.h"

namespace planewright {

/// Points as a table: point, note, case, sx, sy, txy, sz and, where one of them has any, the columns of
/// fibres, section forces, pressure, measured strains and of the first line, where it is not the one that a
/// new point gets; texts as they are typed, cells parted by tabs for the clipboard or commas for a file. A
/// point without stresses has a row of its own. What is pasted from it is what was copied, into a study that
/// has the sections.
std::string copiedPoints(const std::vector<Point>& points, char separator);

/// What these points have and their table does not, each as a name: "watched planes".
std::vector<Text> leftOutOf(const std::vector<Point>& points);

} // namespace planewright

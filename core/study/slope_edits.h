// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"
#include "core/study/edit.h"

namespace planewright {

/// A slope whose sense is not known: the tolerance of the line to either side of the angle that it has.
Edits withinEitherWay(const std::string& point, const std::string& line, const std::string& slope);

/// The true slope of a grain seen on two faces at right angles, from two texts that a line's angle takes
/// ("1 in 12", "4 deg"); a Problem whose place is "a" or "b" where one does not read.
Result<Angle> trueSlopeOf(std::string_view a, std::string_view b);

/// A slope as a short text of a tolerance, "6.0915 deg": degrees rounded upwards to four decimals.
std::string toleranceText(Angle slope);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"
#include "core/study/readout.h"

namespace planewright {

/// An angle as the study keeps one that was not typed: "-60 deg", read back as the same double.
std::string angleText(Angle angle);

/// The text of a plane's normal for the direction in which its cut runs: an angle or, as for a line, a slope.
/// "30 deg" gives "-60 deg"; the Problem when the text does not read.
Result<std::string> normalTextForCut(std::string_view cut);

/// The direction in which the cut of a plane runs, as it would have been typed: theta + 90 deg, folded.
std::string cutText(NormalAngle normal);

} // namespace planewright

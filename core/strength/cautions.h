// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/band.h"

namespace planewright {

/// What must be said beside a verdict of this criterion on this material: where the criterion is known to
/// reassure, what was assumed. `band`: the directions that the line may have, for the taper of an edge.
std::vector<Text> cautionsOf(Criterion criterion, const Strengths& strengths, const Parameters& parameters,
                             const std::optional<Band>& band);

/// What tension across the line asks to be said: the volume factor of timber.
std::optional<Text> cautionOfTensionAcross(MaterialKind kind);

/// What a check of the stress at a point does not see, for materials of this kind; the first is the shortest
/// and stands with every verdict. Each names its source.
std::vector<Text> limitsOfPointChecks(MaterialKind kind);
/// The shortest of them for many points.
Text limitOfAllPoints();

} // namespace planewright

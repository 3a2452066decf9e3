// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/problem.h"

namespace planewright {

/// What keeps the sections, fibres and sources of a study from giving stresses, where all else is sound:
/// sizes that are no section, a fibre outside it, forces whose shear theory does not give there, walls and
/// materials that cannot be. Each with the path of its place; no more than the first 100.
Problems brokenSources(const Study& study);
/// The same, looking only at what differs from a study that is valid.
Problems brokenSources(const Study& study, const Study& valid);

} // namespace planewright

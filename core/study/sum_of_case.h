// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/case_sources.h"

namespace planewright {

/// From what makes a case to its stresses at the point, in the sign convention of the study: the typed
/// stresses and the sum of each source, for each component that has any. Empty where the working of one
/// source ends with the stresses of the case already: with tension positive and nothing typed.
std::vector<Step> sumOfCase(const Study& study, const CaseStress& stress,
                            const std::vector<NamedContribution>& sources);

} // namespace planewright

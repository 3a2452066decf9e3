// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section_forces.h"

namespace planewright {

/// The working of the stress at a fibre: N/A, bending, first moment and V S/(I b), torsion, their sums.
std::vector<Step> stepsOf(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                          ShearRule rule, const FibreStress& stress, const WrittenUnits& units);

/// What the signs of the forces that act mean, and of the view.
std::vector<Text> signRulesOf(const SectionForces& forces, const Fibre& fibre, ShearRule rule);

} // namespace planewright

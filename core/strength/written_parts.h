// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/written_criterion.h"

namespace planewright {

/// The parts of written_criterion by what a criterion is a function of.
void addLineUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);
void addUniaxialUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);
void addPlaneUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);
void addPrincipalUtilisation(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);

/// Closed forms of criteria whose utilisation is not proportional to the load.
void addCoulombMultiplier(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);
void addMohrCoulombMultiplier(const WrittenCriterion& at, CheckSteps& steps, WrittenStrengths& strengths);

/// The step of the utilisation itself.
void addUtilisationStep(const WrittenCriterion& at, CheckSteps& steps, const Formula& formula);
void addMultiplierStep(const WrittenCriterion& at, CheckSteps& steps, const Formula& formula);

} // namespace planewright

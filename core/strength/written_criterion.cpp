// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/written_criterion.h"

#include "core/strength/written_parts.h"

#include <cmath>

namespace planewright {

bool hasAngleForm(Criterion criterion) {
  return criterion == Criterion::hankinson || criterion == Criterion::compressionAtAngle;
}

bool isOfUniaxialStress(Criterion criterion) {
  return hasAngleForm(criterion) || criterion == Criterion::taperedEdge;
}

bool hasMixedStrength(Criterion criterion) {
  return rowOf(criterion).actsOn == ActsOn::line && criterion != Criterion::compressionAtAngle &&
         criterion != Criterion::taperedEdge;
}

void addUtilisationStep(const WrittenCriterion& at, CheckSteps& steps, const Formula& formula) {
  steps.add({PW_TEXT("Working", "utilisation"), "u", formula, at.judgement.utilisation, dimension::none,
             rowOf(at.criterion).source});
}

void addMultiplierStep(const WrittenCriterion& at, CheckSteps& steps, const Formula& formula) {
  steps.add({PW_TEXT("Working", "multiplier on all loads that reaches the limit"), "R", formula,
             *at.judgement.multiplier, dimension::none,
             at.criterion == Criterion::mohrCoulomb || at.criterion == Criterion::coulomb
                 ? rowOf(at.criterion).source
                 : PW_TEXT("Working", "the utilisation is proportional to the loads")});
}

void WrittenCriterion::addUtilisation(CheckSteps& steps, WrittenStrengths& strengths) const {
  switch (rowOf(criterion).actsOn) {
  case ActsOn::line:
    return isOfUniaxialStress(criterion) ? addUniaxialUtilisation(*this, steps, strengths)
                                         : addLineUtilisation(*this, steps, strengths);
  case ActsOn::plane:
    return addPlaneUtilisation(*this, steps, strengths);
  case ActsOn::principal:
    return addPrincipalUtilisation(*this, steps, strengths);
  }
}

void WrittenCriterion::addMultiplier(CheckSteps& steps, WrittenStrengths& strengths) const {
  if (!judgement.multiplier)
    return;
  if (criterion == Criterion::coulomb)
    return addCoulombMultiplier(*this, steps, strengths);
  if (criterion == Criterion::mohrCoulomb)
    return addMohrCoulombMultiplier(*this, steps, strengths);
  addMultiplierStep(*this, steps, 1 / Formula::symbol("u"));
}

} // namespace planewright

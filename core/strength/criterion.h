// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/strength_key.h"

namespace planewright {

/// How strengths interact; the words of `namesOf` stand in files.
enum class Criterion {
  maximumStress,
  hankinson,
  sumOfSquares,
  norrisPlane,
  norrisThreePlane,
  azziTsai,
  azziTsaiTwoSign,
  hoffman,
  tsaiWu,
  linearSum,
  compressionAtAngle,
  taperedEdge,
  vonMises,
  tresca,
  rankine,
  mohrCoulomb,
  coulomb,
  throat,
  bond
};
template <>
const std::vector<Named<Criterion>>& namesOf<Criterion>();

/// What a criterion is a function of.
enum class ActsOn { line, plane, principal };

/// What is published of a criterion. 1 = along the line, 2 = across it, t = shear in those axes, X and Y the
/// strengths along and across by the sign of the stress.
struct CriterionRow {
  Criterion criterion;
  ActsOn actsOn;
  const char* equation; ///< the limit, in symbols of the trade
  Text domain;          ///< what it is meant for; empty: any state of plane stress
  Text source;
};
const CriterionRow& rowOf(Criterion criterion);

/// Whether a criterion can judge a material of this kind.
bool applies(Criterion criterion, MaterialKind kind);
/// All that can, the usual one of the kind first.
std::vector<Criterion> criteriaFor(MaterialKind kind);

} // namespace planewright

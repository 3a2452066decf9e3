// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/contribution.h"
#include "core/source/written_units.h"
#include "core/words/problem.h"

namespace planewright {

/// A thin-walled cylinder under pressure, its axis along x.
struct Vessel {
  double pressure = 0;    ///< inside over outside, MPa; negative from outside
  double innerRadius = 0; ///< mm
  double thickness = 0;   ///< mm
  bool closedEnds = true;
};

/// Hoop stress sy = p r/t and, with closed ends, axial stress sx = p r/(2 t), r the inner radius.
/// A mean over the wall: below r/t = 10 a caution tells how much more the inner face has by Lame's thick
/// wall. Formulas and inner radius: Lord, Richardson, Davison, Dillard: Strength of Materials (2026), chapter
/// 13; the limit r/t = 10: common practice, no source; Lame's formula: common practice, no source.
Results<Contribution> contributionOf(const Vessel& vessel, const WrittenUnits& units = {});

} // namespace planewright

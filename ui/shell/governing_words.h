// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/governing.h"
#include "ui/desk/desk.h"
#include "ui/shell/filter_list.h"

namespace planewright {

/// By what a state governs its point, in a few words and in a sentence; empty where it does not. Where
/// something is checked that is the utilisation, else the greatest stresses.
QString governsBriefly(const Readout& readout, std::size_t state);
QString governsInWords(const Readout& readout, std::size_t state);

/// What stands behind the names of the combinations: the utilisation where something is checked, else the
/// normal stress on the reading plane, and which govern.
ListDetails combinationDetails(const Study& study, const Readout& readout);

/// What stands behind the names of the points: the worst utilisation of each and its combination. Nothing
/// where no point is checked.
ListDetails pointDetails(const Study& study);

/// Shows the combination that governs the shown point: by its utilisation, or where nothing is checked by the
/// greatest s1 and, where that is shown already, by the greatest shear in the plane.
void showGoverningCombination(Desk& desk);
/// The same over all points of the study, with the point.
void showGoverningPoint(Desk& desk);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/governing.h"
#include "ui/desk/desk.h"
#include "ui/shell/filter_list.h"

namespace planewright {

/// By what a combination governs its point, in a few words and in a sentence; empty where it does not.
QString governsBriefly(const Governs& governs);
QString governsInWords(const Governs& governs);

/// What stands behind the names of the combinations: the normal stress on the reading plane, and which
/// govern.
ListDetails combinationDetails(const Study& study, const Readout& readout);

/// Shows the combination that governs the shown point: by the greatest s1, or where that is shown already by
/// the greatest shear in the plane.
void showGoverningCombination(Desk& desk);
/// The same over all points of the study, with the point.
void showGoverningPoint(Desk& desk);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/table/table.h"
#include "ui/desk/desk.h"

namespace planewright {

/// Brings the reading plane to the plane of a row; says so where every direction is one.
void bringReadingTo(Desk& desk, const Table& table, int row);

/// Shows the combination that gives a value: no undo step.
void showCombination(Desk& desk, const QString& combination);

} // namespace planewright

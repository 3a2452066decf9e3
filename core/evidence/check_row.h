// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"

namespace planewright {

/// Whether the row names the columns of a file of checks.
bool isHeading(std::string_view row);

/// Reads one row; what it computes and whether that agrees is left open.
Result<CheckResult> readCheckRow(std::string_view row);

} // namespace planewright

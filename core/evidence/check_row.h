// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"
#include "core/stress/plane_stress.h"

#include <optional>

namespace planewright {

/// A row of a file of checks, read but not yet computed.
struct CheckRow {
  CheckResult result;
  PlaneStress stress;
  std::optional<Angle> theta;
};

/// Whether the row names the columns of a file of checks.
bool isHeading(std::string_view row);

/// Reads one row. Its inputs are pieces "name=number" between semicolons; a piece without "=" is a remark.
/// Where s1 is given in place of txy, txy = sqrt((s1 - sx)(s1 - sy)), from s1 as a root of
/// (s - sx)(s - sy) = txy^2 (common practice, no source).
Result<CheckRow> readCheckRow(std::string_view row);

} // namespace planewright

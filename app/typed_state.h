// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/arguments.h"
#include "core/study/readout.h"

namespace planewright {

/// Why components and a study cannot stand together in these arguments, or neither is there; none when
/// exactly one of them is.
std::optional<Problem> problemOfMixing(const Arguments& arguments);

/// The study that --sx, --sy, --txy, --sz and --positive stand for: one point P1 with one case "typed", in
/// MPa, kN, mm, deg.
Result<Study> typedStudy(const Arguments& arguments);

/// The planes and lines of --normal, --line and --tolerance, named "normal 1", "line 1" in their order.
Result<Extras> extrasOf(const Arguments& arguments);

} // namespace planewright

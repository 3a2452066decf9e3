// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/principals.h"
#include "core/study/study.h"

#include <functional>

namespace planewright {

/// Takes the next piece of what is written; false where there is no more room, or nobody who waits for it.
using Sink = std::function<bool(std::string_view bytes)>;

/// The results of a field as CSV, a row for each judged point in the order of the field, or only `points` in
/// theirs: point, layer where the field has it, utilisation, load_multiplier, combination, check, mode,
/// worst_angle; then s1, s2 and theta1 of that combination in the study's unit and sign where `principals`
/// are given, theta1 from the point's own x axis. Numbers have at most 12 significant digits, angles (deg) at
/// most 6 decimals: what is left out is no longer told by the field, and so every level of processors prints
/// the same. Utilisations without a finite number are inf; no multiplier and no mode are empty cells.
///
/// Written by a buffer that is used again. False where the sink took no more.
bool writeFieldCsv(const Study& study, const ScreenPlan& plan, const Field& field,
                   const FieldResults& results, const Sink& sink,
                   const std::vector<std::uint32_t>* points = nullptr,
                   const FieldPrincipals* principals = nullptr);

} // namespace planewright

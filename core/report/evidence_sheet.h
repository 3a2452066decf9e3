// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"
#include "core/report/sheet.h"

namespace planewright {

/// What an office files as its evidence for using the program: how many published values it meets, counted by
/// how far each can be trusted (values from memory and own arithmetic are no outside evidence and are counted
/// apart); what disagrees; every value with inputs, printed and computed value, difference, tolerance; known
/// misprints of the sources. `platform` says what it ran on.
Sheet evidenceSheet(const std::vector<CheckResult>& checks, const std::string& platform);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/stress_form.h"

namespace planewright {

/// "of σ_{x} (MPa): typed 1.00, axial 1.94, bending 29.67": what the normal stress on the x face is made of,
/// as window and text write it. Empty where nothing of it is axial or bending, nor some typed and some
/// measured.
Text partsOfSx(const StressForm& form, const CaseReading& reading);
Text partsOfSx(const StressForm& form, const StateReading& reading);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

namespace planewright {

/// The invented study that the program carries to show itself with.
const Study& workedExample();
/// True for that study, whatever of it is shown.
bool isWorkedExample(const Study& study);

} // namespace planewright

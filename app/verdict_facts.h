// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"
#include "core/study/readout.h"

namespace planewright {

/// One line for each check of a point that exceeds, or that could not be judged, and the exit that says so.
void addVerdict(Delivery& delivery, const std::vector<Readout>& points);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

namespace planewright {

/// Every place of a study that holds a typed text, in the order of the file.
std::vector<Place> typedPlacesIn(const Study& study);

} // namespace planewright

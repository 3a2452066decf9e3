// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

namespace planewright {

/// Every place of a study that holds a typed text, in the order of the file.
std::vector<Place> typedPlacesIn(const Study& study);
/// Those of one case, combination, material, section or point alone.
std::vector<Place> typedPlacesIn(const LoadCase& loadCase);
std::vector<Place> typedPlacesIn(const Combination& combination);
std::vector<Place> typedPlacesIn(const Material& material);
std::vector<Place> typedPlacesIn(const TypedSection& section);
std::vector<Place> typedPlacesIn(const Point& point);
/// Those before and behind the lists.
std::vector<Place> typedPlacesInHead();
std::vector<Place> typedPlacesInFoot();

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field.h"

namespace planewright {

/// The points of a field with this name or in this region are left out; a name that ends with "*" stands for
/// all that begin so. Gives how many points it meets, also those that are left out already.
std::size_t leaveOut(Field& field, std::string_view name);

/// The points with these names are left out, in all their layers. Gives the names that no point has.
std::vector<std::string> leaveOutListed(Field& field, std::vector<std::string> names);

} // namespace planewright

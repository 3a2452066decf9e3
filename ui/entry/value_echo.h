// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

#include <QString>

namespace planewright {

/// The value of a typed text in the unit of its field, "8.611 MPa"; nothing where the text says it already or
/// does not read.
QString echoOfValue(const Study& study, const Place& place, const std::string& typed);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

#include <span>

namespace planewright {

/// `screen`: the points of a table judged by the checks of one point of a study. It writes its file itself,
/// piece by piece; what it delivers is the summary for standard error.
Outcome<Delivery> screenedField(std::span<const std::string> words);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

#include <span>

namespace planewright {

/// `resolve`: everything that follows from a study, or from three components.
Outcome<Delivery> resolved(std::span<const std::string> words);

} // namespace planewright

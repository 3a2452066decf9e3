// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

#include <span>

namespace planewright {

/// `compare`: what changed from one study to another, as text.
Outcome<Delivery> comparedStudies(std::span<const std::string> words);

} // namespace planewright

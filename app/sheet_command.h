// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

#include <span>

namespace planewright {

/// `sheet`: the calculation sheet of a study as PDF or HTML.
Outcome<Delivery> writtenSheet(std::span<const std::string> words);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

#include <span>

namespace planewright {

/// `manual`: the handbook as HTML in a folder.
Outcome<Delivery> writtenManual(std::span<const std::string> words);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

namespace planewright {

/// `validate`: every shipped published value, recomputed.
Outcome<Delivery> validated(std::span<const std::string> words);

} // namespace planewright

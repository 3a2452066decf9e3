// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// A picture of 90 mm by 60 mm that holds every kind of part, with & and < in its texts.
Picture samplePicture();

} // namespace planewright

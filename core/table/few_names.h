// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <vector>

namespace planewright {

/// "A, B, C", or of more than three the first three and "and 4 more".
Text fewOf(const std::vector<std::string>& names);

} // namespace planewright

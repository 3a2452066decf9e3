// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"
#include "core/working/formula.h"

namespace planewright {

/// The formula on one line, in its symbols: "(σ_{x} + σ_{y})/2".
Text written(const Formula& formula);
/// The formula on one line with the numbers put in for its symbols: "(8.40 + (−0.60))/2".
Text written(const Formula& formula, const NumbersPutIn& numbers);

} // namespace planewright

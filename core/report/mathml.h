// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/working/formula.h"

#include <string>

namespace planewright {

/// The formula as one <math> element of MathML Core (W3C), for browsers; without numbers in symbols.
std::string mathml(const Formula& formula, const NumbersPutIn* numbers = nullptr);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/decimal_sign.h"

namespace planewright {

/// The decimal sign of figures and sheets, as the user chose it; the point without a choice.
DecimalSign chosenDecimalSign();
void chooseDecimalSign(DecimalSign sign);

} // namespace planewright

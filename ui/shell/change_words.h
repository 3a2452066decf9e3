// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

#include <QString>

namespace planewright {

/// "angle of the line now 7.4 deg, was 1 in 10": what changed, when it is one typed text; else empty. Which
/// point is shown does not count.
QString changeInWords(const Study& before, const Study& after);

} // namespace planewright

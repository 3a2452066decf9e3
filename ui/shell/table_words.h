// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

#include <QString>

namespace planewright {

/// " Not in the table: watched planes." behind what is said of a table of these points; empty where all of
/// them is in it.
QString leftOutInWords(const std::vector<Point>& points);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"

#include <string>

namespace planewright {

/// Shortest decimal text that reads back as `value`, at most 15 significant digits, ASCII, never "-0".
/// For files, csv, json and typed texts: it contains no thousands sign and always a decimal point.
std::string exactNumber(double value);

/// `value` with a fixed count of decimals for people: U+2212 for minus, never "-0.00".
/// From 1e15 upwards (and for counts outside 0..15) the form is 1.234e+20.
std::string shownNumber(double value, int decimals);

/// Count of decimals that gives `largest` four significant digits: 8.4 gives 3, 84 gives 2, 8400 gives 0;
/// at most 12. Zero gives 3.
int decimalsFor(double largest, int significant = 4);

/// "5.71°", with U+2212.
std::string shownDegrees(Angle angle, int decimals);

/// The nearest "1 in n" of an angle with at most three significant digits in n ("1 in 10", "−1 in 8"); empty
/// for 0 and beyond 45 deg.
std::string shownSlope(Angle angle);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"

#include <string>

namespace planewright {

/// `value` for reported results (csv, json, clipboard): its shortest decimal text, of more than 15
/// significant digits the nearest with 15, so that what is read back differs by 5e-15 of it at most. ASCII,
/// never "-0", no thousands sign.
std::string exactNumber(double value);

/// The shortest decimal text that reads back as the same double, up to 17 digits, written likewise: for
/// numbers that become typed texts of a study.
std::string shortestNumber(double value);

/// `value` with a fixed count of decimals for people: U+2212 for minus, never "-0.00", the decimal sign as
/// WritesDecimals has it.
/// From 1e15 upwards and for counts outside 0..15 the form is 1.234e+20; with more than 15 decimals what
/// rounds to nothing is "0".
std::string shownNumber(double value, int decimals);

/// Count of decimals that gives `largest` four significant digits: 8.4 gives 3, 84 gives 2, 8400 gives 0.
/// Where that needs more than 12 the count is above 15, for which shownNumber writes the power of ten. Zero
/// gives 3.
int decimalsFor(double largest, int significant = 4);

/// "5.71°", with U+2212.
std::string shownDegrees(Angle angle, int decimals);

/// The nearest "1 in n" of an angle with at most three significant digits in n ("1 in 10", "−1 in 8"); empty
/// for 0 and beyond 45 deg.
std::string shownSlope(Angle angle);

} // namespace planewright

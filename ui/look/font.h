// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QFont>

namespace planewright {

inline constexpr auto programFamily = "Liberation Sans";

/// Makes the embedded Liberation Sans known to Qt; false when it does not load (then no picture can be made
/// and the program stops with a message).
bool loadProgramFont();

/// The program's own font, kerning off so that widths are those of core's metrics. `pixels` is the em.
QFont programFont(double pixels, bool bold = false);

} // namespace planewright

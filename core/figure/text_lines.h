// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

namespace planewright {

/// The text broken at its spaces into lines of at most `width`, measured as set in `size`. A single word that
/// is wider is broken inside. Spaces at breaks vanish; no line is empty.
std::vector<Runs> brokenLines(const Runs& text, double width, double size, bool bold);

/// The text when it is at most `width` wide, else its longest beginning with "…" behind it.
Runs elided(const Runs& text, double width, double size, bool bold);

} // namespace planewright

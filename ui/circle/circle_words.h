// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/round.h"

namespace planewright {

/// The words round the circle: titles of the axes with the unit, which end is compression and which tension,
/// which sense of shear each half stands for, where 0 is when it is not in view, and what a state without a
/// circle means. `extent` is the size of the widget; `note` stands at the right of the top row.
Picture wordsLayer(const Stage& stage, QSizeF extent, const Text& note);

/// What a reading plane that snapped stands on: "on σ1", with every name where several coincide.
Text snapNote(const std::vector<Text>& on);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/marks.h"

namespace planewright {

/// A sign on a drawing.
struct PlacedSign {
  Sign sign = Sign::filledRound;
  Role role = Role::ink;
  Vec at;
  double size = 0;
  double stroke = 0.25;
};

/// Makes signs that others hide larger until 60 % of their outline is seen, at most three times their size.
/// Later signs lie over earlier ones. Like signs do not count as hiding each other.
void showHidden(std::vector<PlacedSign>& signs);

/// Draws a sign: filled in its role or hollow on canvas.
void drawSign(Picture& picture, const PlacedSign& sign);

} // namespace planewright

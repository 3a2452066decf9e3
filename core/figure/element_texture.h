// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element_frame.h"
#include "core/study/kinds.h"

namespace planewright {

/// The texture of a line's kind inside the square whose x' face looks to `square`. It is fixed to the line's
/// direction and never turns with the square; turned by 180 deg it is the same, as a line has no direction.
/// Grain: broken strokes; fibre: even lines; weld: one line with cross ticks; bond: a double line.
void drawTexture(Picture& picture, const ElementFrame& frame, LineKind kind, Angle line, Angle square,
                 const Pen& pen);

} // namespace planewright

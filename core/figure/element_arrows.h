// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element_frame.h"
#include "core/stress/plane_stress.h"

#include <array>

namespace planewright {

/// What acts on the four faces of an element, in drawn lengths as parts of R: positive `normal` leaves the
/// face, positive `shear` runs to the left of the outward normal. 0 is no arrow.
struct FaceArrows {
  double normal = 0;
  double shear = 0;
};
/// Faces at `first`, first + 90 deg; the opposite ones carry the same as seen from outside.
struct ElementArrows {
  Angle first;
  std::array<FaceArrows, 2> faces;
};

enum class ArrowHead { filled, open };

/// The arrows on all four faces: normal ones beyond the shear ones, which are half-headed.
void drawArrows(Picture& picture, const ElementFrame& frame, const ElementArrows& arrows, const Pen& pen,
                ArrowHead head);

/// Outer end of the normal arrow and head's tip of the shear arrow of a face, or where they would begin.
double normalEnd(const FaceArrows& face);

} // namespace planewright

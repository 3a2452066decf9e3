// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/fibre_of_state.h"
#include "core/study/stress_form.h"

namespace planewright {

/// How a drawing of a section lies on the sheet: seen in the direction of +x, y up, z to the right.
struct SectionFrame {
  Vec centroid;
  double scale = 1; ///< units of the drawing for a mm

  Vec at(const SectionPoint& place) const {
    return {centroid.x + scale * place.z, centroid.y - scale * place.y};
  }
  SectionPoint placeAt(Vec at) const { return {(centroid.y - at.y) / scale, (at.x - centroid.x) / scale}; }
};

struct SectionDrawing {
  Picture picture;
  SectionFrame frame;
};

/// The outline of a section with its axes and the mark of the fibre, and beside it (below it for a fibre seen
/// from the top) how sx and txy of the section forces run through it along the second axis of the view.
/// Stresses are written in this form, in the study's sign; `size` is that of the text. Tabled values have
/// no outline, and a drawing with less than 60 in a side shows none: none.
std::optional<SectionDrawing> drawnSection(const LoadedSection& section, const StressForm& stresses,
                                           double width, double height, double size);

} // namespace planewright

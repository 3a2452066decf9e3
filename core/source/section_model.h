// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section_properties.h"

namespace planewright {

/// A section with all that its fibres share, worked out once.
struct SectionModel {
  Section section;
  Region region;                ///< empty for tabled values
  Region transposed;            ///< the same seen from the top: its levels are upright lines
  SectionProperties properties; ///< not of tabled values
  bool isMirroredAboutY = false;
  bool isMirroredAboutZ = false;

  bool isTabled() const { return section.shape == SectionShape::tabled; }
};

/// The model, or everything that keeps the sizes from being a section.
Results<SectionModel> modelOf(const Section& section);

} // namespace planewright

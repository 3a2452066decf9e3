// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section_model.h"
#include "core/source/view.h"

namespace planewright {

/// A place in a section relative to its centroid, in mm, and the face that is looked at.
struct Fibre {
  double y = 0; ///< up
  double z = 0; ///< towards the viewer of the side
  View view = View::side;
  bool operator==(const Fibre&) const = default;
};

/// A place that is looked at often, with its name.
struct NamedFibre {
  Text name;
  Fibre fibre;
};
/// The ready places of a section: extreme fibres, axis, junctions of webs and flanges, middle of walls; those
/// seen from the side first, from the top down. None of a tabled section, whose fibre its values mean.
std::vector<NamedFibre> readyFibres(const SectionModel& model);

} // namespace planewright

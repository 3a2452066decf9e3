// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/fibre.h"

namespace planewright {

/// A section as the view of a fibre has it: its levels run along the line of sight, so that the height v is
/// the fibre's place along the second axis of the plane that is seen, w its place towards the viewer.
struct Seen {
  Seen(const SectionModel& model, const Fibre& fibre)
      : view(fibre.view), region(view == View::side ? model.region : model.transposed),
        v(view == View::side ? fibre.y : fibre.z), w(view == View::side ? fibre.z : fibre.y) {}

  View view;
  const Region& region;
  double v;
  double w;

  double slack() const { return region.slack(); }
};

} // namespace planewright

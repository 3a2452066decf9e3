// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/plane_stress.h"

namespace planewright {

/// What the stresses leave on an edge that carries nothing: the traction on the cut that runs along the edge.
/// Both parts are 0 where the stresses belong to a free edge in that direction; anything else points to a
/// wrong sign, a wrong fibre or a force that was forgotten.
struct FreeEdge {
  Traction traction; ///< on the plane with normal at right angles to the edge
  double scale = 0;  ///< greatest |stress| on any plane of the state, to measure the traction by
  /// The traction over the scale, as parts of 1; 0 for a state of zero.
  double share() const;
  bool operator==(const FreeEdge&) const = default;
};

/// `edge` is the direction of the edge in the plane of stress.
FreeEdge freeEdgeOf(const PlaneStress& stress, LineAngle edge);

} // namespace planewright

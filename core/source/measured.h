// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/contribution.h"
#include "core/source/elastic.h"
#include "core/source/written_units.h"

namespace planewright {

/// What a rosette on the surface says of the stress there: its strains, principal strains and stresses with
/// their working.
struct Measured {
  RosetteSolution solution;
  PrincipalStrains principal;
  Contribution contribution;
};

/// Gauges more sensitive than this to errors of reading get a caution.
inline constexpr double cautionedErrorGain = 10;

Results<Measured> measuredBy(const Rosette& rosette, const Elastic& elastic, const WrittenUnits& units = {});

} // namespace planewright

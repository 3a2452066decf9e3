// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"

#include <functional>

namespace planewright {

/// Told before the work and now and then in it how many of all points are done, on the thread that asked;
/// false ends it.
using Watch = std::function<bool(std::size_t done, std::size_t all)>;

/// Judges every point of a field that is whole. `threads` of 0 takes all processors, and one below the size
/// at which more of them pay. The results do not depend on it, nor on the level of the processor: every point
/// is worked out alone. None where the watch ended it.
///
/// They are those of judgedByCore but for rounding: 1e-12 of the utilisation, and 1e-14 of what the terms
/// before they cancel would have against the least strength. Of combinations that are equal to that the first
/// or another may be named.
std::optional<FieldResults> screened(const ScreenPlan& plan, const Field& field, unsigned threads = 0,
                                     const Watch& watch = {});

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/readout.h"

namespace planewright {

/// The readout of a point of a valid study that shows what governs the point: the combination with the
/// greatest utilisation, where nothing could be judged that with the greatest s1, where no combination counts
/// the one that the study shows.
Readout governingReadout(const Study& study, std::string_view point);

} // namespace planewright

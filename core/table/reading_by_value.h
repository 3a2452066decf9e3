// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/inverse.h"
#include "core/table/table.h"
#include "core/words/problem.h"

namespace planewright {

/// Where a stress typed for the reading plane takes it.
struct ReadingByValue {
  PlanesOfValue planes; ///< never out of reach
  std::string
      reading; ///< text for the reading plane's normal; the present one where every plane has the value
  std::optional<std::string> other; ///< the other of two planes
  Text note; ///< "also at 74.2°", "touches the circle at σ_{1}, ± 0.4°", "every direction"
};

/// Inverse reading: the planes of the shown state on which `component` has the typed stress, the one nearest
/// to the present reading plane first. The text is read in the study's unit and sign convention and stands
/// for the interval of half its last digit. A Problem when it does not read, or names the range that the
/// component reaches.
Result<ReadingByValue> readingFor(const Study& study, const Readout& readout, Component component,
                                  std::string_view text);

} // namespace planewright

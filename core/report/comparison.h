// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/text.h"

namespace planewright {

/// One difference of two studies in words; an empty side is one where the thing is not there.
struct Change {
  Text what; ///< "P1, G: σ_{x}"
  Text before;
  Text after;
  bool operator==(const Change&) const = default;
};

/// What changed from one revision of a study to another.
struct Comparison {
  std::vector<Change> inputs;  ///< everything typed that differs; a thing that came or went is one row
  std::vector<Change> results; ///< verdicts, utilisations and governing stresses as they are shown
  bool empty() const { return inputs.empty() && results.empty(); }
};

/// Compares two valid studies by the names of their things: what was renamed went and came. Which point and
/// combination is shown, and to which state the names of the title block are bound, is no difference.
Comparison compared(const Study& before, const Study& after);

/// The comparison as lines of plain text.
std::string comparisonText(const Comparison& comparison, const Translate& translate = {});

} // namespace planewright

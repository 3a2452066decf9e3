// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

#include <gtest/gtest.h>

namespace planewright {

/// The study after edits that must be taken.
inline Study with(const Study& study, const Edits& edits) {
  const Result<Study> after = edited(study, edits);
  EXPECT_TRUE(after) << plain(after.error());
  return after.value_or(study);
}

inline const std::string sum = "1.35 G + 1.5 S";

/// Three cases, a combination of two of them that the third excludes, two points, a watched plane.
inline Study richStudy() {
  return with(newStudy(),
              {Insert{{Spot::loadCase, "Q", {}}, 0}, Insert{{Spot::loadCase, "S", {}}, {}},
               Insert{{Spot::combination, sum, {}}, {}}, Insert{{Spot::factor, sum, "G"}, {}},
               Type{{Spot::factor, sum, "G"}, "1.35"}, Insert{{Spot::factor, sum, "S"}, {}},
               Type{{Spot::factor, sum, "S"}, "1.5"}, Insert{{Spot::caseStress, "P1", "S"}, {}},
               Insert{{Spot::point, "P2", {}}, {}}, Insert{{Spot::plane, "P1", "scarf"}, {}},
               Type{{Spot::shownPoint, {}, {}}, "P2"}, Type{{Spot::shownCombination, {}, {}}, sum},
               Type{{Spot::caseExcludes, "Q", {}}, "G"}});
}

} // namespace planewright

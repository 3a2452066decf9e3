// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/readout.h"

namespace planewright {

/// The sign of a mark, equal on circle, table, figure and sheet.
enum class Sign {
  filledRound,   ///< reading plane
  hollowRound,   ///< its opposite face; thin: watched
  filledSquare,  ///< x face
  hollowSquare,  ///< y face
  uprightTick,   ///< principal
  levelTick,     ///< greatest shear
  filledLozenge, ///< crossing the line
  hollowLozenge  ///< following the line
};

/// The sign and the role of a kind of plane.
Sign signOf(PlaneKind kind);
Role roleOf(PlaneKind kind);

/// A plane on the circle: its place (sn, tnt) in N/mm2 and its label.
struct Mark {
  PlaneKind kind = PlaneKind::reading;
  std::string name;
  Traction at;
  Text longForm;    ///< "n 7.97 | −2.85"
  Text shortForm;   ///< "n"
  int priority = 0; ///< 0 is kept longest when a column of labels is too full
};

/// The marks of the shown state on its circle, reading plane first. A degenerate state has x, y, lines,
/// watched and reading planes in one place and no principal or shear marks.
std::vector<Mark> marksOf(const Study& study, const Readout& readout);

/// The outline of a sign round (0, 0), y down, `size` across; `filled` in its role or hollow on canvas.
struct SignShape {
  std::vector<Vec> outline; ///< empty for round signs
  bool round = false;
  bool filled = false;
};
SignShape shapeOf(Sign sign, double size);

} // namespace planewright

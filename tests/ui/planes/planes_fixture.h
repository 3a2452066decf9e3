// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

namespace planewright {

/// 80, 20, -30 MPa with a grain at 1 in 10, a watched scarf and the reading plane at 30 deg.
inline Study planesStudy() {
  return *edited(newStudy(),
                 Edits{Type{{Spot::sx, "P1", "G"}, "80"}, Type{{Spot::sy, "P1", "G"}, "20"},
                       Type{{Spot::txy, "P1", "G"}, "-30"}, Type{{Spot::lineAngle, "P1", "grain"}, "1 in 10"},
                       Insert{{Spot::plane, "P1", "scarf"}, {}},
                       Type{{Spot::planeNormal, "P1", "scarf"}, "55"},
                       Type{{Spot::reading, "P1", {}}, "30"}});
}

/// The rows of the table in their fixed order.
enum PlaneRow { reading, x, y, s1, s2, shearMax, shearMin, crossingLine, followingLine, scarf, watch };

} // namespace planewright

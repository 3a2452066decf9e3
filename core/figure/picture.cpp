// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/picture.h"

namespace planewright {

std::vector<double> dashLengths(Dash dash) {
  switch (dash) {
  case Dash::shortDash:
    return {5, 3};
  case Dash::longDashDot:
    return {14, 3, 1.5, 3};
  case Dash::dotted:
    return {1, 2};
  case Dash::solid:
    break;
  }
  return {};
}

} // namespace planewright

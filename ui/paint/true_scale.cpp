// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/paint/true_scale.h"

#include <QScreen>
#include <QWidget>

namespace planewright {

/// A screen that does not know its size says something absurd; then Qt's usual resolution stands.
double truePixelsPerMm(const QWidget& widget) {
  constexpr double mmPerInch = 25.4;
  constexpr double least = 60;
  constexpr double greatest = 400;
  const double stated = widget.screen()->physicalDotsPerInchX();
  const double dpi = stated >= least && stated <= greatest ? stated : widget.logicalDpiX();
  return dpi / mmPerInch;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/zoom.h"

#include <algorithm>

namespace planewright {

double zoomOf(const QWidget& widget, QSizeF least) {
  const double wanted = widget.font().pixelSize() / plainText;
  const double room = std::min(widget.width() / least.width(), widget.height() / least.height());
  return std::max(1.0, std::min(wanted, room));
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/column_area.h"

#include "ui/look/zoom.h"

#include <QEvent>
#include <QScrollBar>

#include <algorithm>

namespace planewright {

ColumnArea::ColumnArea(QWidget* parent) : QScrollArea(parent) {
  setWidgetResizable(true);
  setFrameShape(QFrame::NoFrame);
  setFocusPolicy(Qt::NoFocus);
  setHorizontalScrollBarPolicy(Qt::ScrollBarAsNeeded);
}

QSize ColumnArea::minimumSizeHint() const {
  constexpr int leastHeight = 200;
  const int content = widget() ? widget()->minimumSizeHint().width() : 0;
  // Half of what the text grows by: the drawings need their room too.
  const int most = qRound(mostColumn * (1 + font().pixelSize() / plainText) / 2);
  const int needed = content + verticalScrollBar()->sizeHint().width();
  return {std::clamp(needed, leastColumn, most), leastHeight};
}

bool ColumnArea::eventFilter(QObject* watched, QEvent* event) {
  if (watched == widget() && event->type() == QEvent::LayoutRequest)
    updateGeometry();
  return QScrollArea::eventFilter(watched, event);
}

} // namespace planewright

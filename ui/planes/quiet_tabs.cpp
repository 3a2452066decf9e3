// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/quiet_tabs.h"

#include "ui/look/look.h"

#include <QPainter>

namespace planewright {

namespace {

constexpr int padding = 10;

QFont boldOf(QFont font) {
  font.setBold(true);
  return font;
}

} // namespace

QuietTabs::QuietTabs(QWidget* parent) : QTabBar(parent) {
  setDrawBase(false);
  setExpanding(false);
}

QSize QuietTabs::tabSizeHint(int index) const {
  const QFontMetrics metrics(boldOf(font()));
  return {metrics.horizontalAdvance(tabText(index)) + 2 * padding, metrics.height() + 12};
}

void QuietTabs::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  for (int i = 0; i < count(); ++i) {
    const QRect box = tabRect(i);
    const bool current = i == currentIndex();
    painter.setFont(current ? boldOf(font()) : font());
    painter.setPen(look.colour(current ? Role::ink : Role::soft));
    painter.drawText(box, Qt::AlignCenter, tabText(i));
    if (current)
      painter.fillRect(QRect(box.left() + padding, box.bottom() - 2, box.width() - 2 * padding, 2),
                       look.colour(Role::focus));
    if (current && hasFocus()) {
      painter.setRenderHint(QPainter::Antialiasing);
      painter.setPen(QPen(look.colour(Role::focus), 2));
      painter.drawRoundedRect(QRectF(box).adjusted(2, 2, -2, -2), 3, 3);
    }
  }
}

} // namespace planewright

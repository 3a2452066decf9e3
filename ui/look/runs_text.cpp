// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/runs_text.h"

#include "core/figure/metrics.h"
#include "ui/look/look.h"

#include <QFontInfo>
#include <QFontMetricsF>
#include <QPainter>

namespace planewright {

namespace {

QFont fontOf(const Run& run, QFont font) {
  if (run.lowered)
    font.setPixelSize(qMax(1, qRound(QFontInfo(font).pixelSize() * loweredSize)));
  return font;
}

qreal runWidth(const Run& run, const QFont& font) {
  return QFontMetricsF(fontOf(run, font)).horizontalAdvance(fromUtf8(run.text));
}

} // namespace

qreal runsWidth(const Runs& runs, const QFont& font) {
  qreal width = 0;
  for (const Run& run : runs)
    width += runWidth(run, font);
  return width;
}

void drawRuns(QPainter& painter, const QRectF& box, const Runs& runs, Qt::Alignment align) {
  const QFont font = painter.font();
  const QFontMetricsF metrics(font);
  qreal x = align & Qt::AlignRight ? box.right() - runsWidth(runs, font) : box.left();
  const qreal base = box.center().y() + (metrics.ascent() - metrics.descent()) / 2;
  for (const Run& run : runs) {
    painter.setFont(fontOf(run, font));
    const qreal drop = run.lowered ? loweredDrop * QFontInfo(font).pixelSize() : 0;
    painter.drawText(QPointF(x, base + drop), fromUtf8(run.text));
    x += runWidth(run, font);
  }
  painter.setFont(font);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/runs_text.h"

#include "core/figure/advances.h"
#include "core/figure/metrics.h"
#include "core/words/characters.h"
#include "ui/look/font.h"
#include "ui/look/look.h"

#include <QFontInfo>
#include <QFontMetricsF>
#include <QPainter>

#include <algorithm>

namespace planewright {

namespace {

QFont fontOf(const Run& run, QFont font) {
  if (run.lowered)
    font.setPixelSize(qMax(1, qRound(QFontInfo(font).pixelSize() * loweredSize)));
  return font;
}

bool isMeasured(const std::string& text) {
  return std::ranges::all_of(charactersOf(text),
                             [](const Character& character) { return advanceOf(character.code) != nullptr; });
}

/// Windows and figures are set in the same font without kerning or hinting, so core's table of widths holds
/// for both and spares the shaping of the text; what the table lacks comes from another font.
qreal runWidth(const Run& run, const QFont& font) {
  const QFont set = fontOf(run, font);
  if (set.pixelSize() > 0 && set.family() == QLatin1String(programFamily) && isMeasured(run.text))
    return textWidth({{run.text, false}}, set.pixelSize(), set.bold());
  return QFontMetricsF(set).horizontalAdvance(fromUtf8(run.text));
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

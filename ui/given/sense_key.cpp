// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/sense_key.h"

#include "ui/given/sense_picture.h"
#include "ui/look/runs_text.h"

#include <QPainter>

namespace planewright {

namespace {
constexpr int pictureSize = 64;
constexpr int gap = 10;
} // namespace

SenseKey::SenseKey(Desk& desk, QWidget* parent) : QWidget(parent), m_desk(desk) {
  connect(&m_desk, &Desk::changed, this, &SenseKey::tell);
  tell();
}

std::vector<Text> SenseKey::lines() const {
  const Positive positive = m_desk.study().convention.positive;
  return {labelOf(positive), PW_TEXT("Given", "positive τ_{xy} on the x face"),
          positive == Positive::tension ? PW_TEXT("Given", "runs towards +y")
                                        : PW_TEXT("Given", "runs towards −y")};
}

void SenseKey::tell() {
  QStringList words;
  for (const Text& line : lines())
    words += shown(line);
  const QString name = words.join(QLatin1Char(' '));
  if (name == accessibleName())
    return;
  setAccessibleName(name);
  update();
}

QSize SenseKey::sizeHint() const {
  int widest = 0;
  for (const Text& line : lines())
    widest = qMax(widest, qCeil(runsWidth(runs(line, translation()), font())));
  return {pictureSize + gap + widest, qMax(pictureSize, 3 * fontMetrics().lineSpacing())};
}

void SenseKey::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  paintSense(painter, QRectF(0, (height() - pictureSize) / 2.0, pictureSize, pictureSize),
             m_desk.study().convention.positive, look);
  const std::vector<Text> words = lines();
  const qreal pitch = fontMetrics().lineSpacing() + 1;
  QRectF box(pictureSize + gap, (height() - pitch * static_cast<qreal>(words.size())) / 2, width(), pitch);
  painter.setPen(look.colour(Role::ink));
  for (const Text& line : words) {
    drawRuns(painter, box, runs(line, translation()), Qt::AlignLeft);
    painter.setPen(look.colour(Role::soft));
    box.translate(0, pitch);
  }
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/choice_button.h"

#include "ui/look/runs_text.h"

#include <QPainter>

namespace planewright {

namespace {
constexpr int pictureSize = 52;
constexpr int margin = 5;
} // namespace

ChoiceButton::ChoiceButton(Picture picture, const Text& words, QWidget* parent)
    : QRadioButton(shown(words), parent), m_picture(std::move(picture)), m_words(runs(words, translation())) {
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Fixed);
}

QSize ChoiceButton::sizeHint() const {
  const QFontMetrics metrics(font());
  return {qMax(pictureSize, qCeil(runsWidth(m_words, font()))) + 2 * margin,
          pictureSize + metrics.height() + 3 * margin};
}

void ChoiceButton::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  const QRectF frame = QRectF(rect()).adjusted(1, 1, -1, -1);
  painter.setPen(QPen(look.colour(isChecked() ? Role::focus : Role::rule), isChecked() ? 1.5 : 1));
  painter.setBrush(look.colour(isChecked() ? Role::selection : Role::canvas));
  painter.drawRoundedRect(frame, 3, 3);
  if (hasFocus()) {
    painter.setPen(QPen(look.colour(Role::focus), 2));
    painter.setBrush(Qt::NoBrush);
    painter.drawRoundedRect(frame.adjusted(2, 2, -2, -2), 2, 2);
  }
  m_picture(painter, QRectF((width() - pictureSize) / 2.0, margin, pictureSize, pictureSize), look);
  painter.setPen(look.colour(Role::ink));
  const qreal wide = runsWidth(m_words, font());
  drawRuns(painter, QRectF((width() - wide) / 2, pictureSize + margin, wide, height() - pictureSize - margin),
           m_words, Qt::AlignLeft);
}

} // namespace planewright

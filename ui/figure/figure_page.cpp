// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_page.h"

#include "ui/look/font.h"
#include "ui/look/look.h"
#include "ui/paint/painter.h"
#include "ui/paint/true_scale.h"

#include <QPaintEvent>
#include <QPainter>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double textColumn = 170; ///< mm of text on an A4 page with margins of 25 and 15
constexpr double aroundFigure = 5; ///< mm of the column round the figure at least
constexpr double ruleHeight = 26;  ///< pixels, and the ground round the column
constexpr double ground = 12;

/// The least of 1, 5, 10, 50, 100 mm that is at least `pixels` wide.
double stepOf(double pixels, double scale) {
  for (const double step : {1.0, 5.0, 10.0, 50.0})
    if (step * scale >= pixels)
      return step;
  return 100;
}

} // namespace

FigurePage::FigurePage(QWidget* parent) : QWidget(parent) {
  setAccessibleName(tr("Figure"));
}

void FigurePage::setPicture(std::optional<Picture> picture, Palette palette) {
  m_picture = std::move(picture);
  m_palette = palette;
  setAccessibleDescription(m_picture ? fromUtf8(m_picture->description) : QString());
  updateGeometry();
  update();
}

void FigurePage::setZoom(Zoom zoom) {
  m_zoom = zoom;
  updateGeometry();
  update();
}

double FigurePage::columnWidth() const {
  return std::max(textColumn, (m_picture ? m_picture->width : 0) + 2 * aroundFigure);
}

QSizeF FigurePage::sheet() const {
  return {columnWidth(), (m_picture ? m_picture->height : textColumn) + 2 * aroundFigure};
}

double FigurePage::pixelsPerMm() const {
  if (m_zoom == Zoom::trueSize)
    return truePixelsPerMm(*this);
  const double across = (width() - 2 * ground) / sheet().width();
  const double down = (height() - ruleHeight - 2 * ground) / sheet().height();
  return std::max(0.1, std::min(across, down));
}

QRectF FigurePage::columnRect() const {
  const QSizeF size = sheet() * pixelsPerMm();
  return {std::max(ground, (width() - size.width()) / 2), ruleHeight + ground, size.width(), size.height()};
}

QRectF FigurePage::figureRect() const {
  if (!m_picture)
    return {};
  const double scale = pixelsPerMm();
  const QRectF column = columnRect();
  const double left = column.left() + (column.width() - m_picture->width * scale) / 2;
  return {left, column.top() + aroundFigure * scale, m_picture->width * scale, m_picture->height * scale};
}

QSize FigurePage::sizeHint() const {
  const QSizeF size = sheet() * truePixelsPerMm(*this);
  return {static_cast<int>(std::ceil(size.width() + 2 * ground)),
          static_cast<int>(std::ceil(size.height() + ruleHeight + 2 * ground))};
}

QSize FigurePage::minimumSizeHint() const {
  return m_zoom == Zoom::trueSize ? sizeHint() : QSize(240, 240);
}

void FigurePage::paintEvent(QPaintEvent* event) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  painter.fillRect(event->rect(), look.colour(Role::hush));
  painter.fillRect(columnRect(), Qt::white);
  paintRule(painter);
  if (!m_picture)
    return;
  painter.translate(figureRect().topLeft());
  painter.scale(pixelsPerMm(), pixelsPerMm());
  paintPicture(painter, *m_picture, m_palette);
}

void FigurePage::paintRule(QPainter& painter) const {
  if (!m_picture)
    return;
  constexpr double textSize = 10;
  const double scale = pixelsPerMm();
  const double left = figureRect().left();
  const double numbered = stepOf(40, scale);
  const double ticked = stepOf(4, scale);
  painter.fillRect(QRectF(0, 0, width(), ruleHeight), lookOf(*this).colour(Role::window));
  painter.setPen(lookOf(*this).colour(Role::soft));
  painter.setFont(programFont(textSize));
  const auto count = static_cast<int>(std::floor(m_picture->width / ticked + 1e-9));
  for (int i = 0; i <= count; ++i) {
    const double mm = i * ticked;
    const double x = left + mm * scale;
    const bool isNumbered = std::fmod(mm, numbered) == 0;
    painter.drawLine(QPointF(x, ruleHeight), QPointF(x, ruleHeight - (isNumbered ? 8 : 4)));
    if (isNumbered)
      painter.drawText(QRectF(x - 40, 0, 80, ruleHeight - 9), Qt::AlignHCenter | Qt::AlignBottom,
                       i == 0 ? tr("0 mm") : QString::number(mm));
  }
}

} // namespace planewright

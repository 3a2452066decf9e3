// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_preview.h"

#include "ui/look/look.h"
#include "ui/paint/painter.h"
#include "ui/paint/true_scale.h"

#include <QPaintEvent>
#include <QPainter>

#include <cmath>

namespace planewright {

namespace {

constexpr double ground = 14; ///< pixels round the pages

} // namespace

SheetPreview::SheetPreview(QWidget* parent) : QWidget(parent) {
  setAccessibleName(tr("Calculation sheet"));
  QSizePolicy policy(QSizePolicy::Preferred, QSizePolicy::Preferred);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
}

void SheetPreview::setPages(std::vector<Picture> pages) {
  m_pages = std::move(pages);
  setAccessibleDescription(tr("%n page(s)", nullptr, static_cast<int>(m_pages.size())));
  updateGeometry();
  update();
}

void SheetPreview::setZoom(Zoom zoom) {
  m_zoom = zoom;
  updateGeometry();
  update();
}

double SheetPreview::scaleFor(int width) const {
  if (m_zoom == Zoom::trueSize || m_pages.empty())
    return truePixelsPerMm(*this);
  return std::max(0.5, (width - 2 * ground) / m_pages.front().width);
}

QRectF SheetPreview::pageRect(std::size_t page) const {
  const double scale = scaleFor(width());
  const Picture& one = m_pages[page];
  const double left = std::max(ground, (width() - one.width * scale) / 2);
  return {left, ground + static_cast<double>(page) * (one.height * scale + ground), one.width * scale,
          one.height * scale};
}

int SheetPreview::heightForWidth(int width) const {
  if (m_pages.empty())
    return 100;
  const double one = m_pages.front().height * scaleFor(width) + ground;
  return static_cast<int>(std::ceil(ground + static_cast<double>(m_pages.size()) * one));
}

QSize SheetPreview::sizeHint() const {
  if (m_pages.empty())
    return {600, 100};
  const double scale = truePixelsPerMm(*this);
  const int across = static_cast<int>(std::ceil(m_pages.front().width * scale + 2 * ground));
  if (m_zoom == Zoom::width)
    return {300, heightForWidth(300)};
  return {across, heightForWidth(across)};
}

void SheetPreview::paintEvent(QPaintEvent* event) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  painter.fillRect(event->rect(), lookOf(*this).colour(Role::hush));
  for (std::size_t i = 0; i < m_pages.size(); ++i) {
    const QRectF rect = pageRect(i);
    if (!rect.intersects(event->rect()))
      continue;
    painter.fillRect(rect, Qt::white);
    painter.save();
    painter.translate(rect.topLeft());
    painter.scale(rect.width() / m_pages[i].width, rect.width() / m_pages[i].width);
    paintPicture(painter, m_pages[i], Palette::paper);
    painter.restore();
  }
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/histogram_view.h"

#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "ui/look/look.h"

#include <QKeyEvent>
#include <QMouseEvent>
#include <QPainter>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int side = 6;        ///< beside texts, in pixels
constexpr int leastStroke = 2; ///< of any point at all

QString nameOf(std::size_t bin) {
  if (bin == binEnds.size())
    return HistogramView::tr("above %1").arg(fromUtf8(shownNumber(binEnds.back(), 1)));
  return HistogramView::tr("up to %1").arg(fromUtf8(shownNumber(binEnds[bin], 1)));
}

bool isExceeding(std::size_t bin) {
  return bin == binEnds.size() || binEnds[bin] > 1;
}

} // namespace

HistogramView::HistogramView(QWidget* parent) : QWidget(parent) {
  setFocusPolicy(Qt::StrongFocus);
  setAccessibleName(tr("Points by utilisation"));
  setProperty("helpPlace", "screening#bars");
  setToolTip(tr("Click on a bar to see its points alone, and once more for all."));
  setSizePolicy(QSizePolicy::Preferred, QSizePolicy::Fixed);
}

void HistogramView::show(const Histogram& histogram) {
  m_histogram = histogram;
  m_chosen.reset();
  update();
}

int HistogramView::rowHeight() const {
  return fontMetrics().height() + 3;
}

QRect HistogramView::rowOf(std::size_t bin) const {
  return {0, static_cast<int>(bin) * rowHeight(), width(), rowHeight()};
}

QSize HistogramView::sizeHint() const {
  return {260, static_cast<int>(m_histogram.size()) * rowHeight()};
}

void HistogramView::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  int names = 0;
  int counts = 0;
  for (std::size_t bin = 0; bin < m_histogram.size(); ++bin) {
    names = std::max(names, fontMetrics().horizontalAdvance(nameOf(bin)));
    counts = std::max(counts, fontMetrics().horizontalAdvance(fromUtf8(shownCount(m_histogram[bin]))));
  }
  const int from = names + 2 * side;
  const int room = std::max(width() - from - counts - 2 * side, 0);
  const auto most = static_cast<double>(std::max<std::size_t>(*std::ranges::max_element(m_histogram), 1));
  for (std::size_t bin = 0; bin < m_histogram.size(); ++bin) {
    const QRect row = rowOf(bin);
    if (m_chosen == bin)
      painter.fillRect(row, look.colour(Role::selection));
    painter.setPen(look.colour(Role::ink));
    painter.drawText(row.adjusted(side, 0, 0, 0), Qt::AlignLeft | Qt::AlignVCenter, nameOf(bin));
    const std::size_t points = m_histogram[bin];
    const int length =
        points == 0
            ? 0
            : std::max(leastStroke, static_cast<int>(std::lround(static_cast<double>(points) / most * room)));
    const QRect bar(from, row.top() + 3, length, row.height() - 6);
    painter.fillRect(bar, look.colour(isExceeding(bin) ? Role::limit : Role::state));
    painter.drawText(row.adjusted(from + length + side, 0, 0, 0), Qt::AlignLeft | Qt::AlignVCenter,
                     fromUtf8(shownCount(points)));
    if (hasFocus() && m_current == bin) {
      painter.setPen(look.colour(Role::focus));
      painter.drawRect(row.adjusted(0, 0, -1, -1));
    }
  }
}

void HistogramView::toggle(std::size_t bin) {
  m_current = bin;
  m_chosen = m_chosen == bin ? std::nullopt : std::optional(bin);
  setAccessibleDescription(m_chosen ? tr("chosen: %1").arg(nameOf(bin)) : QString());
  update();
  emit choiceMoved();
}

void HistogramView::mousePressEvent(QMouseEvent* event) {
  const auto bin = static_cast<std::size_t>(std::max(event->position().toPoint().y(), 0) / rowHeight());
  if (event->button() == Qt::LeftButton && bin < m_histogram.size())
    toggle(bin);
}

void HistogramView::keyPressEvent(QKeyEvent* event) {
  switch (event->key()) {
  case Qt::Key_Up:
    m_current -= m_current > 0 ? 1 : 0;
    break;
  case Qt::Key_Down:
    m_current += m_current + 1 < m_histogram.size() ? 1 : 0;
    break;
  case Qt::Key_Space:
    return toggle(m_current);
  default:
    return QWidget::keyPressEvent(event);
  }
  update();
}

} // namespace planewright

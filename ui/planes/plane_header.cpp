// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/plane_header.h"

#include "ui/look/look.h"
#include "ui/look/runs_text.h"
#include "ui/planes/plane_delegate.h"
#include "ui/planes/table_model.h"

#include <QPainter>

namespace planewright {

namespace {

/// A heading in one line, or in two: `over` is empty then where nothing is to be broken.
struct Heading {
  Runs over;
  Runs line;
};

Heading headingOf(const Column& column, bool broken) {
  Heading heading{{}, runs(column.heading, translation())};
  if (column.unit.empty())
    return heading;
  heading.line.push_back({" " + column.unit, false});
  Run& first = heading.line.front();
  const std::size_t space = first.text.find(' ');
  if (broken && space != std::string::npos) {
    heading.over.push_back({first.text.substr(0, space), false});
    first.text.erase(0, space + 1);
  }
  return heading;
}

} // namespace

PlaneHeader::PlaneHeader(QWidget* parent) : QHeaderView(Qt::Horizontal, parent) {
  setSectionsClickable(false);
  setHighlightSections(false);
  setMinimumSectionSize(20);
}

const Column& PlaneHeader::columnAt(int section) const {
  return static_cast<TableModel*>(model())->table().columns[static_cast<std::size_t>(section)];
}

int PlaneHeader::headingWidth(int section, bool broken) const {
  const Heading heading = headingOf(columnAt(section), broken);
  return qCeil(qMax(runsWidth(heading.over, font()), runsWidth(heading.line, font())));
}

void PlaneHeader::setBroken(bool broken) {
  if (m_isBroken == broken)
    return;
  m_isBroken = broken;
  Q_EMIT geometriesChanged();
  viewport()->update();
}

QSize PlaneHeader::sizeHint() const {
  return {100, (m_isBroken ? 2 : 1) * fontMetrics().height() + 8};
}

// The style would paint the room beside the last heading in the colour of buttons.
void PlaneHeader::paintEvent(QPaintEvent* event) {
  QHeaderView::paintEvent(event);
  QPainter painter(viewport());
  painter.fillRect(viewport()->rect().adjusted(length(), 0, 0, 0), lookOf(*this).colour(Role::canvas));
}

void PlaneHeader::paintSection(QPainter* painter, const QRect& rect, int section) const {
  const Look look = lookOf(*this);
  const Column& column = columnAt(section);
  const Heading heading = headingOf(column, m_isBroken);
  painter->save();
  painter->fillRect(rect, look.colour(Role::canvas));
  painter->fillRect(QRect(rect.left(), rect.bottom(), rect.width(), 1), look.colour(Role::rule));
  painter->setFont(font());
  painter->setPen(look.colour(Role::soft));
  const Qt::Alignment side = column.isNumber ? Qt::AlignRight : Qt::AlignLeft;
  const QRectF box = PlaneDelegate::textBox(rect, section);
  const qreal upper = m_isBroken ? fontMetrics().height() : 0; // the heading itself stands on the lower line
  drawRuns(*painter, box.adjusted(0, upper, 0, 0), heading.line, side);
  if (!heading.over.empty())
    drawRuns(*painter, box.adjusted(0, 0, 0, -upper), heading.over, side);
  painter->restore();
}

} // namespace planewright

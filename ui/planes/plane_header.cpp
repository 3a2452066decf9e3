// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/plane_header.h"

#include "ui/look/look.h"
#include "ui/look/runs_text.h"
#include "ui/planes/plane_delegate.h"
#include "ui/planes/table_model.h"

#include <QPainter>

namespace planewright {

namespace {

Runs headingOf(const Column& column) {
  Runs heading = runs(column.heading, translation());
  if (!column.unit.empty())
    heading.push_back({" " + column.unit, false});
  return heading;
}

} // namespace

PlaneHeader::PlaneHeader(QWidget* parent) : QHeaderView(Qt::Horizontal, parent) {
  setSectionsClickable(false);
  setHighlightSections(false);
  setMinimumSectionSize(20);
}

int PlaneHeader::headingWidth(int section) const {
  const auto& columns = static_cast<TableModel*>(model())->table().columns;
  return qCeil(runsWidth(headingOf(columns[static_cast<std::size_t>(section)]), font()));
}

QSize PlaneHeader::sizeHint() const {
  return {100, fontMetrics().height() + 8};
}

// The style would paint the room beside the last heading in the colour of buttons.
void PlaneHeader::paintEvent(QPaintEvent* event) {
  QHeaderView::paintEvent(event);
  QPainter painter(viewport());
  painter.fillRect(viewport()->rect().adjusted(length(), 0, 0, 0), lookOf(*this).colour(Role::canvas));
}

void PlaneHeader::paintSection(QPainter* painter, const QRect& rect, int section) const {
  const Look look = lookOf(*this);
  const auto& columns = static_cast<TableModel*>(model())->table().columns;
  const Column& column = columns[static_cast<std::size_t>(section)];
  painter->save();
  painter->fillRect(rect, look.colour(Role::canvas));
  painter->fillRect(QRect(rect.left(), rect.bottom(), rect.width(), 1), look.colour(Role::rule));
  painter->setFont(font());
  painter->setPen(look.colour(Role::soft));
  drawRuns(*painter, PlaneDelegate::textBox(rect, section), headingOf(column),
           column.isNumber ? Qt::AlignRight : Qt::AlignLeft);
  painter->restore();
}

} // namespace planewright

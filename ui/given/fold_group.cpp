// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/fold_group.h"

#include "ui/look/look.h"
#include "ui/look/steady_label.h"

#include <QApplication>
#include <QHBoxLayout>
#include <QLabel>
#include <QPainter>
#include <QPolygonF>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int triangleRoom = 14;

QFont boldOf(QFont font) {
  font.setBold(true);
  return font;
}

/// A triangle that points down for open and right for folded, 8 px across.
QPolygonF triangleAt(QPointF centre, bool open) {
  if (open)
    return {{centre + QPointF(-4, -2), centre + QPointF(4, -2), centre + QPointF(0, 3)}};
  return {{centre + QPointF(-2, -4), centre + QPointF(3, 0), centre + QPointF(-2, 4)}};
}

} // namespace

FoldHeading::FoldHeading(const QString& title, Role role, QWidget* parent)
    : QAbstractButton(parent), m_role(role) {
  setText(title);
  setCheckable(true);
  setChecked(true);
  setFocusPolicy(Qt::TabFocus);
  setAccessibleName(title);
}

QSize FoldHeading::sizeHint() const {
  const QFontMetrics metrics(boldOf(font()));
  return {triangleRoom + metrics.horizontalAdvance(text()) + 4, metrics.height() + 6};
}

void FoldHeading::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  painter.setPen(Qt::NoPen);
  painter.setBrush(look.colour(Role::soft));
  painter.drawPolygon(triangleAt({5, height() / 2.0}, isChecked()));
  painter.setFont(boldOf(font()));
  painter.setPen(look.colour(m_role));
  painter.drawText(rect().adjusted(triangleRoom, 0, 0, 0), Qt::AlignLeft | Qt::AlignVCenter, text());
  if (hasFocus()) {
    painter.setPen(QPen(look.colour(Role::focus), 2));
    painter.setBrush(Qt::NoBrush);
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 3, 3);
  }
}

FoldGroup::FoldGroup(const QString& title, Role role, QWidget* parent)
    : QWidget(parent), m_heading(new FoldHeading(title, role, this)), m_summary(new SteadyLabel(this)),
      m_content(new QWidget(this)), m_body(new QVBoxLayout(m_content)) {
  m_summary->setForegroundRole(QPalette::PlaceholderText);
  m_summary->label().setAlignment(Qt::AlignRight | Qt::AlignVCenter);
  m_summary->hide();
  m_body->setContentsMargins(0, 0, 0, 0);
  m_body->setSpacing(4);
  auto* top = new QHBoxLayout;
  top->setSpacing(6);
  top->addWidget(m_heading, 0, Qt::AlignTop);
  top->addWidget(m_summary, 1);
  top->addStretch(0);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->setSpacing(3);
  rows->addLayout(top);
  rows->addWidget(m_content);
  connect(m_heading, &QAbstractButton::clicked, this, &FoldGroup::showFold);
}

void FoldGroup::setCorner(QWidget* corner) {
  m_corner = corner;
  auto* top = static_cast<QHBoxLayout*>(layout()->itemAt(0)->layout());
  top->addWidget(corner, 0, Qt::AlignTop);
}

void FoldGroup::setSummary(const QString& summary) {
  m_summary->setText(summary);
  m_heading->setAccessibleDescription(summary);
}

void FoldGroup::setFolded(bool folded) {
  m_heading->setChecked(!folded);
  showFold();
}

void FoldGroup::keepKeys(const QWidget& going, QWidget& keeper) {
  const QWidget* focused = QApplication::focusWidget();
  if (focused && (focused == &going || going.isAncestorOf(focused)))
    keeper.setFocus(Qt::OtherFocusReason);
}

bool FoldGroup::isFolded() const {
  return !m_heading->isChecked();
}

void FoldGroup::showFold() {
  m_content->setVisible(!isFolded());
  m_summary->setVisible(isFolded());
  if (m_corner)
    m_corner->setVisible(!isFolded());
}

} // namespace planewright

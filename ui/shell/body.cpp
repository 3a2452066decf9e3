// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/body.h"

#include "ui/look/zoom.h"

#include <QHBoxLayout>
#include <QSettings>
#include <QSplitter>

#include <algorithm>

namespace planewright {

namespace {

// Narrower, the table of planes would lose its last columns.
constexpr int leastForStrength = 1380;
constexpr int strengthWidth = 340;

} // namespace

BodySizes sizesIn(QSize body, int leastPlanes) {
  constexpr int roomy = 1100;
  constexpr int greatestDrawing = 900;
  BodySizes sizes;
  sizes.given = body.width() < roomy ? 264 : 300;
  sizes.strength = body.width() < leastForStrength ? 0 : strengthWidth;
  const int rest = std::max(0, body.width() - sizes.given - sizes.strength);
  sizes.element = rest * 48 / 100;
  sizes.circle = rest - sizes.element;
  sizes.planes = std::max(body.height() * 35 / 100, leastPlanes);
  sizes.drawings = std::clamp(body.height() - sizes.planes, 0, greatestDrawing);
  sizes.planes = body.height() - sizes.drawings;
  return sizes;
}

Body::Body(const Panels& panels, QWidget* parent)
    : QWidget(parent), m_columns(splitter(Qt::Horizontal, QStringLiteral("columns"))),
      m_rows(splitter(Qt::Vertical, QStringLiteral("rows"))),
      m_drawings(splitter(Qt::Horizontal, QStringLiteral("drawings"))), m_planes(panels.planes),
      m_strength(panels.strength) {
  auto* layout = new QHBoxLayout(this);
  layout->setContentsMargins(0, 0, 0, 0);
  layout->addWidget(m_columns);
  m_drawings->addWidget(panels.element);
  m_drawings->addWidget(panels.circle);
  m_rows->addWidget(m_drawings);
  m_rows->addWidget(panels.planes);
  m_columns->addWidget(panels.given);
  m_columns->addWidget(m_rows);
  for (QSplitter* one : splitters()) {
    one->handle(1)->setAutoFillBackground(true);
    one->handle(1)->setBackgroundRole(QPalette::Mid);
  }
  m_columns->setStretchFactor(0, 0);
  m_columns->setStretchFactor(1, 1);
  m_rows->setStretchFactor(0, 65);
  m_rows->setStretchFactor(1, 35);
  m_drawings->setStretchFactor(0, 48);
  m_drawings->setStretchFactor(1, 52);
}

QSplitter* Body::splitter(Qt::Orientation orientation, const QString& name) {
  auto* made = new QSplitter(orientation, this);
  made->setObjectName(name);
  made->setChildrenCollapsible(false);
  made->setHandleWidth(1);
  connect(made, &QSplitter::splitterMoved, this, [this] { m_ownSizes = true; });
  return made;
}

/// With and without a column of strengths the sizes are kept apart.
QString Body::keyOf(const QSplitter& splitter) {
  return QStringLiteral("splitters/%1%2").arg(splitter.objectName()).arg(splitter.count());
}

void Body::store(QSettings& settings) const {
  for (const QSplitter* one : splitters())
    if (m_ownSizes)
      settings.setValue(keyOf(*one), one->saveState());
    else
      settings.remove(keyOf(*one));
}

void Body::restore(const QSettings& settings) {
  for (QSplitter* one : splitters())
    m_ownSizes |= one->restoreState(settings.value(keyOf(*one)).toByteArray());
  m_threeColumns = settings.value(QStringLiteral("splitters/columns3")).toByteArray();
}

void Body::resetSizes() {
  m_ownSizes = false;
  // Tabs, heading and eight rows.
  constexpr int leastRows = 11;
  const int leastPlanes =
      std::max(m_planes->minimumSizeHint().height(), leastRows * (fontMetrics().height() + 7));
  const BodySizes sizes = sizesIn(size(), leastPlanes);
  if (m_strength && m_columns->indexOf(m_strength) >= 0)
    m_columns->setSizes({sizes.given, sizes.element + sizes.circle, sizes.strength});
  else
    m_columns->setSizes({sizes.given, sizes.element + sizes.circle + sizes.strength});
  const int drawings = m_strength && m_columns->indexOf(m_strength) < 0 ? sizes.strength : 0;
  m_drawings->setSizes({sizes.element + drawings * 48 / 100, sizes.circle + drawings * 52 / 100});
  m_rows->setSizes({sizes.drawings, sizes.planes});
}

bool Body::hasRoomForStrength() const {
  return width() >= leastForStrength * font().pixelSize() / plainText;
}

void Body::showStrength() {
  m_columns->addWidget(m_strength);
  m_columns->setStretchFactor(2, 0);
  m_columns->handle(2)->setAutoFillBackground(true);
  m_columns->handle(2)->setBackgroundRole(QPalette::Mid);
  m_strength->show();
  m_ownSizes = m_columns->restoreState(m_threeColumns);
}

void Body::resizeEvent(QResizeEvent* event) {
  QWidget::resizeEvent(event);
  if (m_strength && m_hadRoom != hasRoomForStrength()) {
    m_hadRoom = !m_hadRoom;
    if (m_hadRoom)
      showStrength();
    emit roomForStrengthChanged(m_hadRoom);
  }
  if (!m_ownSizes)
    resetSizes();
}

} // namespace planewright

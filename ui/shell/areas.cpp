// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/areas.h"

#include <QApplication>
#include <QVariant>
#include <QWidget>

namespace planewright {

namespace {

bool takesFocus(const QWidget& widget, const QWidget& area) {
  return area.isAncestorOf(&widget) && widget.isVisibleTo(&area) && widget.isEnabled() &&
         (widget.focusPolicy() & Qt::TabFocus);
}

/// Where the focus was in the area, else the first widget of its tab order that takes it.
QWidget* entryOf(QWidget& area) {
  if (area.focusPolicy() & Qt::TabFocus)
    return &area;
  if (QWidget* last = area.focusWidget(); last && takesFocus(*last, area))
    return last;
  for (QWidget* widget = area.nextInFocusChain(); widget != &area; widget = widget->nextInFocusChain())
    if (takesFocus(*widget, area))
      return widget;
  return nullptr;
}

} // namespace

Areas::Areas(const QList<QWidget*>& areas, QObject* parent) : QObject(parent), m_areas(areas) {
  connect(qApp, &QApplication::focusChanged, this, [this](QWidget*, QWidget* now) { follow(now); });
}

QString Areas::keys() const {
  for (const QWidget* widget = m_focused; widget; widget = widget->parentWidget())
    if (const QVariant keys = widget->property("areaKeys"); keys.isValid())
      return keys.toString();
  return {};
}

void Areas::enter(QWidget& area, Qt::FocusReason reason) {
  if (QWidget* entry = entryOf(area))
    entry->setFocus(reason);
}

void Areas::follow(QWidget* focused) {
  if (!focused)
    return;
  m_focused = focused;
  for (QWidget* area : m_areas)
    if (area == focused || area->isAncestorOf(focused))
      m_current = area;
  Q_EMIT focusMoved();
}

void Areas::step(int by) {
  const qsizetype count = m_areas.size();
  qsizetype at = m_areas.indexOf(m_current);
  for (qsizetype tried = 0; tried < count; ++tried) {
    at = at < 0 ? 0 : (at + by + count) % count;
    if (m_areas[at]->isVisible() && entryOf(*m_areas[at])) {
      enter(*m_areas[at]);
      return;
    }
  }
}

} // namespace planewright

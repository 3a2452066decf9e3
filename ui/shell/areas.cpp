// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/areas.h"

#include <QApplication>
#include <QEvent>
#include <QScrollArea>
#include <QVariant>
#include <QWidget>

namespace planewright {

namespace {

bool takesFocus(const QWidget& widget, const QWidget& area) {
  return area.isAncestorOf(&widget) && widget.isVisibleTo(&area) && widget.isEnabled() &&
         (widget.focusPolicy() & Qt::TabFocus);
}

QWidget* lastProxyOf(QWidget& area) {
  QWidget* proxy = area.focusProxy();
  while (proxy && proxy->focusProxy())
    proxy = proxy->focusProxy();
  return proxy;
}

/// Where the focus was in the area, else what the area hands it to, else the first widget of its tab order
/// that takes it.
QWidget* entryOf(QWidget& area) {
  if (area.focusPolicy() & Qt::TabFocus)
    return &area;
  for (QWidget* wanted : {area.focusWidget(), lastProxyOf(area)})
    if (wanted && takesFocus(*wanted, area))
      return wanted;
  for (QWidget* widget = area.nextInFocusChain(); widget != &area; widget = widget->nextInFocusChain())
    if (takesFocus(*widget, area))
      return widget;
  return nullptr;
}

/// Keys that come from elsewhere in the window find their place in view; under the mouse nothing moves.
void bringIntoView(QWidget& focused) {
  if (QApplication::mouseButtons() != Qt::NoButton)
    return;
  for (QWidget* above = focused.parentWidget(); above; above = above->parentWidget())
    if (auto* scrolled = qobject_cast<QScrollArea*>(above))
      scrolled->ensureWidgetVisible(&focused);
}

} // namespace

Areas::Areas(const QList<QWidget*>& areas, QObject* parent) : QObject(parent), m_areas(areas) {
  connect(qApp, &QApplication::focusChanged, this, [this](QWidget* before, QWidget* now) {
    follow(now);
    if (before && now && before->window() == now->window())
      bringIntoView(*now);
  });
  for (QWidget* area : m_areas)
    area->installEventFilter(this);
}

// An area whose page has changed has other keys.
bool Areas::eventFilter(QObject* watched, QEvent* event) {
  if (event->type() == QEvent::DynamicPropertyChange)
    Q_EMIT focusMoved();
  return QObject::eventFilter(watched, event);
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

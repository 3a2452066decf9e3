// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/help_key.h"

#include "ui/shell/help_window.h"

#include <QApplication>
#include <QKeyEvent>
#include <QVariant>

namespace planewright {

namespace {

constexpr auto property = "helpPlace";

} // namespace

const QWidget* holderOfHelp(const QWidget* widget) {
  while (widget && !widget->property(property).isValid())
    widget = widget->parentWidget();
  return widget;
}

QString helpPlaceOf(const QWidget* widget) {
  const QWidget* holder = holderOfHelp(widget);
  return holder ? holder->property(property).toString() : QString();
}

HelpKey::HelpKey(QWidget& window) : QObject(&window), m_window(window) {
  qApp->installEventFilter(this);
}

// A dialog that must be answered lets no other window be used but those over it.
HelpWindow& HelpKey::help() {
  QWidget* modal = QApplication::activeModalWidget();
  QWidget* over = modal ? modal : &m_window;
  if (m_help && m_help->parentWidget() != over && modal != m_help)
    delete m_help;
  if (!m_help)
    m_help = new HelpWindow(over);
  return *m_help;
}

void HelpKey::show(const QString& place) {
  help().showPlace(place);
}

void HelpKey::showForFocus() {
  const QWidget* focused = QApplication::focusWidget();
  show(helpPlaceOf(focused ? focused : &m_window));
}

// A key that is a shortcut of the main window alone would be lost in every other one; a widget that says that
// it wants the key gets it, and it is taken on its way there.
bool HelpKey::eventFilter(QObject* watched, QEvent* event) {
  const QEvent::Type type = event->type();
  if (type != QEvent::ShortcutOverride && type != QEvent::KeyPress)
    return false;
  const auto* key = static_cast<QKeyEvent*>(event);
  const auto* widget = qobject_cast<const QWidget*>(watched);
  if (!widget || key->key() != Qt::Key_F1 || key->modifiers() != Qt::NoModifier)
    return false;
  event->accept();
  if (type == QEvent::KeyPress) {
    const QString place = helpPlaceOf(widget);
    while (QWidget* menu = QApplication::activePopupWidget())
      menu->close();
    show(place.isEmpty() ? helpPlaceOf(&m_window) : place);
  }
  return true;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/angle_field.h"

#include "ui/entry/window_keys.h"
#include "ui/look/look.h"

#include <QKeyEvent>

namespace planewright {

AngleField::AngleField(const QString& text, QWidget* parent) : QLineEdit(text, parent) {
  constexpr int characters = 14;
  setFixedWidth(fontMetrics().averageCharWidth() * characters + 16);
  selectAll();
}

void AngleField::refuse(const QString& why) {
  const Look look = lookOf(*this);
  QPalette wrong = palette();
  wrong.setColor(QPalette::Base, look.colour(Role::wrongGround));
  wrong.setColor(QPalette::Text, look.colour(Role::wrong));
  setPalette(wrong);
  setToolTip(why);
  selectAll();
}

bool AngleField::event(QEvent* event) {
  if (event->type() == QEvent::ShortcutOverride &&
      isForWindow(*static_cast<QKeyEvent*>(event), isUndoAvailable(), isRedoAvailable())) {
    event->ignore();
    return false;
  }
  return QLineEdit::event(event);
}

bool AngleField::focusNextPrevChild(bool) {
  Q_EMIT offered(text());
  return true;
}

void AngleField::keyPressEvent(QKeyEvent* event) {
  if (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter)
    Q_EMIT offered(text());
  else if (event->key() == Qt::Key_Escape)
    parentWidget()->setFocus(Qt::OtherFocusReason);
  else
    QLineEdit::keyPressEvent(event);
}

void AngleField::focusOutEvent(QFocusEvent* event) {
  QLineEdit::focusOutEvent(event);
  if (event->reason() != Qt::PopupFocusReason && event->reason() != Qt::ActiveWindowFocusReason)
    deleteLater();
}

} // namespace planewright

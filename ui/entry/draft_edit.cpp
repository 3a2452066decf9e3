// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/draft_edit.h"

#include "ui/entry/window_keys.h"
#include "ui/look/look.h"

#include <QFocusEvent>
#include <QKeyEvent>
#include <QPainter>

namespace planewright {

namespace {

constexpr int sideMargin = 6;
constexpr int topMargin = 4;
constexpr qreal corner = 3;

bool isPassing(const QFocusEvent* event) {
  return event->reason() == Qt::PopupFocusReason || event->reason() == Qt::MenuBarFocusReason;
}

/// Where code point `column` (1-based) stands in UTF-16.
qsizetype offsetOf(const QString& text, int column) {
  qsizetype at = 0;
  for (int i = 1; i < column && at < text.size(); ++i)
    at += text.at(at).isHighSurrogate() ? 2 : 1;
  return at;
}

} // namespace

DraftEdit::DraftEdit(QWidget* parent) : QLineEdit(parent) {
  setFrame(false);
  setTextMargins(sideMargin, topMargin, sideMargin, topMargin);
  QPalette clear;
  clear.setColor(QPalette::Base, Qt::transparent);
  setPalette(clear);
}

void DraftEdit::setWrong(bool wrong) {
  m_wrong = wrong;
  update();
}

void DraftEdit::selectPiece(const std::string& quoted, int column) {
  const QString piece = fromUtf8(quoted);
  const qsizetype there = column > 0 ? offsetOf(text(), column) : -1;
  const bool stands = there >= 0 && !piece.isEmpty() && text().mid(there, piece.size()) == piece;
  const qsizetype at = stands ? there : piece.isEmpty() ? there : text().indexOf(piece);
  if (at < 0)
    selectAll();
  else
    setSelection(static_cast<int>(at), piece.isEmpty() ? 1 : static_cast<int>(piece.size()));
}

bool DraftEdit::event(QEvent* event) {
  if (event->type() == QEvent::ShortcutOverride &&
      isForWindow(*static_cast<QKeyEvent*>(event), isUndoAvailable(), isRedoAvailable())) {
    event->ignore();
    return false;
  }
  return QLineEdit::event(event);
}

void DraftEdit::keyPressEvent(QKeyEvent* event) {
  const bool bare = !(event->modifiers() & ~Qt::KeypadModifier);
  if (bare && (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter))
    Q_EMIT accepted();
  else if (event->key() == Qt::Key_Escape)
    event->setAccepted(m_putBack && m_putBack());
  else
    QLineEdit::keyPressEvent(event);
}

void DraftEdit::focusInEvent(QFocusEvent* event) {
  QLineEdit::focusInEvent(event);
  if (!isPassing(event))
    Q_EMIT entered(event->reason());
}

void DraftEdit::focusOutEvent(QFocusEvent* event) {
  QLineEdit::focusOutEvent(event);
  if (!isPassing(event))
    Q_EMIT left();
}

void DraftEdit::paintEvent(QPaintEvent* event) {
  const Look look = lookOf(*this);
  const auto ring = [this](QPainter& painter, const QColor& colour, qreal width, qreal inset) {
    const qreal by = inset + width / 2;
    painter.setPen(QPen(colour, width));
    painter.drawRoundedRect(QRectF(rect()).adjusted(by, by, -by, -by), corner, corner);
  };
  {
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.setBrush(look.colour(m_wrong ? Role::wrongGround : Role::field));
    if (m_wrong)
      ring(painter, look.colour(Role::wrong), 2, 0);
    else if (!hasFocus())
      ring(painter, look.colour(Role::other), 1, 0);
    painter.setBrush(m_wrong ? Qt::NoBrush : painter.brush());
    if (hasFocus())
      ring(painter, look.colour(Role::focus), 2, m_wrong ? 2 : 0);
  }
  QLineEdit::paintEvent(event);
}

} // namespace planewright

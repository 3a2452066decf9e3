// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/note_field.h"

#include "ui/entry/entry_field.h"
#include "ui/look/look.h"

#include <QFocusEvent>
#include <QKeyEvent>
#include <QPainter>

namespace planewright {

namespace {
constexpr int shownLines = 3;
}

NoteField::NoteField(Desk& desk, QWidget* parent) : QPlainTextEdit(parent), m_desk(desk) {
  setTabChangesFocus(true);
  setAccessibleName(tr("note on this point"));
  setFrameShape(QFrame::NoFrame);
  document()->setDocumentMargin(6);
  m_settle.setSingleShot(true);
  m_settle.setInterval(EntryField::settlePause);
  connect(&m_settle, &QTimer::timeout, this, &NoteField::take);
  connect(&m_desk, &Desk::changed, this, &NoteField::refresh);
  refresh();
}

QSize NoteField::sizeHint() const {
  return {160, shownLines * fontMetrics().lineSpacing() + 14};
}

void NoteField::focusInEvent(QFocusEvent* event) {
  QPlainTextEdit::focusInEvent(event);
  if (!m_visit)
    m_visit = m_desk.newGesture();
}

void NoteField::focusOutEvent(QFocusEvent* event) {
  QPlainTextEdit::focusOutEvent(event);
  if (event->reason() == Qt::PopupFocusReason)
    return;
  take();
  m_visit.reset();
}

void NoteField::keyPressEvent(QKeyEvent* event) {
  QPlainTextEdit::keyPressEvent(event);
  m_settle.start();
}

void NoteField::paintEvent(QPaintEvent* event) {
  QPlainTextEdit::paintEvent(event);
  QPainter painter(viewport());
  painter.setRenderHint(QPainter::Antialiasing);
  const qreal width = hasFocus() ? 2 : 1;
  painter.setPen(QPen(lookOf(*this).colour(hasFocus() ? Role::focus : Role::other), width));
  painter.drawRoundedRect(QRectF(viewport()->rect()).adjusted(width / 2, width / 2, -width / 2, -width / 2),
                          3, 3);
}

std::string NoteField::noted() const {
  return shownPoint(m_desk.study()).note;
}

void NoteField::take() {
  m_settle.stop();
  const std::string text = toPlainText().toStdString();
  if (text == noted())
    return;
  const auto problem = m_desk.request({Type{{Spot::pointNote, shownPoint(m_desk.study()).name, {}}, text}},
                                      m_visit ? *m_visit : m_desk.newGesture(), tr("note"));
  if (problem)
    m_desk.say(shown(*problem));
}

// What is being typed stays; anything else that changes the note is shown at once.
void NoteField::refresh() {
  const bool isOwn = m_visit && m_desk.cause() == m_visit;
  const QString note = fromUtf8(noted());
  if (isOwn || note == toPlainText() || m_settle.isActive())
    return;
  setPlainText(note);
  if (m_visit)
    m_visit = m_desk.newGesture();
}

} // namespace planewright

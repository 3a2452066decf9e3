// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/note_field.h"

#include "ui/entry/entry_field.h"
#include "ui/entry/window_keys.h"
#include "ui/look/look.h"

#include <QFocusEvent>
#include <QKeyEvent>
#include <QPainter>

namespace planewright {

namespace {

constexpr int shownLines = 3;

Place noteOfShownPoint(const Study& study) {
  return {Spot::pointNote, shownPoint(study).name, {}};
}

} // namespace

NoteField::NoteField(Desk& desk, QWidget* parent) : QPlainTextEdit(parent), m_desk(desk) {
  setProperty("helpPlace", "given#notes");
  setTabChangesFocus(true);
  setAccessibleName(tr("note on this point"));
  setFrameShape(QFrame::NoFrame);
  document()->setDocumentMargin(6);
  m_settle.setSingleShot(true);
  m_settle.setInterval(EntryField::settlePause);
  connect(this, &QPlainTextEdit::textChanged, &m_settle, qOverload<>(&QTimer::start));
  connect(&m_settle, &QTimer::timeout, this, &NoteField::take);
  connect(&m_desk, &Desk::changed, this, &NoteField::refresh);
  follow();
}

QSize NoteField::sizeHint() const {
  return {160, shownLines * fontMetrics().lineSpacing() + 14};
}

bool NoteField::event(QEvent* event) {
  if (event->type() == QEvent::ShortcutOverride &&
      isForWindow(*static_cast<QKeyEvent*>(event), document()->isUndoAvailable(),
                  document()->isRedoAvailable())) {
    event->ignore();
    return false;
  }
  return QPlainTextEdit::event(event);
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

void NoteField::paintEvent(QPaintEvent* event) {
  QPlainTextEdit::paintEvent(event);
  QPainter painter(viewport());
  painter.setRenderHint(QPainter::Antialiasing);
  const qreal width = hasFocus() ? 2 : 1;
  painter.setPen(QPen(lookOf(*this).colour(hasFocus() ? Role::focus : Role::other), width));
  painter.drawRoundedRect(QRectF(viewport()->rect()).adjusted(width / 2, width / 2, -width / 2, -width / 2),
                          3, 3);
}

bool NoteField::hasDraft() const {
  return toPlainText() != m_shown;
}

void NoteField::take() {
  m_settle.stop();
  if (!hasDraft())
    return;
  m_shown = toPlainText();
  request({m_place, m_shown.toStdString()}, m_visit ? *m_visit : m_desk.newGesture());
}

void NoteField::request(const Type& draft, Gesture gesture) {
  if (const auto problem = m_desk.request({draft}, gesture, tr("note")))
    m_desk.say(shown(*problem));
}

// Another point, or another text of this note, ends the draft; a change elsewhere leaves it.
void NoteField::refresh() {
  const Study& study = m_desk.study();
  const Place place = noteOfShownPoint(study);
  const std::string note = textAt(study, place).value_or("");
  const bool isOwn = m_visit && m_desk.cause() == m_visit;
  if (place == m_place && (note == m_known || isOwn)) {
    m_known = note;
    return;
  }
  if (place != m_place && hasDraft())
    takeLater({m_place, toPlainText().toStdString()});
  follow();
}

// The desk is in the middle of telling of another change. What then has no such note, or another one, is
// another study.
void NoteField::takeLater(const Type& draft) {
  const Gesture gesture = m_visit ? *m_visit : m_desk.newGesture();
  const auto takeNow = [this, draft, gesture, known = m_known] {
    if (textAt(m_desk.study(), draft.place) == known)
      request(draft, gesture);
  };
  QMetaObject::invokeMethod(this, takeNow, Qt::QueuedConnection);
}

void NoteField::follow() {
  m_place = noteOfShownPoint(m_desk.study());
  m_known = textAt(m_desk.study(), m_place).value_or("");
  setPlainText(fromUtf8(m_known));
  m_shown = toPlainText();
  if (m_visit)
    m_visit = m_desk.newGesture();
}

} // namespace planewright

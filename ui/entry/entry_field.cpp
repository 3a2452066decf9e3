// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/entry_field.h"

#include "ui/entry/complaint.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/look/runs_label.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QVBoxLayout>

namespace planewright {

EntryField::EntryField(Desk& desk, EntryBinding binding, EntryWords words, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_binding(std::move(binding)), m_words(std::move(words)),
      m_caption(new RunsLabel(m_words.caption, this)), m_edit(new DraftEdit(this)), m_note(new QLabel(this)),
      m_echo(new QLabel(this)), m_complaint(new Complaint(this)) {
  build();
  m_settle.setSingleShot(true);
  m_settle.setInterval(settlePause);
  m_patience.setSingleShot(true);
  m_patience.setInterval(complaintPause);
  m_edit->setPutBack([this] { return putBack(); });
  connect(m_edit, &QLineEdit::textEdited, this, &EntryField::typed);
  connect(m_edit, &DraftEdit::entered, this, &EntryField::beginVisit);
  connect(m_edit, &DraftEdit::left, this, &EntryField::endVisit);
  connect(m_edit, &DraftEdit::accepted, this, &EntryField::accept);
  connect(&m_settle, &QTimer::timeout, this, &EntryField::take);
  connect(&m_patience, &QTimer::timeout, this, [this] { complain(judged(m_edit->text()).problem); });
  connect(&m_desk, &Desk::changed, this, &EntryField::refresh);
  follow();
}

// The focus leaves a field that goes while it has it; by then nothing can be taken any more.
EntryField::~EntryField() {
  m_edit->disconnect(this);
}

void EntryField::build() {
  m_caption->setBuddy(m_edit);
  m_edit->setAccessibleName(name() == m_words.meaning || m_words.meaning.isEmpty()
                                ? name()
                                : name() + QStringLiteral(", ") + m_words.meaning);
  m_note->setForegroundRole(QPalette::PlaceholderText);
  m_echo->setForegroundRole(QPalette::PlaceholderText);
  m_echo->setAlignment(Qt::AlignRight | Qt::AlignTop);
  m_note->setText(tr("from drag"));
  m_complaint->hide();
  m_note->hide();

  auto* line = new QHBoxLayout;
  line->setSpacing(6);
  line->addWidget(m_caption);
  line->addWidget(m_edit, 1);
  auto* under = new QHBoxLayout;
  under->addWidget(m_note);
  under->addWidget(m_echo, 1);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->setSpacing(1);
  rows->addLayout(line);
  rows->addLayout(under);
  rows->addWidget(m_complaint);
}

QString EntryField::name() const {
  return shown(m_words.caption);
}

QString EntryField::echoText() const {
  return m_echo->text();
}

QString EntryField::complaintText() const {
  return m_problem ? m_complaint->words() : QString();
}

void EntryField::focusProblem() {
  m_edit->setFocus(Qt::OtherFocusReason);
  if (m_problem)
    m_edit->selectPiece(m_problem->quoted, m_problem->column);
}

void EntryField::changeEvent(QEvent* event) {
  QWidget::changeEvent(event);
  if (event->type() == QEvent::PaletteChange)
    m_edit->update();
}

// A text that another view, undo or another point put here ends the draft; a change elsewhere leaves it.
void EntryField::refresh() {
  const Study& study = m_desk.study();
  const std::string now = m_binding.text(study);
  const bool sameSpot = m_binding.path(study) == m_path;
  const bool isOwn = m_visit && m_desk.cause() == m_visit->gesture;
  if (sameSpot && (now == m_known || isOwn)) {
    m_known = now;
    if (!m_hasDraft)
      showEcho(standingEcho(), false);
    else if (m_problem && !isOwn)
      judgeAgain();
    return;
  }
  const bool byDrag =
      sameSpot && m_desk.cause() && !m_desk.cause()->isCommand && !m_known.empty() && !now.empty();
  if (byDrag && m_beforeDrag.empty())
    m_beforeDrag = m_known;
  if (!byDrag || now == m_beforeDrag)
    m_beforeDrag.clear();
  if (sameSpot && m_problem && m_desk.cause() && !byDrag && !judged(m_edit->text()).problem) {
    m_known = now;
    judgeAgain();
    return;
  }
  if (m_problem)
    m_desk.say(tr("“%1” for %2 was not taken.").arg(m_edit->text(), name()));
  follow();
}

// What was refused may be right after a change elsewhere. It is not taken while its field is typed in, nor
// after an undo, which another step would make final.
void EntryField::judgeAgain() {
  std::optional<Problem> problem = judged(m_edit->text()).problem;
  if (problem || m_visit || !m_desk.cause()) {
    if (!problem)
      problem =
          Problem{{}, 0, 0, {}, PW_TEXT("Entry", "This can be taken now."), PW_TEXT("Entry", "Press Enter.")};
    complain(std::move(problem));
    return;
  }
  // The step that made it right has to be on the history first.
  QMetaObject::invokeMethod(
      this,
      [this] {
        if (m_problem && m_hasDraft && !m_visit && !judged(m_edit->text()).problem && take())
          dropDraft();
      },
      Qt::QueuedConnection);
}

void EntryField::follow() {
  m_path = m_binding.path(m_desk.study());
  m_known = m_binding.text(m_desk.study());
  dropDraft();
  showDragNote();
  if (m_visit)
    m_visit = {m_desk.newCommand(), m_known};
}

void EntryField::beginVisit(Qt::FocusReason reason) {
  m_visit = {m_desk.newCommand(), m_known};
  if (m_problem && reason != Qt::MouseFocusReason)
    m_edit->selectPiece(m_problem->quoted, m_problem->column);
}

void EntryField::endVisit() {
  if (take())
    dropDraft();
  else
    m_edit->selectPiece(m_problem->quoted, m_problem->column);
  m_visit.reset();
}

void EntryField::typed() {
  m_hasDraft = true;
  m_beforeDrag.clear();
  showDragNote();
  Judgement judgement = judged(m_edit->text());
  if (!judgement.problem) {
    m_patience.stop();
    m_settle.start();
    complain(std::nullopt);
    showEcho(judgement.echo, false);
    return;
  }
  m_settle.stop();
  showEcho(standingEcho(), true);
  if (m_problem)
    complain(std::move(judgement.problem));
  else
    m_patience.start();
}

void EntryField::accept() {
  if (!take()) {
    m_edit->selectPiece(m_problem->quoted, m_problem->column);
    return;
  }
  if (m_visit)
    m_visit->textAtEntry = m_known;
  dropDraft();
  m_edit->selectAll();
}

bool EntryField::putBack() {
  if (!m_visit || (!m_hasDraft && m_known == m_visit->textAtEntry))
    return false;
  // What stood in the study is taken as it stands.
  const auto& back = m_binding.putBack ? m_binding.putBack : m_binding.edits;
  if (Result<Edits> edits = back(m_desk.study(), m_visit->textAtEntry);
      edits && m_known != m_visit->textAtEntry)
    m_desk.request(*edits, m_visit->gesture, tr("typing of %1").arg(name()));
  dropDraft();
  m_edit->selectAll();
  return true;
}

bool EntryField::take() {
  m_settle.stop();
  m_patience.stop();
  if (!m_hasDraft)
    return true;
  const std::string draft = m_edit->text().toStdString();
  Result<Edits> edits = m_binding.edits(m_desk.study(), draft);
  std::optional<Problem> problem;
  if (!edits)
    problem = std::move(edits).error();
  else
    problem = m_desk.request(*edits, m_visit ? m_visit->gesture : m_desk.newCommand(),
                             tr("typing of %1").arg(name()));
  complain(std::move(problem));
  return !m_problem;
}

void EntryField::dropDraft() {
  m_settle.stop();
  m_patience.stop();
  m_hasDraft = false;
  m_edit->setText(fromUtf8(m_known));
  if (!m_edit->hasFocus())
    m_edit->setCursorPosition(0); // a long text shows its start
  complain(std::nullopt);
  showEcho(standingEcho(), false);
}

EntryField::Judgement EntryField::judged(const QString& draft) const {
  const std::string typed = draft.toStdString();
  Result<Edits> edits = m_binding.edits(m_desk.study(), typed);
  if (!edits)
    return {std::move(edits).error(), {}};
  Result<Study> after = edited(m_desk.study(), *edits);
  if (!after)
    return {std::move(after).error(), {}};
  return {std::nullopt, m_binding.echo ? m_binding.echo(*after, evaluate(*after), typed) : QString()};
}

QString EntryField::standingEcho() const {
  return m_binding.echo ? m_binding.echo(m_desk.study(), m_desk.readout(), m_known) : QString();
}

void EntryField::showEcho(const QString& echo, bool stale) {
  QFont font = m_echo->font();
  font.setItalic(stale);
  m_echo->setFont(font);
  QString words;
  if (stale)
    words = tr("still %1").arg(echo.isEmpty() ? fromUtf8(m_known) : echo);
  else if (!echo.isEmpty())
    words = tr("= %1").arg(echo);
  m_echo->setText(words);
  m_echo->setVisible(!words.isEmpty());
  describe();
}

void EntryField::showDragNote() {
  const bool dragged = m_words.tellsDrag && !m_beforeDrag.empty();
  m_note->setVisible(dragged);
  m_edit->setToolTip(dragged ? tr("before the drag: %1").arg(fromUtf8(m_beforeDrag)) : QString());
}

void EntryField::complain(std::optional<Problem> problem) {
  const bool wasTaken = isTaken();
  m_problem = std::move(problem);
  m_edit->setWrong(!isTaken());
  m_complaint->setVisible(!isTaken());
  if (m_problem) {
    m_complaint->say(shown(m_problem->what), shown(m_problem->mend));
    showEcho(standingEcho(), true);
  }
  describe();
  if (wasTaken != isTaken())
    Q_EMIT takenChanged();
}

void EntryField::describe() {
  QString words = m_echo->text();
  if (m_problem)
    words = tr("Not taken: %1 %2").arg(m_complaint->words(), words);
  if (m_edit->accessibleDescription() != words)
    m_edit->setAccessibleDescription(words);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/desk.h"

#include "core/record/fingerprint.h"
#include "core/study/verdict.h"

#include <QUndoCommand>

namespace planewright {

/// The one undo command: swaps whole studies. Edits of one gesture merge; a gesture that ends where it began
/// leaves no step.
class StudyCommand : public QUndoCommand {
public:
  StudyCommand(Desk& desk, std::shared_ptr<const Study> after, Gesture gesture, const QString& what)
      : QUndoCommand(what), m_desk(desk), m_before(desk.m_study), m_after(std::move(after)),
        m_gesture(gesture) {}

  int id() const override { return 1; }
  void undo() override { m_desk.take(m_before); }
  void redo() override { m_desk.take(m_after); }

  const Study& before() const { return *m_before; }

  bool mergeWith(const QUndoCommand* other) override {
    const auto* later = static_cast<const StudyCommand*>(other);
    if (later->m_gesture != m_gesture)
      return false;
    m_after = later->m_after;
    setText(later->text());
    setObsolete(*m_after == *m_before);
    return true;
  }

private:
  Desk& m_desk;
  std::shared_ptr<const Study> m_before;
  std::shared_ptr<const Study> m_after;
  Gesture m_gesture;
};

namespace {
constexpr int undoLimit = 1000;
}

Desk::Desk(Study study, QObject* parent)
    : QObject(parent), m_study(std::make_shared<const Study>(std::move(study))),
      m_readout(evaluate(*m_study)) {
  m_undo.setUndoLimit(undoLimit);
}

Gesture Desk::newGesture() {
  return {++m_lastGesture};
}

Gesture Desk::newCommand() {
  return {++m_lastGesture, true};
}

std::optional<Problem> Desk::request(const Edits& edits, Gesture gesture, const QString& what) {
  Result<Study> after = editedAndSigned(*m_study, edits);
  if (!after)
    return std::move(after).error();
  if (*after != *m_study) {
    m_cause = gesture;
    m_undo.push(new StudyCommand(*this, std::make_shared<const Study>(*std::move(after)), gesture, what));
    m_cause.reset();
  }
  return std::nullopt;
}

const Study* Desk::beforeNewestStep() const {
  const auto* newest = static_cast<const StudyCommand*>(m_undo.command(m_undo.index() - 1));
  return newest ? &newest->before() : nullptr;
}

void Desk::show(const std::string& point, const std::string& combination) {
  const Result<Study> after = edited(*m_study, Edits{Type{{Spot::shownPoint, {}, {}}, point},
                                                     Type{{Spot::shownCombination, {}, {}}, combination}});
  if (after && *after != *m_study)
    take(std::make_shared<const Study>(*after));
}

void Desk::replace(Study study) {
  m_undo.clear();
  take(std::make_shared<const Study>(std::move(study)));
}

void Desk::say(const QString& message) {
  Q_EMIT said(message);
}

const AllRound& Desk::allRound(std::size_t check) {
  m_allRound.follow(m_readout, check);
  return m_allRound;
}

void Desk::take(std::shared_ptr<const Study> study) {
  m_study = std::move(study);
  Readout readout = evaluate(*m_study);
  const bool isAlike = isJudgedAlike(m_readout, readout);
  m_readout = std::move(readout);
  Q_EMIT changed();
  if (!isAlike)
    Q_EMIT judgedAnew();
}

} // namespace planewright

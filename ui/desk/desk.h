// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/all_round.h"
#include "core/study/edit.h"
#include "core/study/readout.h"

#include <QObject>
#include <QUndoStack>

#include <memory>
#include <optional>

namespace planewright {

/// Names one drag, one stay in a field or one command; edits of one gesture make one undo step. Never reused.
struct Gesture {
  quint64 number = 0;
  bool isCommand = false; ///< typed, chosen in a menu or a dialog, or by keys: nothing was drawn by hand
  bool operator==(const Gesture&) const = default;
};

/// Owns the study, its readout and the undo history. The only way to change the study is request().
class Desk : public QObject {
  Q_OBJECT

public:
  explicit Desk(Study study, QObject* parent = nullptr);

  const Study& study() const { return *m_study; }
  const Readout& readout() const { return m_readout; }
  QUndoStack* undoStack() { return &m_undo; }

  Gesture newGesture();
  Gesture newCommand();
  /// Applies the edits as one step of the gesture; the Problem when they are not taken. Edits that change
  /// nothing leave no step.
  std::optional<Problem> request(const Edits& edits, Gesture gesture, const QString& what);
  /// While changed() tells of a request: its gesture. None for undo, redo, show and replace.
  const std::optional<Gesture>& cause() const { return m_cause; }
  /// The study before the newest step of the history; null where there is none to undo.
  const Study* beforeNewestStep() const;
  /// Shows another point or combination: no undo step, not a change to save.
  void show(const std::string& point, const std::string& combination);
  /// Puts another study on the desk with an empty history (New, Open).
  void replace(Study study);
  /// What a check of the readout says of every direction; good until the next call.
  const AllRound& allRound(std::size_t check);
  /// A message for the status line, with what changed.
  void say(const QString& message);

signals:
  void changed();
  /// After changed(), where what follows from the checks is another: for what takes long to work out.
  void judgedAnew();
  void said(const QString& message);

private:
  friend class StudyCommand;
  void take(std::shared_ptr<const Study> study);

  std::shared_ptr<const Study> m_study;
  Readout m_readout;
  AllRound m_allRound; ///< of the check that was asked for last
  QUndoStack m_undo;
  quint64 m_lastGesture = 0;
  std::optional<Gesture> m_cause;
};

} // namespace planewright

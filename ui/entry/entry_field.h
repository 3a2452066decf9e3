// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_binding.h"

#include <QTimer>
#include <QWidget>

class QLabel;

namespace planewright {

class Complaint;
class DraftEdit;

/// How a field is called.
struct EntryWords {
  Text caption;           ///< beside the field: "σ_{x}", "normal at"
  QString meaning;        ///< for those who do not see it: "normal stress on the x face"
  bool tellsDrag = false; ///< says when another view replaced the typed text
};

/// The one expression field: caption and text, under it the evaluated value and, when the text does not
/// read, what is wrong. The draft is its only state; everything else comes from the study.
///
/// The echo follows each key. The study takes the text at Enter, on leaving, or after a pause when it reads
/// well; one stay in the field is one gesture and so one undo step. Escape puts back the text at entry, or
/// what Enter took last. A refused text stays, and is taken as soon as a change elsewhere makes it right.
class EntryField : public QWidget {
  Q_OBJECT

public:
  static constexpr int settlePause = 600;    ///< ms without a key until the study takes a good text
  static constexpr int complaintPause = 400; ///< ms without a key until a bad one is explained

  EntryField(Desk& desk, EntryBinding binding, EntryWords words, QWidget* parent = nullptr);
  ~EntryField() override;

  DraftEdit& edit() const { return *m_edit; }
  QLabel& caption() const { return *m_caption; }
  /// False while a text stands here that the study could not take.
  bool isTaken() const { return !m_problem; }
  /// The caption without indices in their place: "τxy".
  QString name() const;
  QString echoText() const;
  QString complaintText() const;
  /// Looks at the study again, for a binding that has moved to another spot.
  void refresh();
  /// Puts the cursor into the field, on what is wrong.
  void focusProblem();

signals:
  void takenChanged();

protected:
  void changeEvent(QEvent* event) override;

private:
  /// What a draft would do: its echo, or why it cannot be taken.
  struct Judgement {
    std::optional<Problem> problem;
    QString echo;
  };
  /// One stay of the focus.
  struct Visit {
    Gesture gesture;
    std::string textAtEntry;
  };

  void build();
  void follow();
  void judgeAgain();
  void beginVisit(Qt::FocusReason reason);
  void endVisit();
  void typed();
  void accept();
  bool putBack();
  bool take();
  void dropDraft();
  Judgement judged(const QString& draft) const;
  QString standingEcho() const;
  void showEcho(const QString& echo, bool stale);
  void showDragNote();
  void complain(std::optional<Problem> problem);
  void describe();

  Desk& m_desk;
  EntryBinding m_binding;
  EntryWords m_words;
  QLabel* m_caption;
  DraftEdit* m_edit;
  QLabel* m_note;
  QLabel* m_echo;
  Complaint* m_complaint;
  QTimer m_settle;
  QTimer m_patience;
  bool m_hasDraft = false;
  std::string m_path;  ///< the spot and
  std::string m_known; ///< its text when last seen, to tell whether they have moved
  std::string m_beforeDrag;
  std::optional<Visit> m_visit;
  std::optional<Problem> m_problem;
};

} // namespace planewright

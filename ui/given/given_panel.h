// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/look/column_area.h"

namespace planewright {

class ConventionGroup;
class EntryField;
class FoldGroup;
class LineGroup;
class NoteField;
class ReadingGroup;
class SectionGroup;
class SteadyLabel;
class StressGroup;

/// Everything that is given, in groups that fold: what counts positive, stress, line, reading plane,
/// conventions, notes.
class GivenPanel : public ColumnArea {
  Q_OBJECT

public:
  explicit GivenPanel(Desk& desk, QWidget* parent = nullptr);
  ~GivenPanel() override;

  QSize sizeHint() const override { return {300, 600}; }

public slots:
  /// Puts the cursor into the first component, its text selected.
  void focusFirst();
  /// Puts the cursor into the angle of the reading plane's normal, its text selected.
  void focusReading();
  /// Opens the group of conventions and units and puts the cursor into it.
  void focusConventions();
  /// To the next or previous entry that is not taken, round the end.
  void focusNextProblem();
  void focusPreviousProblem();

signals:
  /// How many entries stand here that the study could not take, and what the first is called:
  /// "τxy of case S".
  void entriesNotTaken(int count, const QString& firstLabel);

private:
  void buildGroups(QWidget* content);
  void buildHeading(QWidget* content);
  void makeSecondLine();
  void takeFields();
  void watchFields();
  void orderTabs();
  void refresh();
  void countProblems();
  void focusProblem(int step);
  QString labelOfEntry(const EntryField& field) const;
  QList<EntryField*> fields() const;

  Desk& m_desk;
  SteadyLabel* m_fact;
  StressGroup* m_stress;
  SectionGroup* m_section;
  LineGroup* m_line;
  LineGroup* m_secondLine = nullptr; ///< made when a point first has a second line
  QWidget* m_secondRule = nullptr;
  ReadingGroup* m_reading;
  ConventionGroup* m_conventions;
  FoldGroup* m_notes;
  NoteField* m_note;
};

} // namespace planewright

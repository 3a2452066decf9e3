// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

class QLabel;

namespace planewright {

class CaseStrip;
class QuietButton;

/// The components of one load case at the shown point, its third direction and the member's axes.
class StressGroup : public FoldGroup {
  Q_OBJECT

public:
  explicit StressGroup(Desk& desk, QWidget* parent = nullptr);

  /// In the order of Tab: sx, sy, txy; then sz and the axes.
  const QList<EntryField*>& fields() const { return m_fields; }
  /// The case whose stresses are typed here.
  std::string caseId(const Study& study) const;
  /// Whether a field holds a stress of the case, and not the axes.
  bool isOfCase(const EntryField& field) const;
  QList<QWidget*> buttons() const;

private:
  void addStress(Spot spot, const QString& meaning, decltype(EntryBinding::echo) echo);
  void addComponent(Spot spot, const QString& meaning, double PlaneStress::*component);
  void addAxes();
  void buildMore();
  void chooseCase(const std::string& id);
  void refresh();
  QString sumLine() const;
  QString cautionLine() const;
  QString summary() const;
  QString componentsOf(const StateReading& state) const;

  Desk& m_desk;
  std::string m_case; ///< as chosen in the strip; the first where the study has it no more
  bool m_thirdWanted = false;
  bool m_axesWanted = false;
  QList<EntryField*> m_fields;
  CaseStrip* m_strip;
  QLabel* m_sum;
  QLabel* m_caution;
  QuietButton* m_addThird;
  QuietButton* m_addAxes;
};

} // namespace planewright

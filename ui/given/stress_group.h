// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

class QLabel;

namespace planewright {

class CaseStrip;
class QuietButton;
class SourceFields;

/// The components of one load case at the shown point, its third direction and the member's axes.
class StressGroup : public FoldGroup {
  Q_OBJECT

public:
  explicit StressGroup(Desk& desk, QWidget* parent = nullptr);

  /// In the order of Tab: sx, sy, txy; the sources; then sz, the axes and the free edge.
  QList<EntryField*> fields() const;
  /// The case whose stresses are typed here: one that acts in the shown state at the shown point, until
  /// another is chosen.
  std::string caseId(const Study& study) const;
  /// Whether a field holds a stress of the case, and not the axes.
  bool isOfCase(const EntryField& field) const;
  QList<QWidget*> buttons() const;

signals:
  /// Other fields or buttons stand here than before.
  void fieldsChanged();

private:
  void addStress(Spot spot, const QString& meaning, decltype(EntryBinding::echo) echo);
  void addComponent(Spot spot, const QString& meaning);
  void addDirection(Spot spot, const Text& caption, const QString& meaning,
                    decltype(EntryBinding::echo) echo);
  void addSources();
  void addAxes();
  void buildMore();
  void followShown();
  void chooseCase(const std::string& id);
  void refresh();
  QString caseLine() const;
  QString edgeLine() const;
  QString sumLine() const;
  QString cautionLine() const;
  QString summary() const;
  QString componentsOf(const StateReading& state) const;

  Desk& m_desk;
  Shown m_chosenAt;   ///< the point and combination for which the case was chosen
  std::string m_case; ///< as chosen in the strip, else one that acts there
  bool m_thirdWanted = false;
  bool m_axesWanted = false;
  bool m_edgeWanted = false;
  QList<EntryField*> m_fields;
  CaseStrip* m_strip;
  QLabel* m_whole; ///< what sources make of the case
  QLabel* m_sum;
  QLabel* m_caution;
  QList<SourceFields*> m_sources;
  QuietButton* m_addSource;
  QuietButton* m_addThird;
  QuietButton* m_addAxes;
  QuietButton* m_addEdge;
};

} // namespace planewright

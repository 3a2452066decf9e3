// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

class QAction;

namespace planewright {

class QuietButton;
class SteadyLabel;

/// One physical line in the plane of stress, the first or the second of a point: its kind and name, its angle
/// and tolerance, and where the normal of the cut that follows it stands.
class LineGroup : public FoldGroup {
  Q_OBJECT

public:
  LineGroup(Desk& desk, std::size_t index, QWidget* parent = nullptr);

  /// In the order of Tab: angle, tolerance; then the name.
  const QList<EntryField*>& fields() const { return m_fields; }
  QList<QWidget*> buttons() const;

private:
  Place spot(const Study& study, Spot spot) const;
  const Line* line(const Study& study) const;
  EntryBinding boundToLine(Spot spot) const;
  void buildKinds();
  void buildSlopes();
  void nameSlopes();
  void takeEitherWay(const std::string& slope);
  void buildSecond();
  void addField(EntryBinding binding, EntryWords words);
  void addName();
  void editName();
  bool isNamedByKind() const;
  void addAngle();
  void addTolerance();
  void chooseKind(LineKind kind);
  void removeLine();
  void addLine(LineKind kind);
  void refresh();
  QString sentence() const;
  QString summary() const;

  Desk& m_desk;
  std::size_t m_index;
  QuietButton* m_kind;
  QuietButton* m_slopes;
  QList<QAction*> m_eitherWay;
  QuietButton* m_second;
  bool m_nameWanted = false;
  QList<EntryField*> m_fields;
  SteadyLabel* m_sentence;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

class QGridLayout;

namespace planewright {

class ChoiceButton;
class QuietButton;

/// What counts positive, how the shear axis is drawn, and the units of bare numbers and results.
class ConventionGroup : public FoldGroup {
  Q_OBJECT

public:
  explicit ConventionGroup(Desk& desk, QWidget* parent = nullptr);

  const QList<EntryField*>& fields() const { return m_fields; }
  QList<QWidget*> buttons() const;

private:
  template <class Enum>
  void addChoices(QGridLayout& grid, QList<ChoiceButton*>& buttons);
  /// A button that names the chosen word of a spot and opens a menu of all.
  template <class Enum>
  QuietButton* addWord(Spot spot, const QString& what);
  void addUnits();
  void choose(Positive positive);
  void choose(ShearAxis axis);
  void refresh();

  Desk& m_desk;
  QList<ChoiceButton*> m_positive;
  QList<ChoiceButton*> m_shearAxis;
  QuietButton* m_shearForce;
  QuietButton* m_digits;
  QList<EntryField*> m_fields;
};

} // namespace planewright

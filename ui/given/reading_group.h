// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

namespace planewright {

class QuietButton;

/// The reading plane by its normal or by the direction in which the cut itself runs: one plane, two fields.
class ReadingGroup : public FoldGroup {
  Q_OBJECT

public:
  explicit ReadingGroup(Desk& desk, QWidget* parent = nullptr);

  const QList<EntryField*>& fields() const { return m_fields; }
  QList<QWidget*> buttons() const;

private:
  void addField(EntryBinding binding, EntryWords words);
  void addNormal();
  void addCut();
  void listDirections();
  void refresh();

  Desk& m_desk;
  QuietButton* m_goTo;
  QList<EntryField*> m_fields;
};

} // namespace planewright

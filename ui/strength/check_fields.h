// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"

#include <functional>

namespace planewright {

class QuietButton;

/// What is asked of the selected check: material, criterion, line or plane, and the parameters that the
/// criterion may have.
class CheckFields : public QWidget {
  Q_OBJECT

public:
  /// `selected` tells the index of the check in the Readout.
  CheckFields(Desk& desk, std::function<std::optional<std::size_t>()> selected, QWidget* parent);

  QList<EntryField*> fields() const { return m_fields; }
  QList<QWidget*> buttons() const;
  /// After another check was selected.
  void refresh();

private:
  const Check* check() const;
  void addParameter(Spot spot, const QString& meaning);
  void listMaterials();
  void listCriteria();
  void listDirections();
  void ask(const Edits& edits, const QString& what);

  Desk& m_desk;
  std::function<std::optional<std::size_t>()> m_selectedIndex;
  QuietButton* m_material;
  QuietButton* m_criterion;
  QuietButton* m_direction;
  QList<EntryField*> m_fields;
  QList<Spot> m_spots; ///< of the fields
};

} // namespace planewright

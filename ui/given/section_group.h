// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"
#include "ui/given/fold_group.h"

class QLabel;

namespace planewright {

class QuietButton;
class SectionView;

/// The cross section in which the shown point lies: its shape and sizes, the place of the fibre and the side
/// from which it is seen, and a drawing of it with the stresses of the section forces.
class SectionGroup : public FoldGroup {
  Q_OBJECT

public:
  explicit SectionGroup(Desk& desk, QWidget* parent = nullptr);

  /// In the order of Tab: sizes, then y and z. They change with the section.
  QList<EntryField*> fields() const { return m_sizes + m_places; }
  QList<QWidget*> buttons() const;
  SectionView& view() const { return *m_view; }

signals:
  /// Other fields stand here than before.
  void fieldsChanged();

private:
  void buildButtons();
  void buildPlaces();
  void buildView();
  void listSections();
  void listPlaces();
  void listWorst();
  void rebuildSizes();
  void addSize(const std::string& key);
  void ask(const Edits& edits, const QString& what);
  void reshape(SectionShape shape);
  void refresh();
  const TypedSection* section() const;
  QString properties() const;

  Desk& m_desk;
  QuietButton* m_choice;
  QuietButton* m_shape;
  QuietButton* m_side;
  QuietButton* m_ready;
  QuietButton* m_worst;
  QuietButton* m_addBlock;
  QuietButton* m_dropBlock;
  QWidget* m_sizeRows;
  QWidget* m_rest; ///< all below the sizes
  QLabel* m_drawn; ///< whose stresses the drawing has
  QLabel* m_properties;
  SectionView* m_view;
  std::string m_builtFor; ///< the section and keys that the size fields stand for
  QList<EntryField*> m_sizes;
  QList<EntryField*> m_places;
};

} // namespace planewright

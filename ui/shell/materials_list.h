// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/material_choice.h"

#include <QString>
#include <QWidget>

#include <vector>

class QLineEdit;
class QTreeWidget;
class QTreeWidgetItem;

namespace planewright {

/// A heading of the list and the names under it.
struct MaterialGroup {
  MaterialOrigin origin;
  QString title;
  QString whenEmpty; ///< stands in place of names
  std::vector<std::string> names;
  bool operator==(const MaterialGroup&) const = default;
};

/// The materials that there are, by groups, under a line that filters them by name.
class MaterialsList : public QWidget {
  Q_OBJECT

public:
  explicit MaterialsList(QWidget* parent);

  /// Shows these groups, with `current` as the current one.
  void fill(const std::vector<MaterialGroup>& groups, const MaterialChoice& current);
  QLineEdit& filter() const { return *m_filter; }
  QTreeWidget& tree() const { return *m_tree; }

signals:
  /// Another material has become the current one, by the user or by fill().
  void chosen(const planewright::MaterialChoice& choice);
  /// Enter or a double click on a material; F2 on one.
  void opened(const planewright::MaterialChoice& choice);
  void renameWanted(const planewright::MaterialChoice& choice);

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;
  void showEvent(QShowEvent* event) override;

private:
  void narrow();
  QTreeWidgetItem* firstSeen() const;
  void select(const MaterialChoice& choice);
  void reveal();
  QTreeWidgetItem* itemOf(const MaterialChoice& choice) const;

  QLineEdit* m_filter;
  QTreeWidget* m_tree;
  std::vector<MaterialGroup> m_groups;
};

} // namespace planewright

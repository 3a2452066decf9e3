// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where these come first.
#include "core/screen/field_rows.h"
#include "ui/screen/screened_field.h"

#include <QAbstractTableModel>

namespace planewright {

/// The points of a screened field that are wanted, in the order that is wanted: an index of them that is made
/// elsewhere, beside the window. Texts are made of what is looked at.
class FieldModel : public QAbstractTableModel {
  Q_OBJECT

public:
  explicit FieldModel(QObject* parent) : QAbstractTableModel(parent) {}

  const std::shared_ptr<const ScreenedField>& field() const { return m_field; }
  const FieldRows& rows() const { return m_rows; }
  /// Another field, without rows until they come; or none.
  void show(std::shared_ptr<const ScreenedField> field);
  void take(FieldRows rows);

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;
  /// Asks for other rows.
  void sort(int column, Qt::SortOrder order) override;

  FieldKey keyOf(int column) const { return m_keys[static_cast<std::size_t>(column)]; }
  int columnOf(FieldKey key) const;
  std::uint32_t pointAt(int row) const { return (*m_rows)[static_cast<std::size_t>(row)]; }
  /// The row of a point, where it is wanted.
  std::optional<int> rowOf(std::uint32_t point) const;
  /// What the table has of a point, a line for each value.
  QString linesOf(std::uint32_t point) const;

signals:
  void sortWanted(const planewright::FieldSort& sort);

private:
  QString textOf(std::uint32_t point, FieldKey key) const;
  QString textOfJudged(const PointResult& result, FieldKey key) const;

  std::shared_ptr<const ScreenedField> m_field;
  FieldRows m_rows = std::make_shared<const std::vector<std::uint32_t>>();
  std::vector<FieldKey> m_keys;
};

} // namespace planewright

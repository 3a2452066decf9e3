// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where this one comes first.
#include "core/study/verdict.h"

#include <QAbstractTableModel>

namespace planewright {

/// One row for each check of each point, with its worst over all combinations and its band; points without a
/// check have a row that says so. It is worked out when it is looked at, from the desk's study.
class SummaryModel : public QAbstractTableModel {
  Q_OBJECT

public:
  enum Column { point, check, utilisation, combination, mode, angle, columns };

  explicit SummaryModel(QObject* parent) : QAbstractTableModel(parent) {}

  void show(const Study& study);

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;

  Standing standing() const { return m_summary.standing; }
  bool exceeds(int row) const;
  const std::string& pointOf(int row) const;
  /// Empty for a point without a check.
  std::string combinationOf(int row) const;

private:
  bool isChecked(int row) const { return static_cast<std::size_t>(row) < m_summary.rows.size(); }
  const SummaryRow& rowAt(int row) const { return m_summary.rows[static_cast<std::size_t>(row)]; }
  QString textOf(int row, int column) const;
  QVariant sortKey(int row, int column) const;

  Summary m_summary;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

// First, because moc does not read <compare> of the standard library on its own.
#include <QAbstractTableModel>

#include "core/record/pasted_points.h"

class QWidget;

namespace planewright {

/// What pasting comes to as an item model: its rows as they would be kept, and behind them what is wrong.
class PasteModel : public QAbstractTableModel {
  Q_OBJECT

public:
  /// Wrong cells are marked in the colours of `dressed`.
  explicit PasteModel(QWidget& dressed);

  const PastedPoints& pasted() const { return m_pasted; }
  void put(PastedPoints pasted);
  /// The next row from `row` on, going round, that has a Problem; -1 where none has.
  int nextWrongRow(int row) const;

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;

private:
  const PastedRow& row(int at) const { return m_pasted.rows[static_cast<std::size_t>(at)]; }
  QString headingOf(int column) const;
  QString wordsAt(const QModelIndex& index) const;
  bool isWrong(const QModelIndex& index) const;

  QWidget& m_dressed;
  PastedPoints m_pasted;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

// First, because moc does not read <compare> of the standard library on its own.
#include <QAbstractTableModel>

#include "core/table/table.h"
#include "core/words/problem.h"

namespace planewright {

/// The columns of the tables of planes; the last three stand where several combinations are judged.
enum class PlaneColumn { plane, normal, cut, sn, tnt, leastSn, greatestSn, greatestShear };

/// What stands at the right end of the first cell of a row: a fact, a choice to click, or what is wrong.
struct RowNote {
  enum class Kind { none, fact, choice, wrong };
  Kind kind = Kind::none;
  Text words;
};

/// A Table of core as an item model. A new Table only changes data where it has the same shape, and lets
/// columns come and go at the end, so that cursor, selection and an open editor stay.
class TableModel : public QAbstractTableModel {
  Q_OBJECT

public:
  using QAbstractTableModel::QAbstractTableModel;

  const Table& table() const { return m_table; }
  /// The combination that gives the value of a cell; empty for one of the shown state.
  QString combinationIn(const QModelIndex& index) const;
  /// The row on the selection ground, -1 for none; bold where it is the reading plane itself.
  virtual int tintedRow() const = 0;
  virtual bool tintIsBold() const = 0;
  virtual RowNote noteOf(int row) const = 0;
  /// Takes what was typed in a cell; the Problem when it is not taken.
  virtual std::optional<Problem> enter(const QModelIndex& index, const QString& typed) = 0;

  /// An editor closed without an entry: what it was told does not count any more.
  virtual void forget() {}

  int rowCount(const QModelIndex& parent = {}) const override;
  int columnCount(const QModelIndex& parent = {}) const override;
  QVariant data(const QModelIndex& index, int role) const override;
  bool setData(const QModelIndex& index, const QVariant& value, int role) override;
  QVariant headerData(int section, Qt::Orientation orientation, int role) const override;

protected:
  void setTable(Table table);
  void resetTable(Table table);
  void tellChanged();

private:
  QString rangeTip() const;
  void setColumns(const std::vector<Column>& columns);

  Table m_table;
};

} // namespace planewright

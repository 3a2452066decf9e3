// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/table_model.h"

#include "core/quantity/format.h"
#include "ui/look/look.h"

#include <algorithm>

namespace planewright {

namespace {

bool isSameRow(const Row& a, const Row& b) {
  return a.kind == b.kind && a.name == b.name;
}

/// Full digits with the true minus and the unit.
QString fullDigits(double value, const Column& column) {
  QString digits = fromUtf8(exactNumber(value));
  digits.replace(QLatin1Char('-'), QChar(0x2212));
  return column.unit.empty() ? digits + QChar(0xB0) : digits + QLatin1Char(' ') + fromUtf8(column.unit);
}

} // namespace

int TableModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_table.rows.size());
}

int TableModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_table.columns.size());
}

QString TableModel::combinationIn(const QModelIndex& index) const {
  const auto row = static_cast<std::size_t>(index.row());
  if (!index.isValid() || row >= m_table.rows.size())
    return {};
  return fromUtf8(m_table.rows[row].cells[static_cast<std::size_t>(index.column())].combination);
}

QVariant TableModel::data(const QModelIndex& index, int role) const {
  const auto row = static_cast<std::size_t>(index.row());
  if (!index.isValid() || row >= m_table.rows.size())
    return {};
  const auto at = static_cast<std::size_t>(index.column());
  const Column& column = m_table.columns[at];
  const Cell& cell = m_table.rows[row].cells[at];
  switch (role) {
  case Qt::DisplayRole:
    return shown(cell.shown);
  case Qt::ToolTipRole:
    if (!cell.combination.empty())
      return tr("%1 in %2\nEnter shows this combination")
          .arg(fullDigits(*cell.exact, column), combinationIn(index));
    if (cell.exact)
      return fullDigits(*cell.exact, column);
    return shown(noteOf(index.row()).words);
  case Qt::AccessibleTextRole:
    return cell.combination.empty() ? shown(cell.shown)
                                    : tr("%1 in %2").arg(shown(cell.shown), combinationIn(index));
  case Qt::AccessibleDescriptionRole:
    return index.column() == 0 ? shown(noteOf(index.row()).words) : QString();
  case Qt::TextAlignmentRole:
    return int(column.isNumber ? Qt::AlignRight | Qt::AlignVCenter : Qt::AlignLeft | Qt::AlignVCenter);
  default:
    return {};
  }
}

bool TableModel::setData(const QModelIndex& index, const QVariant& value, int role) {
  return role == Qt::EditRole && !enter(index, value.toString());
}

QString TableModel::rangeTip() const {
  QStringList sentences = {tr("Over all combinations that are judged; single cases are not part of it.")};
  for (const Text& caution : m_table.ofRange)
    sentences << shown(caution);
  return sentences.join(QLatin1Char('\n'));
}

QVariant TableModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation == Qt::Horizontal && role == Qt::ToolTipRole &&
      section >= static_cast<int>(PlaneColumn::leastSn) && section < columnCount())
    return rangeTip();
  if (orientation != Qt::Horizontal || role != Qt::DisplayRole || section >= columnCount())
    return {};
  const Column& column = m_table.columns[static_cast<std::size_t>(section)];
  const QString heading = shown(column.heading);
  return column.unit.empty() ? heading : heading + QLatin1Char(' ') + fromUtf8(column.unit);
}

// Columns come and go at the end, before the rows change.
void TableModel::setColumns(const std::vector<Column>& columns) {
  const int before = columnCount();
  const int now = static_cast<int>(columns.size());
  if (now > before)
    beginInsertColumns({}, before, now - 1);
  else
    beginRemoveColumns({}, now, before - 1);
  m_table.columns = columns;
  for (Row& row : m_table.rows)
    row.cells.resize(columns.size());
  if (now > before)
    endInsertColumns();
  else
    endRemoveColumns();
}

// One block of rows may come or go; what stands above and below it stays. Any other change of rows is a
// table anew.
void TableModel::setTable(Table table) {
  const std::vector<Row>& old = m_table.rows;
  const std::vector<Row>& now = table.rows;
  const std::size_t shorter = std::min(old.size(), now.size());
  const auto above = static_cast<std::size_t>(
      std::mismatch(old.begin(), old.begin() + static_cast<std::ptrdiff_t>(shorter), now.begin(), isSameRow)
          .first -
      old.begin());
  const bool below = std::equal(old.rbegin(), old.rbegin() + static_cast<std::ptrdiff_t>(shorter - above),
                                now.rbegin(), isSameRow);
  const int first = static_cast<int>(above);
  const int come = static_cast<int>(now.size()) - static_cast<int>(old.size());
  if (m_table.columns.empty() || (come != 0 && !below)) {
    resetTable(std::move(table));
    return;
  }
  if (m_table.columns.size() != table.columns.size())
    setColumns(table.columns);
  const bool otherUnits =
      !std::ranges::equal(m_table.columns, table.columns, {}, &Column::unit, &Column::unit);
  if (come < 0)
    beginRemoveRows({}, first, first - come - 1);
  else if (come > 0)
    beginInsertRows({}, first, first + come - 1);
  m_table = std::move(table);
  if (come < 0)
    endRemoveRows();
  else if (come > 0)
    endInsertRows();
  if (otherUnits)
    Q_EMIT headerDataChanged(Qt::Horizontal, 0, columnCount() - 1);
  tellChanged();
}

void TableModel::resetTable(Table table) {
  beginResetModel();
  m_table = std::move(table);
  endResetModel();
}

void TableModel::tellChanged() {
  if (rowCount() > 0)
    Q_EMIT dataChanged(index(0, 0), index(rowCount() - 1, columnCount() - 1));
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/copied_table.h"

#include "core/quantity/format.h"
#include "ui/look/look.h"

#include <set>

namespace planewright {

Table partOf(const Table& table, const QModelIndexList& cells) {
  std::set<std::size_t> rows;
  std::set<std::size_t> columns;
  for (const QModelIndex& cell : cells) {
    rows.insert(static_cast<std::size_t>(cell.row()));
    columns.insert(static_cast<std::size_t>(cell.column()));
  }
  Table part;
  part.cautions = table.cautions;
  for (const std::size_t column : columns)
    part.columns.push_back(table.columns[column]);
  for (const std::size_t at : rows) {
    if (at >= table.rows.size()) // the row in which a plane to watch is typed
      continue;
    Row row = table.rows[at];
    row.cells.clear();
    for (const std::size_t column : columns)
      row.cells.push_back(table.rows[at].cells[column]);
    part.rows.push_back(std::move(row));
  }
  return part;
}

QString oneCell(const Table& table, const QModelIndex& cell) {
  const auto row = static_cast<std::size_t>(cell.row());
  if (row >= table.rows.size())
    return {};
  const Cell& there = table.rows[row].cells[static_cast<std::size_t>(cell.column())];
  return there.exact ? fromUtf8(exactNumber(*there.exact)) : shown(there.shown);
}

} // namespace planewright

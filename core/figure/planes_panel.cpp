// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/planes_panel.h"

#include "core/figure/signs.h"
#include "core/figure/text_lines.h"
#include "core/table/table.h"

#include <algorithm>

namespace planewright {

namespace {

// In ems of the table's text.
constexpr double pitch = 1.45;
constexpr double headHeight = 1.75;
constexpr double baseline = 1.1; ///< of a row under its top
constexpr double nameStart = 1.6;
constexpr double columnGap = 1.6;
constexpr double edge = 0.15;
constexpr double leastColumn = 0.115; ///< of the figure's width

/// A column as set: its cells without the heading, right aligned at `right` but for the first.
struct SetColumn {
  Runs heading;
  std::vector<Runs> cells;
  bool isNumber = true;
  double right = 0;
};

/// "σ_n (MPa)".
Runs headingOf(const Setting& setting, const Column& column) {
  if (column.unit.empty())
    return setting.runsOf(column.heading);
  return setting.runsOf(PW_TEXT("Figure", "%1 (%2)").with(column.heading).with(column.unit));
}

bool isBold(const Row& row) {
  return row.kind == PlaneKind::reading;
}

std::vector<SetColumn> columnsOf(const Setting& setting, const Table& table) {
  std::vector<SetColumn> columns;
  for (std::size_t i = 0; i < table.columns.size(); ++i) {
    if (setting.isNarrow && table.columns[i].key == "cut")
      continue;
    SetColumn column{headingOf(setting, table.columns[i]), {}, table.columns[i].isNumber};
    for (const Row& row : table.rows)
      column.cells.push_back(setting.runsOf(row.cells[i].shown));
    columns.push_back(std::move(column));
  }
  return columns;
}

/// Right ends from the right edge on, by the widest text of each column; what is left is the names'.
void placeColumns(std::vector<SetColumn>& columns, const Setting& setting, double right) {
  const double size = setting.table;
  double end = right - edge * size;
  for (std::size_t i = columns.size(); i-- > 1;) {
    columns[i].right = end;
    double width = std::max(leastColumn * setting.order.width - columnGap * size,
                            setting.widthOf(columns[i].heading, size, true));
    for (const Runs& cell : columns[i].cells)
      width = std::max(width, setting.widthOf(cell, size, true));
    end -= width + columnGap * size;
  }
  columns.front().right = end;
}

void setRow(Picture& picture, const Setting& setting, const std::vector<SetColumn>& columns, const Row& row,
            std::size_t which, double left, double top) {
  const double size = setting.table;
  const double base = top + baseline * size;
  drawSign(picture, {signOf(row.kind),
                     roleOf(row.kind),
                     {left + 0.55 * size, base - capHeight / 2 * size},
                     setting.mark,
                     row.kind == PlaneKind::watched ? setting.hair : setting.medium});
  for (const SetColumn& column : columns) {
    const bool bold = isBold(row);
    if (column.isNumber)
      setWords(picture, {column.right, base}, column.cells[which], size, Align::end, Role::ink, bold);
    else
      setWords(picture, {left + nameStart * size, base},
               elided(column.cells[which], column.right - left - nameStart * size, size, bold), size,
               Align::start, Role::ink, bold);
  }
}

} // namespace

double drawPlanes(Picture& picture, const Setting& setting, double left, double right, double top) {
  const double size = setting.table;
  const Table table = planesTable(setting.study, setting.readout, setting.readout.state());
  std::vector<SetColumn> columns = columnsOf(setting, table);
  placeColumns(columns, setting, right);
  const auto rule = [&](double y, double width) {
    setLine(picture, {left, y}, {right, y}, {Role::ink, width, Dash::solid});
  };
  rule(top, setting.medium);
  for (const SetColumn& column : columns)
    setWords(picture, {column.isNumber ? column.right : left + edge * size, top + 1.15 * size},
             column.heading, size, column.isNumber ? Align::end : Align::start, Role::ink, true);
  double y = top + headHeight * size;
  rule(y, setting.hair);
  y += 0.15 * size;
  for (std::size_t i = 0; i < table.rows.size(); ++i, y += pitch * size)
    setRow(picture, setting, columns, table.rows[i], i, left, y);
  y += 0.2 * size;
  rule(y, setting.medium);
  return y;
}

} // namespace planewright

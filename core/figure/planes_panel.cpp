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
constexpr double lineHeight = 1.15;   ///< of a second line of a name
constexpr double comfortable = 0.125; ///< width of a column of numbers, of the figure's

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

double widestIn(const SetColumn& column, const Setting& setting) {
  double width = setting.widthOf(column.heading, setting.table, true);
  for (const Runs& cell : column.cells)
    width = std::max(width, setting.widthOf(cell, setting.table, true));
  return width;
}

/// Right ends from the right edge on, by the widest text of each column. Where the names leave room, columns
/// of numbers stand further apart.
void placeColumns(std::vector<SetColumn>& columns, const Setting& setting, double left, double right) {
  const double size = setting.table;
  std::vector<double> widths;
  double spare = right - left - nameStart * size - widestIn(columns.front(), setting);
  for (std::size_t i = 1; i < columns.size(); ++i) {
    widths.push_back(widestIn(columns[i], setting) + columnGap * size);
    spare -= widths.back();
  }
  for (double& width : widths) {
    const double wished = std::max(0.0, comfortable * setting.order.width - width);
    width += std::clamp(spare / static_cast<double>(widths.size()), 0.0, wished);
  }
  double end = right;
  for (std::size_t i = columns.size(); i-- > 1;) {
    columns[i].right = end;
    end -= widths[i - 1];
  }
  columns.front().right = end;
}

/// A name in at most two lines.
std::vector<Runs> nameLines(const Setting& setting, const SetColumn& names, std::size_t which, double left,
                            bool bold) {
  const double width = names.right - left - nameStart * setting.table;
  std::vector<Runs> lines = brokenLines(names.cells[which], width, setting.table, bold);
  if (lines.size() > 2) {
    lines[1].push_back({" " + plain(lines[2]), false});
    lines.resize(2);
    lines[1] = elided(lines[1], width, setting.table, bold);
  }
  return lines;
}

/// Sets one row and returns its height.
double setRow(Picture& picture, const Setting& setting, const std::vector<SetColumn>& columns, const Row& row,
              std::size_t which, double left, double top) {
  const double size = setting.table;
  const double base = top + baseline * size;
  const bool bold = isBold(row);
  drawSign(picture, {signOf(row.kind),
                     roleOf(row.kind),
                     {left + 0.5 * size, base - capHeight / 2 * size},
                     setting.mark,
                     row.kind == PlaneKind::watched ? setting.hair : setting.medium});
  const std::vector<Runs> name = nameLines(setting, columns.front(), which, left, bold);
  for (std::size_t i = 0; i < name.size(); ++i)
    setWords(picture, {left + nameStart * size, base + static_cast<double>(i) * lineHeight * size}, name[i],
             size, Align::start, Role::ink, bold);
  for (std::size_t i = 1; i < columns.size(); ++i)
    setWords(picture, {columns[i].right, base}, columns[i].cells[which], size, Align::end, Role::ink, bold);
  return (pitch + lineHeight * static_cast<double>(std::max<std::size_t>(name.size(), 1) - 1)) * size;
}

} // namespace

double drawPlanes(Picture& picture, const Setting& setting, double left, double right, double top) {
  const double size = setting.table;
  const Table table = planesTable(setting.study, setting.readout, setting.readout.state());
  std::vector<SetColumn> columns = columnsOf(setting, table);
  placeColumns(columns, setting, left, right);
  const auto rule = [&](double y, double width) {
    setLine(picture, {left, y}, {right, y}, {Role::ink, width, Dash::solid});
  };
  rule(top, setting.medium);
  for (const SetColumn& column : columns)
    setWords(picture, {column.isNumber ? column.right : left, top + 1.15 * size}, column.heading, size,
             column.isNumber ? Align::end : Align::start, Role::ink, true);
  double y = top + headHeight * size;
  rule(y, setting.hair);
  y += 0.15 * size;
  for (std::size_t i = 0; i < table.rows.size(); ++i)
    y += setRow(picture, setting, columns, table.rows[i], i, left, y);
  y += 0.2 * size;
  rule(y, setting.medium);
  return y;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/copied_points.h"

#include "core/record/column_texts.h"

#include <algorithm>

namespace planewright {

namespace {

/// Of a point that has no stresses too.
std::vector<RowThings> rowsOf(const std::vector<Point>& points) {
  std::vector<RowThings> rows;
  for (const Point& point : points) {
    const Line* line = point.lines.empty() ? nullptr : &point.lines.front();
    if (point.stress.empty())
      rows.push_back({&point, line, nullptr});
    for (const CaseStress& stress : point.stress)
      rows.push_back({&point, line, &stress});
  }
  return rows;
}

std::vector<ColumnKind> kindsOf(const std::vector<RowThings>& rows) {
  using enum ColumnKind;
  std::vector<ColumnKind> kinds = {point, note};
  const auto add = [&kinds](Spot thing) {
    const std::vector<ColumnKind> more = columnsThatFill(thing);
    kinds.insert(kinds.end(), more.begin(), more.end());
  };
  const auto any = [&rows](Spot thing) {
    return std::ranges::any_of(rows, [thing](const RowThings& row) { return has(row, thing); });
  };
  if (any(Spot::fibre))
    add(Spot::fibre);
  if (std::ranges::any_of(rows, [](const RowThings& row) { return !row.line || *row.line != Line(); })) {
    kinds.push_back(line);
    add(Spot::line);
  }
  kinds.push_back(loadCase);
  add(Spot::caseStress);
  for (const Spot source : {Spot::forces, Spot::pressure, Spot::rosette})
    if (any(source))
      add(source);
  return kinds;
}

std::string rowOfCells(const std::vector<std::string>& cells, char separator) {
  std::string row;
  for (const std::string& cell : cells)
    row += (&cell == cells.data() ? "" : std::string(1, separator)) + writtenCell(cell, separator);
  return row + "\n";
}

} // namespace

std::string copiedPoints(const std::vector<Point>& points, char separator) {
  const std::vector<RowThings> rows = rowsOf(points);
  const std::vector<ColumnKind> kinds = kindsOf(rows);
  std::vector<std::string> cells;
  cells.reserve(kinds.size());
  for (const ColumnKind kind : kinds)
    cells.emplace_back(wordOf(kind));
  std::string table = rowOfCells(cells, separator);
  for (const RowThings& row : rows) {
    for (std::size_t i = 0; i < kinds.size(); ++i)
      cells[i] = textIn(row, kinds[i]).value_or(std::string());
    table += rowOfCells(cells, separator);
  }
  return table;
}

std::vector<Text> leftOutOf(const std::vector<Point>& points) {
  std::vector<Text> names;
  const auto add = [&](Text name, auto has) {
    if (std::ranges::any_of(points, has))
      names.push_back(std::move(name));
  };
  const Point usual;
  add(PW_TEXT("Paste", "sizes of sections"), [](const Point& one) { return one.fibre.has_value(); });
  add(PW_TEXT("Paste", "second lines"), [](const Point& one) { return one.lines.size() > 1; });
  add(PW_TEXT("Paste", "watched planes"), [](const Point& one) { return !one.planes.empty(); });
  add(PW_TEXT("Paste", "checks"), [](const Point& one) { return !one.checks.empty(); });
  add(PW_TEXT("Paste", "free edges"), [](const Point& one) { return !one.freeEdge.empty(); });
  add(PW_TEXT("Paste", "inclined axes"), [&](const Point& one) { return one.axes != usual.axes; });
  add(PW_TEXT("Paste", "reading planes"), [&](const Point& one) { return one.reading != usual.reading; });
  return names;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/copied_points.h"

#include "core/record/pasted_columns.h"
#include "core/record/stress_texts.h"

#include <algorithm>

namespace planewright {

namespace {

std::string rowOfCells(const std::vector<std::string>& cells, char separator) {
  std::string row;
  for (const std::string& cell : cells)
    row += (&cell == cells.data() ? "" : std::string(1, separator)) + writtenCell(cell, separator);
  return row + "\n";
}

} // namespace

std::string copiedPoints(const std::vector<Point>& points, char separator) {
  const bool hasForces = std::ranges::any_of(points, [](const Point& point) {
    return std::ranges::any_of(point.stress, [](const CaseStress& one) { return one.forces.has_value(); });
  });
  const std::vector<ColumnKind> numbers = numberColumns(hasForces);
  std::vector<std::string> cells;
  for (const ColumnKind kind : {ColumnKind::point, ColumnKind::note, ColumnKind::loadCase})
    cells.emplace_back(wordOf(kind));
  for (const ColumnKind kind : numbers)
    cells.emplace_back(wordOf(kind));
  std::string table = rowOfCells(cells, separator);
  for (const Point& point : points) {
    if (point.stress.empty()) {
      cells = {point.name, point.note};
      cells.resize(3 + numbers.size());
      table += rowOfCells(cells, separator);
    }
    for (const CaseStress& stress : point.stress) {
      cells = {point.name, point.note, stress.caseId};
      for (const ColumnKind kind : numbers) {
        const std::string* text = textIn(stress, *spotOf(kind));
        cells.push_back(text ? *text : std::string());
      }
      table += rowOfCells(cells, separator);
    }
  }
  return table;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/table.h"

#include "core/quantity/format.h"
#include "core/words/markup.h"

#include <algorithm>

namespace planewright {

namespace {

std::string headingOf(const Column& column, const Translate& translate) {
  std::string heading = plain(column.heading, translate);
  if (!column.unit.empty())
    heading += " (" + column.unit + ")";
  return heading;
}

/// Tabs and line ends part cells and rows, so none may stand inside one.
std::string inOneCell(std::string words) {
  std::ranges::replace_if(
      words, [](char c) { return c == '\t' || c == '\n' || c == '\r'; }, ' ');
  return words;
}

std::string htmlCell(const char* tag, bool isNumber, const std::string& content) {
  const std::string align = isNumber ? " style=\"text-align:right\"" : "";
  return std::string("<") + tag + align + ">" + content + "</" + tag + ">";
}

} // namespace

std::string tabSeparated(const Table& table, const Translate& translate) {
  std::string result;
  for (const Column& column : table.columns)
    result += (&column == &table.columns.front() ? "" : "\t") + inOneCell(headingOf(column, translate));
  result += '\n';
  for (const Row& row : table.rows) {
    for (const Cell& cell : row.cells)
      result += (&cell == &row.cells.front() ? "" : "\t") +
                inOneCell(cell.exact ? exactNumber(*cell.exact) : plain(cell.shown, translate));
    result += '\n';
  }
  for (const Text& caution : table.cautions)
    result += inOneCell(plain(caution, translate)) + '\n';
  return result;
}

std::string html(const Table& table, const Translate& translate) {
  std::string result = "<table><tr>";
  for (const Column& column : table.columns) {
    const std::string unit = column.unit.empty() ? "" : " (" + markupOf(column.unit) + ")";
    result += htmlCell("th", column.isNumber, markupOf(column.heading, translate) + unit);
  }
  result += "</tr>\n";
  for (const Row& row : table.rows) {
    result += "<tr>";
    for (std::size_t i = 0; i < row.cells.size(); ++i)
      result += htmlCell("td", table.columns[i].isNumber, markupOf(row.cells[i].shown, translate));
    result += "</tr>\n";
  }
  result += "</table>\n";
  for (const Text& caution : table.cautions)
    result += "<p>" + markupOf(caution, translate) + "</p>\n";
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/table_row.h"

namespace planewright {

namespace {

bool isBlank(char c) {
  return c == ' ' || c == '\t';
}

/// A cell in quotes; `at` stands on the first one and then behind the last.
bool takeQuoted(std::string_view rest, std::size_t& at, std::string& unquoted) {
  unquoted.clear();
  for (++at; at < rest.size(); ++at) {
    if (rest[at] != '"') {
      unquoted += rest[at];
    } else if (at + 1 < rest.size() && rest[at + 1] == '"') {
      unquoted += rest[at++];
    } else {
      ++at;
      return true;
    }
  }
  return false;
}

} // namespace

char separatorOf(std::string_view header) {
  for (const char separator : {'\t', ';'})
    if (header.find(separator) != std::string_view::npos)
      return separator;
  return ',';
}

bool takeCell(std::string_view& rest, char separator, std::string_view& cell, std::string& unquoted,
              bool& isLast) {
  std::size_t from = 0;
  while (from < rest.size() && isBlank(rest[from]) && rest[from] != separator)
    ++from;
  std::size_t at = from;
  if (at < rest.size() && rest[at] == '"') {
    if (!takeQuoted(rest, at, unquoted))
      return false;
    cell = unquoted;
    while (at < rest.size() && isBlank(rest[at]) && rest[at] != separator)
      ++at;
    if (at < rest.size() && rest[at] != separator)
      return false;
  } else {
    while (at < rest.size() && rest[at] != separator)
      ++at;
    std::size_t end = at;
    while (end > from && isBlank(rest[end - 1]))
      --end;
    cell = rest.substr(from, end - from);
  }
  isLast = at == rest.size();
  rest.remove_prefix(isLast ? at : at + 1);
  return true;
}

bool cutRow(std::string_view row, char separator, std::vector<std::string>& cells) {
  cells.clear();
  std::string unquoted;
  std::string_view cell;
  for (bool isLast = false; !isLast;) {
    if (!takeCell(row, separator, cell, unquoted, isLast))
      return false;
    cells.emplace_back(cell);
  }
  return true;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_cells.h"

#include "core/words/utf8.h"

#include <algorithm>
#include <optional>

namespace planewright {

namespace {

constexpr std::string_view separators = "\t;,";

bool endsLine(char c) {
  return c == '\n' || c == '\r';
}

/// The separator that is found outside of quotes, in their order. A quote opens at the start of a cell,
/// whichever of the separators is the one.
char separatorOf(std::string_view text) {
  std::size_t best = separators.size();
  bool quoted = false;
  bool atStart = true;
  for (const char c : text) {
    const std::size_t which = separators.find(c);
    if (c == '"' && (quoted || atStart))
      quoted = !quoted;
    if (!quoted && which != std::string_view::npos)
      best = std::min(best, which);
    // Behind a closing quote, so that a doubled one opens again.
    atStart = !quoted && (c == '"' || endsLine(c) || which != std::string_view::npos);
  }
  return best < separators.size() ? separators[best] : '\t';
}

class Cutter {
public:
  Cutter(std::string_view text, char separator) : m_text(text) { m_table.separator = separator; }

  Result<CellTable> table() {
    while (m_at < m_text.size() && !m_problem) {
      addRow();
      endLine();
      if (m_table.rows.size() > mostTableRows)
        refuse(m_table.rows.back().line, 0, PW_TEXT("Paste", "The table has more than 100 000 rows."),
               PW_TEXT("Paste", "Take it in parts."));
    }
    if (m_problem)
      return tl::unexpected(*std::move(m_problem));
    return std::move(m_table);
  }

private:
  void refuse(int line, std::size_t column, Text what, Text mend) {
    if (!m_problem)
      m_problem = Problem{{}, line, static_cast<int>(column), {}, std::move(what), std::move(mend)};
  }

  bool more() const { return m_at < m_text.size(); }
  bool atSeparator() const { return more() && m_text[m_at] == m_table.separator; }
  bool atEnd() const { return !more() || endsLine(m_text[m_at]); }

  void endLine() {
    if (!more() || !endsLine(m_text[m_at]))
      return;
    m_at += m_text.substr(m_at).starts_with("\r\n") ? 2 : 1;
    ++m_line;
  }

  void addRow() {
    CellRow row{m_line, {}};
    do {
      if (!row.cells.empty())
        ++m_at; // the separator
      if (row.cells.size() == mostTableColumns)
        return refuse(row.line, row.cells.size() + 1, PW_TEXT("Paste", "The table has more than 40 columns."),
                      PW_TEXT("Paste", "Copy only the columns that are wanted."));
      row.cells.push_back(cell(row));
    } while (atSeparator() && !m_problem);
    const auto isBlank = [](const std::string& cell) {
      return cell.find_first_not_of(" \t\n") == std::string::npos;
    };
    if (!std::ranges::all_of(row.cells, isBlank))
      m_table.rows.push_back(std::move(row));
  }

  std::string cell(const CellRow& row) {
    if (more() && m_text[m_at] == '"')
      return quotedCell(row);
    const std::size_t start = m_at;
    while (!atEnd() && !atSeparator())
      ++m_at;
    return std::string(m_text.substr(start, m_at - start));
  }

  std::string quotedCell(const CellRow& row) {
    std::string cell;
    ++m_at;
    while (more() && (m_text[m_at] != '"' || m_text.substr(m_at).starts_with("\"\""))) {
      if (endsLine(m_text[m_at])) {
        endLine();
        cell += '\n';
        continue;
      }
      m_at += m_text[m_at] == '"' ? 1 : 0;
      cell += m_text[m_at++];
    }
    const std::size_t column = row.cells.size() + 1;
    if (!more())
      refuse(row.line, column, PW_TEXT("Paste", "A cell begins with a quote that is not closed."),
             PW_TEXT("Paste", "Close it, or put the cell in quotes and double those inside it."));
    else
      ++m_at;
    while (!atEnd() && !atSeparator() && m_text[m_at] == ' ')
      ++m_at;
    if (!atEnd() && !atSeparator())
      refuse(row.line, column, PW_TEXT("Paste", "Behind the closing quote of a cell stands more text."),
             PW_TEXT("Paste", "Put the whole cell in quotes and double those inside it."));
    return cell;
  }

  std::string_view m_text;
  std::size_t m_at = 0;
  int m_line = 1;
  CellTable m_table;
  std::optional<Problem> m_problem;
};

int lineAt(std::string_view text, std::size_t offset) {
  return 1 +
         static_cast<int>(std::count(text.begin(), text.begin() + static_cast<std::ptrdiff_t>(offset), '\n'));
}

} // namespace

Result<CellTable> cellsIn(std::string_view text) {
  constexpr std::string_view byteOrderMark = "\xEF\xBB\xBF";
  if (text.size() > greatestTable)
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  {},
                                  PW_TEXT("Paste", "The table has more than 10 MB of text."),
                                  PW_TEXT("Paste", "Take it in parts.")});
  if (const auto wrong = invalidUtf8In(text))
    return tl::unexpected(Problem{{},
                                  lineAt(text, *wrong),
                                  0,
                                  {},
                                  PW_TEXT("Paste", "The text is not UTF-8."),
                                  PW_TEXT("Paste", "Save the table as CSV in UTF-8.")});
  if (text.starts_with(byteOrderMark))
    text.remove_prefix(byteOrderMark.size());
  return Cutter(text, separatorOf(text)).table();
}

std::string writtenCell(std::string_view cell, char separator) {
  // The other separators stand in quotes where they would be taken for the one.
  const std::string_view risky = separator == '\t' ? "\t\"\r\n" : "\t;,\"\r\n";
  if (cell.find_first_of(risky) == std::string_view::npos)
    return std::string(cell);
  std::string quoted = "\"";
  for (const char c : cell)
    quoted += c == '"' ? std::string("\"\"") : std::string(1, c);
  return quoted + '"';
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/table_strips.h"

#include "core/figure/metrics.h"
#include "core/figure/text_lines.h"
#include "core/words/characters.h"

#include <algorithm>
#include <numeric>

namespace planewright {

namespace {

constexpr double gap = 3;         ///< between columns
constexpr double leastWords = 22; ///< a column of words is not squeezed below this

/// Some columns of a table at a size of letters.
class TableSetter {
public:
  TableSetter(const SheetTable& table, std::vector<std::size_t> columns, double width,
              const Translate& translate, double size)
      : m_table(table), m_columns(std::move(columns)), m_translate(translate), m_size(size) {
    for (const std::size_t column : m_columns) {
      const Runs heading = runs(table.columns[column].heading, translate);
      // A heading of words may break, its longest word may not.
      double widest =
          table.columns[column].isNumber ? longestWord(heading, true) : textWidth(heading, size, true);
      for (const std::vector<Text>& row : table.rows)
        if (column < row.size())
          widest = std::max(widest, textWidth(runs(row[column], translate), size, false));
      m_widths.push_back(widest + 0.2);
    }
    squeeze(width);
  }

  double width() const {
    return std::accumulate(m_widths.begin(), m_widths.end(), gap * static_cast<double>(m_widths.size() - 1));
  }

  std::vector<PageStrip> strips() const {
    const auto head = std::make_shared<const PageStrip>(headStrip());
    std::vector<PageStrip> strips = {*head};
    strips.front().before = 1.6;
    strips.front().keepsWithNext = true;
    for (std::size_t i = 0; i < m_table.rows.size(); ++i) {
      PageStrip row = rowStrip(m_table.rows[i]);
      row.head = head;
      const std::size_t left = m_table.rows.size() - i;
      // Two rows stay with the head, and two at the end.
      row.keepsWithNext = left > 1 && (i == 0 || left == 2);
      if (left == 1) {
        row.parts.emplace_back(rule(row.height, 0.35));
        row.height += 1.4;
      }
      strips.push_back(std::move(row));
    }
    return strips;
  }

private:
  double longestWord(const Runs& text, bool bold) const {
    double longest = 0;
    Runs word;
    const auto measure = [&] {
      longest = std::max(longest, textWidth(word, m_size, bold));
      word.clear();
    };
    for (const Run& run : text)
      for (const Character& character : charactersOf(run.text))
        if (character.bytes == " ")
          measure();
        else if (word.empty() || word.back().lowered != run.lowered)
          word.push_back({std::string(character.bytes), run.lowered});
        else
          word.back().text += character.bytes;
    measure();
    return longest;
  }

  bool isWords(std::size_t at) const { return !m_table.columns[m_columns[at]].isNumber; }

  /// Takes from the widest columns of words until all fit, or none can give more.
  void squeeze(double most) {
    for (double over = width() - most; over > 0; over = width() - most) {
      std::size_t widest = m_widths.size();
      for (std::size_t i = 0; i < m_widths.size(); ++i)
        if (isWords(i) && m_widths[i] > leastWords &&
            (widest == m_widths.size() || m_widths[i] > m_widths[widest]))
          widest = i;
      if (widest == m_widths.size())
        return;
      double second = leastWords;
      for (std::size_t i = 0; i < m_widths.size(); ++i)
        if (isWords(i) && i != widest && m_widths[i] < m_widths[widest])
          second = std::max(second, m_widths[i]);
      m_widths[widest] = std::max({second - 0.01, m_widths[widest] - over, leastWords});
    }
  }

  Path rule(double y, double stroke) const {
    return {{{0, y}, {width(), y}}, false, Pen{Role::ink, stroke, Dash::solid}, std::nullopt};
  }

  /// The lines of a cell in its column.
  void addCell(PageStrip& strip, std::size_t at, const std::vector<Runs>& lines, double top,
               bool bold) const {
    double left = 0;
    for (std::size_t i = 0; i < at; ++i)
      left += m_widths[i] + gap;
    double base = top + 0.9 * m_size;
    for (const Runs& line : lines) {
      const Vec place = {isWords(at) ? left : left + m_widths[at], base};
      strip.parts.emplace_back(
          lettering(line, m_size, place, Role::ink, bold, isWords(at) ? Align::start : Align::end));
      base += 1.22 * m_size;
    }
  }

  PageStrip lined(const std::vector<std::vector<Runs>>& cells, bool bold) const {
    std::size_t most = 1;
    for (const std::vector<Runs>& lines : cells)
      most = std::max(most, lines.size());
    const double pad = 0.16 * m_size;
    PageStrip strip;
    strip.height = 2 * pad + (1.05 + 1.22 * static_cast<double>(most - 1)) * m_size + 0.14 * m_size;
    for (std::size_t i = 0; i < cells.size(); ++i) {
      // Headings stand at the foot of their row.
      const double down = bold ? 1.22 * m_size * static_cast<double>(most - cells[i].size()) : 0;
      addCell(strip, i, cells[i], pad + down, bold);
    }
    return strip;
  }

  PageStrip headStrip() const {
    std::vector<std::vector<Runs>> cells;
    for (std::size_t i = 0; i < m_columns.size(); ++i)
      cells.push_back(
          brokenLines(runs(m_table.columns[m_columns[i]].heading, m_translate), m_widths[i], m_size, true));
    PageStrip strip = lined(cells, true);
    strip.parts.emplace_back(rule(0, 0.35));
    strip.parts.emplace_back(rule(strip.height, 0.18));
    strip.height += 0.3;
    return strip;
  }

  PageStrip rowStrip(const std::vector<Text>& row) const {
    std::vector<std::vector<Runs>> cells;
    for (std::size_t i = 0; i < m_columns.size(); ++i)
      cells.push_back(m_columns[i] < row.size()
                          ? brokenLines(runs(row[m_columns[i]], m_translate), m_widths[i], m_size, false)
                          : std::vector<Runs>());
    return lined(cells, false);
  }

  const SheetTable& m_table;
  std::vector<std::size_t> m_columns;
  const Translate& m_translate;
  double m_size;
  std::vector<double> m_widths;
};

constexpr double sizes[] = {points(8), points(7.5), points(7), points(6.5)};

} // namespace

std::vector<PageStrip> tableStrips(const SheetTable& table, double width, const Translate& translate) {
  std::vector<std::size_t> all(table.columns.size());
  std::iota(all.begin(), all.end(), 0);
  for (const double size : sizes)
    if (const TableSetter setter(table, all, width, translate, size);
        setter.width() <= width || all.size() <= 2)
      return setter.strips();
  // Too many columns for one table.
  std::vector<PageStrip> strips;
  const double size = sizes[0];
  for (std::size_t from = 1; from < all.size();) {
    std::vector<std::size_t> part = {0};
    while (from < all.size()) {
      part.push_back(from);
      if (part.size() > 2 && TableSetter(table, part, width, translate, size).width() > width) {
        part.pop_back();
        break;
      }
      ++from;
    }
    for (PageStrip& strip : TableSetter(table, part, width, translate, size).strips())
      strips.push_back(std::move(strip));
  }
  return strips;
}

} // namespace planewright

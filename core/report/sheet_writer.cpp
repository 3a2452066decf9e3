// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/sheet_writer.h"

#include "core/quantity/shown_count.h"
#include "core/study/governing.h"
#include "core/study/verdict.h"
#include "core/working/recoverable.h"

#include <algorithm>

namespace planewright {

void SheetWriter::heading(Text words) {
  m_subnumber = 0;
  m_blocks.emplace_back(SheetHeading{shownCount(static_cast<std::size_t>(++m_number)), std::move(words), 1});
}

void SheetWriter::subheading(Text words) {
  m_blocks.emplace_back(SheetHeading{shownCount(static_cast<std::size_t>(m_number)) + "." +
                                         shownCount(static_cast<std::size_t>(++m_subnumber)),
                                     std::move(words), 2});
}

void SheetWriter::text(Text words, Voice voice) {
  if (!words.empty())
    m_blocks.emplace_back(SheetText{std::move(words), voice});
}

void SheetWriter::box(std::vector<Text> lines, bool alarms) {
  m_blocks.emplace_back(SheetBox{std::move(lines), alarms});
}

void SheetWriter::table(SheetTable table) {
  if (!table.rows.empty())
    m_blocks.emplace_back(std::move(table));
}

void SheetWriter::table(const Table& table) {
  SheetTable rows;
  for (const Column& column : table.columns)
    rows.columns.push_back({withUnit(column.heading, column.unit), column.isNumber});
  for (const Row& row : table.rows) {
    std::vector<Text>& cells = rows.rows.emplace_back();
    for (const Cell& cell : row.cells)
      cells.push_back(cell.shown);
  }
  this->table(std::move(rows));
}

void SheetWriter::figure(Picture picture, Text caption) {
  m_blocks.emplace_back(SheetFigure{std::move(picture), std::move(caption)});
}

std::string SheetWriter::referenceTo(const Text& source) {
  if (source.empty())
    return {};
  auto at = std::ranges::find(m_sources, source);
  if (at == m_sources.end())
    at = m_sources.insert(m_sources.end(), source);
  return "[" + shownCount(static_cast<std::size_t>(at - m_sources.begin()) + 1) + "]";
}

void SheetWriter::step(const Step& step) {
  m_blocks.emplace_back(SheetStep{recoverable(step), referenceTo(step.source)});
}

void SheetWriter::steps(const std::vector<Step>& steps) {
  for (const Step& one : steps)
    step(one);
}

void SheetWriter::signatures(SheetSignatures lines) {
  m_blocks.emplace_back(std::move(lines));
}

void SheetWriter::sources() {
  if (m_sources.empty())
    return;
  subheading(PW_TEXT("Sheet", "Sources of the formulas"));
  for (const Text& source : std::vector<Text>(m_sources))
    text(symbol("%1 %2").with(referenceTo(source)).with(source));
}

Text withUnit(const Text& heading, const std::string& unit) {
  return unit.empty() ? heading : symbol("%1 (%2)").with(heading).with(unit);
}

std::size_t governingStateOf(const Readout& readout) {
  const Verdict verdict = verdictOf(readout);
  if (verdict.governing)
    return verdict.governing->state;
  if (verdict.unjudged)
    return verdict.unjudged->state;
  const std::optional<GoverningStates> worst = governingOf(readout);
  return worst ? worst->principal.state : readout.shown;
}

Text pointAndState(const Readout& readout, std::size_t state) {
  return symbol("%1, %2").with(readout.point).with(readout.states[state].combination);
}

} // namespace planewright

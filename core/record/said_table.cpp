// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/said_table.h"

#include "core/quantity/format.h"
#include "core/quantity/lexer.h"
#include "core/record/pasted_numbers.h"
#include "core/study/typed.h"

#include <algorithm>

namespace planewright {

namespace {

using std::string;
using std::string_view;

/// Without the blanks that no name has at its ends.
string trimmedName(string_view text) {
  const auto first = text.find_first_not_of(" \t\r\n");
  if (first == string_view::npos)
    return {};
  return string(text.substr(first, text.find_last_not_of(" \t\r\n") - first + 1));
}

void add(PastedRow& row, std::size_t column, string_view quoted, Text what, Text mend) {
  row.problems.push_back(
      {{}, row.line, static_cast<int>(column), string(quoted), std::move(what), std::move(mend)});
}

class RowReading {
public:
  RowReading(const Study& study, const KnownThings& known, char separator, PastedPoints& pasted)
      : m_study(study), m_known(known), m_pasted(pasted), m_marks(separator) {}

  SaidTable read() && {
    m_said.namesLines = columnOf(ColumnKind::line) > 0;
    for (const PastedRow& row : m_pasted.rows)
      for (std::size_t i = 0; i < row.cells.size(); ++i)
        if (isExpression(kindOf(i)))
          m_marks.see(row.cells[i]);
    for (std::size_t i = 0; i < m_pasted.rows.size(); ++i)
      readRow(i);
    // What a point has may stand in any of its rows.
    for (std::size_t i = 0; i < m_pasted.rows.size(); ++i)
      checkFibre(m_pasted.rows[i], m_said.rows[i], i);
    for (PastedRow& row : m_pasted.rows)
      std::ranges::stable_sort(row.problems, {}, &Problem::column);
    return std::move(m_said);
  }

private:
  ColumnKind kindOf(std::size_t column) const { return *m_pasted.columns[column].kind; }

  /// Its number from 1; 0 where the table has none.
  std::size_t columnOf(ColumnKind kind) const {
    const auto at = std::ranges::find(m_pasted.columns, kind, &PastedColumn::kind);
    return at == m_pasted.columns.end() ? 0 : static_cast<std::size_t>(at - m_pasted.columns.begin()) + 1;
  }

  std::size_t firstColumnOf(const SaidRow& said, std::initializer_list<Spot> things) const {
    for (const Spot thing : things)
      for (const ColumnKind kind : columnsThatFill(thing))
        if (said.texts.contains(kind) || (isOfPoint(kind) && columnOf(kind) > 0))
          return columnOf(kind);
    return 0;
  }

  void readRow(std::size_t index) {
    PastedRow& row = m_pasted.rows[index];
    SaidRow said;
    std::map<ColumnKind, string> ofPoint;
    for (std::size_t i = 0; i < row.cells.size(); ++i) {
      const ColumnKind kind = kindOf(i);
      if (kind == ColumnKind::point)
        said.point = row.cells[i] = trimmedName(row.cells[i]);
      else if (kind == ColumnKind::loadCase)
        said.loadCase = row.cells[i] = trimmedName(row.cells[i]);
      else if (kind != ColumnKind::unused)
        if (const std::optional<string> text = readText(row, i))
          (isOfCase(kind) ? said.texts : ofPoint)[kind] = *text;
    }
    checkNames(row, said);
    const auto [at, isNew] = m_said.points.try_emplace(said.point);
    if (isNew)
      at->second.firstRow = index;
    for (const auto& [kind, text] : ofPoint)
      saySame(row, said, at->second, kind, {text, index});
    if (!said.loadCase.empty())
      checkSources(row, said);
    m_said.rows.push_back(std::move(said));
  }

  /// None for an empty cell and for one that does not read.
  std::optional<string> readText(PastedRow& row, std::size_t i) {
    string& cell = row.cells[i];
    const ColumnKind kind = kindOf(i);
    if (kind == ColumnKind::note)
      return cell.empty() ? std::nullopt : std::optional(cell);
    if (trimmed(cell).empty())
      return std::nullopt;
    if (!isExpression(kind))
      return cell = trimmedName(cell);
    EntryKind wanted = entryKindOf(m_study, *spotOf(kind));
    wanted.unit = m_pasted.columns[i].unit.value_or(wanted.unit);
    const Result<string> text = m_marks.pointed(cell);
    const Result<Entry> entry = text ? readEntry(*text, wanted) : tl::unexpected(text.error());
    if (entry)
      return cell = entry->text;
    add(row, i + 1, entry.error().quoted, entry.error().what, entry.error().mend);
    return std::nullopt;
  }

  void checkNames(PastedRow& row, SaidRow& said) {
    const std::size_t pointColumn = columnOf(ColumnKind::point);
    if (pointColumn == 0)
      said.point = shownPoint(m_study).name;
    if (Text fault = faultOfKey(Spot::point, said.point); !fault.empty())
      add(row, pointColumn, said.point, std::move(fault),
          PW_TEXT("Paste", "Name the point in each of its rows."));
    const bool isPointAlone = pointColumn > 0 && said.loadCase.empty() && said.texts.empty();
    if (!isPointAlone)
      checkCase(row, said);
  }

  void checkCase(PastedRow& row, const SaidRow& said) {
    const std::size_t column = columnOf(ColumnKind::loadCase);
    if (Text fault = faultOfKey(Spot::loadCase, said.loadCase); !fault.empty())
      return add(row, column, said.loadCase, std::move(fault),
                 PW_TEXT("Paste", "Name the load case in each row, such as G or Q2."));
    const auto [before, isNew] = m_lines.try_emplace({said.point, said.loadCase}, row.line);
    if (!isNew)
      add(row, column, said.loadCase,
          PW_TEXT("Paste", "Case %1 stands twice for point %2: in line %3 too.")
              .with(said.loadCase)
              .with(said.point)
              .with(exactNumber(before->second)),
          PW_TEXT("Paste", "Leave one of the rows out, or give it a case of its own."));
    if (said.texts.empty() && row.problems.empty())
      add(row, 0, said.loadCase, PW_TEXT("Paste", "Nothing is given for case %1.").with(said.loadCase),
          PW_TEXT("Paste", "Write 0 where nothing acts, or leave the row out."));
  }

  void saySame(PastedRow& row, const SaidRow& said, SaidPoint& point, ColumnKind kind,
               SaidPoint::Said text) const {
    const auto [before, isNew] = point.texts.try_emplace(kind, text);
    if (isNew || before->second.text == text.text)
      return;
    add(row, columnOf(kind), text.text,
        PW_TEXT("Paste", "Point %1 has another text in a row above: %2.")
            .with(said.point)
            .with(labelOf(kind)),
        PW_TEXT("Paste", "Give each point one, in all of its rows or in the first."));
  }

  /// A source that is new takes nothing from a default of its own.
  void checkSources(PastedRow& row, const SaidRow& said) const {
    const Point* point = m_known.point(said.point);
    const RowThings before{point, nullptr, point ? findStress(*point, said.loadCase) : nullptr};
    for (const Spot thing : {Spot::pressure, Spot::rosette})
      if (said.says(thing) && !has(before, thing) && row.problems.empty())
        for (const ColumnKind kind : columnsThatFill(thing))
          if (isNeeded(said, kind) && !said.texts.contains(kind))
            return add(row, columnOf(kind), said.loadCase,
                       PW_TEXT("Paste", "%1 of case %2 is not whole: %3 is not given.")
                           .with(planewright::rowOf(thing).label)
                           .with(said.loadCase)
                           .with(labelOf(kind)),
                       PW_TEXT("Paste", "Fill the column headed “%1” too.").with(wordOf(kind)));
  }

  static bool isNeeded(const SaidRow& said, ColumnKind kind) {
    using enum ColumnKind;
    const bool isOfIsotropic = kind == E || kind == nu;
    const bool isOfOrthotropic = kind == along || kind == across || kind == nu12 || kind == G;
    if (!isOfIsotropic && !isOfOrthotropic)
      return true;
    const auto told = said.texts.find(material);
    return told != said.texts.end() &&
           told->second == wordOf(isOfIsotropic ? Elasticity::isotropic : Elasticity::orthotropic);
  }

  void checkFibre(PastedRow& row, const SaidRow& said, std::size_t index) const {
    const SaidPoint& point = m_said.points.at(said.point);
    const Point* before = m_known.point(said.point);
    const string* section = point.text(ColumnKind::section);
    if (section && !m_known.hasSection(*section) && (said.says(Spot::forces) || saysOf(point, index)))
      return add(row, columnOf(ColumnKind::section), *section,
                 PW_TEXT("Paste", "This study has no section “%1”.").with(*section),
                 PW_TEXT("Paste", "Make the section in the study first, by this name."));
    // What does not read is told of first.
    if (!row.problems.empty() || (before && before->fibre))
      return;
    if (!section && (said.says(Spot::forces) || saysOf(point, index)))
      return add(
          row, firstColumnOf(said, {Spot::forces, Spot::fibre}), said.point,
          PW_TEXT("Paste", "Point %1 has no section, which section forces need.").with(said.point),
          PW_TEXT("Paste", "Give the point its section and fibre first, or in columns section, y, z."));
    if (section && saysOf(point, index) && (!point.text(ColumnKind::y) || !point.text(ColumnKind::z)))
      add(row, columnOf(ColumnKind::section), *section,
          PW_TEXT("Paste", "Where point %1 lies in section “%2” is not given.")
              .with(said.point)
              .with(*section),
          PW_TEXT("Paste", "Add columns y and z, measured from the centroid."));
  }

  /// Whether a row is one that says something of the fibre.
  static bool saysOf(const SaidPoint& point, std::size_t index) {
    return std::ranges::any_of(columnsThatFill(Spot::fibre), [&](ColumnKind kind) {
      const auto said = point.texts.find(kind);
      return said != point.texts.end() && said->second.row == index;
    });
  }

  const Study& m_study;
  const KnownThings& m_known;
  PastedPoints& m_pasted;
  DecimalMarks m_marks;
  SaidTable m_said;
  std::map<std::pair<string, string>, int> m_lines; ///< of each case at each point
};

template <class Texts>
bool saysAny(const Texts& texts, Spot thing) {
  return std::ranges::any_of(texts, [thing](const auto& said) { return thingOf(said.first) == thing; });
}

} // namespace

KnownThings::KnownThings(const Study& study) {
  for (const Point& one : study.points)
    m_points.emplace(one.name, &one);
  for (const LoadCase& one : study.cases)
    m_cases.emplace(one.id, &one);
  for (const TypedSection& one : study.sections)
    m_sections.emplace(one.name, &one);
}

const Point* KnownThings::point(string_view name) const {
  const auto at = m_points.find(name);
  return at == m_points.end() ? nullptr : at->second;
}

bool SaidRow::says(Spot thing) const {
  return saysAny(texts, thing);
}

bool SaidPoint::says(Spot thing) const {
  return saysAny(texts, thing);
}

const string* SaidPoint::text(ColumnKind kind) const {
  const auto said = texts.find(kind);
  return said == texts.end() ? nullptr : &said->second.text;
}

std::optional<string> SaidTable::lineOf(const string& point, const Point* before) const {
  const SaidPoint& said = points.at(point);
  if (const string* name = said.text(ColumnKind::line))
    return *name;
  if (before && !before->lines.empty())
    return before->lines.front().name;
  const bool isWanted = said.says(Spot::line) || (!before && !namesLines);
  return isWanted ? std::optional<string>("grain") : std::nullopt;
}

RowThings SaidTable::thingsOf(const KnownThings& known, const SaidRow& row) const {
  const Point* point = known.point(row.point);
  const std::optional<string> line = lineOf(row.point, point);
  return {point, point && line ? findLine(*point, *line) : nullptr,
          point ? findStress(*point, row.loadCase) : nullptr};
}

SaidTable saidIn(const Study& study, const KnownThings& known, char separator, PastedPoints& pasted) {
  return RowReading(study, known, separator, pasted).read();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_points.h"

#include "core/quantity/format.h"
#include "core/quantity/lexer.h"
#include "core/record/pasted_numbers.h"
#include "core/record/stress_texts.h"
#include "core/study/typed.h"

#include <algorithm>
#include <map>
#include <unordered_map>

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

/// What a row says, when all of it reads.
struct Said {
  string point;
  string loadCase; ///< empty: nothing but the point
  string note;
  std::map<ColumnKind, string> numbers; ///< as entries keep them; no empty ones

  bool hasForces() const { return !numbers.empty() && isForce(numbers.rbegin()->first); }
};

/// The points and cases of a study, found without searching them.
struct Known {
  explicit Known(const Study& study) {
    for (const Point& point : study.points)
      points.emplace(point.name, &point);
    for (const LoadCase& one : study.cases)
      cases.emplace(one.id, &one);
  }
  const Point* point(const string& name) const {
    const auto at = points.find(name);
    return at == points.end() ? nullptr : at->second;
  }
  const CaseStress* stress(const Said& said) const {
    const Point* one = point(said.point);
    return one ? findStress(*one, said.loadCase) : nullptr;
  }
  std::unordered_map<string_view, const Point*> points;
  std::unordered_map<string_view, const LoadCase*> cases;
};

class Pasting {
public:
  Pasting(const Study& study, CellTable table) : m_study(study), m_table(std::move(table)), m_known(study) {}

  PastedPoints read(const ColumnChoices& choices) && {
    PastedColumns columns = columnsOf(m_study, m_table, choices);
    m_result.columns = std::move(columns.columns);
    m_result.hasHeader = columns.hasHeader;
    m_result.problems = std::move(columns.problems);
    addRows();
    if (!m_result.problems.empty())
      return std::move(m_result);
    if (m_result.rows.empty())
      return without(PW_TEXT("Paste", "There is no row below the headings."));
    readRows();
    addCautions(columns.areGuessed);
    if (!m_result.isSound())
      return std::move(m_result);
    for (const Said& said : m_said)
      addEdits(said);
    prove();
    return std::move(m_result);
  }

private:
  PastedPoints without(Text what) {
    m_result.problems.push_back(
        {{}, 0, 0, {}, std::move(what), PW_TEXT("Paste", "Copy the rows of the table as well.")});
    return std::move(m_result);
  }

  void addRows() {
    const std::size_t first = m_result.hasHeader ? 1 : 0;
    for (std::size_t i = first; i < m_table.rows.size(); ++i) {
      CellRow& row = m_table.rows[i];
      row.cells.resize(m_result.columns.size());
      m_result.rows.push_back({row.line, std::move(row.cells), {}});
    }
  }

  static void add(PastedRow& row, std::size_t column, string_view quoted, Text what, Text mend) {
    row.problems.push_back(
        {{}, row.line, static_cast<int>(column), string(quoted), std::move(what), std::move(mend)});
  }

  std::size_t columnOf(ColumnKind kind) const {
    const auto at = std::ranges::find(m_result.columns, kind, &PastedColumn::kind);
    return at == m_result.columns.end() ? 0 : static_cast<std::size_t>(at - m_result.columns.begin()) + 1;
  }

  void readRows() {
    DecimalMarks marks(m_table.separator);
    for (const PastedRow& row : m_result.rows)
      for (std::size_t i = 0; i < row.cells.size(); ++i)
        if (spotOf(*m_result.columns[i].kind))
          marks.see(row.cells[i]);
    for (PastedRow& row : m_result.rows) {
      Said said;
      for (std::size_t i = 0; i < row.cells.size(); ++i)
        readCell(row, i, marks, said);
      checkRow(row, said);
      std::ranges::stable_sort(row.problems, {}, &Problem::column);
      m_said.push_back(std::move(said));
    }
  }

  void readCell(PastedRow& row, std::size_t i, const DecimalMarks& marks, Said& said) {
    const ColumnKind kind = *m_result.columns[i].kind;
    string& cell = row.cells[i];
    if (kind == ColumnKind::point)
      said.point = cell = trimmedName(cell);
    else if (kind == ColumnKind::loadCase)
      said.loadCase = cell = trimmedName(cell);
    else if (kind == ColumnKind::note)
      said.note = cell;
    else if (spotOf(kind) && !trimmed(cell).empty())
      readNumber(row, i, marks, said);
  }

  void readNumber(PastedRow& row, std::size_t i, const DecimalMarks& marks, Said& said) {
    const PastedColumn& column = m_result.columns[i];
    EntryKind kind = entryKindOf(m_study, *spotOf(*column.kind));
    kind.unit = column.unit.value_or(kind.unit);
    const Result<string> text = marks.pointed(row.cells[i]);
    const Result<Entry> entry = text ? readEntry(*text, kind) : tl::unexpected(text.error());
    if (entry)
      said.numbers[*column.kind] = row.cells[i] = entry->text;
    else
      add(row, i + 1, entry.error().quoted, entry.error().what, entry.error().mend);
  }

  void checkRow(PastedRow& row, Said& said) {
    const std::size_t pointColumn = columnOf(ColumnKind::point);
    const std::size_t caseColumn = columnOf(ColumnKind::loadCase);
    if (pointColumn == 0)
      said.point = shownPoint(m_study).name;
    if (Text fault = faultOfKey(Spot::point, said.point); !fault.empty())
      add(row, pointColumn, said.point, std::move(fault),
          PW_TEXT("Paste", "Name the point in each of its rows."));
    const bool isPointAlone = pointColumn > 0 && said.loadCase.empty() && said.numbers.empty();
    if (!isPointAlone)
      checkCase(row, said, caseColumn);
    checkNote(row, said);
    // Forces that do not read are told of first.
    const bool needsFibre = said.hasForces() && row.problems.empty();
    const Point* point = m_known.point(said.point);
    if (needsFibre && !(point && point->fibre))
      add(row, columnOf(said.numbers.rbegin()->first), said.point,
          PW_TEXT("Paste", "Point %1 has no section, which section forces need.").with(said.point),
          PW_TEXT("Paste", "Give the point its section and fibre first."));
  }

  void checkCase(PastedRow& row, const Said& said, std::size_t column) {
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
    if (said.numbers.empty() && row.problems.empty())
      add(row, 0, said.loadCase, PW_TEXT("Paste", "Nothing is given for case %1.").with(said.loadCase),
          PW_TEXT("Paste", "Write 0 where nothing acts, or leave the row out."));
  }

  void checkNote(PastedRow& row, const Said& said) {
    if (said.note.empty())
      return;
    const auto [before, isNew] = m_notes.try_emplace(said.point, said.note);
    if (!isNew && before->second != said.note)
      add(row, columnOf(ColumnKind::note), said.note,
          PW_TEXT("Paste", "Point %1 has another note in a row above.").with(said.point),
          PW_TEXT("Paste", "Give each point one note."));
  }

  void addCautions(bool areGuessed) {
    if (areGuessed)
      m_result.cautions.push_back(
          PW_TEXT("Paste", "The table has no headings: what its columns are was told by their count."));
    if (std::ranges::any_of(m_said, [](const Said& said) { return !said.numbers.empty(); }))
      m_result.cautions.push_back(PW_TEXT("Paste", "Signs are read as in this study: %1.")
                                      .with(labelOf(m_study.convention.positive)));
    if (std::ranges::any_of(m_said, [](const Said& said) { return said.numbers.contains(ColumnKind::Vy); }))
      m_result.cautions.push_back(PW_TEXT("Paste", "The sense of V_{y} is that of this study: %1.")
                                      .with(labelOf(m_study.convention.shearForce)));
    if (std::ranges::any_of(m_said, &Said::hasForces))
      m_result.cautions.push_back(
          PW_TEXT("Paste", "Envelope rows (greatest N with greatest M of different instants) cannot be told "
                           "from the data: forces of one row must act at the same time."));
    addCautionOfSources();
  }

  /// Stresses that the table does not show are added to those that it does.
  void addCautionOfSources() {
    const auto isAddedTo = [this](const Said& said) {
      const CaseStress* stress = m_known.stress(said);
      return stress && (stress->pressure || stress->rosette || (stress->forces && !said.hasForces()));
    };
    const auto first = std::ranges::find_if(m_said, isAddedTo);
    if (first != m_said.end())
      m_result.cautions.push_back(
          PW_TEXT("Paste", "%1 of these rows have section forces, pressure or measured strains in the study, "
                           "the first is %2 at %3: they stay, and add to what is pasted.")
              .with(exactNumber(static_cast<double>(std::ranges::count_if(m_said, isAddedTo))))
              .with(first->loadCase)
              .with(first->point));
  }

  void insert(Place place) { m_result.edits.push_back(Insert{std::move(place), std::nullopt}); }
  void type(Place place, string text) { m_result.edits.push_back(Type{std::move(place), std::move(text)}); }

  void addEdits(const Said& said) {
    const auto index = static_cast<std::size_t>(&said - m_said.data());
    if (m_firstOfPoint.try_emplace(said.point, index).second)
      addPoint(said);
    if (said.loadCase.empty())
      return;
    if (m_firstOfCase.try_emplace(said.loadCase, index).second && !m_known.cases.contains(said.loadCase))
      addCase(said.loadCase);
    m_rowOf[{said.point, said.loadCase}] = index;
    const CaseStress* before = m_known.stress(said);
    if (!before)
      insert({Spot::caseStress, said.point, said.loadCase});
    if (said.hasForces() && !(before && before->forces))
      insert({Spot::forces, said.point, said.loadCase});
    for (const auto& [kind, text] : said.numbers) {
      const string* old = before ? textIn(*before, *spotOf(kind)) : nullptr;
      if (old && *old == text)
        continue;
      m_result.replaced += old ? 1 : 0;
      type({*spotOf(kind), said.point, said.loadCase}, text);
    }
  }

  void addPoint(const Said& said) {
    const Point* before = m_known.point(said.point);
    if (!before) {
      m_result.newPoints.push_back(said.point);
      insert({Spot::point, said.point, {}});
      insert({Spot::line, said.point, "grain"});
    }
    const auto note = m_notes.find(said.point);
    if (note != m_notes.end() && (!before || before->note != note->second)) {
      m_result.replaced += before && !before->note.empty() ? 1 : 0;
      type({Spot::pointNote, said.point, {}}, note->second);
    }
  }

  void addCase(const string& id) {
    m_result.newCases.push_back(id);
    insert({Spot::loadCase, id, {}});
    type({Spot::caseNature, id, {}}, string(wordOf(Nature::variable)));
    type({Spot::caseDuration, id, {}}, string(wordOf(Duration::medium)));
  }

  /// The edits have to pass as a whole; then each row shows what the study keeps.
  void prove() {
    const Result<Study> after = edited(m_study, m_result.edits);
    if (!after) {
      m_result.edits.clear();
      return blame(after.error());
    }
    const Known known(*after);
    for (std::size_t i = 0; i < m_said.size(); ++i)
      if (const CaseStress* stress = known.stress(m_said[i]))
        fill(m_result.rows[i], *stress);
  }

  void fill(PastedRow& row, const CaseStress& stress) const {
    for (std::size_t i = 0; i < row.cells.size(); ++i)
      if (const auto spot = spotOf(*m_result.columns[i].kind))
        if (const string* text = textIn(stress, *spot))
          row.cells[i] = *text;
  }

  void blame(Problem problem) {
    const std::optional<Place> place = placeOf(problem.place);
    const std::optional<std::size_t> index = place ? rowAt(*place) : std::nullopt;
    if (!index) {
      m_result.problems.push_back(std::move(problem));
      return;
    }
    PastedRow& row = m_result.rows[*index];
    problem.line = row.line;
    problem.column = 0;
    for (const ColumnKind kind : numberColumns(true))
      if (spotOf(kind) == place->spot)
        problem.column = static_cast<int>(columnOf(kind));
    row.problems.push_back(std::move(problem));
  }

  std::optional<std::size_t> rowAt(const Place& place) const {
    if (const auto at = m_rowOf.find({place.owner, place.item}); at != m_rowOf.end())
      return at->second;
    if (const auto at = m_firstOfPoint.find(place.owner); at != m_firstOfPoint.end())
      return at->second;
    const auto at = m_firstOfCase.find(place.owner);
    return at == m_firstOfCase.end() ? std::nullopt : std::optional(at->second);
  }

  const Study& m_study;
  CellTable m_table;
  Known m_known;
  std::vector<Said> m_said;
  std::map<std::pair<string, string>, int> m_lines; ///< of each case at each point
  std::unordered_map<string, string> m_notes;
  std::unordered_map<string, std::size_t> m_firstOfPoint;
  std::unordered_map<string, std::size_t> m_firstOfCase;
  std::map<std::pair<string, string>, std::size_t> m_rowOf;
  PastedPoints m_result;
};

} // namespace

bool PastedPoints::isSound() const {
  return problems.empty() &&
         std::ranges::all_of(rows, [](const PastedRow& row) { return row.problems.empty(); });
}

Problems PastedPoints::allProblems() const {
  Problems all = problems;
  for (const PastedRow& row : rows)
    all.insert(all.end(), row.problems.begin(), row.problems.end());
  return all;
}

PastedPoints pastedPoints(const Study& study, std::string_view text, const ColumnChoices& choices) {
  Result<CellTable> table = cellsIn(text);
  PastedPoints nothing;
  if (!table) {
    nothing.problems.push_back(std::move(table).error());
    return nothing;
  }
  if (table->rows.empty()) {
    nothing.problems.push_back({{},
                                0,
                                0,
                                {},
                                PW_TEXT("Paste", "There is no table in this text."),
                                PW_TEXT("Paste", "Copy the cells of a table first.")});
    return nothing;
  }
  return Pasting(study, *std::move(table)).read(choices);
}

} // namespace planewright

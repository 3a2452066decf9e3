// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_points.h"

#include "core/quantity/format.h"
#include "core/record/said_table.h"

#include <algorithm>
#include <array>

namespace planewright {

namespace {

using std::string;

class Pasting {
public:
  Pasting(const Study& study, CellTable table, const ColumnChoices& choices)
      : m_study(study), m_known(study), m_separator(table.separator) {
    PastedColumns columns = columnsOf(m_study, table, choices);
    m_areGuessed = columns.areGuessed;
    m_result.columns = std::move(columns.columns);
    m_result.hasHeader = columns.hasHeader;
    m_result.problems = std::move(columns.problems);
    for (std::size_t i = m_result.hasHeader ? 1 : 0; i < table.rows.size(); ++i) {
      CellRow& row = table.rows[i];
      row.cells.resize(m_result.columns.size());
      m_result.rows.push_back({row.line, std::move(row.cells), {}});
    }
  }

  PastedPoints read() && {
    if (!m_result.problems.empty())
      return std::move(m_result);
    if (m_result.rows.empty()) {
      m_result.problems.push_back({{},
                                   0,
                                   0,
                                   {},
                                   PW_TEXT("Paste", "There is no row below the headings."),
                                   PW_TEXT("Paste", "Copy the rows of the table as well.")});
      return std::move(m_result);
    }
    m_said = saidIn(m_study, m_known, m_separator, m_result);
    addCautions();
    if (!m_result.isSound())
      return std::move(m_result);
    for (std::size_t i = 0; i < m_said.rows.size(); ++i)
      addEdits(i);
    prove();
    return std::move(m_result);
  }

private:
  void caution(Text words) { m_result.cautions.push_back(std::move(words)); }

  void addCautions() {
    const auto any = [this](auto is) { return std::ranges::any_of(m_said.rows, is); };
    const auto says = [](Spot thing) { return [thing](const SaidRow& said) { return said.says(thing); }; };
    if (m_areGuessed)
      caution(PW_TEXT("Paste", "The table has no headings: what its columns are was told by their count."));
    if (any([](const SaidRow& said) { return !said.texts.empty(); }))
      caution(PW_TEXT("Paste", "Signs are read as in this study: %1.")
                  .with(labelOf(m_study.convention.positive)));
    if (any([](const SaidRow& said) { return said.texts.contains(ColumnKind::Vy); }))
      caution(PW_TEXT("Paste", "The sense of V_{y} is that of this study: %1.")
                  .with(labelOf(m_study.convention.shearForce)));
    if (any(says(Spot::forces)))
      caution(PW_TEXT("Paste",
                      "Envelope rows (greatest N with greatest M of different instants) cannot be told "
                      "from the data: forces of one row must act at the same time."));
    addCautionOfSources();
    for (const PastedColumn& column : m_result.columns)
      if (!column.writtenUnit.empty())
        caution(PW_TEXT("Paste", "“%1” in the heading “%2” is read as %3.")
                    .with(column.writtenUnit)
                    .with(column.heading)
                    .with(column.unit->name));
  }

  /// Stresses that the table does not show are added to those that it does.
  void addCautionOfSources() {
    const auto isAddedTo = [this](const SaidRow& said) {
      const RowThings before = m_said.thingsOf(m_known, said);
      return std::ranges::any_of(std::array{Spot::forces, Spot::pressure, Spot::rosette},
                                 [&](Spot thing) { return has(before, thing) && !said.says(thing); });
    };
    const auto first = std::ranges::find_if(m_said.rows, isAddedTo);
    if (first != m_said.rows.end())
      caution(PW_TEXT("Paste",
                      "Rows whose case has section forces, pressure or measured strains in the study: %1, "
                      "the first is %2 at %3. They stay, and add to what is pasted.")
                  .with(exactNumber(static_cast<double>(std::ranges::count_if(m_said.rows, isAddedTo))))
                  .with(first->loadCase)
                  .with(first->point));
  }

  void insert(Place place) { m_result.edits.push_back(Insert{std::move(place), std::nullopt}); }
  void type(Place place, string text) { m_result.edits.push_back(Type{std::move(place), std::move(text)}); }

  /// Types a text where the study has another one; what stood there is replaced unless it was empty.
  void type(const RowThings& before, ColumnKind kind, Place place, const string& text) {
    const std::optional<string> old = textIn(before, kind);
    if (old == text)
      return;
    m_result.replaced += old && !old->empty() ? 1 : 0;
    type(std::move(place), text);
  }

  void addEdits(std::size_t index) {
    const SaidRow& said = m_said.rows[index];
    const RowThings before = m_said.thingsOf(m_known, said);
    if (m_said.points.at(said.point).firstRow == index)
      addPoint(said.point, before);
    if (said.loadCase.empty())
      return;
    if (m_firstOfCase.try_emplace(said.loadCase, index).second && !m_known.hasCase(said.loadCase))
      addCase(said.loadCase);
    m_rowOf[{said.point, said.loadCase}] = index;
    if (!before.stress)
      insert({Spot::caseStress, said.point, said.loadCase});
    for (const Spot source : {Spot::forces, Spot::pressure, Spot::rosette})
      if (said.says(source) && !has(before, source))
        insert({source, said.point, said.loadCase});
    for (const auto& [kind, text] : said.texts)
      type(before, kind, {*spotOf(kind), said.point, said.loadCase}, text);
  }

  void addPoint(const string& name, const RowThings& before) {
    const SaidPoint& said = m_said.points.at(name);
    const std::optional<string> line = m_said.lineOf(name, before.point);
    if (!before.point) {
      m_result.newPoints.push_back(name);
      insert({Spot::point, name, {}});
    }
    if (said.says(Spot::fibre) && !has(before, Spot::fibre))
      insert({Spot::fibre, name, {}});
    if (line && !before.line)
      insert({Spot::line, name, *line});
    for (const auto& [kind, one] : said.texts)
      if (const auto thing = thingOf(kind))
        type(before, kind, {*spotOf(kind), name, thing == Spot::line ? *line : string()}, one.text);
  }

  void addCase(const string& id) {
    const bool isMeasured = std::ranges::any_of(
        m_said.rows, [&](const SaidRow& said) { return said.loadCase == id && said.says(Spot::rosette); });
    (isMeasured ? m_result.newMeasured : m_result.newCases).push_back(id);
    insert({Spot::loadCase, id, {}});
    type({Spot::caseNature, id, {}}, string(wordOf(isMeasured ? Nature::measured : Nature::variable)));
    type({Spot::caseDuration, id, {}}, string(wordOf(Duration::medium)));
  }

  /// The edits have to pass as a whole; then each row shows what the study keeps.
  void prove() {
    const Result<Study> after = edited(m_study, m_result.edits);
    if (!after) {
      m_result.edits.clear();
      return blame(after.error());
    }
    const KnownThings known(*after);
    for (std::size_t i = 0; i < m_said.rows.size(); ++i)
      fill(m_result.rows[i], m_said.thingsOf(known, m_said.rows[i]));
  }

  void fill(PastedRow& row, const RowThings& things) const {
    for (std::size_t i = 0; i < row.cells.size(); ++i)
      if (const auto text = textIn(things, *m_result.columns[i].kind))
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
    for (std::size_t i = 0; i < m_result.columns.size(); ++i)
      if (spotOf(*m_result.columns[i].kind) == place->spot)
        problem.column = static_cast<int>(i) + 1;
    row.problems.push_back(std::move(problem));
  }

  std::optional<std::size_t> rowAt(const Place& place) const {
    if (const auto point = m_said.points.find(place.owner); point != m_said.points.end()) {
      for (const auto& [kind, said] : point->second.texts)
        if (spotOf(kind) == place.spot)
          return said.row;
      const auto at = m_rowOf.find({place.owner, place.item});
      return at == m_rowOf.end() ? point->second.firstRow : at->second;
    }
    const auto at = m_firstOfCase.find(place.owner);
    return at == m_firstOfCase.end() ? std::nullopt : std::optional(at->second);
  }

  const Study& m_study;
  KnownThings m_known;
  char m_separator;
  bool m_areGuessed = false;
  SaidTable m_said;
  std::unordered_map<string, std::size_t> m_firstOfCase;
  std::map<std::pair<string, string>, std::size_t> m_rowOf; ///< of each case at each point
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
  Pasting pasting(study, *std::move(table), choices);
  return std::move(pasting).read();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_columns.h"

#include "core/record/heading.h"

#include <algorithm>

namespace planewright {

namespace {

using std::string;
using std::string_view;

struct KindRow {
  ColumnKind kind;
  const char* word; ///< as it is written
  std::optional<Spot> thing;
  std::optional<Spot> spot;
  std::vector<string_view> headings; ///< as `plainHeading` leaves them
};

/// In the order of ColumnKind.
const std::vector<KindRow>& kindTable() {
  using enum ColumnKind;
  constexpr auto none = std::nullopt;
  static const std::vector<KindRow> table = {
      {unused, "unused", none, none, {}},
      {point, "point", none, none, {"point", "pt"}},
      {note, "note", Spot::point, Spot::pointNote, {"note", "notes", "remark", "remarks", "comment"}},
      {section, "section", Spot::fibre, Spot::fibreSection, {"section", "crosssection"}},
      {y, "y", Spot::fibre, Spot::fibreY, {"y"}},
      {z, "z", Spot::fibre, Spot::fibreZ, {"z"}},
      {view, "view", Spot::fibre, Spot::fibreView, {"view"}},
      {line, "line", none, none, {"line"}},
      {lineKind, "line kind", Spot::line, Spot::lineKind, {"linekind"}},
      {lineAngle, "line angle", Spot::line, Spot::lineAngle, {"lineangle", "angleofline"}},
      {lineTolerance, "line tolerance", Spot::line, Spot::lineTolerance, {"linetolerance"}},
      {loadCase, "case", none, none, {"case", "loadcase", "lc"}},
      {sx, "sx", Spot::caseStress, Spot::sx, {"sx", "sigmax", "sxx", "sigmaxx"}},
      {sy, "sy", Spot::caseStress, Spot::sy, {"sy", "sigmay", "syy", "sigmayy"}},
      {txy, "txy", Spot::caseStress, Spot::txy, {"txy", "tauxy"}},
      {sz, "sz", Spot::caseStress, Spot::sz, {"sz", "sigmaz", "szz", "sigmazz"}},
      {N, "N", Spot::forces, Spot::forceN, {"n"}},
      {Vy, "V_y", Spot::forces, Spot::forceVy, {"vy", "v"}},
      {Vz, "V_z", Spot::forces, Spot::forceVz, {"vz"}},
      {T, "T", Spot::forces, Spot::forceT, {"t"}},
      {My, "M_y", Spot::forces, Spot::forceMy, {"my"}},
      {Mz, "M_z", Spot::forces, Spot::forceMz, {"mz", "m"}},
      {pressure, "pressure", Spot::pressure, Spot::pressureP, {"pressure", "p"}},
      {radius, "inner radius", Spot::pressure, Spot::pressureR, {"innerradius", "ri"}},
      {wall, "wall", Spot::pressure, Spot::pressureT, {"wall", "wallthickness"}},
      {ends, "ends", Spot::pressure, Spot::pressureEnds, {"ends"}},
      {strainA, "strain_a", Spot::rosette, Spot::gaugeStrainA, {"straina"}},
      {angleA, "angle_a", Spot::rosette, Spot::gaugeAngleA, {"anglea"}},
      {strainB, "strain_b", Spot::rosette, Spot::gaugeStrainB, {"strainb"}},
      {angleB, "angle_b", Spot::rosette, Spot::gaugeAngleB, {"angleb"}},
      {strainC, "strain_c", Spot::rosette, Spot::gaugeStrainC, {"strainc"}},
      {angleC, "angle_c", Spot::rosette, Spot::gaugeAngleC, {"anglec"}},
      {material, "material", Spot::rosette, Spot::rosetteMaterial, {"material"}},
      {E, "E", Spot::rosette, Spot::rosetteE, {"e"}},
      {nu, "nu", Spot::rosette, Spot::rosetteNu, {"nu"}},
      {along, "E_along", Spot::rosette, Spot::rosetteAlong, {"ealong"}},
      {across, "E_across", Spot::rosette, Spot::rosetteAcross, {"eacross"}},
      {nu12, "nu12", Spot::rosette, Spot::rosetteNu12, {"nu12"}},
      {G, "G12", Spot::rosette, Spot::rosetteG, {"g12"}}};
  return table;
}

const KindRow& rowOf(ColumnKind kind) {
  return kindTable()[static_cast<std::size_t>(kind)];
}

/// Whether a cell holds a number or an expression of one, also one that is written wrongly.
bool isNumber(const Study& study, string_view cell) {
  string_view text = withoutBlanks(cell);
  if (text.empty())
    return false;
  for (const Spot spot : {Spot::sx, Spot::forceN, Spot::forceMz})
    if (readEntry(text, entryKindOf(study, spot)))
      return true;
  for (const string_view sign : {"+", "-", "−"})
    if (text.starts_with(sign))
      text.remove_prefix(sign.size());
  return !text.empty() && text[0] >= '0' && text[0] <= '9';
}

bool looksLikeHeader(const Study& study, const CellRow& row) {
  const auto named = std::ranges::count_if(
      row.cells, [](const string& cell) { return kindOfHeading(headingOf(cell).name).has_value(); });
  return named >= 2 &&
         std::ranges::none_of(row.cells, [&](const string& cell) { return isNumber(study, cell); });
}

/// By the count of the columns of a table without a header.
std::vector<ColumnKind> guessed(const Study& study, const CellTable& table, std::size_t count) {
  using enum ColumnKind;
  const std::vector<string>& first = table.rows.front().cells;
  const auto numbers =
      std::ranges::count_if(first, [&](const string& cell) { return isNumber(study, cell); });
  const bool isCaseFirst = !isNumber(study, first[0]) && static_cast<std::size_t>(numbers) + 1 == count;
  if (isCaseFirst && count == 4)
    return {loadCase, sx, sy, txy};
  if (isCaseFirst && count == 5)
    return {loadCase, N, Vy, Mz, T};
  return {};
}

/// Columns up to the last in which anything stands.
std::size_t widthOf(const CellTable& table) {
  std::size_t width = 0;
  for (const CellRow& row : table.rows)
    for (std::size_t i = width; i < row.cells.size(); ++i)
      if (!withoutBlanks(row.cells[i]).empty())
        width = i + 1;
  return width;
}

class Columns {
public:
  Columns(const Study& study, const CellTable& table, const ColumnChoices& choices)
      : m_study(study), m_table(table), m_choices(choices) {}

  PastedColumns read() && {
    m_result.columns.resize(widthOf(m_table));
    m_result.hasHeader = m_choices.hasHeader.value_or(looksLikeHeader(m_study, m_table.rows.front()));
    if (m_result.hasHeader)
      readHeader();
    choose();
    if (!m_result.hasHeader)
      guess();
    for (std::size_t i = 0; i < m_result.columns.size(); ++i)
      check(i);
    if (m_result.problems.empty())
      checkWhole();
    return std::move(m_result);
  }

private:
  void add(std::size_t column, string_view quoted, Text what, Text mend) {
    m_result.problems.push_back({{},
                                 m_table.rows.front().line,
                                 static_cast<int>(column),
                                 string(quoted),
                                 std::move(what),
                                 std::move(mend)});
  }

  void readHeader() {
    const std::vector<string>& cells = m_table.rows.front().cells;
    for (std::size_t i = 0; i < std::min(cells.size(), m_result.columns.size()); ++i) {
      PastedColumn& column = m_result.columns[i];
      column.heading = withoutBlanks(cells[i]);
      column.kind = kindOfHeading(headingOf(column.heading).name);
    }
  }

  void choose() {
    for (std::size_t i = 0; i < std::min(m_choices.kinds.size(), m_result.columns.size()); ++i)
      if (m_choices.kinds[i])
        m_result.columns[i].kind = m_choices.kinds[i];
  }

  /// A guess holds for all columns, or is none.
  void guess() {
    const auto isTold = [](const PastedColumn& column) { return column.kind.has_value(); };
    if (std::ranges::any_of(m_result.columns, isTold))
      return;
    const std::vector<ColumnKind> kinds = guessed(m_study, m_table, m_result.columns.size());
    for (std::size_t i = 0; i < kinds.size(); ++i)
      m_result.columns[i].kind = kinds[i];
    m_result.areGuessed = !kinds.empty();
  }

  bool isEmpty(std::size_t column) const {
    const auto isBlank = [column](const CellRow& row) {
      return column >= row.cells.size() || withoutBlanks(row.cells[column]).empty();
    };
    return std::ranges::all_of(m_table.rows, isBlank);
  }

  void check(std::size_t i) {
    PastedColumn& column = m_result.columns[i];
    if (!column.kind && isEmpty(i))
      column.kind = ColumnKind::unused;
    if (!column.kind)
      return notTold(i);
    if (column.kind == ColumnKind::unused)
      return;
    const auto before = m_result.columns.begin() + static_cast<std::ptrdiff_t>(i);
    if (std::any_of(m_result.columns.begin(), before,
                    [&](const PastedColumn& other) { return other.kind == column.kind; }))
      add(i + 1, column.heading, PW_TEXT("Paste", "Two columns are %1.").with(labelOf(*column.kind)),
          PW_TEXT("Paste", "Leave one of them out."));
    readUnitOf(i);
  }

  void notTold(std::size_t i) {
    const string& heading = m_result.columns[i].heading;
    const Text mend = PW_TEXT(
        "Paste", "Choose what it is, or head it with its name: point, note, case, sx, sy, txy, sz, N, "
                 "V_y, V_z, T, M_y, M_z, section, y, z.");
    if (heading.empty())
      add(i + 1, {}, PW_TEXT("Paste", "It is not told what this column is."), mend);
    else
      add(i + 1, heading, PW_TEXT("Paste", "“%1” is not a heading that is known.").with(heading), mend);
  }

  void readUnitOf(std::size_t i) {
    PastedColumn& column = m_result.columns[i];
    const std::optional<string_view> unit = headingOf(column.heading).unit;
    const std::optional<Spot> spot = spotOf(*column.kind);
    if (!unit || !spot || !isExpression(*column.kind))
      return;
    const Dimension wanted = planewright::rowOf(*spot).dimension;
    const Result<Unit> read = readUnit(*unit, wanted);
    // A unit that stands alone in a heading can mean nothing else.
    if (const std::string spelled = read ? std::string() : spelledUnit(*unit); !spelled.empty())
      if (const Result<Unit> meant = readUnit(spelled, wanted)) {
        column.unit = *meant;
        column.writtenUnit = *unit;
        return;
      }
    if (read)
      column.unit = *read;
    else
      add(i + 1, read.error().quoted, read.error().what, read.error().mend);
  }

  void checkWhole() {
    const auto has = [this](auto is) {
      return std::ranges::any_of(m_result.columns, [&](const PastedColumn& one) { return is(*one.kind); });
    };
    if (!has([](ColumnKind kind) { return kind == ColumnKind::loadCase; }))
      add(0, {}, PW_TEXT("Paste", "The table has no column with the load case."),
          PW_TEXT("Paste", "Add a column headed “case”; of one case alone, with its id in each row."));
    else if (!has(isOfCase))
      add(0, {}, PW_TEXT("Paste", "The table has no column with a stress or a section force."),
          PW_TEXT("Paste", "Head the columns sx, sy, txy or N, V_y, M_z."));
  }

  const Study& m_study;
  const CellTable& m_table;
  const ColumnChoices& m_choices;
  PastedColumns m_result;
};

} // namespace

template <>
const std::vector<Named<ColumnKind>>& namesOf() {
  static const std::vector<Named<ColumnKind>> rows = [] {
    const auto labelOfColumn = [](const KindRow& row) {
      switch (row.kind) {
      case ColumnKind::unused:
        return PW_TEXT("Paste", "not used");
      case ColumnKind::point:
        return PW_TEXT("Paste", "point");
      case ColumnKind::note:
        return PW_TEXT("Paste", "note of the point");
      case ColumnKind::line:
        return PW_TEXT("Paste", "name of the line");
      case ColumnKind::loadCase:
        return PW_TEXT("Paste", "load case");
      default:
        return planewright::rowOf(*row.spot).label;
      }
    };
    std::vector<Named<ColumnKind>> names;
    for (const KindRow& row : kindTable())
      names.push_back({row.kind, row.word, labelOfColumn(row)});
    return names;
  }();
  return rows;
}

std::optional<Spot> spotOf(ColumnKind kind) {
  return rowOf(kind).spot;
}

std::optional<Spot> thingOf(ColumnKind kind) {
  return rowOf(kind).thing;
}

bool isOfCase(ColumnKind kind) {
  return kind > ColumnKind::loadCase;
}

bool isOfPoint(ColumnKind kind) {
  return kind > ColumnKind::point && kind < ColumnKind::loadCase;
}

bool isExpression(ColumnKind kind) {
  const std::optional<Spot> spot = spotOf(kind);
  return spot && planewright::rowOf(*spot).holds == Holds::expression;
}

std::vector<ColumnKind> columnsThatFill(Spot thing) {
  std::vector<ColumnKind> kinds;
  for (const KindRow& row : kindTable())
    if (row.thing == thing)
      kinds.push_back(row.kind);
  return kinds;
}

std::optional<ColumnKind> kindOfHeading(string_view heading) {
  const string plain = plainHeading(heading);
  for (const KindRow& row : kindTable())
    if (std::ranges::find(row.headings, plain) != row.headings.end())
      return row.kind;
  return std::nullopt;
}

PastedColumns columnsOf(const Study& study, const CellTable& table, const ColumnChoices& choices) {
  return Columns(study, table, choices).read();
}

} // namespace planewright

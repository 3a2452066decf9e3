// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_columns.h"

#include "core/record/heading.h"
#include "core/screen/table_row.h"

#include <algorithm>

namespace planewright {

namespace {

using std::string;
using std::string_view;

struct RoleRow {
  FieldRole role;
  std::vector<string_view> headings; ///< as `plainHeading` leaves them
};

const std::vector<RoleRow>& roleTable() {
  using enum FieldRole;
  static const std::vector<RoleRow> table = {{point, {"point", "pt", "node", "element"}},
                                             {layer, {"layer"}},
                                             {loadCase, {"case", "loadcase", "lc"}},
                                             {axes, {"axes", "axesangle", "angleofaxes"}},
                                             {line, {"line", "lineangle", "angleofline"}},
                                             {region, {"region", "part"}},
                                             {x, {"x"}},
                                             {y, {"y"}},
                                             {sx, {"sx", "sigmax", "sxx", "sigmaxx"}},
                                             {sy, {"sy", "sigmay", "syy", "sigmayy"}},
                                             {txy, {"txy", "tauxy"}}};
  return table;
}

FieldRole roleOf(string_view name) {
  const string plain = plainHeading(name);
  for (const RoleRow& row : roleTable())
    if (std::ranges::find(row.headings, plain) != row.headings.end())
      return row.role;
  return FieldRole::unread;
}

bool isStress(FieldRole role) {
  return role == FieldRole::sx || role == FieldRole::sy || role == FieldRole::txy;
}

constexpr string_view between = " _.:/|-";

/// The name of a component that is left of a heading once the key of a case and what parts them is off.
string_view componentBeside(string_view heading, string_view key) {
  if (key.empty() || heading.size() < key.size() + 2)
    return {};
  string_view rest;
  if (heading.starts_with(key) && between.find(heading[key.size()]) != string_view::npos)
    rest = heading.substr(key.size() + 1);
  else if (heading.ends_with(key) &&
           between.find(heading[heading.size() - key.size() - 1]) != string_view::npos)
    rest = heading.substr(0, heading.size() - key.size() - 1);
  return rest;
}

class HeaderReader {
public:
  HeaderReader(const Study& study, string_view header, const std::vector<MappedHeading>& mapped)
      : m_study(study), m_header(header), m_mapped(mapped) {}

  Results<FieldColumns> read() {
    if (takeAll())
      checkWhole();
    if (!m_problems.empty())
      return tl::unexpected(std::move(m_problems));
    return std::move(m_columns);
  }

  std::vector<NamedColumn> named() {
    std::vector<NamedColumn> named;
    if (takeAll())
      for (std::size_t i = 0; i < m_columns.columns.size(); ++i)
        named.push_back({m_columns.columns[i], m_isOfCase[i]});
    return named;
  }

private:
  bool takeAll() {
    m_columns.separator = separatorOf(m_header);
    m_columns.isGiven.assign(m_study.cases.size(), false);
    std::vector<string> cells;
    if (!cutRow(m_header, m_columns.separator, cells)) {
      add(0, {}, PW_TEXT("Field", "A quote in the header is not closed."),
          PW_TEXT("Field", "Close it in the same line."));
      return false;
    }
    for (const string& cell : cells)
      m_columns.columns.push_back({string(withoutBlanks(cell)), FieldRole::unread, 0, Unit{}});
    for (const MappedHeading& one : m_mapped)
      checkMapped(one);
    for (std::size_t i = 0; i < m_columns.columns.size(); ++i)
      take(i);
    return true;
  }

  static bool isHeading(const string& written, const string& wanted) {
    return written == wanted || headingOf(written).name == wanted;
  }

  void checkMapped(const MappedHeading& one) {
    if (std::ranges::none_of(m_columns.columns, [&](const FieldColumn& column) {
          return isHeading(column.heading, one.heading);
        }))
      add(0, one.heading, PW_TEXT("Field", "The table has no column “%1”.").with(one.heading),
          PW_TEXT("Field", "Write the heading as it stands in the table."));
    Heading name = headingOf(one.name);
    FieldColumn column;
    nameColumn(column, name.name);
    if (column.role == FieldRole::unread && name.name != wordOf(FieldRole::unread))
      add(0, one.name, PW_TEXT("Field", "No column can be “%1”.").with(one.name),
          PW_TEXT("Field",
                  "Take point, layer, case, axes, line, region, x, y, sx, sy, txy, a stress with its "
                  "case (“sx G”), or unread."));
  }

  void nameColumn(FieldColumn& column, string_view name) const {
    column.role = roleOf(name);
    if (column.role != FieldRole::unread)
      return;
    for (std::size_t k = 0; k < m_study.cases.size(); ++k)
      for (const string* key : {&m_study.cases[k].id, &m_study.cases[k].name})
        if (const FieldRole role = roleOf(componentBeside(name, *key)); isStress(role)) {
          column.role = role;
          column.loadCase = k;
          return;
        }
  }

  void take(std::size_t i) {
    FieldColumn& column = m_columns.columns[i];
    const Heading own = headingOf(column.heading);
    Heading read = own;
    for (const MappedHeading& one : m_mapped)
      if (isHeading(column.heading, one.heading)) {
        read = headingOf(one.name);
        if (!read.unit)
          read.unit = own.unit;
      }
    nameColumn(column, read.name);
    // The case stands in the heading exactly where the plain name is no component.
    m_isOfCase.push_back(isStress(column.role) && roleOf(read.name) == FieldRole::unread);
    readUnit(i, read.unit);
  }

  void readUnit(std::size_t i, const std::optional<string_view>& written) {
    using enum FieldRole;
    FieldColumn& column = m_columns.columns[i];
    const bool isAngle = column.role == axes || column.role == line;
    const bool isLength = column.role == x || column.role == y;
    if (!isStress(column.role) && !isAngle && !isLength)
      return;
    const string usual = isAngle ? "deg" : isLength ? m_study.units.length : m_study.units.stress;
    const Dimension wanted = isAngle ? dimension::angle : isLength ? dimension::length : dimension::stress;
    string text(written.value_or(usual));
    if (const string spelled = spelledUnit(text); !spelled.empty())
      text = spelled;
    const Result<Unit> unit = planewright::readUnit(text, wanted);
    if (unit)
      column.unit = *unit;
    else
      add(i + 1, column.heading, unit.error().what, unit.error().mend);
  }

  std::size_t countOf(FieldRole role) const {
    return static_cast<std::size_t>(std::ranges::count(m_columns.columns, role, &FieldColumn::role));
  }

  void checkWhole() {
    using enum FieldRole;
    const bool hasCases = std::ranges::find(m_isOfCase, true) != m_isOfCase.end();
    const bool hasPlain = std::ranges::any_of(m_columns.columns, [&](const FieldColumn& column) {
      return isStress(column.role) &&
             !m_isOfCase[static_cast<std::size_t>(&column - m_columns.columns.data())];
    });
    m_columns.isWide = hasCases;
    for (const FieldRole role : {point, layer, loadCase, axes, line, region, x, y})
      if (countOf(role) > 1)
        add(0, {}, PW_TEXT("Field", "Two columns are %1.").with(labelOf(role)),
            PW_TEXT("Field", "Say which one counts, by mapping its heading."));
    if (countOf(point) == 0)
      missing(labelOf(point));
    if (hasCases && (countOf(loadCase) > 0 || hasPlain))
      add(0, {}, PW_TEXT("Field", "The table has both stresses of a case and a row for each case."),
          PW_TEXT("Field", "Give either point,case,sx,sy,txy or a column triple for each case."));
    else if (hasCases)
      checkTriples();
    else
      checkLong();
  }

  void checkLong() {
    using enum FieldRole;
    for (const FieldRole role : {loadCase, sx, sy, txy}) {
      if (countOf(role) == 0)
        missing(labelOf(role));
      if (isStress(role) && countOf(role) > 1)
        add(0, {}, PW_TEXT("Field", "Two columns are %1.").with(labelOf(role)),
            PW_TEXT("Field", "Say which one counts, by mapping its heading."));
    }
    m_columns.isGiven.assign(m_study.cases.size(), true);
  }

  void checkTriples() {
    for (std::size_t k = 0; k < m_study.cases.size(); ++k) {
      std::size_t all = 0;
      for (const FieldRole role : {FieldRole::sx, FieldRole::sy, FieldRole::txy}) {
        const auto count = std::ranges::count_if(m_columns.columns, [&](const FieldColumn& column) {
          return column.role == role && column.loadCase == k;
        });
        all += static_cast<std::size_t>(count);
        if (count > 1)
          add(0, {},
              PW_TEXT("Field", "Two columns are %1 of case %2.")
                  .with(labelOf(role))
                  .with(m_study.cases[k].id),
              PW_TEXT("Field", "Leave one of them out."));
        if (count == 0 && isNamed(k))
          missing(PW_TEXT("Field", "%1 of case %2").with(labelOf(role)).with(m_study.cases[k].id));
      }
      m_columns.isGiven[k] = all == 3;
    }
  }

  bool isNamed(std::size_t loadCase) const {
    return std::ranges::any_of(m_columns.columns, [&](const FieldColumn& column) {
      return isStress(column.role) && column.loadCase == loadCase;
    });
  }

  void missing(const Text& what) {
    add(0, {}, PW_TEXT("Field", "No column is %1.").with(what),
        PW_TEXT("Field", "Head it so, or map the heading that it has."));
  }

  void add(std::size_t column, string_view quoted, Text what, Text mend) {
    m_problems.push_back({{}, 1, static_cast<int>(column), string(quoted), std::move(what), std::move(mend)});
  }

  const Study& m_study;
  string_view m_header;
  const std::vector<MappedHeading>& m_mapped;
  FieldColumns m_columns;
  std::vector<bool> m_isOfCase; ///< of each column
  Problems m_problems;
};

} // namespace

template <>
const std::vector<Named<FieldRole>>& namesOf() {
  using enum FieldRole;
  static const std::vector<Named<FieldRole>> names = {
      {unread, "unread", PW_TEXT("Field", "not read")},
      {point, "point", PW_TEXT("Field", "the point")},
      {layer, "layer", PW_TEXT("Field", "the layer")},
      {loadCase, "case", PW_TEXT("Field", "the case")},
      {axes, "axes", PW_TEXT("Field", "the turn of the row's axes")},
      {line, "line", PW_TEXT("Field", "the angle of the line")},
      {region, "region", PW_TEXT("Field", "the region")},
      {x, "x", PW_TEXT("Field", "x of the point")},
      {y, "y", PW_TEXT("Field", "y of the point")},
      {sx, "sx", PW_TEXT("Field", "σ_{x}")},
      {sy, "sy", PW_TEXT("Field", "σ_{y}")},
      {txy, "txy", PW_TEXT("Field", "τ_{xy}")}};
  return names;
}

bool FieldColumns::has(FieldRole role) const {
  return std::ranges::find(columns, role, &FieldColumn::role) != columns.end();
}

string nameOfColumn(const Study& study, FieldRole role, std::optional<std::size_t> loadCase) {
  string name(wordOf(role));
  return loadCase ? name + " " + study.cases[*loadCase].id : name;
}

std::vector<NamedColumn> namedColumnsOf(const Study& study, string_view header,
                                        const std::vector<MappedHeading>& mapped) {
  return HeaderReader(study, header, mapped).named();
}

Results<FieldColumns> fieldColumnsOf(const Study& study, string_view header,
                                     const std::vector<MappedHeading>& mapped) {
  return HeaderReader(study, header, mapped).read();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_reader.h"

#include "core/screen/plain_number.h"
#include "core/screen/point_index.h"
#include "core/screen/table_row.h"
#include "core/study/typed.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <cmath>
#include <cstring>
#include <limits>

namespace planewright {

namespace {

constexpr std::size_t mostFaults = 100;
constexpr std::size_t longestRow = 1'000'000; // bytes
constexpr double none = std::numeric_limits<double>::quiet_NaN();
// As in a study, so that each point can be opened as one of it.
constexpr double greatestValue = 1e100;

std::string quotedStart(std::string_view text) {
  constexpr std::size_t longest = 40;
  if (!isUtf8(text))
    return {};
  std::size_t end = 0;
  while (end < text.size() && end < longest)
    end += utf8Length(text.substr(end));
  return std::string(text.substr(0, end));
}

Text whatOf(NumberFault fault, const std::string& quoted) {
  switch (fault) {
  case NumberFault::empty:
    return PW_TEXT("Field", "A number is missing.");
  case NumberFault::notFinite:
    return PW_TEXT("Field", "“%1” is no finite number.").with(quoted);
  case NumberFault::tooGreat:
    return PW_TEXT("Field", "The number is beyond 1e100 MPa, degrees or mm.");
  default:
    return PW_TEXT("Field", "“%1” is no number.").with(quoted);
  }
}

} // namespace

/// The rows below a header.
class FieldReader::Rows {
public:
  Rows(const Study& study, FieldColumns columns) : m_study(study) {
    using enum FieldRole;
    std::vector<std::string> cases;
    cases.reserve(study.cases.size());
    for (const LoadCase& one : study.cases)
      cases.push_back(one.id);
    m_reading.field = Field(std::move(cases), {columns.has(layer), columns.has(axes), columns.has(line),
                                               columns.has(region), columns.has(x), columns.has(y)});
    m_reading.columns = std::move(columns);
    m_index.emplace(m_reading.field);
    m_stresses.resize(m_reading.columns.isWide ? study.cases.size() : 1);
    m_isSeen.resize(study.cases.size());
  }

  void take(std::string_view row, std::uint32_t line) {
    if (row.find_first_not_of(" \t") == std::string_view::npos)
      return;
    ++m_reading.rows;
    m_line = line;
    if (readCells(row))
      keep();
  }

  void refuse(std::uint32_t line, Text what, Text mend) {
    ++m_reading.rows;
    m_line = line;
    fault(0, {}, std::move(what), std::move(mend));
  }

  Results<FieldReading> finish(const std::vector<bool>& acts) {
    for (std::size_t k = 0; k < acts.size(); ++k)
      if (acts[k] && !m_isSeen[k] && m_reading.rows > 0)
        m_missing.push_back(missingCase(m_study.cases[k].id));
    if (!m_missing.empty())
      return tl::unexpected(std::move(m_missing));
    findIncomplete(acts);
    return std::move(m_reading);
  }

private:
  struct Row {
    std::string_view name;
    std::string_view region;
    Layer layer = Layer::none;
    std::size_t loadCase = 0;
    double axes = 0, line = none, x = none, y = none;
  };

  /// Numbers are read where they stand, without their cell being cut first: that is most of the work.
  bool readCells(std::string_view rest) {
    m_row = {};
    const std::vector<FieldColumn>& columns = m_reading.columns.columns;
    const char separator = m_reading.columns.separator;
    bool isLast = false;
    for (std::size_t i = 0; i < columns.size(); ++i) {
      if (isLast)
        return fault(0, {}, PW_TEXT("Field", "The row has fewer cells than the header."),
                     PW_TEXT("Field", "Give it a cell for each column."));
      const FieldColumn& column = columns[i];
      if (column.role >= FieldRole::sx) {
        double value = 0;
        if (takeNumber(rest, separator, value, isLast)) {
          if (!keepStress(column, i, value))
            return false;
          continue;
        }
      }
      std::string_view cell;
      if (!takeCell(rest, separator, cell, column.role == FieldRole::region ? m_region : m_unquoted, isLast))
        return fault(i + 1, {}, PW_TEXT("Field", "A quote is not closed, or text stands behind it."),
                     PW_TEXT("Field", "Close it in the same line."));
      if (!readCell(column, i, cell))
        return false;
    }
    return isLast || fault(0, {}, PW_TEXT("Field", "The row has more cells than the header."),
                           PW_TEXT("Field", "Give it one for each column, and decimals with a point."));
  }

  bool readCell(const FieldColumn& column, std::size_t i, std::string_view cell) {
    switch (column.role) {
    case FieldRole::unread:
      return true;
    case FieldRole::point:
      if (cell.data() == m_unquoted.data()) {
        m_name = m_unquoted;
        cell = m_name;
      }
      m_row.name = cell;
      return isGoodName(i, cell);
    case FieldRole::region:
      m_row.region = cell;
      return cell.empty() || isGoodName(i, cell);
    case FieldRole::layer:
      return readLayer(i, cell);
    case FieldRole::loadCase:
      return readCase(i, cell);
    case FieldRole::axes:
      return cell.empty() || readNumber(column, i, cell, m_row.axes);
    case FieldRole::line:
      return cell.empty() || readNumber(column, i, cell, m_row.line);
    case FieldRole::x:
      return cell.empty() || readNumber(column, i, cell, m_row.x);
    case FieldRole::y:
      return cell.empty() || readNumber(column, i, cell, m_row.y);
    default:
      break;
    }
    const tl::expected<double, NumberFault> number = plainNumber(cell);
    if (!number)
      return numberFault(i, cell, number.error());
    return keepStress(column, i, *number);
  }

  bool readNumber(const FieldColumn& column, std::size_t i, std::string_view cell, double& value) {
    const tl::expected<double, NumberFault> number = plainNumber(cell);
    if (!number)
      return numberFault(i, cell, number.error());
    value = column.unit.toBase(*number);
    return std::abs(value) <= greatestValue || numberFault(i, cell, NumberFault::tooGreat);
  }

  bool keepStress(const FieldColumn& column, std::size_t i, double value) {
    PlaneStress& stress = m_stresses[m_reading.columns.isWide ? column.loadCase : 0];
    const double base = column.unit.toBase(value);
    if (!(std::abs(base) <= greatestValue))
      return numberFault(i, {}, NumberFault::tooGreat);
    (column.role == FieldRole::sx ? stress.sx : column.role == FieldRole::sy ? stress.sy : stress.txy) = base;
    return true;
  }

  bool isGoodName(std::size_t i, std::string_view name) {
    const bool isPlain = !name.empty() && name.size() <= longestName &&
                         std::ranges::all_of(name, [](char c) { return c >= 0x20 && c < 0x7F; });
    if (isPlain)
      return true;
    const Text wrong = faultOfName(name);
    return wrong.empty() || fault(i + 1, quotedStart(name), wrong, {});
  }

  bool readLayer(std::size_t i, std::string_view cell) {
    if (const auto layer = fromWord<Layer>(cell)) {
      m_row.layer = *layer;
      return true;
    }
    return fault(i + 1, quotedStart(cell), PW_TEXT("Field", "“%1” is no layer.").with(quotedStart(cell)),
                 PW_TEXT("Field", "Write top, mid or bottom."));
  }

  /// Cases come in turn or in runs: the last one is looked at first, then the next.
  bool readCase(std::size_t i, std::string_view cell) {
    const std::size_t count = m_study.cases.size();
    for (std::size_t step = 0; step < count; ++step) {
      const std::size_t k = (m_lastCase + step) % count;
      if (m_study.cases[k].id == cell || (!cell.empty() && m_study.cases[k].name == cell)) {
        m_row.loadCase = m_lastCase = k;
        return true;
      }
    }
    return fault(i + 1, quotedStart(cell),
                 PW_TEXT("Field", "The study has no case “%1”.").with(quotedStart(cell)),
                 PW_TEXT("Field", "Write the id or the name of one that it has."));
  }

  void keep() {
    Field& field = m_reading.field;
    const bool isWide = m_reading.columns.isWide;
    const std::optional<std::size_t> known = m_index->find(m_row.name, m_row.layer);
    if (known && (isWide || field.hasStress(m_row.loadCase, *known))) {
      field.setStanding(*known, PointStanding::incomplete);
      fault(0, quotedStart(m_row.name),
            PW_TEXT("Field", "The point “%1” has this a second time.").with(quotedStart(m_row.name)),
            PW_TEXT("Field", "Give each point, layer and case one row, and points names of their own."));
      return;
    }
    if (known && differs(*known)) {
      field.setStanding(*known, PointStanding::incomplete);
      fault(0, quotedStart(m_row.name),
            PW_TEXT("Field", "Another row of the point “%1” has other axes, another line, region or place.")
                .with(quotedStart(m_row.name)),
            PW_TEXT("Field", "Give all rows of a point the same."));
      return;
    }
    const std::size_t point = known ? *known : added();
    for (std::size_t k = 0; isWide && k < m_stresses.size(); ++k)
      if (m_reading.columns.isGiven[k]) {
        field.setStress(k, point, m_stresses[k]);
        m_isSeen[k] = true;
      }
    if (!isWide) {
      field.setStress(m_row.loadCase, point, m_stresses[0]);
      m_isSeen[m_row.loadCase] = true;
    }
  }

  std::size_t added() {
    Field& field = m_reading.field;
    const std::size_t point = field.add(m_row.name, m_row.layer, m_line);
    m_index->added(point);
    const Field::Columns& columns = field.columns();
    if (columns.axes)
      field.setAxes(point, m_row.axes);
    if (columns.line)
      field.setLine(point, m_row.line);
    if (columns.region)
      field.setRegion(point, m_row.region);
    field.setPlace(point, m_row.x, m_row.y);
    return point;
  }

  bool differs(std::size_t point) const {
    const Field& field = m_reading.field;
    const auto other = [](double a, double b) { return a != b && !(std::isnan(a) && std::isnan(b)); };
    const Field::Columns& columns = field.columns();
    return (columns.axes && field.axesOf(point) != m_row.axes) ||
           (columns.line && other(field.lineOf(point), m_row.line)) ||
           (columns.region && field.regionOf(point) != m_row.region) ||
           (columns.x && other(field.xOf(point), m_row.x)) || (columns.y && other(field.yOf(point), m_row.y));
  }

  void findIncomplete(const std::vector<bool>& acts) {
    Field& field = m_reading.field;
    for (std::size_t point = 0; point < field.size(); ++point) {
      bool isWhole = field.standingOf(point) == PointStanding::whole;
      for (std::size_t k = 0; isWhole && k < acts.size(); ++k)
        if (acts[k] && !field.hasStress(k, point)) {
          isWhole = false;
          lacks(point, k);
        }
      if (!isWhole) {
        field.setStanding(point, PointStanding::incomplete);
        ++m_reading.incompletePoints;
      }
    }
    std::ranges::stable_sort(m_reading.faults, {}, &Problem::line);
  }

  void lacks(std::size_t point, std::size_t loadCase) {
    if (m_reading.faults.size() >= mostFaults)
      return;
    const std::string name = quotedStart(m_reading.field.nameOf(point));
    m_reading.faults.push_back(
        {{},
         static_cast<int>(m_reading.field.fileLineOf(point)),
         0,
         name,
         PW_TEXT("Field", "The point “%1” lacks case %2.").with(name).with(m_study.cases[loadCase].id),
         PW_TEXT("Field", "Give it a row for each case; where nothing acts, zeros.")});
  }

  static Problem missingCase(const std::string& id) {
    return {{},
            0,
            0,
            id,
            PW_TEXT("Field", "The table has nothing of case %1, which acts in a combination.").with(id),
            PW_TEXT("Field", "Give it for every point, or take the case out of the combinations.")};
  }

  bool numberFault(std::size_t i, std::string_view cell, NumberFault fault) {
    if (fault == NumberFault::notFinite)
      ++m_reading.notFinite;
    const std::string quoted = quotedStart(cell);
    return this->fault(i + 1, quoted, whatOf(fault, quoted),
                       PW_TEXT("Field", "Write a plain number, decimals with a point."));
  }

  /// Counts the row as faulty, and tells it where it is among the first.
  bool fault(std::size_t column, std::string quoted, Text what, Text mend) {
    ++m_reading.faultyRows;
    if (m_reading.faults.size() < mostFaults)
      m_reading.faults.push_back({{},
                                  static_cast<int>(m_line),
                                  static_cast<int>(column),
                                  std::move(quoted),
                                  std::move(what),
                                  std::move(mend)});
    return false;
  }

  const Study& m_study;
  FieldReading m_reading;
  std::optional<PointIndex> m_index;
  Row m_row;
  std::string m_unquoted, m_name, m_region;
  std::vector<PlaneStress> m_stresses; ///< of the row: of each case in the wide form, else of its one
  std::vector<bool> m_isSeen;
  std::size_t m_lastCase = 0;
  std::uint32_t m_line = 0;
  Problems m_missing;
};

FieldReader::FieldReader(const Study& study, std::vector<bool> acts, std::vector<MappedHeading> mapped)
    : m_study(study), m_acts(std::move(acts)), m_mapped(std::move(mapped)) {}
FieldReader::~FieldReader() = default;

Results<void> FieldReader::take(std::string_view bytes) {
  while (!bytes.empty() && !m_isRefused) {
    const void* found = std::memchr(bytes.data(), '\n', bytes.size());
    if (!found) {
      // Of a row that is too long only as much is kept as tells so.
      m_cut.append(bytes.substr(0, m_cut.size() > longestRow ? 0 : bytes.size()));
      return {};
    }
    const auto length = static_cast<std::size_t>(static_cast<const char*>(found) - bytes.data());
    Results<void> taken;
    if (m_cut.empty()) {
      taken = takeLine(bytes.substr(0, length));
    } else {
      m_cut.append(bytes.substr(0, m_cut.size() > longestRow ? 0 : length));
      const std::string line = std::exchange(m_cut, {});
      taken = takeLine(line);
    }
    if (!taken)
      return taken;
    bytes.remove_prefix(length + 1);
  }
  return {};
}

Results<void> FieldReader::takeLine(std::string_view line) {
  ++m_line;
  constexpr std::string_view byteOrderMark = "\xEF\xBB\xBF";
  if (m_line == 1 && line.starts_with(byteOrderMark))
    line.remove_prefix(byteOrderMark.size());
  if (line.ends_with('\r'))
    line.remove_suffix(1);
  const bool isTooLong = line.size() > longestRow;
  if (m_rows && isTooLong) {
    m_rows->refuse(m_line, PW_TEXT("Field", "The row has more than a million bytes."),
                   PW_TEXT("Field", "End rows with a line feed."));
    return {};
  }
  if (m_rows) {
    m_rows->take(line, m_line);
    return {};
  }
  if (!isTooLong && line.find_first_not_of(" \t,;") == std::string_view::npos)
    return {};
  Problems problems;
  if (isTooLong || !isUtf8(line) || line.find('\0') != std::string_view::npos) {
    problems = {{{},
                 static_cast<int>(m_line),
                 0,
                 {},
                 PW_TEXT("Field", "This is no table in UTF-8."),
                 PW_TEXT("Field", "Export it as CSV in UTF-8.")}};
  } else {
    Results<FieldColumns> columns = fieldColumnsOf(m_study, line, m_mapped);
    if (columns) {
      m_rows = std::make_unique<Rows>(m_study, *std::move(columns));
      return {};
    }
    problems = std::move(columns).error();
    for (Problem& problem : problems)
      problem.line = static_cast<int>(m_line);
  }
  m_isRefused = true;
  return tl::unexpected(std::move(problems));
}

Results<FieldReading> FieldReader::finish() {
  if (!m_cut.empty() && !m_isRefused) {
    const std::string line = std::exchange(m_cut, {});
    if (Results<void> taken = takeLine(line); !taken)
      return tl::unexpected(std::move(taken).error());
  }
  if (!m_rows)
    return tl::unexpected(Problems{{{},
                                    0,
                                    0,
                                    {},
                                    PW_TEXT("Field", "The file holds no table."),
                                    PW_TEXT("Field", "Give it a header and a row for each point.")}});
  const std::unique_ptr<Rows> rows = std::move(m_rows);
  return rows->finish(m_acts);
}

} // namespace planewright

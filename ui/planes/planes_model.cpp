// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_model.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"
#include "core/study/fresh_name.h"
#include "core/table/reading_by_value.h"
#include "ui/look/look.h"

#include <utility>

namespace planewright {

namespace {

PlaneColumn columnOf(const QModelIndex& index) {
  return static_cast<PlaneColumn>(index.column());
}

/// A normal as it was typed, by itself or by its cut.
Result<std::string> normalTyped(PlaneColumn column, const std::string& typed) {
  return column == PlaneColumn::cut ? normalTextForCut(typed) : Result<std::string>(typed);
}

/// The normal as it is typed, with its tolerance behind.
QString watchedText(const Study& study, const std::string& point, const std::string& name) {
  const QString normal = fromUtf8(textAt(study, {Spot::planeNormal, point, name}).value_or(""));
  const QString tolerance = fromUtf8(textAt(study, {Spot::planeTolerance, point, name}).value_or(""));
  return tolerance.isEmpty() ? normal : normal + QStringLiteral(" ± ") + tolerance;
}

/// "55 deg ± 2 deg" in its two parts, also with "+/-"; the second is empty without a sign.
std::pair<std::string, std::string> splitTolerance(const std::string& typed) {
  for (const std::string_view sign : {"±", "+/-"})
    if (const std::size_t at = typed.find(sign); at != std::string::npos)
      return {typed.substr(0, at), typed.substr(at + sign.size())};
  return {typed, {}};
}

} // namespace

PlanesModel::PlanesModel(Desk& desk, QObject* parent) : TableModel(parent), m_desk(desk) {
  connect(&m_desk, &Desk::changed, this, &PlanesModel::refresh);
  refresh();
}

void PlanesModel::refresh() {
  m_refused.reset();
  if (m_asked && !solution())
    m_asked.reset();
  const Readout& readout = m_desk.readout();
  const Study& study = m_desk.study();
  setTable(withEnvelope(planesTable(study, readout, readout.state()), study, readout));
}

int PlanesModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : TableModel::rowCount() + 1;
}

std::string PlanesModel::watchedIn(int row) const {
  if (row < 0 || row >= TableModel::rowCount())
    return {};
  const Row& there = table().rows[static_cast<std::size_t>(row)];
  return there.kind == PlaneKind::watched ? there.name : std::string();
}

QVariant PlanesModel::data(const QModelIndex& index, int role) const {
  if (role == Qt::EditRole)
    return editText(index);
  if (index.isValid() && isWatchRow(index.row())) {
    if (role == Qt::DisplayRole && columnOf(index) == PlaneColumn::plane)
      return tr("Watch a plane…");
    if (role == Qt::ToolTipRole)
      return tr("Type a name, or the angle of a normal or of a cut");
  }
  return TableModel::data(index, role);
}

Qt::ItemFlags PlanesModel::flags(const QModelIndex& index) const {
  Qt::ItemFlags flags = TableModel::flags(index);
  const PlaneColumn column = columnOf(index);
  const bool angle = column == PlaneColumn::normal || column == PlaneColumn::cut;
  const bool named = isWatchRow(index.row()) || !watchedIn(index.row()).empty();
  const bool ofReading = angle || column == PlaneColumn::sn || column == PlaneColumn::tnt;
  const bool editable = index.row() == 0 ? ofReading : named && (angle || column == PlaneColumn::plane);
  return editable ? flags | Qt::ItemIsEditable : flags;
}

QString PlanesModel::editText(const QModelIndex& index) const {
  if (!index.isValid() || isWatchRow(index.row()))
    return {};
  const Study& study = m_desk.study();
  const Row& row = table().rows[static_cast<std::size_t>(index.row())];
  const Cell& cell = row.cells[static_cast<std::size_t>(index.column())];
  switch (columnOf(index)) {
  case PlaneColumn::plane:
    return fromUtf8(row.name);
  case PlaneColumn::normal:
    if (row.kind == PlaneKind::reading)
      return fromUtf8(textAt(study, {Spot::reading, owner(), {}}).value_or(""));
    if (row.kind == PlaneKind::watched)
      return watchedText(study, owner(), row.name);
    break;
  case PlaneColumn::cut:
    return cell.exact ? fromUtf8(angleText(Angle::fromDegrees(*cell.exact))) : QString();
  case PlaneColumn::sn:
  case PlaneColumn::tnt:
  case PlaneColumn::leastSn:
  case PlaneColumn::greatestSn:
  case PlaneColumn::greatestShear:
    break;
  }
  return cell.exact ? fromUtf8(exactNumber(*cell.exact)) : QString();
}

RowNote PlanesModel::noteOf(int row) const {
  if (m_refused && m_refused->row == row) {
    const Problem& problem = m_refused->problem;
    const Text words =
        problem.mend.empty() ? problem.what : symbol("%1 %2").with(problem.what).with(problem.mend);
    return {RowNote::Kind::wrong, words};
  }
  if (const std::string tolerance = toleranceIn(row); !tolerance.empty())
    return {RowNote::Kind::fact, symbol("± %1").with(tolerance)};
  if (row != 0 || !m_asked)
    return {};
  const std::optional<ReadingByValue> found = solution();
  if (!found)
    return {};
  return {found->other ? RowNote::Kind::choice : RowNote::Kind::fact, found->note};
}

// Looked up anew after each change, so that the note goes when the state or the reading plane moves on.
std::optional<ReadingByValue> PlanesModel::solution() const {
  const Readout& readout = m_desk.readout();
  const Result<ReadingByValue> found =
      readingFor(m_desk.study(), readout, m_asked->component, m_asked->typed);
  if (!found)
    return std::nullopt;
  const bool stands = found->planes.kind == PlanesOfValue::Kind::every ||
                      coincide(found->planes.first.value, readout.reading.value);
  return stands ? std::optional(*found) : std::nullopt;
}

std::optional<Problem> PlanesModel::enter(const QModelIndex& index, const QString& text) {
  const std::string typed = text.toStdString();
  const PlaneColumn column = columnOf(index);
  std::optional<Problem> problem;
  if (isWatchRow(index.row()))
    problem = enterNew(column, typed);
  else if (index.row() == 0)
    problem = enterReading(column, typed);
  else
    problem = enterWatched(watchedIn(index.row()), column, typed);
  m_refused.reset();
  if (problem)
    m_refused = Refused{index.row(), *problem};
  tellChanged();
  if (const RowNote note = noteOf(index.row()); note.kind != RowNote::Kind::none)
    m_desk.say(shown(note.words));
  return problem;
}

void PlanesModel::forget() {
  if (!m_refused)
    return;
  m_refused.reset();
  tellChanged();
  m_desk.say({});
}

std::optional<Problem> PlanesModel::enterReading(PlaneColumn column, const std::string& typed) {
  if (column == PlaneColumn::sn || column == PlaneColumn::tnt)
    return enterValue(column == PlaneColumn::sn ? Component::sn : Component::tnt, typed);
  Result<std::string> normal = normalTyped(column, typed);
  return normal ? turn(*normal) : std::optional(std::move(normal).error());
}

std::optional<Problem> PlanesModel::enterValue(Component component, const std::string& typed) {
  Result<ReadingByValue> found = readingFor(m_desk.study(), m_desk.readout(), component, typed);
  if (!found)
    return std::move(found).error();
  std::optional<Problem> problem = turn(found->reading);
  if (!problem)
    m_asked = Asked{component, typed};
  return problem;
}

std::optional<Problem> PlanesModel::enterWatched(const std::string& name, PlaneColumn column,
                                                 const std::string& typed) {
  const Place place{Spot::plane, owner(), name};
  if (column == PlaneColumn::plane)
    return m_desk.request({Rename{place, typed}}, m_desk.newCommand(), tr("name of a watched plane"));
  const auto [angle, tolerance] = splitTolerance(typed);
  Result<std::string> normal = normalTyped(column, angle);
  if (!normal)
    return std::move(normal).error();
  Edits edits = {Type{{Spot::planeNormal, owner(), name}, *normal}};
  if (column == PlaneColumn::normal || !tolerance.empty())
    edits.push_back(Type{{Spot::planeTolerance, owner(), name}, tolerance});
  return m_desk.request(edits, m_desk.newCommand(), tr("normal of a watched plane"));
}

std::optional<Problem> PlanesModel::enterNew(PlaneColumn column, const std::string& typed) {
  const bool isName = column == PlaneColumn::plane;
  Result<std::string> normal =
      isName ? textAt(m_desk.study(), {Spot::reading, owner(), {}}).value_or("") : normalTyped(column, typed);
  if (!normal)
    return std::move(normal).error();
  const std::string name = isName ? typed : freshName();
  return m_desk.request(
      {Insert{{Spot::plane, owner(), name}, std::nullopt}, Type{{Spot::planeNormal, owner(), name}, *normal}},
      m_desk.newCommand(), tr("watched plane"));
}

std::optional<Problem> PlanesModel::turn(const std::string& normal) {
  return m_desk.request({Type{{Spot::reading, owner(), {}}, normal}}, m_desk.newCommand(),
                        tr("turn of the reading plane"));
}

bool PlanesModel::swapSolution() {
  const std::optional<ReadingByValue> found = m_asked ? solution() : std::nullopt;
  return found && found->other && !turn(*found->other);
}

int PlanesModel::watchReading() {
  const std::string name = freshName();
  enter(index(TableModel::rowCount(), 0), fromUtf8(name));
  return TableModel::rowCount() - 1;
}

void PlanesModel::removeWatched(int row) {
  if (const std::string name = watchedIn(row); !name.empty())
    m_desk.request({Remove{{Spot::plane, owner(), name}}}, m_desk.newCommand(),
                   tr("removal of a watched plane"));
}

std::string PlanesModel::toleranceIn(int row) const {
  const std::string name = row < TableModel::rowCount() ? watchedIn(row) : std::string();
  return name.empty() ? name
                      : textAt(m_desk.study(), {Spot::planeTolerance, owner(), name}).value_or(std::string());
}

std::string PlanesModel::owner() const {
  return shownPoint(m_desk.study()).name;
}

std::string PlanesModel::freshName() const {
  const Point& point = shownPoint(m_desk.study());
  return planewright::freshName(
      1, [](const std::string& number) { return tr("plane %1").arg(fromUtf8(number)).toStdString(); },
      [&](const std::string& name) { return findPlane(point, name); });
}

} // namespace planewright

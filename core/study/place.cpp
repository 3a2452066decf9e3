// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place.h"

#include <algorithm>
#include <array>
#include <cassert>

namespace planewright {

namespace {

using std::string;
using std::string_view;
using std::vector;

/// In the order of Spot.
const vector<SpotRow>& spotTable() {
  using enum Holds;
  const auto& stress = dimension::stress;
  const auto& angle = dimension::angle;
  static const vector<SpotRow> table = {
      {Spot::loadCase, "cases/*", PW_TEXT("Place", "load case")},
      {Spot::combination, "combinations/*", PW_TEXT("Place", "combination")},
      {Spot::point, "points/*", PW_TEXT("Place", "point")},
      {Spot::caseStress, "points/*/stress/*", PW_TEXT("Place", "stresses of a case")},
      {Spot::line, "points/*/line", PW_TEXT("Place", "line")},
      {Spot::plane, "points/*/planes/*", PW_TEXT("Place", "watched plane")},
      {Spot::factor, "combinations/*/factors/*", PW_TEXT("Place", "factor"), expression},
      {Spot::titleProject, "title/project", PW_TEXT("Place", "project"), freeText},
      {Spot::titleSubject, "title/subject", PW_TEXT("Place", "subject"), freeText},
      {Spot::titleNumber, "title/number", PW_TEXT("Place", "number"), freeText},
      {Spot::titleRevision, "title/revision", PW_TEXT("Place", "revision"), freeText},
      {Spot::titlePrepared, "title/prepared", PW_TEXT("Place", "prepared"), freeText},
      {Spot::titleChecked, "title/checked", PW_TEXT("Place", "checked"), freeText},
      {Spot::titleDate, "title/date", PW_TEXT("Place", "date"), freeText},
      {Spot::titleNotes, "title/notes", PW_TEXT("Place", "notes"), freeText},
      {Spot::unitStress, "units/stress", PW_TEXT("Place", "unit of stress"), unit, stress},
      {Spot::unitForce, "units/force", PW_TEXT("Place", "unit of force"), unit, dimension::force},
      {Spot::unitLength, "units/length", PW_TEXT("Place", "unit of length"), unit, dimension::length},
      {Spot::unitMoment, "units/moment", PW_TEXT("Place", "unit of moment"), unit, dimension::moment},
      {Spot::positive, "convention/positive", PW_TEXT("Place", "positive normal stress"), word},
      {Spot::shearAxis, "convention/shear_axis", PW_TEXT("Place", "shear axis of the circle"), word},
      {Spot::caseName, "cases/*/name", PW_TEXT("Place", "name of the case"), freeText},
      {Spot::caseNature, "cases/*/nature", PW_TEXT("Place", "nature of the action"), word},
      {Spot::caseDuration, "cases/*/duration", PW_TEXT("Place", "duration of the action"), word},
      {Spot::caseExcludes, "cases/*/excludes", PW_TEXT("Place", "cases never together with this"), ids},
      {Spot::combinationBasis, "combinations/*/basis", PW_TEXT("Place", "basis of the combination"), word},
      {Spot::pointNote, "points/*/note", PW_TEXT("Place", "note"), freeText},
      {Spot::axes, "points/*/axes", PW_TEXT("Place", "inclination of the member"), expression, angle},
      {Spot::sx, "points/*/stress/*/sx", symbol("σ_{x}"), expression, stress},
      {Spot::sy, "points/*/stress/*/sy", symbol("σ_{y}"), expression, stress},
      {Spot::txy, "points/*/stress/*/txy", symbol("τ_{xy}"), expression, stress},
      {Spot::sz, "points/*/stress/*/sz", symbol("σ_{z}"), expression, stress},
      {Spot::lineName, "points/*/line/name", PW_TEXT("Place", "name of the line"), name},
      {Spot::lineKind, "points/*/line/kind", PW_TEXT("Place", "kind of line"), word},
      {Spot::lineAngle, "points/*/line/angle", PW_TEXT("Place", "angle of the line"), expression, angle,
       Slopes::line},
      {Spot::lineTolerance, "points/*/line/tolerance", PW_TEXT("Place", "tolerance of the line's angle"),
       expression, angle, Slopes::tolerance, true},
      {Spot::planeNormal, "points/*/planes/*/normal", PW_TEXT("Place", "normal of the plane"), expression,
       angle},
      {Spot::planeTolerance, "points/*/planes/*/tolerance", PW_TEXT("Place", "tolerance of the normal"),
       expression, angle, Slopes::none, true},
      {Spot::reading, "points/*/reading", PW_TEXT("Place", "normal of the reading plane"), expression, angle},
      {Spot::shownPoint, "shown/point", PW_TEXT("Place", "shown point"), freeText},
      {Spot::shownCombination, "shown/combination", PW_TEXT("Place", "shown combination"), freeText}};
  return table;
}

vector<string_view> segmentsOf(string_view path) {
  vector<string_view> segments;
  while (true) {
    const auto slash = path.find('/');
    segments.push_back(path.substr(0, slash));
    if (slash == string_view::npos)
      return segments;
    path.remove_prefix(slash + 1);
  }
}

string escaped(string_view name) {
  string result;
  for (const char c : name)
    result += c == '~' ? string("~0") : c == '/' ? string("~1") : string(1, c);
  return result;
}

string unescaped(string_view segment) {
  string result;
  for (std::size_t i = 0; i < segment.size(); ++i) {
    if (segment[i] == '~' && i + 1 < segment.size() && (segment[i + 1] == '0' || segment[i + 1] == '1'))
      result += segment[++i] == '0' ? '~' : '/';
    else
      result += segment[i];
  }
  return result;
}

/// The owner and item that make `path` an instance of the row's pattern.
std::optional<Place> matched(const SpotRow& row, const vector<string_view>& path) {
  const vector<string_view> pattern = segmentsOf(row.path);
  if (pattern.size() != path.size())
    return std::nullopt;
  Place place{row.spot, {}, {}};
  std::array<string*, 2> names{&place.owner, &place.item};
  std::size_t next = 0;
  for (std::size_t i = 0; i < pattern.size(); ++i) {
    if (pattern[i] == "*") {
      assert(next < names.size());
      *names[next++] = unescaped(path[i]);
    } else if (pattern[i] != path[i])
      return std::nullopt;
  }
  return place;
}

} // namespace

const SpotRow& rowOf(Spot spot) {
  const SpotRow& row = spotTable()[static_cast<std::size_t>(spot)];
  assert(row.spot == spot);
  return row;
}

string pathOf(const Place& place) {
  string path;
  const std::array<const string*, 2> names{&place.owner, &place.item};
  std::size_t next = 0;
  for (const string_view segment : segmentsOf(rowOf(place.spot).path)) {
    if (!path.empty())
      path += '/';
    if (segment != "*") {
      path += segment;
      continue;
    }
    assert(next < names.size());
    path += escaped(*names[next++]);
  }
  return path;
}

std::optional<Place> placeOf(string_view path) {
  const vector<string_view> segments = segmentsOf(path);
  for (const SpotRow& row : spotTable())
    if (auto place = matched(row, segments))
      return place;
  return std::nullopt;
}

namespace {

/// The unit that a study names for a dimension, and what the base has for it.
struct UnitWord {
  const string& word;
  const char* base;
};

UnitWord unitWord(const Units& units, Dimension wanted) {
  if (wanted == dimension::stress)
    return {units.stress, "MPa"};
  if (wanted == dimension::force)
    return {units.force, "N"};
  if (wanted == dimension::length)
    return {units.length, "mm"};
  assert(wanted == dimension::moment);
  return {units.moment, "N*mm"};
}

Unit unitOf(const Study& study, Dimension wanted) {
  if (wanted == dimension::none)
    return {};
  if (wanted == dimension::angle)
    return degreeUnit();
  const auto [word, base] = unitWord(study.units, wanted);
  // A study whose unit does not read is refused for that; until then its texts are read in the base unit.
  return readUnit(word, wanted).value_or(Unit{base, wanted, 1, 1});
}

} // namespace

EntryKind entryKindOf(const Study& study, Spot spot) {
  const SpotRow& row = rowOf(spot);
  return {row.dimension, unitOf(study, row.dimension), row.slopes};
}

} // namespace planewright

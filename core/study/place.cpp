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

SpotRow strain(Spot spot, const char* path, Text label) {
  SpotRow row{spot, path, std::move(label), Holds::expression};
  row.ownUnit = "ustrain";
  return row;
}

/// In the order of Spot.
const vector<SpotRow>& spotTable() {
  using enum Holds;
  const auto& stress = dimension::stress;
  const auto& angle = dimension::angle;
  const auto& force = dimension::force;
  const auto& length = dimension::length;
  const auto& moment = dimension::moment;
  static const vector<SpotRow> table = {
      {Spot::loadCase, "cases/*", PW_TEXT("Place", "load case")},
      {Spot::combination, "combinations/*", PW_TEXT("Place", "combination")},
      {Spot::material, "materials/*", PW_TEXT("Place", "material")},
      {Spot::section, "sections/*", PW_TEXT("Place", "section")},
      {Spot::point, "points/*", PW_TEXT("Place", "point")},
      {Spot::fibre, "points/*/fibre", PW_TEXT("Place", "fibre")},
      {Spot::caseStress, "points/*/stress/*", PW_TEXT("Place", "stresses of a case")},
      {Spot::forces, "points/*/stress/*/forces", PW_TEXT("Place", "section forces")},
      {Spot::pressure, "points/*/stress/*/pressure", PW_TEXT("Place", "pressure in a thin wall")},
      {Spot::rosette, "points/*/stress/*/rosette", PW_TEXT("Place", "strain rosette")},
      {Spot::line, "points/*/lines/*", PW_TEXT("Place", "line")},
      {Spot::plane, "points/*/planes/*", PW_TEXT("Place", "watched plane")},
      {Spot::check, "points/*/checks/*", PW_TEXT("Place", "check")},
      {Spot::factor, "combinations/*/factors/*", PW_TEXT("Place", "factor"), expression},
      {Spot::size, "sections/*/sizes/*", PW_TEXT("Place", "size of the section"), expression},
      {Spot::titleProject, "title/project", PW_TEXT("Place", "project"), freeText},
      {Spot::titleSubject, "title/subject", PW_TEXT("Place", "subject"), freeText},
      {Spot::titleNumber, "title/number", PW_TEXT("Place", "number"), freeText},
      {Spot::titleRevision, "title/revision", PW_TEXT("Place", "revision"), freeText},
      {Spot::titlePrepared, "title/prepared", PW_TEXT("Place", "prepared"), freeText},
      {Spot::titlePreparedFor, "title/prepared_for", PW_TEXT("Place", "state that was prepared"), freeText},
      {Spot::titleChecked, "title/checked", PW_TEXT("Place", "checked"), freeText},
      {Spot::titleCheckedFor, "title/checked_for", PW_TEXT("Place", "state that was checked"), freeText},
      {Spot::titleDate, "title/date", PW_TEXT("Place", "date"), freeText},
      {Spot::titlePurpose, "title/purpose", PW_TEXT("Place", "purpose"), freeText},
      {Spot::titleNotes, "title/notes", PW_TEXT("Place", "notes"), freeText},
      {Spot::unitStress, "units/stress", PW_TEXT("Place", "unit of stress"), unit, stress},
      {Spot::unitForce, "units/force", PW_TEXT("Place", "unit of force"), unit, force},
      {Spot::unitLength, "units/length", PW_TEXT("Place", "unit of length"), unit, length},
      {Spot::unitMoment, "units/moment", PW_TEXT("Place", "unit of moment"), unit, moment},
      {Spot::positive, "convention/positive", PW_TEXT("Place", "positive normal stress"), word},
      {Spot::shearAxis, "convention/shear_axis", PW_TEXT("Place", "shear axis of the circle"), word},
      {Spot::shearForce, "convention/shear_force", PW_TEXT("Place", "sense of V_{y}"), word},
      {Spot::digits, "convention/digits", PW_TEXT("Place", "digits of stresses"), word},
      {Spot::caseName, "cases/*/name", PW_TEXT("Place", "name of the case"), freeText},
      {Spot::caseNature, "cases/*/nature", PW_TEXT("Place", "nature of the action"), word},
      {Spot::caseDuration, "cases/*/duration", PW_TEXT("Place", "duration of the action"), word},
      {Spot::caseExcludes, "cases/*/excludes", PW_TEXT("Place", "cases never together with this"), ids},
      {Spot::combinationBasis, "combinations/*/basis", PW_TEXT("Place", "basis of the combination"), word},
      {Spot::materialKind, "materials/*/kind", PW_TEXT("Place", "kind of material"), word},
      {Spot::materialSource, "materials/*/source", PW_TEXT("Place", "source of the strengths"), freeText},
      {Spot::materialEdition, "materials/*/edition", PW_TEXT("Place", "edition of the source"), freeText},
      {Spot::materialTrust, "materials/*/trust", PW_TEXT("Place", "how the strengths were read"), freeText},
      {Spot::materialBasis, "materials/*/basis", PW_TEXT("Place", "basis of the strengths"), word},
      {Spot::alongTension, "materials/*/along_tension",
       PW_TEXT("Place", "strength along the line in tension"), expression, stress, Slopes::none, true},
      {Spot::alongCompression, "materials/*/along_compression",
       PW_TEXT("Place", "strength along the line in compression"), expression, stress, Slopes::none, true},
      {Spot::alongBending, "materials/*/along_bending",
       PW_TEXT("Place", "strength along the line in bending"), expression, stress, Slopes::none, true},
      {Spot::acrossTension, "materials/*/across_tension",
       PW_TEXT("Place", "strength across the line in tension"), expression, stress, Slopes::none, true},
      {Spot::acrossCompression, "materials/*/across_compression",
       PW_TEXT("Place", "strength across the line in compression"), expression, stress, Slopes::none, true},
      {Spot::strengthShear, "materials/*/shear", PW_TEXT("Place", "strength in shear"), expression, stress,
       Slopes::none, true},
      {Spot::strengthTension, "materials/*/tension", PW_TEXT("Place", "strength in tension"), expression,
       stress, Slopes::none, true},
      {Spot::strengthCompression, "materials/*/compression", PW_TEXT("Place", "strength in compression"),
       expression, stress, Slopes::none, true},
      {Spot::cohesion, "materials/*/cohesion", PW_TEXT("Place", "cohesion"), expression, stress, Slopes::none,
       true},
      {Spot::friction, "materials/*/friction", PW_TEXT("Place", "angle of friction"), expression, angle,
       Slopes::none, true},
      {Spot::cutoff, "materials/*/cutoff", PW_TEXT("Place", "greatest tension across the plane"), expression,
       stress, Slopes::none, true},
      {Spot::fu, "materials/*/fu", symbol("f_{u}"), expression, stress, Slopes::none, true},
      {Spot::betaW, "materials/*/beta_w", symbol("β_{w}"), expression, dimension::none, Slopes::none, true},
      {Spot::gammaM2, "materials/*/gamma_M2", symbol("γ_{M2}"), expression, dimension::none, Slopes::none,
       true},
      {Spot::seam, "materials/*/seam", PW_TEXT("Place", "seam"), word},
      {Spot::partialFactor, "materials/*/partial_factor", PW_TEXT("Place", "partial factor"), expression,
       dimension::none, Slopes::none, true},
      {Spot::strengthFactor, "materials/*/factor", PW_TEXT("Place", "factor of the strengths"), expression,
       dimension::none, Slopes::none, true},
      {Spot::serviceClass, "materials/*/service_class", PW_TEXT("Place", "service class"), freeText},
      {Spot::durationPermanent, "materials/*/duration_factors/permanent",
       PW_TEXT("Place", "factor of permanent loads"), expression, dimension::none, Slopes::none, true},
      {Spot::durationLong, "materials/*/duration_factors/long", PW_TEXT("Place", "factor of long loads"),
       expression, dimension::none, Slopes::none, true},
      {Spot::durationMedium, "materials/*/duration_factors/medium",
       PW_TEXT("Place", "factor of medium loads"), expression, dimension::none, Slopes::none, true},
      {Spot::durationShort, "materials/*/duration_factors/short", PW_TEXT("Place", "factor of short loads"),
       expression, dimension::none, Slopes::none, true},
      {Spot::durationInstantaneous, "materials/*/duration_factors/instantaneous",
       PW_TEXT("Place", "factor of instantaneous loads"), expression, dimension::none, Slopes::none, true},
      {Spot::sectionShape, "sections/*/shape", PW_TEXT("Place", "shape of the section"), word},
      {Spot::pointNote, "points/*/note", PW_TEXT("Place", "note"), freeText},
      {Spot::axes, "points/*/axes", PW_TEXT("Place", "inclination of the member"), expression, angle},
      {Spot::fibreSection, "points/*/fibre/section", PW_TEXT("Place", "section of the fibre"), name},
      {Spot::fibreY, "points/*/fibre/y", symbol("y"), expression, length},
      {Spot::fibreZ, "points/*/fibre/z", symbol("z"), expression, length},
      {Spot::fibreView, "points/*/fibre/view", PW_TEXT("Place", "face that is looked at"), word},
      {Spot::freeEdge, "points/*/free_edge", PW_TEXT("Place", "direction of a free edge"), expression, angle,
       Slopes::line, true},
      {Spot::sx, "points/*/stress/*/sx", symbol("σ_{x}"), expression, stress},
      {Spot::sy, "points/*/stress/*/sy", symbol("σ_{y}"), expression, stress},
      {Spot::txy, "points/*/stress/*/txy", symbol("τ_{xy}"), expression, stress},
      {Spot::sz, "points/*/stress/*/sz", symbol("σ_{z}"), expression, stress},
      {Spot::forceN, "points/*/stress/*/forces/N", symbol("N"), expression, force},
      {Spot::forceVy, "points/*/stress/*/forces/V_y", symbol("V_{y}"), expression, force},
      {Spot::forceVz, "points/*/stress/*/forces/V_z", symbol("V_{z}"), expression, force},
      {Spot::forceT, "points/*/stress/*/forces/T", symbol("T"), expression, moment},
      {Spot::forceMy, "points/*/stress/*/forces/M_y", symbol("M_{y}"), expression, moment},
      {Spot::forceMz, "points/*/stress/*/forces/M_z", symbol("M_{z}"), expression, moment},
      {Spot::pressureP, "points/*/stress/*/pressure/p", symbol("p"), expression, stress},
      {Spot::pressureR, "points/*/stress/*/pressure/r", symbol("r"), expression, length},
      {Spot::pressureT, "points/*/stress/*/pressure/t", symbol("t"), expression, length},
      {Spot::pressureEnds, "points/*/stress/*/pressure/ends", PW_TEXT("Place", "ends of the vessel"), word},
      {Spot::gaugeAngleA, "points/*/stress/*/rosette/angle_a", symbol("α_{a}"), expression, angle},
      {Spot::gaugeAngleB, "points/*/stress/*/rosette/angle_b", symbol("α_{b}"), expression, angle},
      {Spot::gaugeAngleC, "points/*/stress/*/rosette/angle_c", symbol("α_{c}"), expression, angle},
      strain(Spot::gaugeStrainA, "points/*/stress/*/rosette/strain_a", symbol("ε_{a}")),
      strain(Spot::gaugeStrainB, "points/*/stress/*/rosette/strain_b", symbol("ε_{b}")),
      strain(Spot::gaugeStrainC, "points/*/stress/*/rosette/strain_c", symbol("ε_{c}")),
      {Spot::rosetteMaterial, "points/*/stress/*/rosette/material",
       PW_TEXT("Place", "material under the gauges"), word},
      {Spot::rosetteE, "points/*/stress/*/rosette/E", symbol("E"), expression, stress},
      {Spot::rosetteNu, "points/*/stress/*/rosette/nu", symbol("ν"), expression},
      {Spot::rosetteAlong, "points/*/stress/*/rosette/E_along", symbol("E_{φ}"), expression, stress},
      {Spot::rosetteAcross, "points/*/stress/*/rosette/E_across", symbol("E_{φ+90°}"), expression, stress},
      {Spot::rosetteNu12, "points/*/stress/*/rosette/nu12", symbol("ν_{12}"), expression},
      {Spot::rosetteG, "points/*/stress/*/rosette/G", symbol("G"), expression, stress},
      {Spot::lineKind, "points/*/lines/*/kind", PW_TEXT("Place", "kind of line"), word},
      {Spot::lineAngle, "points/*/lines/*/angle", PW_TEXT("Place", "angle of the line"), expression, angle,
       Slopes::line},
      {Spot::lineTolerance, "points/*/lines/*/tolerance", PW_TEXT("Place", "tolerance of the line's angle"),
       expression, angle, Slopes::tolerance, true},
      {Spot::planeNormal, "points/*/planes/*/normal", PW_TEXT("Place", "normal of the plane"), expression,
       angle},
      {Spot::planeTolerance, "points/*/planes/*/tolerance", PW_TEXT("Place", "tolerance of the normal"),
       expression, angle, Slopes::none, true},
      {Spot::checkMaterial, "points/*/checks/*/material", PW_TEXT("Place", "material of the check"), name},
      {Spot::checkCriterion, "points/*/checks/*/criterion", PW_TEXT("Place", "criterion"), word},
      {Spot::checkLine,
       "points/*/checks/*/line",
       PW_TEXT("Place", "line of the check"),
       name,
       {},
       Slopes::none,
       true},
      {Spot::checkPlane,
       "points/*/checks/*/plane",
       PW_TEXT("Place", "plane of the check"),
       name,
       {},
       Slopes::none,
       true},
      {Spot::checkN, "points/*/checks/*/parameters/n", symbol("n"), expression, dimension::none, Slopes::none,
       true},
      {Spot::checkF12, "points/*/checks/*/parameters/F12", symbol("F_{12}"), expression,
       -2 * dimension::stress, Slopes::none, true},
      {Spot::checkKc90, "points/*/checks/*/parameters/k_c90", symbol("k_{c,90}"), expression, dimension::none,
       Slopes::none, true},
      {Spot::checkEdge, "points/*/checks/*/parameters/edge", PW_TEXT("Place", "direction of the edge"),
       expression, angle, Slopes::line, true},
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

Spot spotOf(StrengthKey key) {
  return static_cast<Spot>(static_cast<int>(Spot::alongTension) + static_cast<int>(key));
}

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

/// Area, first and second moment of area: the unit of length to a power.
Unit powerOfLength(const Study& study, Dimension wanted) {
  const char digit = static_cast<char>('0' + wanted.length);
  const string power = {'^', digit};
  return readUnit(study.units.length + power, wanted).value_or(Unit{"mm" + power, wanted, 1, 1});
}

/// Of a coefficient of squared stresses: the unit of stress to the power -2.
Unit inverseSquareOfStress(const Study& study, Dimension wanted) {
  return readUnit(study.units.stress + "^-2", wanted).value_or(Unit{"MPa^-2", wanted, 1, 1});
}

Unit unitOf(const Study& study, Dimension wanted) {
  if (wanted == dimension::none)
    return {};
  if (wanted == dimension::angle)
    return degreeUnit();
  if (wanted.force == 0 && wanted.length > 1)
    return powerOfLength(study, wanted);
  if (wanted == -2 * dimension::stress)
    return inverseSquareOfStress(study, wanted);
  const auto [word, base] = unitWord(study.units, wanted);
  // A study whose unit does not read is refused for that; until then its texts are read in the base unit.
  return readUnit(word, wanted).value_or(Unit{base, wanted, 1, 1});
}

} // namespace

std::string_view SpotRow::key() const {
  const string_view whole = path;
  return whole.substr(whole.rfind('/') + 1);
}

EntryKind entryKindOf(const Study& study, Spot spot) {
  const SpotRow& row = rowOf(spot);
  if (row.ownUnit)
    return {row.dimension, *findUnit(row.ownUnit), row.slopes};
  return {row.dimension, unitOf(study, row.dimension), row.slopes};
}

EntryKind entryKindOf(const Study& study, const Place& place) {
  const TypedSection* section = place.spot == Spot::size ? findSection(study, place.owner) : nullptr;
  if (!section)
    return entryKindOf(study, place.spot);
  const SizeKind* kind = sizeOfKey(section->shape, place.item);
  const Dimension wanted = kind ? kind->dimension : dimension::length;
  return {wanted, unitOf(study, wanted)};
}

} // namespace planewright

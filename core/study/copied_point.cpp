// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/copied_point.h"

#include "core/study/fresh_name.h"
#include "core/study/place_list.h"

#include <cassert>

namespace planewright {

namespace {

/// The things inside a point that have to be there before texts are typed into them.
std::vector<Place> thingsIn(const Point& point) {
  std::vector<Place> places;
  if (point.fibre)
    places.push_back({Spot::fibre, point.name, {}});
  for (const CaseStress& stress : point.stress) {
    places.push_back({Spot::caseStress, point.name, stress.caseId});
    if (stress.forces)
      places.push_back({Spot::forces, point.name, stress.caseId});
    if (stress.pressure)
      places.push_back({Spot::pressure, point.name, stress.caseId});
    if (stress.rosette)
      places.push_back({Spot::rosette, point.name, stress.caseId});
  }
  for (const Line& line : point.lines)
    places.push_back({Spot::line, point.name, line.name});
  for (const WatchedPlane& plane : point.planes)
    places.push_back({Spot::plane, point.name, plane.name});
  for (const Check& check : point.checks)
    places.push_back({Spot::check, point.name, check.id});
  return places;
}

} // namespace

Edits editsThatMakePoint(const Study& study, const Point& point, std::optional<std::size_t> index) {
  Study with = study;
  with.points.push_back(point);
  Edits edits = {Insert{{Spot::point, point.name, {}}, index}};
  for (const Place& thing : thingsIn(point))
    edits.push_back(Insert{thing, std::nullopt});
  for (const Place& place : typedPlacesIn(point))
    edits.push_back(Type{place, textAt(with, place).value_or(std::string())});
  return edits;
}

Edits editsThatCopyPoint(const Study& study, const std::string& from, const std::string& to) {
  const Point* point = findPoint(study, from);
  assert(point);
  Point copy = *point;
  copy.name = to;
  return editsThatMakePoint(study, copy, static_cast<std::size_t>(point - study.points.data()) + 1);
}

std::string freshPointName(const Study& study, const std::string& like) {
  return freshNameLike(like, [&](const std::string& name) { return findPoint(study, name); });
}

} // namespace planewright

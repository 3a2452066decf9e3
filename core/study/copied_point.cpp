// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/copied_point.h"

#include "core/study/place_list.h"

#include <array>
#include <cassert>
#include <charconv>

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
  return places;
}

} // namespace

Edits editsThatCopyPoint(const Study& study, const std::string& from, const std::string& to) {
  const Point* point = findPoint(study, from);
  assert(point);
  const auto index = static_cast<std::size_t>(point - study.points.data()) + 1;
  Edits edits = {Insert{{Spot::point, to, {}}, index}};
  const auto of = [&to](Place place) {
    place.owner = to;
    return place;
  };
  for (const Place& thing : thingsIn(*point))
    edits.push_back(Insert{of(thing), std::nullopt});
  for (const Place& place : typedPlacesIn(*point))
    edits.push_back(Type{of(place), textAt(study, place).value_or(std::string())});
  return edits;
}

std::string freshPointName(const Study& study, const std::string& like) {
  const std::size_t stem = like.find_last_not_of("0123456789") + 1;
  int number = 1;
  std::from_chars(like.data() + stem, like.data() + like.size(), number);
  // A number too long to count with stays part of the name.
  const std::string base = stem == like.size() || like.size() - stem > 8 ? like + " " : like.substr(0, stem);
  for (++number;; ++number) {
    std::array<char, 16> digits{};
    const auto end = std::to_chars(digits.data(), digits.data() + digits.size(), number).ptr;
    std::string name = base + std::string(digits.data(), end);
    if (!findPoint(study, name))
      return name;
  }
}

} // namespace planewright

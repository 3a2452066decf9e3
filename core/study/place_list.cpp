// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place_list.h"

#include <iterator>

namespace planewright {

namespace {

using Places = std::vector<Place>;

void add(Places& places, std::initializer_list<Spot> spots, const std::string& owner = {},
         const std::string& item = {}) {
  for (const Spot spot : spots)
    places.push_back({spot, owner, item});
}

void append(Places& places, Places more) {
  places.insert(places.end(), std::move_iterator(more.begin()), std::move_iterator(more.end()));
}

} // namespace

std::vector<Place> typedPlacesInHead() {
  Places places;
  add(places, {Spot::titleProject, Spot::titleSubject, Spot::titleNumber, Spot::titleRevision,
               Spot::titlePrepared, Spot::titleChecked, Spot::titleDate, Spot::titleNotes});
  add(places, {Spot::unitStress, Spot::unitForce, Spot::unitLength, Spot::unitMoment});
  add(places, {Spot::positive, Spot::shearAxis});
  return places;
}

std::vector<Place> typedPlacesInFoot() {
  Places places;
  add(places, {Spot::shownPoint, Spot::shownCombination});
  return places;
}

std::vector<Place> typedPlacesIn(const LoadCase& loadCase) {
  Places places;
  add(places, {Spot::caseName, Spot::caseNature, Spot::caseDuration, Spot::caseExcludes}, loadCase.id);
  return places;
}

std::vector<Place> typedPlacesIn(const Combination& combination) {
  Places places;
  for (const Factor& factor : combination.factors)
    add(places, {Spot::factor}, combination.name, factor.caseId);
  add(places, {Spot::combinationBasis}, combination.name);
  return places;
}

std::vector<Place> typedPlacesIn(const Point& point) {
  Places places;
  add(places, {Spot::pointNote, Spot::axes}, point.name);
  for (const CaseStress& stress : point.stress)
    add(places, {Spot::sx, Spot::sy, Spot::txy, Spot::sz}, point.name, stress.caseId);
  if (point.line)
    add(places, {Spot::lineName, Spot::lineKind, Spot::lineAngle, Spot::lineTolerance}, point.name);
  for (const WatchedPlane& plane : point.planes)
    add(places, {Spot::planeNormal, Spot::planeTolerance}, point.name, plane.name);
  add(places, {Spot::reading}, point.name);
  return places;
}

std::vector<Place> typedPlacesIn(const Study& study) {
  Places places = typedPlacesInHead();
  for (const LoadCase& loadCase : study.cases)
    append(places, typedPlacesIn(loadCase));
  for (const Combination& combination : study.combinations)
    append(places, typedPlacesIn(combination));
  for (const Point& point : study.points)
    append(places, typedPlacesIn(point));
  append(places, typedPlacesInFoot());
  return places;
}

} // namespace planewright

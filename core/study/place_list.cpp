// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place_list.h"

namespace planewright {

namespace {

using Places = std::vector<Place>;

void add(Places& places, std::initializer_list<Spot> spots, const std::string& owner = {},
         const std::string& item = {}) {
  for (const Spot spot : spots)
    places.push_back({spot, owner, item});
}

void addPoint(Places& places, const Point& point) {
  add(places, {Spot::pointNote, Spot::axes}, point.name);
  for (const CaseStress& stress : point.stress)
    add(places, {Spot::sx, Spot::sy, Spot::txy, Spot::sz}, point.name, stress.caseId);
  if (point.line)
    add(places, {Spot::lineName, Spot::lineKind, Spot::lineAngle, Spot::lineTolerance}, point.name);
  for (const WatchedPlane& plane : point.planes)
    add(places, {Spot::planeNormal, Spot::planeTolerance}, point.name, plane.name);
  add(places, {Spot::reading}, point.name);
}

} // namespace

std::vector<Place> typedPlacesIn(const Study& study) {
  Places places;
  add(places, {Spot::titleProject, Spot::titleSubject, Spot::titleNumber, Spot::titleRevision,
               Spot::titlePrepared, Spot::titleChecked, Spot::titleDate, Spot::titleNotes});
  add(places, {Spot::unitStress, Spot::unitForce, Spot::unitLength, Spot::unitMoment});
  add(places, {Spot::positive, Spot::shearAxis});
  for (const LoadCase& loadCase : study.cases)
    add(places, {Spot::caseName, Spot::caseNature, Spot::caseDuration, Spot::caseExcludes}, loadCase.id);
  for (const Combination& combination : study.combinations) {
    for (const Factor& factor : combination.factors)
      add(places, {Spot::factor}, combination.name, factor.caseId);
    add(places, {Spot::combinationBasis}, combination.name);
  }
  for (const Point& point : study.points)
    addPoint(places, point);
  add(places, {Spot::shownPoint, Spot::shownCombination});
  return places;
}

} // namespace planewright

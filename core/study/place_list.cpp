// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place_list.h"

#include "core/study/text_fields.h"

#include <iterator>

namespace planewright {

namespace {

using Places = std::vector<Place>;

void add(Places& places, std::initializer_list<Spot> spots, const std::string& owner = {},
         const std::string& item = {}) {
  for (const Spot spot : spots)
    places.push_back({spot, owner, item});
}

/// The typed texts of a thing that may be absent.
template <class Thing>
void addTexts(Places& places, const Thing* thing, const std::string& owner = {},
              const std::string& item = {}) {
  if (thing)
    for (const TextField<Thing>& field : textFieldsOf<Thing>())
      places.push_back({field.spot, owner, item});
}

template <class Thing>
const Thing* inside(const std::optional<Thing>& thing) {
  return thing ? &*thing : nullptr;
}

void append(Places& places, Places more) {
  places.insert(places.end(), std::move_iterator(more.begin()), std::move_iterator(more.end()));
}

} // namespace

std::vector<Place> typedPlacesInHead() {
  Places places;
  const Study none;
  addTexts(places, &none.title);
  addTexts(places, &none.units);
  add(places, {Spot::positive, Spot::shearAxis, Spot::shearForce, Spot::digits});
  return places;
}

std::vector<Place> typedPlacesInFoot() {
  Places places;
  const Shown none;
  addTexts(places, &none);
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

std::vector<Place> typedPlacesIn(const Material& material) {
  Places places;
  add(places, {Spot::materialKind, Spot::materialBasis}, material.name);
  addTexts(places, &material, material.name);
  add(places, {Spot::seam}, material.name);
  addTexts(places, &material.durations, material.name);
  return places;
}

std::vector<Place> typedPlacesIn(const TypedSection& section) {
  Places places;
  add(places, {Spot::sectionShape}, section.name);
  for (const TypedSize& size : section.sizes)
    add(places, {Spot::size}, section.name, size.key);
  return places;
}

std::vector<Place> typedPlacesIn(const Point& point) {
  Places places;
  add(places, {Spot::pointNote, Spot::axes}, point.name);
  addTexts(places, inside(point.fibre), point.name);
  if (point.fibre)
    add(places, {Spot::fibreView}, point.name);
  add(places, {Spot::freeEdge}, point.name);
  for (const CaseStress& stress : point.stress) {
    addTexts(places, &stress, point.name, stress.caseId);
    addTexts(places, inside(stress.forces), point.name, stress.caseId);
    addTexts(places, inside(stress.pressure), point.name, stress.caseId);
    if (stress.pressure)
      add(places, {Spot::pressureEnds}, point.name, stress.caseId);
    addTexts(places, inside(stress.rosette), point.name, stress.caseId);
    if (stress.rosette)
      add(places, {Spot::rosetteMaterial}, point.name, stress.caseId);
  }
  for (const Line& line : point.lines) {
    add(places, {Spot::lineKind}, point.name, line.name);
    addTexts(places, &line, point.name, line.name);
  }
  for (const WatchedPlane& plane : point.planes)
    addTexts(places, &plane, point.name, plane.name);
  for (const Check& check : point.checks) {
    add(places, {Spot::checkCriterion}, point.name, check.id);
    addTexts(places, &check, point.name, check.id);
    addTexts(places, &check.parameters, point.name, check.id);
  }
  add(places, {Spot::reading}, point.name);
  return places;
}

std::vector<Place> typedPlacesIn(const Study& study) {
  Places places = typedPlacesInHead();
  for (const LoadCase& loadCase : study.cases)
    append(places, typedPlacesIn(loadCase));
  for (const Combination& combination : study.combinations)
    append(places, typedPlacesIn(combination));
  for (const Material& material : study.materials)
    append(places, typedPlacesIn(material));
  for (const TypedSection& section : study.sections)
    append(places, typedPlacesIn(section));
  for (const Point& point : study.points)
    append(places, typedPlacesIn(point));
  append(places, typedPlacesInFoot());
  return places;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/references.h"

#include <algorithm>

namespace planewright {

namespace {

void dropCase(Study& study, const std::string& id) {
  for (LoadCase& other : study.cases)
    std::erase(other.excludes, id);
  for (Combination& combination : study.combinations)
    std::erase_if(combination.factors, [&](const Factor& factor) { return factor.caseId == id; });
  for (Point& point : study.points)
    std::erase_if(point.stress, [&](const CaseStress& stress) { return stress.caseId == id; });
}

void renameCase(Study& study, const std::string& from, const std::string& to) {
  for (LoadCase& other : study.cases)
    std::ranges::replace(other.excludes, from, to);
  for (Combination& combination : study.combinations)
    for (Factor& factor : combination.factors)
      if (factor.caseId == from)
        factor.caseId = to;
  for (Point& point : study.points)
    for (CaseStress& stress : point.stress)
      if (stress.caseId == from)
        stress.caseId = to;
}

void renameSection(Study& study, const std::string& from, const std::string& to) {
  for (Point& point : study.points)
    if (point.fibre && point.fibre->section == from)
      point.fibre->section = to;
}

/// A name that was the one given.
void follow(std::string& shown, const std::string& from, const std::string& to) {
  if (shown == from)
    shown = to;
}

/// A check cannot stand without its material, line or plane.
template <class Meets>
void dropChecks(Point& point, Meets meets) {
  std::erase_if(point.checks, meets);
}

void dropChecksOf(Study& study, const Place& place) {
  for (Point& point : study.points) {
    if (place.spot == Spot::material)
      dropChecks(point, [&](const Check& check) { return check.material == place.owner; });
    if (place.spot == Spot::line && point.name == place.owner)
      dropChecks(point, [&](const Check& check) { return check.line == place.item; });
    if (place.spot == Spot::plane && point.name == place.owner)
      dropChecks(point, [&](const Check& check) { return check.plane == place.item; });
  }
}

void renameInChecks(Study& study, const Place& place, const std::string& name) {
  for (Point& point : study.points)
    for (Check& check : point.checks) {
      if (place.spot == Spot::material)
        follow(check.material, place.owner, name);
      if (place.spot == Spot::line && point.name == place.owner)
        follow(check.line, place.item, name);
      if (place.spot == Spot::plane && point.name == place.owner)
        follow(check.plane, place.item, name);
    }
}

} // namespace

void dropReferences(Study& study, const Place& place) {
  if (place.spot == Spot::loadCase)
    dropCase(study, place.owner);
  dropChecksOf(study, place);
  if (place.spot == Spot::loadCase || place.spot == Spot::combination)
    follow(study.shown.combination, place.owner, "");
  if (place.spot == Spot::point)
    follow(study.shown.point, place.owner, "");
}

void renameReferences(Study& study, const Place& place, const std::string& name) {
  renameInChecks(study, place, name);
  if (place.spot == Spot::section)
    renameSection(study, place.owner, name);
  if (place.spot == Spot::loadCase)
    renameCase(study, place.owner, name);
  if (place.spot == Spot::loadCase || place.spot == Spot::combination)
    follow(study.shown.combination, place.owner, name);
  if (place.spot == Spot::point)
    follow(study.shown.point, place.owner, name);
}

} // namespace planewright

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

/// What is shown may be a combination or, under its id, a single case.
void follow(std::string& shown, const std::string& from, const std::string& to) {
  if (shown == from)
    shown = to;
}

} // namespace

void dropReferences(Study& study, const Place& place) {
  if (place.spot == Spot::loadCase)
    dropCase(study, place.owner);
  if (place.spot == Spot::loadCase || place.spot == Spot::combination)
    follow(study.shown.combination, place.owner, "");
  if (place.spot == Spot::point)
    follow(study.shown.point, place.owner, "");
}

void renameReferences(Study& study, const Place& place, const std::string& name) {
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

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/study.h"

#include <algorithm>
#include <cassert>

namespace planewright {

namespace {

template <class Item, class Key>
const Item* found(const std::vector<Item>& items, Key Item::*key, std::string_view wanted) {
  const auto at = std::ranges::find(items, wanted, key);
  return at == items.end() ? nullptr : &*at;
}

} // namespace

Study newStudy() {
  Study study;
  study.cases = {{"G", "Permanent", Nature::permanent, Duration::permanent, {}}};
  Point point;
  point.name = "P1";
  point.stress = {CaseStress{"G"}};
  point.lines = {Line{}};
  study.points = {point};
  return study;
}

const LoadCase* findCase(const Study& study, std::string_view id) {
  return found(study.cases, &LoadCase::id, id);
}

const Combination* findCombination(const Study& study, std::string_view name) {
  return found(study.combinations, &Combination::name, name);
}

const Material* findMaterial(const Study& study, std::string_view name) {
  return found(study.materials, &Material::name, name);
}

const TypedSection* findSection(const Study& study, std::string_view name) {
  return found(study.sections, &TypedSection::name, name);
}

const Point* findPoint(const Study& study, std::string_view name) {
  return found(study.points, &Point::name, name);
}

const Point& shownPoint(const Study& study) {
  assert(!study.points.empty());
  const Point* point = findPoint(study, study.shown.point);
  return point ? *point : study.points.front();
}

const CaseStress* findStress(const Point& point, std::string_view caseId) {
  return found(point.stress, &CaseStress::caseId, caseId);
}

const Check* findCheck(const Point& point, std::string_view id) {
  return found(point.checks, &Check::id, id);
}

const Line* findLine(const Point& point, std::string_view name) {
  return found(point.lines, &Line::name, name);
}

const WatchedPlane* findPlane(const Point& point, std::string_view name) {
  return found(point.planes, &WatchedPlane::name, name);
}

} // namespace planewright

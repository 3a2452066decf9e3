// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/slot.h"

#include <algorithm>

namespace planewright {

/// A list of a study whose items have a name as their key, seen alike by insert, remove, move and rename.
template <class Item>
struct KeyedList {
  std::vector<Item>& items;
  std::string Item::*key;

  std::optional<std::size_t> indexOf(const std::string& name) const {
    const auto at = std::ranges::find(items, name, key);
    return at == items.end() ? std::nullopt : std::optional(static_cast<std::size_t>(at - items.begin()));
  }
  bool holds(const std::string& name) const { return indexOf(name).has_value(); }
  void insert(std::optional<std::size_t> index, const std::string& name) {
    Item item;
    item.*key = name;
    const std::size_t at = std::min(index.value_or(items.size()), items.size());
    items.insert(items.begin() + static_cast<std::ptrdiff_t>(at), std::move(item));
  }
  bool erase(const std::string& name) {
    return std::erase_if(items, [&](const Item& item) { return item.*key == name; }) > 0;
  }
  bool move(const std::string& name, std::size_t index) {
    const auto from = indexOf(name);
    if (!from || index >= items.size())
      return false;
    Item item = std::move(items[*from]);
    items.erase(items.begin() + static_cast<std::ptrdiff_t>(*from));
    items.insert(items.begin() + static_cast<std::ptrdiff_t>(index), std::move(item));
    return true;
  }
  bool rename(const std::string& from, const std::string& to) {
    const auto at = indexOf(from);
    if (at)
      items[*at].*key = to;
    return at.has_value();
  }
};

/// A thing that stands once or not at all, seen as a list of at most one that needs no key and has no name.
template <class Thing>
struct SingleThing {
  std::optional<Thing>& thing;

  bool holds(const std::string&) const { return thing.has_value(); }
  void insert(std::optional<std::size_t>, const std::string&) { thing.emplace(); }
  bool erase(const std::string&) {
    const bool was = thing.has_value();
    thing.reset();
    return was;
  }
  bool move(const std::string&, std::size_t index) const { return thing && index == 0; }
  bool rename(const std::string&, const std::string&) const { return false; }
};

/// One of the sources in the stresses of a case at a point.
template <class Source, class Visit>
bool withSource(Point* point, const Place& place, std::optional<Source> CaseStress::*source, Visit visit) {
  CaseStress* stress = point ? itemIn(point->stress, &CaseStress::caseId, place.item) : nullptr;
  if (!stress)
    return false;
  SingleThing<Source> list{stress->*source};
  return visit(list);
}

/// The key of the thing that a place names.
inline const std::string& keyOf(const Place& place) {
  return place.item.empty() ? place.owner : place.item;
}

/// Calls `visit` with the list that holds the thing at `place`; false when there is no such list.
template <class Visit>
bool withList(Study& study, const Place& place, Visit visit) {
  const auto in = [&visit](auto list) { return visit(list); };
  Point* point = itemIn(study.points, &Point::name, place.owner);
  switch (place.spot) {
  case Spot::loadCase:
    return in(KeyedList<LoadCase>{study.cases, &LoadCase::id});
  case Spot::combination:
    return in(KeyedList<Combination>{study.combinations, &Combination::name});
  case Spot::material:
    return in(KeyedList<Material>{study.materials, &Material::name});
  case Spot::section:
    return in(KeyedList<TypedSection>{study.sections, &TypedSection::name});
  case Spot::point:
    return in(KeyedList<Point>{study.points, &Point::name});
  case Spot::caseStress:
    return point && in(KeyedList<CaseStress>{point->stress, &CaseStress::caseId});
  case Spot::plane:
    return point && in(KeyedList<WatchedPlane>{point->planes, &WatchedPlane::name});
  case Spot::check:
    return point && in(KeyedList<Check>{point->checks, &Check::id});
  case Spot::line:
    return point && in(KeyedList<Line>{point->lines, &Line::name});
  case Spot::fibre:
    return point && in(SingleThing<FibreTexts>{point->fibre});
  case Spot::forces:
    return withSource(point, place, &CaseStress::forces, visit);
  case Spot::pressure:
    return withSource(point, place, &CaseStress::pressure, visit);
  case Spot::rosette:
    return withSource(point, place, &CaseStress::rosette, visit);
  case Spot::size: {
    TypedSection* section = itemIn(study.sections, &TypedSection::name, place.owner);
    return section && in(KeyedList<TypedSize>{section->sizes, &TypedSize::key});
  }
  case Spot::factor: {
    Combination* combination = itemIn(study.combinations, &Combination::name, place.owner);
    return combination && in(KeyedList<Factor>{combination->factors, &Factor::caseId});
  }
  default:
    return false;
  }
}

} // namespace planewright

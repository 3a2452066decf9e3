// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/rules.h"

#include "core/study/typed.h"

#include <unordered_set>

namespace planewright {

namespace {

using Names = std::unordered_set<std::string_view>;

constexpr std::size_t mostCases = 1000;
constexpr std::size_t mostCombinations = 10000;
constexpr std::size_t mostPoints = 10000;
constexpr std::size_t mostPlanes = 1000;

Place listPlace(Spot spot) {
  return {spot, {}, {}};
}

class Rules {
public:
  explicit Rules(const Study& study) : m_study(study) {}

  Problems broken() {
    for (const LoadCase& one : m_study.cases)
      key(m_cases, {Spot::loadCase, one.id, {}}, one.id);
    count(m_study.cases.size(), 1, mostCases, Spot::loadCase);
    for (const LoadCase& one : m_study.cases)
      excludes(one);
    count(m_study.combinations.size(), 0, mostCombinations, Spot::combination);
    Names combinations;
    for (const Combination& one : m_study.combinations)
      combination(combinations, one);
    count(m_study.points.size(), 1, mostPoints, Spot::point);
    Names points;
    for (const Point& one : m_study.points)
      point(points, one);
    shown(points, combinations);
    return std::move(m_problems);
  }

private:
  void add(const Place& place, std::string_view quoted, Text what, Text mend = {}) {
    m_problems.push_back(problemAt(place, quoted, std::move(what), std::move(mend)));
  }

  void key(Names& names, const Place& place, const std::string& name) {
    if (Text fault = faultOfName(name); !fault.empty())
      add(place, name, std::move(fault));
    else if (!names.insert(name).second)
      add(place, name, PW_TEXT("Study", "The name “%1” stands twice.").with(name),
          PW_TEXT("Study", "Give each its own name."));
  }

  void reference(const Names& names, const Place& place, const std::string& name) {
    if (!names.contains(name))
      add(place, name, PW_TEXT("Study", "There is no “%1” in this study.").with(name),
          PW_TEXT("Study", "Use a name that the study has."));
  }

  void count(std::size_t size, std::size_t least, std::size_t most, Spot spot) {
    const Text& what = rowOf(spot).label;
    if (size < least)
      add(listPlace(spot), {}, PW_TEXT("Study", "A study needs at least one %1.").with(what));
    if (size > most)
      add(listPlace(spot), {}, PW_TEXT("Study", "There are too many of this kind: %1.").with(what));
  }

  void excludes(const LoadCase& one) {
    for (const std::string& id : one.excludes) {
      const Place place{Spot::caseExcludes, one.id, {}};
      reference(m_cases, place, id);
      if (id == one.id)
        add(place, id, PW_TEXT("Study", "A case cannot exclude itself."));
    }
  }

  void combination(Names& names, const Combination& one) {
    key(names, {Spot::combination, one.name, {}}, one.name);
    Names factors;
    for (const Factor& factor : one.factors) {
      const Place place{Spot::factor, one.name, factor.caseId};
      reference(m_cases, place, factor.caseId);
      key(factors, place, factor.caseId);
    }
  }

  void point(Names& names, const Point& one) {
    key(names, {Spot::point, one.name, {}}, one.name);
    Names stresses;
    for (const CaseStress& stress : one.stress) {
      const Place place{Spot::caseStress, one.name, stress.caseId};
      reference(m_cases, place, stress.caseId);
      key(stresses, place, stress.caseId);
    }
    count(one.planes.size(), 0, mostPlanes, Spot::plane);
    Names planes;
    for (const WatchedPlane& plane : one.planes)
      key(planes, {Spot::plane, one.name, plane.name}, plane.name);
  }

  void shown(const Names& points, const Names& combinations) {
    if (!m_study.shown.point.empty())
      reference(points, listPlace(Spot::shownPoint), m_study.shown.point);
    const std::string& combination = m_study.shown.combination;
    if (!combination.empty() && !m_cases.contains(combination))
      reference(combinations, listPlace(Spot::shownCombination), combination);
  }

  const Study& m_study;
  Names m_cases;
  Problems m_problems;
};

} // namespace

Problems brokenRules(const Study& study) {
  return Rules(study).broken();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/rules.h"

#include "core/study/edit.h"
#include "core/study/strength_rules.h"
#include "core/study/typed.h"

#include <algorithm>
#include <unordered_set>

namespace planewright {

namespace {

using Names = std::unordered_set<std::string_view>;

constexpr std::size_t mostCases = 1000;
constexpr std::size_t mostCombinations = 10000;
constexpr std::size_t mostPoints = 10000;
constexpr std::size_t mostPlanes = 1000;
constexpr std::size_t mostMaterials = 1000;
constexpr std::size_t mostChecks = 100;
constexpr std::size_t mostSections = 1000;
constexpr std::size_t mostSizes = 1000;
constexpr std::size_t mostLines = 10;

Place listPlace(Spot spot, const std::string& owner = {}) {
  return {spot, owner, {}};
}

void limit(Problems& problems, std::size_t size, std::size_t most, const Place& place) {
  if (size > most && problems.size() < mostProblems)
    problems.push_back(problemAt(
        place, {}, PW_TEXT("Study", "There are too many of this kind: %1.").with(rowOf(place.spot).label)));
}

/// Of a factor that does not read nothing is said here: that is a Problem of its own.
std::optional<double> valueOf(const Factor& factor) {
  const Result<Entry> entry = readEntry(factor.factor, {});
  return entry ? std::optional(entry->value) : std::nullopt;
}

class Rules {
public:
  explicit Rules(const Study& study) : m_study(study) {}

  Problems broken() {
    for (const LoadCase& one : m_study.cases)
      key(m_cases, {Spot::loadCase, one.id, {}}, one.id);
    for (const TypedSection& one : m_study.sections)
      section(one);
    Names materials;
    for (const Material& one : m_study.materials)
      material(materials, one);
    needed(m_study.cases.size(), Spot::loadCase);
    for (const LoadCase& one : m_study.cases)
      excludes(one);
    Names combinations;
    for (const Combination& one : m_study.combinations)
      combination(combinations, one);
    needed(m_study.points.size(), Spot::point);
    Names points;
    for (const Point& one : m_study.points)
      point(points, one);
    shown(points, combinations);
    return std::move(m_problems);
  }

private:
  void add(const Place& place, std::string_view quoted, Text what, Text mend = {}) {
    if (m_problems.size() < mostProblems)
      m_problems.push_back(problemAt(place, quoted, std::move(what), std::move(mend)));
  }

  void key(Names& names, const Place& place, const std::string& name) {
    const bool isNew = names.insert(name).second;
    if (Text fault = faultOfKey(place.spot, name); !fault.empty())
      add(place, name, std::move(fault));
    else if (!isNew)
      add(place, name, PW_TEXT("Study", "The name “%1” stands twice.").with(name),
          PW_TEXT("Study", "Give each its own name."));
  }

  void reference(const Names& names, const Place& place, const std::string& name) {
    if (!names.contains(name))
      add(place, name, PW_TEXT("Study", "There is no “%1” in this study.").with(name),
          PW_TEXT("Study", "Use a name that the study has."));
  }

  void needed(std::size_t size, Spot spot) {
    if (size == 0)
      add(listPlace(spot), {}, PW_TEXT("Study", "A study needs at least one %1.").with(rowOf(spot).label));
  }

  void excludes(const LoadCase& one) {
    Names excluded;
    for (const std::string& id : one.excludes) {
      const Place place{Spot::caseExcludes, one.id, {}};
      reference(m_cases, place, id);
      if (!excluded.insert(id).second)
        add(place, id, PW_TEXT("Study", "The name “%1” stands twice.").with(id),
            PW_TEXT("Study", "Name it once."));
      if (id == one.id)
        add(place, id, PW_TEXT("Study", "A case cannot exclude itself."));
    }
  }

  void combination(Names& names, const Combination& one) {
    const Place own{Spot::combination, one.name, {}};
    key(names, own, one.name);
    if (m_cases.contains(one.name))
      add(own, one.name, PW_TEXT("Study", "“%1” is the id of a case already.").with(one.name),
          PW_TEXT("Study", "Give the combination its factor, such as “1.0 %1”.").with(one.name));
    Names factors;
    for (const Factor& factor : one.factors) {
      const Place place{Spot::factor, one.name, factor.caseId};
      reference(m_cases, place, factor.caseId);
      key(factors, place, factor.caseId);
      if (const LoadCase* loadCase = findCase(m_study, factor.caseId))
        acting(one, factor, *loadCase);
    }
  }

  /// What a case allows of its factor in a combination.
  void acting(const Combination& one, const Factor& factor, const LoadCase& loadCase) {
    if (loadCase.nature != Nature::measured && loadCase.excludes.empty())
      return;
    const std::optional<double> value = valueOf(factor);
    const Place place{Spot::factor, one.name, factor.caseId};
    if (loadCase.nature == Nature::measured && value && *value != 1 && *value != 0)
      add(place, factor.factor,
          PW_TEXT("Study", "Case %1 is measured: it takes factor 1 only.").with(factor.caseId),
          PW_TEXT("Study", "Give it factor 1; what was measured acts as it is."));
    for (const Factor& other : one.factors)
      if (other.caseId != factor.caseId && value && *value != 0 && valueOf(other).value_or(0) != 0 &&
          std::ranges::find(loadCase.excludes, other.caseId) != loadCase.excludes.end())
        add(place, factor.caseId,
            PW_TEXT("Study", "Cases %1 and %2 exclude each other, but “%3” has both.")
                .with(factor.caseId)
                .with(other.caseId)
                .with(one.name),
            PW_TEXT("Study", "Take one of them out of the combination."));
  }

  void material(Names& names, const Material& one) {
    key(names, {Spot::material, one.name, {}}, one.name);
    append(brokenStrengths(m_study, one));
  }

  void append(Problems problems) {
    for (Problem& problem : problems)
      if (m_problems.size() < mostProblems)
        m_problems.push_back(std::move(problem));
  }

  void section(const TypedSection& one) {
    key(m_sections, {Spot::section, one.name, {}}, one.name);
    Names sizes;
    for (const TypedSize& size : one.sizes)
      key(sizes, {Spot::size, one.name, size.key}, size.key);
  }

  void point(Names& names, const Point& one) {
    key(names, {Spot::point, one.name, {}}, one.name);
    if (one.fibre && !m_sections.contains(one.fibre->section))
      add({Spot::fibreSection, one.name, {}}, one.fibre->section,
          PW_TEXT("Study", "Point %1 lies in section “%2”, which is not in this study.")
              .with(one.name)
              .with(one.fibre->section),
          PW_TEXT("Study", "Give the point a section that the study has."));
    Names stresses;
    for (const CaseStress& stress : one.stress) {
      const Place place{Spot::caseStress, one.name, stress.caseId};
      reference(m_cases, place, stress.caseId);
      key(stresses, place, stress.caseId);
      sources(one, stress);
    }
    Names lines;
    for (const Line& line : one.lines)
      key(lines, {Spot::line, one.name, line.name}, line.name);
    Names planes;
    for (const WatchedPlane& plane : one.planes)
      key(planes, {Spot::plane, one.name, plane.name}, plane.name);
    Names checks;
    for (const Check& check : one.checks) {
      key(checks, {Spot::check, one.name, check.id}, check.id);
      append(brokenCheck(m_study, one, check));
    }
  }

  void sources(const Point& one, const CaseStress& stress) {
    if (stress.forces && !one.fibre)
      add({Spot::forces, one.name, stress.caseId}, stress.caseId,
          PW_TEXT("Study", "Section forces of case %1 need a fibre: a section and a place in it.")
              .with(stress.caseId),
          PW_TEXT("Study", "Give point %1 its section first.").with(one.name));
    const LoadCase* loadCase = findCase(m_study, stress.caseId);
    if (stress.rosette && loadCase && loadCase->nature != Nature::measured)
      add({Spot::rosette, one.name, stress.caseId}, stress.caseId,
          PW_TEXT("Study", "Case %1 has measured strains, but its nature is not “measured”.")
              .with(stress.caseId),
          PW_TEXT("Study", "Make its nature “measured”, or give the rosette a case of its own."));
    if (stress.rosette && stress.rosette->material == Elasticity::orthotropic && one.lines.empty())
      add({Spot::rosetteMaterial, one.name, stress.caseId}, "orthotropic",
          PW_TEXT("Study", "A material with a line needs the line of point %1.").with(one.name),
          PW_TEXT("Study", "Give the point a line first."));
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
  Names m_sections;
  Problems m_problems;
};

} // namespace

Problems excessIn(const Study& study) {
  Problems problems;
  limit(problems, study.cases.size(), mostCases, listPlace(Spot::loadCase));
  for (const LoadCase& one : study.cases)
    limit(problems, one.excludes.size(), mostCases, listPlace(Spot::caseExcludes, one.id));
  limit(problems, study.combinations.size(), mostCombinations, listPlace(Spot::combination));
  for (const Combination& one : study.combinations)
    limit(problems, one.factors.size(), mostCases, listPlace(Spot::factor, one.name));
  limit(problems, study.materials.size(), mostMaterials, listPlace(Spot::material));
  limit(problems, study.sections.size(), mostSections, listPlace(Spot::section));
  for (const TypedSection& one : study.sections)
    limit(problems, one.sizes.size(), mostSizes, listPlace(Spot::size, one.name));
  limit(problems, study.points.size(), mostPoints, listPlace(Spot::point));
  for (const Point& one : study.points) {
    limit(problems, one.stress.size(), mostCases, listPlace(Spot::caseStress, one.name));
    limit(problems, one.lines.size(), mostLines, listPlace(Spot::line, one.name));
    limit(problems, one.planes.size(), mostPlanes, listPlace(Spot::plane, one.name));
    limit(problems, one.checks.size(), mostChecks, listPlace(Spot::check, one.name));
  }
  return problems;
}

Problems brokenRules(const Study& study) {
  Problems excess = excessIn(study);
  return excess.empty() ? Rules(study).broken() : excess;
}

} // namespace planewright

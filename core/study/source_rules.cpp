// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/source_rules.h"

#include "core/study/case_sources.h"
#include "core/study/edit.h"

#include <algorithm>

namespace planewright {

namespace {

class SourceRules {
public:
  SourceRules(const Study& study, const Study* valid) : m_study(study), m_valid(valid) {}

  Problems broken() {
    for (const TypedSection& section : m_study.sections)
      if (!isSame(section))
        if (Results<SectionModel> model = modelOf(m_study, section); !model)
          add(std::move(model).error());
    // A fibre says nothing in a section that is none.
    if (m_problems.empty())
      for (const Point& point : m_study.points)
        if (!isSame(point))
          addPoint(point);
    return std::move(m_problems);
  }

private:
  void add(Problems problems) {
    for (Problem& problem : problems)
      if (m_problems.size() < mostProblems)
        m_problems.push_back(std::move(problem));
  }

  bool isSame(const TypedSection& section) const {
    const TypedSection* before = m_valid ? findSection(*m_valid, section.name) : nullptr;
    return before && *before == section;
  }

  /// Points mostly keep their index, which spares looking for them.
  const Point* before(const Point& point) const {
    if (!m_valid)
      return nullptr;
    const auto index = static_cast<std::size_t>(&point - m_study.points.data());
    if (index < m_valid->points.size() && m_valid->points[index].name == point.name)
      return &m_valid->points[index];
    return findPoint(*m_valid, point.name);
  }

  /// The rule of V changes a sign and the units nothing that is typed, so neither can break a source.
  bool isSame(const Point& point) const {
    const bool hasSources = !std::ranges::all_of(point.stress, &CaseStress::isDirect);
    if (!point.fibre && !hasSources)
      return true;
    const Point* was = before(point);
    if (!was || was->fibre != point.fibre || was->stress != point.stress || was->lines != point.lines)
      return false;
    const TypedSection* section = point.fibre ? findSection(m_study, point.fibre->section) : nullptr;
    return !section || isSame(*section);
  }

  void addPoint(const Point& point) {
    const Results<PointSources> sources = PointSources::of(m_study, point);
    if (!sources)
      return add(sources.error());
    for (const CaseStress& stress : point.stress)
      if (Results<SourceStress> made = sources->stressOf(stress); !made)
        add(std::move(made).error());
  }

  const Study& m_study;
  const Study* m_valid;
  Problems m_problems;
};

} // namespace

Problems brokenSources(const Study& study) {
  return SourceRules(study, nullptr).broken();
}

Problems brokenSources(const Study& study, const Study& valid) {
  return SourceRules(study, &valid).broken();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/written_strengths.h"

#include "core/strength/line_criteria.h"

#include <cassert>

namespace planewright {

namespace {

const Text source = PW_TEXT("Working", "common practice, no source");

std::string labelFor(MaterialKind kind, StrengthKey key) {
  return labelOf(kind, key).source;
}

} // namespace

bool isMixed(const Strengths& strengths, const Demand& demand) {
  return strengths.kind == MaterialKind::timber && demand.bendingShare != 0;
}

WrittenStrengths::WrittenStrengths(CheckSteps& steps, const Strengths& given, std::optional<double> factor,
                                   const Demand& demand)
    : m_steps(steps), m_given(given), m_factor(factor), m_demand(demand) {}

double WrittenStrengths::valueOf(StrengthKey key) const {
  const double given = m_given[key].value_or(0);
  return m_factor && rowOf(key).isScaled ? *m_factor * given : given;
}

std::string WrittenStrengths::derived(const std::string& symbol) const {
  if (!m_factor)
    return symbol;
  return symbol.ends_with("}") ? symbol.substr(0, symbol.size() - 1) + ",d}" : symbol + "_{d}";
}

Formula WrittenStrengths::of(StrengthKey key) {
  const std::string given = labelFor(kind(), key);
  const Dimension dimension = rowOf(key).dimension;
  if (!m_factor || !rowOf(key).isScaled)
    return m_steps.put(given, valueOf(key), dimension);
  const std::string scaled = derived(given);
  if (m_steps.knows(scaled))
    return Formula::symbol(scaled);
  const Formula strength = m_steps.put(given, m_given[key].value_or(0), dimension);
  return m_steps.addStrength({PW_TEXT("Working", "strength %1 times the factor").with(labelOf(kind(), key)),
                              scaled, Formula::symbol("k") * strength, valueOf(key), dimension, source});
}

Formula WrittenStrengths::along(bool pulls) {
  const StrengthKey axialKey = pulls ? StrengthKey::alongTension : StrengthKey::alongCompression;
  Formula axial = of(axialKey);
  if (!isMixed(m_given, m_demand) || !mixesBending(m_demand, pulls))
    return axial;
  const std::string mixed = derived(pulls ? "f_{t,NM}" : "f_{c,NM}");
  if (m_steps.knows(mixed))
    return Formula::symbol(mixed);
  const Formula bending = of(StrengthKey::alongBending);
  const Formula w = bendingShare();
  const Result<double> value = alongStrengthOf(m_factor ? *m_factor * m_given : m_given, m_demand, pulls);
  assert(value);
  return m_steps.addStrength({pulls ? PW_TEXT("Working", "strength along the line, axial tension mixed with "
                                                         "bending")
                                    : PW_TEXT("Working", "strength along the line, axial compression mixed "
                                                         "with bending"),
                              mixed, 1 / ((1 - w) / axial + w / bending), *value, dimension::stress, source});
}

/// The share of bending in sx stands for that along the line where nothing else acts.
Formula WrittenStrengths::bendingShare() {
  Formula ofSx = m_steps.put("w", m_demand.bendingShare, dimension::none);
  const double along = bendingShareAlong(m_demand);
  if (along == m_demand.bendingShare)
    return ofSx;
  const Formula sx = absolute(Formula::symbol("σ_{x}"));
  const Formula sy = absolute(Formula::symbol("σ_{y}"));
  const Formula shear = absolute(Formula::symbol("τ_{xy}"));
  return m_steps.addStrength(
      {PW_TEXT("Working", "share of bending along the line, all else counted as axial"), "w_{φ}",
       ofSx * sx / (sx + sy + 2 * shear), along, dimension::none, source});
}

Formula WrittenStrengths::across(bool pulls) {
  return of(pulls ? StrengthKey::acrossTension : StrengthKey::acrossCompression);
}

} // namespace planewright

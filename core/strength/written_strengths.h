// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/check_steps.h"
#include "core/strength/demand.h"
#include "core/strength/strengths.h"

#include <optional>

namespace planewright {

/// The strengths of a check as symbols of its working. Where a factor applies, a strength that it scales
/// enters as "f_{t,0,d}", which a step makes of "f_{t,0}" the first time it is asked for; else as it is
/// given.
class WrittenStrengths {
public:
  /// `given`: before the factor, all that the criterion needs among them. A factor is the number of "k" in
  /// the steps.
  WrittenStrengths(CheckSteps& steps, const Strengths& given, std::optional<double> factor,
                   const Demand& demand);

  Formula of(StrengthKey key);
  /// Along the line in tension (`pulls`) or compression: of timber that of the mix of axial and bending
  /// parts where sx has that sign; the share of bending in sx is "w" in the steps, which have the stresses of
  /// the x and y faces too.
  Formula along(bool pulls);
  Formula across(bool pulls);

  /// What the working calls what is made of this strength: "f_{t,α,d}" for "α" in the place of "0".
  std::string derived(const std::string& symbol) const;
  /// What the strengths are multiplied by; none where they count as given.
  const std::optional<double>& factor() const { return m_factor; }
  MaterialKind kind() const { return m_given.kind; }
  const Demand& demand() const { return m_demand; }
  /// As it counts in the criterion; what is not given counts as 0.
  double valueOf(StrengthKey key) const;

private:
  Formula bendingShare();

  CheckSteps& m_steps;
  Strengths m_given;
  std::optional<double> m_factor;
  Demand m_demand;
};

/// Whether the strength along the line is that of a mix of axial and bending parts.
bool isMixed(const Strengths& strengths, const Demand& demand);

} // namespace planewright

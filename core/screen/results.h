// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field.h"
#include "core/screen/plan.h"

namespace planewright {

/// How one point of a field stands: the greatest utilisation over all combinations, checks and directions of
/// the band.
struct PointResult {
  double utilisation = 0; ///< NaN of a point that is not judged
  std::optional<Mode> mode;
  std::uint32_t combination = 0;
  std::uint32_t check = 0;
  /// Of the line, in degrees from the x axis in which lines are given, unfolded inside the band.
  double worstAngle = 0;

  /// The multiplier on all loads that brings the point to its limit; none where no multiple does.
  std::optional<double> multiplier() const;
  bool isJudged() const { return utilisation == utilisation; }
  bool operator==(const PointResult&) const = default;
};

/// The results of all points of a field, in its order; a structure of arrays.
class FieldResults {
public:
  explicit FieldResults(std::size_t size);
  std::size_t size() const { return m_utilisations.size(); }
  PointResult operator[](std::size_t point) const;
  void set(std::size_t point, const PointResult& result);
  const WideVector<double>& utilisations() const { return m_utilisations; }

private:
  WideVector<double> m_utilisations;
  WideVector<double> m_angles;
  WideVector<std::uint32_t> m_combinations;
  WideVector<std::uint16_t> m_checks;
  WideVector<std::uint8_t> m_modes; ///< of Mode; noMode for none
};

} // namespace planewright

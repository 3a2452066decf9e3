// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/results.h"

#include <limits>

namespace planewright {

namespace {
constexpr std::uint8_t noMode = 0xFF;
}

std::optional<double> PointResult::multiplier() const {
  return utilisation > 0 ? std::optional(1 / utilisation) : std::nullopt;
}

FieldResults::FieldResults(std::size_t size)
    : m_utilisations(size, std::numeric_limits<double>::quiet_NaN()), m_angles(size), m_combinations(size),
      m_checks(size), m_modes(size, noMode) {}

PointResult FieldResults::operator[](std::size_t point) const {
  PointResult result;
  result.utilisation = m_utilisations[point];
  if (m_modes[point] != noMode)
    result.mode = static_cast<Mode>(m_modes[point]);
  result.combination = m_combinations[point];
  result.check = m_checks[point];
  result.worstAngle = m_angles[point];
  return result;
}

void FieldResults::set(std::size_t point, const PointResult& result) {
  m_utilisations[point] = result.utilisation;
  m_angles[point] = result.worstAngle;
  m_combinations[point] = result.combination;
  m_checks[point] = static_cast<std::uint16_t>(result.check);
  m_modes[point] = result.mode ? static_cast<std::uint8_t>(*result.mode) : noMode;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>
#include <cstdint>

namespace planewright {

/// Small and quick: the same numbers on every machine.
class Dice {
public:
  explicit Dice(std::uint64_t seed) : m_state(seed * 2862933555777941757U + 3037000493U) {}
  /// 0 to 1.
  double share() {
    m_state ^= m_state << 13;
    m_state ^= m_state >> 7;
    m_state ^= m_state << 17;
    return static_cast<double>(m_state >> 11) * 0x1p-53;
  }
  double between(double from, double to) { return from + (to - from) * share(); }
  std::size_t below(std::size_t count) {
    return static_cast<std::size_t>(share() * static_cast<double>(count));
  }

private:
  std::uint64_t m_state;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <random>

namespace planewright {

/// Random numbers that are equal everywhere: the seed of a failing case brings it back.
class Dice {
public:
  explicit Dice(unsigned seed) : m_engine(seed) {}
  /// 0 .. count-1.
  int below(int count) { return static_cast<int>(m_engine() % static_cast<unsigned>(count)); }
  bool flip() { return below(2) == 0; }
  /// A place in from..to.
  double within(double from, double to) {
    return from + (to - from) * static_cast<double>(m_engine()) / static_cast<double>(std::mt19937::max());
  }

private:
  std::mt19937 m_engine;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <array>
#include <csignal>

namespace planewright {

/// While one lives, the first signal that asks the program to end (interrupt, hang-up, termination) is only
/// noted, so that what was begun can be put away; when it is gone, the program ends by that signal. A second
/// one ends it at once. What is ignored stays ignored. One at a time.
class Interrupts {
public:
  Interrupts();
  Interrupts(const Interrupts&) = delete;
  Interrupts& operator=(const Interrupts&) = delete;
  ~Interrupts();

  /// Whether the program is to end.
  static bool came();

private:
  static constexpr std::array signals = {SIGINT, SIGHUP, SIGTERM};
  std::array<struct sigaction, signals.size()> m_before{};
};

} // namespace planewright

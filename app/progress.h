// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <chrono>

namespace planewright {

/// How far a long work is, on one line of standard error that is written over; nothing where that is no
/// terminal. The line is taken away at the end.
class Progress {
public:
  Progress();
  Progress(const Progress&) = delete;
  Progress& operator=(const Progress&) = delete;
  ~Progress();

  /// `all` of 0 where nobody knows how much it is.
  void tell(const Text& work, std::size_t done, std::size_t all);

private:
  bool m_isShown;
  bool m_hasLine = false;
  std::chrono::steady_clock::time_point m_next;
};

} // namespace planewright

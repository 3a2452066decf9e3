// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <cstddef>
#include <string_view>

namespace planewright {

/// The Problems of one file, each with line and column of a byte of it; no more than the first 100.
class FileProblems {
public:
  explicit FileProblems(std::string_view bytes) : m_bytes(bytes) {}

  /// A Problem at the token that starts at `offset`, which is quoted.
  void add(std::size_t offset, std::string place, Text what, Text mend = {});
  /// The same for a Problem that already has its place and quoted piece; its line and column are set.
  void add(std::size_t offset, Problem problem);

  std::string_view bytes() const { return m_bytes; }
  bool empty() const { return m_problems.empty(); }
  bool full() const { return m_problems.size() >= most; }
  Problems taken() { return std::move(m_problems); }

private:
  static constexpr std::size_t most = 100;
  std::string_view m_bytes;
  Problems m_problems;
};

} // namespace planewright

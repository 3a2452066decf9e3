// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/file_problems.h"

#include "core/record/json_text.h"

namespace planewright {

void FileProblems::add(std::size_t offset, std::string place, Text what, Text mend) {
  if (!full())
    add(offset, {std::move(place), 0, 0, pieceAt(m_bytes, offset), std::move(what), std::move(mend)});
}

void FileProblems::add(std::size_t offset, Problem problem) {
  if (full())
    return;
  const LineColumn at = lineColumnOf(m_bytes, offset);
  problem.line = at.line;
  problem.column = at.column;
  m_problems.push_back(std::move(problem));
}

} // namespace planewright

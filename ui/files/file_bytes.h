// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <string>
#include <string_view>

namespace planewright {

/// The bytes of a file, at most `most` and one more, so that a reader sees that it is too large.
Result<std::string> bytesOf(const std::string& path, std::size_t most);

/// The same from an open descriptor; `place` names it in a Problem.
Result<std::string> bytesFrom(int descriptor, std::size_t most, const std::string& place);

/// Writes a file whole or not at all, as FileAside does.
Result<void> writeAside(const std::string& path, std::string_view bytes);

/// The same, and the file that was there stays beside it under its name with a tilde behind it.
Result<void> writeKeepingPrevious(const std::string& path, std::string_view bytes);

/// Writes all bytes to an open descriptor; `place` names it in a Problem.
Result<void> writeTo(int descriptor, std::string_view bytes, const std::string& place);

/// True when both paths lead to one existing file.
bool isSameFile(const std::string& a, const std::string& b);

} // namespace planewright

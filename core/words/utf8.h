// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>
#include <string_view>

namespace planewright {

/// Length in bytes of the well-formed UTF-8 sequence at the start of `text` (no overlong forms, no
/// surrogates, at most U+10FFFF), or 0 where there is none.
std::size_t utf8Length(std::string_view text);

/// Whether the whole text is well-formed UTF-8.
bool isUtf8(std::string_view text);

/// Count of code points of a well-formed text; a broken byte counts as one.
std::size_t codePoints(std::string_view text);

} // namespace planewright

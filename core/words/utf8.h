// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <string_view>

namespace planewright {

/// A Unicode code point and the count of bytes that it takes in UTF-8.
struct CodePoint {
  char32_t value = 0;
  std::size_t bytes = 0;
};

/// The code point at `offset`; none where the bytes are not UTF-8 (RFC 3629: no overlong form, no surrogate,
/// nothing beyond U+10FFFF) or the text ends.
std::optional<CodePoint> codePointAt(std::string_view text, std::size_t offset);

/// Offset of the first byte that is not part of valid UTF-8; none when all is.
std::optional<std::size_t> invalidUtf8In(std::string_view text);

/// Bytes of the code point at the start of `text`; 0 where there is none.
std::size_t utf8Length(std::string_view text);

bool isUtf8(std::string_view text);

/// Count of code points of a valid text.
std::size_t codePointsIn(std::string_view text);

/// `value` in hexadecimal capitals, at least `digits` long: 20AC.
std::string hexadecimal(unsigned long value, std::size_t digits);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <optional>
#include <string>
#include <string_view>

namespace planewright {

/// Blanks and line breaks of ASCII, which base64 and markup pass over.
constexpr bool isBlank(char c) {
  return c == ' ' || c == '\t' || c == '\n' || c == '\r';
}

/// Base64 of RFC 4648, section 4, with padding, in lines of 76 characters with a line break behind each.
std::string base64Lines(std::string_view bytes);

/// The bytes of such a text; blanks anywhere in it are passed over. None where another character stands in
/// it, its end is missing or bits are set beyond the last byte.
std::optional<std::string> bytesOfBase64(std::string_view text);

/// Characters of base64 that `bytes` bytes take, without line breaks.
constexpr std::size_t base64Size(std::size_t bytes) {
  return (bytes + 2) / 3 * 4;
}

} // namespace planewright

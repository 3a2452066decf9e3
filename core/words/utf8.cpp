// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/utf8.h"

#include <algorithm>

namespace planewright {

namespace {

struct Lead {
  std::size_t bytes;
  char32_t bits;
  char32_t least; ///< smallest code point that may take this many bytes
};

std::optional<Lead> leadOf(unsigned char byte) {
  if (byte < 0x80)
    return Lead{1, byte, 0};
  if (byte >= 0xC2 && byte < 0xE0)
    return Lead{2, byte & 0x1Fu, 0x80};
  if (byte >= 0xE0 && byte < 0xF0)
    return Lead{3, byte & 0x0Fu, 0x800};
  if (byte >= 0xF0 && byte < 0xF5)
    return Lead{4, byte & 0x07u, 0x10000};
  return std::nullopt;
}

} // namespace

std::optional<CodePoint> codePointAt(std::string_view text, std::size_t offset) {
  if (offset >= text.size())
    return std::nullopt;
  const auto lead = leadOf(static_cast<unsigned char>(text[offset]));
  if (!lead || text.size() - offset < lead->bytes)
    return std::nullopt;
  char32_t value = lead->bits;
  for (std::size_t i = 1; i < lead->bytes; ++i) {
    const auto byte = static_cast<unsigned char>(text[offset + i]);
    if ((byte & 0xC0) != 0x80)
      return std::nullopt;
    value = (value << 6) | (byte & 0x3Fu);
  }
  const bool surrogate = value >= 0xD800 && value <= 0xDFFF;
  if (value < lead->least || surrogate || value > 0x10FFFF)
    return std::nullopt;
  return CodePoint{value, lead->bytes};
}

std::optional<std::size_t> invalidUtf8In(std::string_view text) {
  for (std::size_t offset = 0; offset < text.size();) {
    const auto point = codePointAt(text, offset);
    if (!point)
      return offset;
    offset += point->bytes;
  }
  return std::nullopt;
}

std::size_t utf8Length(std::string_view text) {
  const auto point = codePointAt(text, 0);
  return point ? point->bytes : 0;
}

bool isUtf8(std::string_view text) {
  return !invalidUtf8In(text);
}

std::size_t codePointsIn(std::string_view text) {
  const auto starts = std::count_if(
      text.begin(), text.end(), [](char byte) { return (static_cast<unsigned char>(byte) & 0xC0) != 0x80; });
  return static_cast<std::size_t>(starts);
}

std::string hexadecimal(unsigned long value, std::size_t digits) {
  std::string result;
  while (value != 0 || result.size() < digits) {
    result.push_back("0123456789ABCDEF"[value & 15]);
    value >>= 4;
  }
  std::reverse(result.begin(), result.end());
  return result;
}

} // namespace planewright

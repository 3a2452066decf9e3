// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/json_text.h"

#include "core/words/utf8.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr std::string_view blanksAndSeparators = " \t\r\n,:";
constexpr std::size_t longestPiece = 60;

int whole(std::ptrdiff_t count) {
  return static_cast<int>(count);
}

bool isOneOf(std::string_view characters, char c) {
  return characters.find(c) != std::string_view::npos;
}

bool startsCodePoint(char c) {
  return (static_cast<unsigned char>(c) & 0xC0) != 0x80;
}

/// Bytes of one character inside a JSON text: an escape, a pair of surrogate escapes, or a code point.
std::size_t characterLength(std::string_view rest) {
  if (!rest.starts_with('\\'))
    return std::max<std::size_t>(utf8Length(rest), 1);
  if (!rest.starts_with("\\u"))
    return 2;
  const bool isHighSurrogate = rest.size() > 3 && isOneOf("dD", rest[2]) && isOneOf("89abAB", rest[3]);
  return isHighSurrogate ? 12 : 6;
}

} // namespace

LineColumn lineColumnOf(std::string_view bytes, std::size_t offset) {
  const std::string_view before = bytes.substr(0, offset);
  const std::size_t newline = before.rfind('\n');
  const std::size_t start = newline == std::string_view::npos ? byteOrderMark(before) : newline + 1;
  const std::string_view line = before.substr(start);
  return {whole(std::ranges::count(before, '\n')) + 1,
          whole(std::ranges::count_if(line, startsCodePoint)) + 1};
}

std::size_t byteOrderMark(std::string_view bytes) {
  return bytes.starts_with("\xEF\xBB\xBF") ? 3 : 0;
}

std::size_t tokenStart(std::string_view bytes, std::size_t from) {
  return std::min(bytes.find_first_not_of(blanksAndSeparators, from), bytes.size());
}

std::size_t tokenEnd(std::string_view bytes, std::size_t start) {
  if (start >= bytes.size())
    return bytes.size();
  if (isOneOf("{}[],:", bytes[start]))
    return start + 1;
  if (bytes[start] != '"')
    return std::min(bytes.find_first_of(" \t\r\n,:{}[]\"", start + 1), bytes.size());
  for (std::size_t at = start + 1; at < bytes.size(); ++at) {
    if (bytes[at] == '"')
      return at + 1;
    if (bytes[at] == '\\')
      ++at;
  }
  return bytes.size();
}

std::size_t offsetInText(std::string_view bytes, std::size_t start, std::size_t index) {
  const std::size_t quote = tokenEnd(bytes, start) - 1;
  std::size_t at = start + 1;
  for (; index > 0 && at < quote; --index)
    at += characterLength(bytes.substr(at));
  return std::min(at, quote);
}

std::string pieceAt(std::string_view bytes, std::size_t start) {
  std::string_view token = bytes.substr(start, tokenEnd(bytes, start) - start);
  if (token.starts_with('"'))
    token.remove_prefix(1);
  if (token.ends_with('"'))
    token.remove_suffix(1);
  std::size_t end = 0;
  for (std::size_t count = 0; end < token.size() && count < longestPiece; ++count)
    end += std::max<std::size_t>(utf8Length(token.substr(end)), 1);
  return std::string(token.substr(0, end)) + (end < token.size() ? "…" : "");
}

} // namespace planewright

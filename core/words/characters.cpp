// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/characters.h"

#include "core/words/utf8.h"

namespace planewright {

namespace {

char32_t codeOf(std::string_view bytes) {
  const auto lead = static_cast<unsigned char>(bytes.front());
  if (bytes.size() == 1)
    return lead;
  auto code = static_cast<char32_t>(lead & (0x7F >> bytes.size()));
  for (const char next : bytes.substr(1))
    code = (code << 6) | (static_cast<unsigned char>(next) & 0x3F);
  return code;
}

} // namespace

std::vector<Character> charactersOf(std::string_view text) {
  constexpr char32_t replacement = 0xFFFD;
  std::vector<Character> result;
  while (!text.empty()) {
    const std::size_t length = utf8Length(text);
    const std::string_view bytes = text.substr(0, length == 0 ? 1 : length);
    result.push_back({length == 0 ? replacement : codeOf(bytes), bytes});
    text.remove_prefix(bytes.size());
  }
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/characters.h"

#include <cstddef>

namespace planewright {

namespace {

constexpr char32_t replacement = 0xFFFD;

std::size_t lengthBy(unsigned char lead) {
  if (lead < 0x80)
    return 1;
  if (lead >= 0xC2 && lead < 0xE0)
    return 2;
  if (lead >= 0xE0 && lead < 0xF0)
    return 3;
  return lead >= 0xF0 && lead < 0xF5 ? 4 : 0;
}

bool wellFormed(char32_t code, std::size_t length) {
  constexpr char32_t least[] = {0, 0, 0x80, 0x800, 0x10000};
  return code >= least[length] && code <= 0x10FFFF && (code < 0xD800 || code > 0xDFFF);
}

Character characterAt(std::string_view text) {
  const auto lead = static_cast<unsigned char>(text.front());
  const std::size_t length = lengthBy(lead);
  if (length == 1)
    return {lead, text.substr(0, 1)};
  if (length == 0 || length > text.size())
    return {replacement, text.substr(0, 1)};
  char32_t code = static_cast<char32_t>(lead & (0x7F >> length));
  for (std::size_t i = 1; i < length; ++i) {
    const auto next = static_cast<unsigned char>(text[i]);
    if ((next & 0xC0) != 0x80)
      return {replacement, text.substr(0, 1)};
    code = (code << 6) | (next & 0x3F);
  }
  return wellFormed(code, length) ? Character{code, text.substr(0, length)}
                                  : Character{replacement, text.substr(0, 1)};
}

} // namespace

std::vector<Character> charactersOf(std::string_view text) {
  std::vector<Character> result;
  while (!text.empty()) {
    result.push_back(characterAt(text));
    text.remove_prefix(result.back().bytes.size());
  }
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/utf8.h"

#include <array>

namespace planewright {

namespace {

struct Form {
  unsigned char least, greatest; // of the first byte
  std::size_t length;
  unsigned char secondLeast, secondGreatest;
};
// The table of well-formed sequences of the Unicode Standard, section 3.9 (from memory).
constexpr std::array forms = {
    Form{0x00, 0x7F, 1, 0x80, 0xBF}, Form{0xC2, 0xDF, 2, 0x80, 0xBF}, Form{0xE0, 0xE0, 3, 0xA0, 0xBF},
    Form{0xE1, 0xEC, 3, 0x80, 0xBF}, Form{0xED, 0xED, 3, 0x80, 0x9F}, Form{0xEE, 0xEF, 3, 0x80, 0xBF},
    Form{0xF0, 0xF0, 4, 0x90, 0xBF}, Form{0xF1, 0xF3, 4, 0x80, 0xBF}, Form{0xF4, 0xF4, 4, 0x80, 0x8F}};

bool follows(std::string_view text, const Form& form) {
  if (text.size() < form.length)
    return false;
  for (std::size_t i = 1; i < form.length; ++i) {
    const auto byte = static_cast<unsigned char>(text[i]);
    const bool second = i == 1;
    if (byte < (second ? form.secondLeast : 0x80) || byte > (second ? form.secondGreatest : 0xBF))
      return false;
  }
  return true;
}

} // namespace

std::size_t utf8Length(std::string_view text) {
  if (text.empty())
    return 0;
  const auto first = static_cast<unsigned char>(text.front());
  for (const Form& form : forms)
    if (first >= form.least && first <= form.greatest)
      return follows(text, form) ? form.length : 0;
  return 0;
}

bool isUtf8(std::string_view text) {
  while (!text.empty()) {
    const std::size_t length = utf8Length(text);
    if (length == 0)
      return false;
    text.remove_prefix(length);
  }
  return true;
}

std::size_t codePoints(std::string_view text) {
  std::size_t count = 0;
  for (; !text.empty(); ++count) {
    const std::size_t length = utf8Length(text);
    text.remove_prefix(length == 0 ? 1 : length);
  }
  return count;
}

} // namespace planewright

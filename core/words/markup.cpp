// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/markup.h"

#include "core/words/characters.h"

namespace planewright {

namespace {

bool allowed(char32_t code) {
  return code == 0x9 || code == 0xA || code == 0xD ||
         (code >= 0x20 && !(code >= 0x7F && code < 0xA0) && code != 0xFFFE && code != 0xFFFF);
}

} // namespace

std::string markupOf(std::string_view text) {
  std::string result;
  for (const Character& character : charactersOf(text)) {
    if (!allowed(character.code))
      continue;
    switch (character.code) {
    case '&':
      result += "&amp;";
      break;
    case '<':
      result += "&lt;";
      break;
    case '>':
      result += "&gt;";
      break;
    case '"':
      result += "&quot;";
      break;
    case '\'':
      result += "&apos;";
      break;
    case '\t':
    case '\n':
    case '\r':
      result += ' ';
      break;
    case 0xFFFD:
      result += "\uFFFD";
      break;
    default:
      result += character.bytes;
    }
  }
  return result;
}

std::string markupOf(const Text& text, const Translate& translate) {
  std::string result;
  for (const Run& run : runs(text, translate))
    result += run.lowered ? "<sub>" + markupOf(run.text) + "</sub>" : markupOf(run.text);
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/text_lines.h"

#include "core/figure/metrics.h"
#include "core/words/characters.h"

#include <cstddef>
#include <optional>

namespace planewright {

namespace {

/// One character and its level.
struct Glyph {
  std::string_view bytes;
  bool lowered;
  double width;
  bool isSpace() const { return bytes == " " || bytes == "\t" || bytes == "\n" || bytes == "\r"; }
};
using Glyphs = std::vector<Glyph>;

Glyphs glyphsOf(const Runs& text, double size, bool bold) {
  Glyphs result;
  for (const Run& run : text)
    for (const Character& character : charactersOf(run.text))
      result.push_back({character.bytes, run.lowered,
                        textWidth({{std::string(character.bytes), run.lowered}}, size, bold)});
  return result;
}

Runs runsOf(const Glyphs& glyphs, std::size_t from, std::size_t to) {
  Runs result;
  for (std::size_t i = from; i < to; ++i) {
    if (result.empty() || result.back().lowered != glyphs[i].lowered)
      result.push_back({"", glyphs[i].lowered});
    result.back().text += glyphs[i].isSpace() ? std::string_view(" ") : glyphs[i].bytes;
  }
  return result;
}

/// How many characters from `from` fit, at least one.
std::size_t fitting(const Glyphs& glyphs, std::size_t from, double width) {
  double used = 0;
  std::size_t to = from;
  while (to < glyphs.size() && (to == from || used + glyphs[to].width <= width))
    used += glyphs[to++].width;
  return to;
}

/// Where a line from `from` ends: behind its last whole word that fits.
std::size_t lineEnd(const Glyphs& glyphs, std::size_t from, double width) {
  const std::size_t most = fitting(glyphs, from, width);
  if (most == glyphs.size() || glyphs[most].isSpace())
    return most;
  for (std::size_t i = most; i > from; --i)
    if (glyphs[i - 1].isSpace())
      return i - 1;
  return most;
}

} // namespace

std::vector<Runs> brokenLines(const Runs& text, double width, double size, bool bold) {
  const Glyphs glyphs = glyphsOf(text, size, bold);
  std::vector<Runs> lines;
  std::size_t from = 0;
  const auto skipSpaces = [&] {
    while (from < glyphs.size() && glyphs[from].isSpace())
      ++from;
  };
  for (skipSpaces(); from < glyphs.size(); skipSpaces()) {
    const std::size_t to = lineEnd(glyphs, from, width);
    std::size_t last = to;
    while (last > from + 1 && glyphs[last - 1].isSpace())
      --last;
    lines.push_back(runsOf(glyphs, from, last));
    from = to;
  }
  return lines;
}

Runs elided(const Runs& text, double width, double size, bool bold) {
  if (textWidth(text, size, bold) <= width)
    return text;
  const std::string dots = "…";
  const double room = width - textWidth({{dots, false}}, size, bold);
  const Glyphs glyphs = glyphsOf(text, size, bold);
  Runs result = room <= 0 ? Runs{} : runsOf(glyphs, 0, fitting(glyphs, 0, room));
  if (!result.empty() && !result.back().lowered)
    result.back().text += dots;
  else
    result.push_back({dots, false});
  return result;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/metrics.h"

#include "core/figure/advances.h"
#include "core/words/characters.h"

#include <algorithm>

namespace planewright {

const Advance* advanceOf(char32_t code) {
  const auto table = advanceTable();
  const auto row =
      std::lower_bound(table.begin(), table.end(), code,
                       [](const Advance& advance, char32_t wanted) { return advance.code < wanted; });
  return row == table.end() || row->code != code ? nullptr : &*row;
}

namespace {

double unitsOf(char32_t code, bool bold) {
  const Advance* row = advanceOf(code);
  if (!row)
    return unitsPerEm;
  return bold ? row->bold : row->regular;
}

} // namespace

double textWidth(const Runs& runs, double size, bool bold) {
  double ems = 0;
  for (const Run& run : runs) {
    double units = 0;
    for (const Character& character : charactersOf(run.text))
      units += unitsOf(character.code, bold);
    ems += units / unitsPerEm * (run.lowered ? loweredSize : 1);
  }
  return ems * size;
}

Box boxOf(const Label& label) {
  const double width = textWidth(label.runs, label.size, label.bold);
  const double part = label.align == Align::start ? 0 : label.align == Align::middle ? 0.5 : 1;
  const double left = label.at.x - part * width;
  const bool index =
      std::any_of(label.runs.begin(), label.runs.end(), [](const Run& run) { return run.lowered; });
  const double side = boxSide * label.size;
  return {left - side, label.at.y - boxOver * label.size, left + width + side,
          label.at.y + (index ? boxUnderIndex : boxUnder) * label.size};
}

bool overlap(const Box& a, const Box& b) {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

} // namespace planewright

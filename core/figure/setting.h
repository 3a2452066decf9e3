// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/figure.h"
#include "core/figure/metrics.h"
#include "core/study/stress_form.h"

namespace planewright {

/// What every panel of one figure needs at hand: whose state it shows, sizes of text and widths of strokes in
/// mm. Strokes follow the series of ISO 128 (wide to narrow 2:1, from memory), in two sets: narrow figures
/// have thinner ones.
struct Setting {
  const Study& study;
  const Readout& readout;
  const FigureOrder& order;
  StressForm stresses; ///< of the shown state
  bool isNarrow = false;
  double title = 0; ///< em of the title
  double text = 0;  ///< em of everything but title, table and conventions
  double table = 0;
  double small = 0; ///< of conventions
  double cut = 0.7;
  double wide = 0.5;    ///< circle, turned square
  double medium = 0.35; ///< spoke, arrows, line, rules
  double narrow = 0.25; ///< given square, diameters, axes
  double hair = 0.18;   ///< grain, leaders
  double grid = 0.13;
  double mark = 2.1;

  Runs runsOf(const Text& words) const { return runs(words, order.translate); }
  double widthOf(const Runs& words, double size, bool bold = false) const {
    return textWidth(words, size, bold);
  }
};

Setting settingOf(const Study& study, const Readout& readout, const FigureOrder& order);

/// Words on the sheet, without ground.
void setWords(Picture& picture, Vec at, const Runs& words, double size, Align align = Align::start,
              Role role = Role::ink, bool bold = false);
void setLine(Picture& picture, Vec from, Vec to, const Pen& pen);

} // namespace planewright

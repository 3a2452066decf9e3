// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/circle_axes.h"

#include <cmath>

namespace planewright {

namespace {

// In ems of the text.
constexpr double tickGap = 0.5;
constexpr double firstRow = 1.35;  ///< base line of the sigma ticks under the frame
constexpr double secondRow = 2.75; ///< base line of the title of the sigma axis
constexpr double arrowLength = 0.7;
constexpr double arrowHalfWidth = 0.26;

/// The whole multiples of the step between two values in the study's unit.
std::vector<double> ticksBetween(const Steps& steps, double from, double to) {
  std::vector<double> ticks;
  const double first = std::ceil(from / steps.step);
  const double count = std::floor(to / steps.step) - first;
  for (int i = 0; i <= count; ++i)
    ticks.push_back((first + i) * steps.step);
  return ticks;
}

struct Plot {
  Picture& picture;
  const Setting& setting;
  const CircleFit& fit;

  double unitsPerStress() const { return setting.stresses.inUnit(1); }
  double perUnit() const { return fit.scale / unitsPerStress(); }
  double meanInUnit() const { return setting.stresses.inUnit(fit.mean); }
  double across(double value) const { return fit.centre.x + (value - meanInUnit()) * perUnit(); }
  double down(double value) const { return fit.centre.y + (fit.down ? value : -value) * perUnit(); }

  void words(Vec at, const Text& text, Align align, Role role) const {
    setWords(picture, at, setting.runsOf(text), setting.text, align, role);
  }
};

void drawSigmaTicks(const Plot& plot) {
  const Box& frame = plot.fit.frame;
  const double from = plot.meanInUnit() + (frame.left - plot.fit.centre.x) / plot.perUnit();
  const double to = plot.meanInUnit() + (frame.right - plot.fit.centre.x) / plot.perUnit();
  for (const double tick : ticksBetween(plot.fit.across, from, to)) {
    const double x = plot.across(tick);
    setLine(plot.picture, {x, frame.top}, {x, frame.bottom}, {Role::grid, plot.setting.grid, Dash::solid});
    const Text number = verbatim(tickWords(tick, plot.fit.across));
    const double half = plot.setting.widthOf(plot.setting.runsOf(number), plot.setting.text) / 2;
    if (x + half <= frame.right)
      plot.words({x, frame.bottom + firstRow * plot.setting.text}, number, Align::middle, Role::soft);
  }
}

void drawTauTicks(const Plot& plot) {
  const Box& frame = plot.fit.frame;
  const double reach = (frame.bottom - frame.top) / 2 / plot.perUnit();
  const double text = plot.setting.text;
  for (const double tick : ticksBetween(plot.fit.upright, -reach, reach)) {
    const double y = plot.down(tick);
    setLine(plot.picture, {frame.left, y}, {frame.right, y}, {Role::grid, plot.setting.grid, Dash::solid});
    const bool free = y - frame.top > capHeight / 2 * text && frame.bottom - y > capHeight / 2 * text;
    if (free)
      plot.words({frame.left - tickGap * text, y + capHeight / 2 * text},
                 verbatim(tickWords(tick, plot.fit.upright)), Align::end, Role::soft);
  }
}

void drawAxesThroughZero(const Plot& plot) {
  const Box& frame = plot.fit.frame;
  const Pen pen{Role::soft, plot.setting.narrow, Dash::solid};
  setLine(plot.picture, {frame.left, plot.fit.centre.y}, {frame.right, plot.fit.centre.y}, pen);
  if (plot.fit.showsZero())
    setLine(plot.picture, {plot.fit.zeroAcross(), frame.top}, {plot.fit.zeroAcross(), frame.bottom}, pen);
}

/// A small triangle on the line of a text; it points to the right, or left.
void drawPointer(const Plot& plot, Vec tip, bool right) {
  const double text = plot.setting.text;
  const double back = right ? -arrowLength * text : arrowLength * text;
  const double y = tip.y - capHeight / 2 * text;
  plot.picture.parts.push_back(
      Path{{{tip.x, y}, {tip.x + back, y - arrowHalfWidth * text}, {tip.x + back, y + arrowHalfWidth * text}},
           true,
           {},
           Role::soft});
}

void drawSides(const Plot& plot) {
  const Box& frame = plot.fit.frame;
  const double y = frame.bottom + secondRow * plot.setting.text;
  const bool tensionRight = plot.setting.study.convention.positive == Positive::tension;
  const Text tension = PW_TEXT("Figure", "tension");
  const Text compression = PW_TEXT("Figure", "compression");
  const double step = (arrowLength + 0.3) * plot.setting.text;
  drawPointer(plot, {frame.left, y}, false);
  plot.words({frame.left + step, y}, tensionRight ? compression : tension, Align::start, Role::soft);
  drawPointer(plot, {frame.right, y}, true);
  plot.words({frame.right - step, y}, tensionRight ? tension : compression, Align::end, Role::soft);
  plot.words({(frame.left + frame.right) / 2, y},
             PW_TEXT("Figure", "σ_{n} (%1)").with(plot.setting.study.units.stress), Align::middle, Role::ink);
}

void drawTauTitle(const Plot& plot) {
  const Box& frame = plot.fit.frame;
  const double text = plot.setting.text;
  const double y = frame.top - 0.55 * text;
  const Text title =
      plot.fit.down ? PW_TEXT("Figure", "τ_{nt} (%1), + down") : PW_TEXT("Figure", "τ_{nt} (%1), + up");
  plot.words({frame.left, y}, title.with(plot.setting.study.units.stress), Align::start, Role::ink);
  if (plot.fit.showsZero())
    return;
  const std::string distance = plot.setting.stresses.shown(std::abs(plot.fit.mean));
  const bool left = plot.fit.mean > 0;
  const Text words = left ? PW_TEXT("Figure", "0 is %1 left of the centre")
                          : PW_TEXT("Figure", "0 is %1 right of the centre");
  const double step = (arrowLength + 0.3) * text;
  const Runs runs = plot.setting.runsOf(words.with(distance));
  setWords(plot.picture, {frame.right - (left ? 0 : step), y}, runs, text, Align::end, Role::soft);
  const double start = frame.right - plot.setting.widthOf(runs, text) - step;
  drawPointer(plot, {left ? start : frame.right, y}, !left);
}

} // namespace

void drawCircleAxes(Picture& picture, const Setting& setting, const CircleFit& fit) {
  const Plot plot{picture, setting, fit};
  drawSigmaTicks(plot);
  drawTauTicks(plot);
  drawAxesThroughZero(plot);
  drawSides(plot);
  drawTauTitle(plot);
}

} // namespace planewright

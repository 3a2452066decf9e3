// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/utilisation_drawing.h"

#include "core/figure/text_lines.h"
#include "core/quantity/format.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double half = 90;
constexpr double usualTop = 2;
constexpr double farBeyond = 5;
constexpr double least = 0.01;     ///< of a logarithmic scale
constexpr double tickLength = 0.3; // em
constexpr double hatchStep = 1.6;  // em
constexpr double barHeight = 0.35; // em

/// The line of directions is a circle: what goes over an end comes in at the other.
std::vector<std::pair<double, double>> foldedParts(double from, double to) {
  if (to - from >= 2 * half)
    return {{-half, half}};
  const double turns = std::floor((from + half) / (2 * half)) * (2 * half);
  const double start = from - turns;
  const double end = to - turns;
  if (end <= half)
    return {{start, end}};
  return {{start, half}, {-half, end - 2 * half}};
}

std::vector<double> ticksOf(const UtilisationFrame& frame) {
  if (!frame.logarithmic)
    return {0, 0.5, 1, 1.5, 2};
  std::vector<double> ticks;
  for (double tick = frame.lowest; tick <= frame.highest * 1.001; tick *= 10)
    ticks.push_back(tick);
  return ticks;
}

std::string tickText(const UtilisationFrame& frame, double tick) {
  return frame.logarithmic ? exactNumber(tick) : shownNumber(tick, 1);
}

class Ground {
public:
  Ground(const UtilisationFrame& frame, const CheckSetup& check, const std::vector<Within>& within,
         const Translate& translate)
      : m_frame(frame), m_check(check), m_within(within), m_translate(translate) {}

  Picture drawn() {
    if (m_check.band && m_check.band->tolerance > Angle())
      for (const auto& [from, to] : foldedParts(m_check.band->from().degrees(), m_check.band->to().degrees()))
        fill(m_frame.xOf(from), m_frame.plot.top, m_frame.xOf(to), m_frame.plot.bottom, Role::band);
    grid();
    limit();
    bars();
    titles();
    return std::move(m_picture);
  }

private:
  double em(double part) const { return part * m_frame.size; }

  void line(Vec from, Vec to, Role role, double width) {
    m_picture.parts.emplace_back(Path{{from, to}, false, Pen{role, width * m_frame.pen}, std::nullopt});
  }
  void fill(double left, double top, double right, double bottom, Role role) {
    m_picture.parts.emplace_back(
        Path{{{left, top}, {right, top}, {right, bottom}, {left, bottom}}, true, std::nullopt, role});
  }
  void label(Vec at, const Text& text, Align align, Role role) {
    m_picture.parts.emplace_back(
        Label{at, runs(text, m_translate), m_frame.size, align, role, false, false, {}});
  }

  void grid() {
    const Box& plot = m_frame.plot;
    for (int degrees = -90; degrees <= 90; degrees += 30) {
      const double x = m_frame.xOf(degrees);
      line({x, plot.top}, {x, plot.bottom}, Role::grid, 0.5);
      label({x, plot.bottom + em(1.45)}, verbatim(shownNumber(degrees, 0)), Align::middle, Role::soft);
    }
    for (const double tick : ticksOf(m_frame)) {
      const double y = m_frame.yOf(tick);
      line({plot.left, y}, {plot.right, y}, Role::grid, 0.5);
      label({plot.left - em(tickLength), y + em(0.35)}, verbatim(tickText(m_frame, tick)), Align::end,
            Role::soft);
    }
    line({plot.left, plot.bottom}, {plot.right, plot.bottom}, Role::soft, 0.7);
    line({plot.left, plot.top}, {plot.left, plot.bottom}, Role::soft, 0.7);
  }

  void limit() {
    const double y = m_frame.yOf(1);
    for (double x = m_frame.plot.left; x < m_frame.plot.right - em(0.5); x += em(hatchStep))
      line({x, y}, {x + em(0.45), y - em(0.45)}, Role::limit, 0.5);
    line({m_frame.plot.left, y}, {m_frame.plot.right, y}, Role::limit, 1.4);
  }

  void bars() {
    const double bottom = m_frame.plot.bottom;
    for (const Within& within : m_within)
      for (const auto& [from, to] : foldedParts(within.from.degrees(), within.to.degrees()))
        fill(m_frame.xOf(from), bottom - em(barHeight), m_frame.xOf(to), bottom, Role::safeEdge);
    std::vector<Box> taken;
    for (const Within& within : m_within)
      if ((within.to - within.from).degrees() < 2 * half) {
        const ShownEnds ends = shownEndsOf(within);
        barEnd(within.from, ends.from, Align::end, taken);
        barEnd(within.to, ends.to, Align::start, taken);
      }
  }

  /// The angle over the end of a bar, on the side away from the bar, where it finds room.
  void barEnd(Angle end, const std::string& shown, Align align, std::vector<Box>& taken) {
    Label one{{m_frame.xOf(folded(end).degrees()), m_frame.plot.bottom - em(barHeight + 0.35)},
              runs(verbatim(shown), m_translate),
              m_frame.size,
              align,
              Role::ink,
              false,
              true,
              {}};
    const double beyondLeft = m_frame.plot.left - boxOf(one).left;
    const double beyondRight = boxOf(one).right - m_frame.plot.right;
    one.at.x += std::max(beyondLeft, 0.0) - std::max(beyondRight, 0.0);
    if (std::ranges::any_of(taken, [&](const Box& box) { return overlap(box, boxOf(one)); }))
      return;
    taken.push_back(boxOf(one));
    m_picture.parts.emplace_back(std::move(one));
  }

  void titles() {
    const Text across = m_check.plane.empty() ? PW_TEXT("Figure", "angle of the line (°)")
                                              : PW_TEXT("Figure", "normal of the plane (°)");
    label({(m_frame.plot.left + m_frame.plot.right) / 2, m_frame.plot.bottom + em(2.7)}, across,
          Align::middle, Role::soft);
    label({m_frame.plot.left, m_frame.plot.top - em(0.5)}, PW_TEXT("Figure", "utilisation"), Align::start,
          Role::soft);
  }

  const UtilisationFrame& m_frame;
  const CheckSetup& m_check;
  const std::vector<Within>& m_within;
  const Translate& m_translate;
  Picture m_picture;
};

} // namespace

double UtilisationFrame::xOf(double degrees) const {
  return plot.left + (degrees + half) / (2 * half) * (plot.right - plot.left);
}

double UtilisationFrame::yOf(double utilisation) const {
  const double value = std::clamp(utilisation, lowest, highest);
  const double share = logarithmic ? std::log(value / lowest) / std::log(highest / lowest)
                                   : (value - lowest) / (highest - lowest);
  return plot.bottom - share * (plot.bottom - plot.top);
}

double UtilisationFrame::degreesAt(double x) const {
  return (x - plot.left) / (plot.right - plot.left) * 2 * half - half;
}

bool isFarBeyond(double highest) {
  return highest > farBeyond;
}

bool suitsLogarithm(const std::optional<WorstInBand>& worst) {
  return worst && std::isfinite(worst->judgement.utilisation) && worst->judgement.utilisation > usualTop;
}

double heightOfKey(const UtilisationCurves& curves, double size) {
  return curves.greatest.empty() ? 0 : 1.5 * size;
}

Picture utilisationKey(const Box& row, double size, double pen, const UtilisationCurves& curves,
                       const std::string& shown, const Translate& translate) {
  Picture picture;
  if (curves.greatest.empty())
    return picture;
  double left = row.left;
  const double middle = row.top + 0.7 * size;
  const auto add = [&](const Text& words, double most, const Pen& sample) {
    const double start = left + 2.2 * size;
    const std::vector<Runs> lines = brokenLines(runs(words, translate), most - 2.2 * size, size, false);
    const Runs& first = lines.front();
    picture.parts.emplace_back(
        Path{{{left, middle}, {left + 1.8 * size, middle}}, false, sample, std::nullopt});
    picture.parts.emplace_back(
        Label{{start, middle + 0.35 * size}, first, size, Align::start, Role::soft, false, false, {}});
    left = start + textWidth(first, size, false) + size;
  };
  const Text greatest = PW_TEXT("Figure", "greatest of all");
  const double room = row.right - row.left;
  const double ofGreatest = 2.4 * size + textWidth(runs(greatest, translate), size, false);
  if (!curves.shown.empty())
    add(verbatim(shown), room - ofGreatest - size, {Role::state, 2 * pen, Dash::solid});
  add(greatest, ofGreatest, {Role::state, 1.4 * pen, Dash::shortDash});
  return picture;
}

UtilisationFrame utilisationFrameIn(const Box& room, double size, double pen, double highest,
                                    bool logarithmic, const Translate& translate) {
  UtilisationFrame frame;
  frame.size = size;
  frame.pen = pen;
  frame.logarithmic = logarithmic;
  frame.lowest = logarithmic ? least : 0;
  frame.highest = logarithmic ? std::pow(10, std::ceil(std::log10(std::max(highest, 10.0)))) : usualTop;
  double widest = 0;
  for (const double tick : ticksOf(frame))
    widest = std::max(widest, textWidth(runs(verbatim(tickText(frame, tick)), translate), size, false));
  const double below = 3.1 * size;
  const double over = 1.4 * size;
  frame.plot = {room.left + widest + 2 * tickLength * size, room.top + over, room.right - 1.2 * size,
                room.bottom - below};
  return frame;
}

Picture utilisationGround(const UtilisationFrame& frame, const CheckSetup& check,
                          const std::vector<Within>& within, const Translate& translate) {
  return Ground(frame, check, within, translate).drawn();
}

std::vector<Path> utilisationLines(const UtilisationFrame& frame, const UtilisationCurve& curve,
                                   const Pen& pen) {
  const double top = frame.highest;
  const auto crossing = [top](Vec a, Vec b) {
    return Vec{a.x + (top - a.y) / (b.y - a.y) * (b.x - a.x), top};
  };
  std::vector<Path> lines;
  bool goesOn = false;
  for (std::size_t i = 1; i < curve.size(); ++i) {
    Vec from = curve[i - 1];
    Vec to = curve[i];
    const bool drawn = from.y <= top || to.y <= top;
    if (from.y > top && drawn)
      from = crossing(from, to);
    if (to.y > top && drawn)
      to = crossing(to, from);
    if (drawn && !goesOn)
      lines.push_back({{frame.at(from)}, false, pen, std::nullopt});
    if (drawn)
      lines.back().points.push_back(frame.at(to));
    goesOn = drawn;
  }
  return lines;
}

Picture utilisationMarks(const UtilisationFrame& frame, const CheckSetup& check,
                         const std::optional<WorstInBand>& worst) {
  Picture picture;
  if (!check.band)
    return picture;
  const double em = frame.size;
  const double x = frame.xOf(check.band->nominal.degrees());
  picture.parts.emplace_back(Path{{{x, frame.plot.top}, {x, frame.plot.bottom}},
                                  false,
                                  Pen{Role::line, frame.pen, Dash::longDashDot},
                                  std::nullopt});
  picture.parts.emplace_back(Path{{{x - 0.75 * em, frame.plot.bottom - 0.3 * em},
                                   {x + 0.75 * em, frame.plot.bottom - 0.3 * em},
                                   {x + 0.75 * em, frame.plot.bottom + 0.3 * em},
                                   {x - 0.75 * em, frame.plot.bottom + 0.3 * em}},
                                  true,
                                  Pen{Role::line, 1.4 * frame.pen},
                                  Role::canvas});
  if (!worst)
    return picture;
  const double wx = frame.xOf(folded(worst->angle).degrees());
  const double wy = frame.yOf(worst->judgement.utilisation);
  picture.parts.emplace_back(
      Path{{{wx, wy}, {wx - 0.5 * em, wy - 0.85 * em}, {wx + 0.5 * em, wy - 0.85 * em}},
           true,
           Pen{Role::limit, frame.pen},
           Role::limit});
  return picture;
}

} // namespace planewright

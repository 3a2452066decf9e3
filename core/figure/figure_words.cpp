// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/figure_words.h"

#include "core/figure/conventions.h"
#include "core/figure/text_lines.h"
#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/words/version.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr std::size_t mostTitleLines = 4;
constexpr std::size_t mostPackageLines = 2;
constexpr double titlePitch = 1.25; // ems
constexpr double wordPitch = 1.42;

const std::string& subjectOf(const Setting& setting) {
  const Point* point = findPoint(setting.study, setting.readout.point);
  return point && !point->note.empty() ? point->note : setting.study.title.subject;
}

Text headingOf(const Setting& setting) {
  const std::string& subject = subjectOf(setting);
  if (subject.empty())
    return verbatim(setting.readout.point);
  return PW_TEXT("Figure", "%1 — %2").with(setting.readout.point).with(subject);
}

void join(std::string& words, const std::string& more) {
  if (!more.empty())
    words += (words.empty() ? "" : " · ") + more;
}

/// What the title block says of the calculation that the figure belongs to: "project · subject · no. 7, rev.
/// B".
std::string packageOf(const Setting& setting) {
  const Title& title = setting.study.title;
  std::string words;
  join(words, title.project);
  if (&subjectOf(setting) != &title.subject)
    join(words, title.subject);
  if (!title.number.empty())
    join(words, plain(PW_TEXT("Figure", "no. %1").with(title.number), setting.order.translate));
  if (!title.revision.empty())
    join(words, plain(PW_TEXT("Figure", "rev. %1").with(title.revision), setting.order.translate));
  return words;
}

/// The name of the combination; a single case says that it is one.
Text combinationOf(const Setting& setting) {
  const std::string& name = setting.readout.state().combination;
  return findCombination(setting.study, name) ? verbatim(name) : PW_TEXT("Figure", "case %1").with(name);
}

std::vector<Runs> atMost(std::vector<Runs> lines, std::size_t most, double width, double size, bool bold) {
  if (lines.size() <= most)
    return lines;
  Runs last = lines[most - 1];
  last.push_back({" " + plain(lines[most]), false});
  lines.resize(most);
  lines.back() = elided(last, width, size, bold);
  return lines;
}

/// Sets lines one under the other and returns the base line of the last.
double setLines(Picture& picture, const std::vector<Runs>& lines, Vec first, double pitch, double size,
                Align align, Role role, bool bold) {
  double y = first.y - pitch;
  for (const Runs& line : lines) {
    y += pitch;
    setWords(picture, {first.x, y}, line, size, align, role, bold);
  }
  return y;
}

void append(Runs& text, const Runs& more) {
  if (!text.empty())
    text.push_back({" ", false});
  text.insert(text.end(), more.begin(), more.end());
}

/// "Planewright 0.1.0 · chord-notch".
Runs signatureOf(const Setting& setting) {
  std::string words;
  if (setting.order.parts.version)
    words = "Planewright " + std::string(programVersion());
  if (!setting.order.studyName.empty())
    words += (words.empty() ? "" : " · ") + setting.order.studyName;
  return words.empty() ? Runs{} : Runs{{words, false}};
}

double drawConventions(Picture& picture, const Setting& setting, double left, double right, double top,
                       std::size_t unnamed) {
  const double size = setting.small;
  Runs text;
  if (unnamed > 0)
    append(text,
           setting.runsOf(PW_TEXT("Figure", "Without room for their names on the circle: %1 watched planes.")
                              .with(shownCount(unnamed))));
  for (const Text& sentence : conventionsOf(setting.study, setting.readout))
    append(text, setting.runsOf(sentence));
  const std::vector<Runs> lines = brokenLines(text, right - left, size, false);
  double y = setLines(picture, lines, {left, top + 1.35 * size}, wordPitch * size, size, Align::start,
                      Role::soft, false);
  const Runs signature = elided(signatureOf(setting), right - left, size, false);
  if (signature.empty())
    return y;
  const double taken = setting.widthOf(lines.back(), size) + setting.widthOf(signature, size);
  if (taken + 1.5 * size > right - left)
    y += wordPitch * size;
  setWords(picture, {right, y}, signature, size, Align::end, Role::soft);
  return y;
}

} // namespace

std::string figureTitle(const Setting& setting) {
  const std::string heading = plain(headingOf(setting), setting.order.translate);
  return heading + ", " + plain(combinationOf(setting), setting.order.translate);
}

std::string figureDescription(const Setting& setting) {
  const StateReading& state = setting.readout.state();
  const auto shown = [&](double stress) { return setting.stresses.withUnit(stress); };
  Text words =
      PW_TEXT("Figure", "Plane stress: σ_{x} %1, σ_{y} %2, τ_{xy} %3. Principal stresses %4 and %5. On the "
                        "plane with its normal at %6: σ_{n} %7, τ_{nt} %8.")
          .with(shown(state.stress.sx))
          .with(shown(state.stress.sy))
          .with(shown(state.stress.txy))
          .with(shown(state.circle.s1))
          .with(shown(state.circle.s2))
          .with(shownDegrees(setting.readout.reading.value, angleDecimals))
          .with(shown(state.reading.sn))
          .with(shown(state.reading.tnt));
  return plain(words, setting.order.translate);
}

double drawTitle(Picture& picture, const Setting& setting, double left, double right) {
  const FigureParts& parts = setting.order.parts;
  if (!parts.title && !parts.combination)
    return 0.4 * setting.text;
  const double width = right - left;
  const Runs heading = parts.title ? setting.runsOf(headingOf(setting)) : Runs{};
  const Runs combination = parts.combination ? setting.runsOf(combinationOf(setting)) : Runs{};
  double y = 0.25 * setting.title;
  const bool oneRow = setting.widthOf(heading, setting.title, true) +
                          setting.widthOf(combination, setting.text) + 2 * setting.text <=
                      width;
  if (oneRow) {
    y += 0.85 * setting.title;
    setWords(picture, {left, y}, heading, setting.title, Align::start, Role::ink, true);
    setWords(picture, {right, y}, combination, setting.text, Align::end);
  } else {
    const auto lines =
        atMost(brokenLines(heading, width, setting.title, true), mostTitleLines, width, setting.title, true);
    if (!lines.empty())
      y = setLines(picture, lines, {left, y + 0.85 * setting.title}, titlePitch * setting.title,
                   setting.title, Align::start, Role::ink, true);
    const auto below = atMost(brokenLines(combination, width, setting.text, false), mostTitleLines, width,
                              setting.text, false);
    if (!below.empty())
      y = setLines(picture, below, {left, y + 1.35 * setting.text}, titlePitch * setting.text, setting.text,
                   Align::start, Role::ink, false);
  }
  if (const std::string package = parts.title ? packageOf(setting) : ""; !package.empty()) {
    const auto lines = atMost(brokenLines({{package, false}}, width, setting.small, false), mostPackageLines,
                              width, setting.small, false);
    y = setLines(picture, lines, {left, y + 1.5 * setting.small}, wordPitch * setting.small, setting.small,
                 Align::start, Role::soft, false);
  }
  y += 0.5 * setting.title;
  setLine(picture, {left, y}, {right, y}, {Role::ink, setting.medium, Dash::solid});
  return y + 0.6 * setting.text;
}

double drawClosing(Picture& picture, const Setting& setting, double left, double right, double top,
                   std::size_t unnamed) {
  const double size = setting.text;
  double y = drawConventions(picture, setting, left, right, top, unnamed);
  const std::vector<Runs> caption =
      brokenLines(setting.runsOf(setting.order.caption), right - left, size, false);
  if (!caption.empty())
    y = setLines(picture, caption, {left, y + 1.9 * size}, wordPitch * size, size, Align::start, Role::ink,
                 false);
  return y + 0.45 * size;
}

} // namespace planewright

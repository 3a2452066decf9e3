// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/page_strips.h"

#include "core/figure/metrics.h"
#include "core/figure/text_lines.h"
#include "core/report/table_strips.h"
#include "core/report/typeset.h"

#include <algorithm>

namespace planewright {

PicturePart moved(PicturePart part, Vec offset) {
  if (auto* path = std::get_if<Path>(&part)) {
    for (Vec& point : path->points)
      point = point + offset;
  } else if (auto* arc = std::get_if<Arc>(&part)) {
    arc->centre = arc->centre + offset;
  } else {
    auto& label = std::get<Label>(part);
    label.at = label.at + offset;
  }
  return part;
}

Label lettering(Runs runs, double size, Vec at, Role role, bool bold, Align align) {
  Label label;
  label.runs = std::move(runs);
  label.size = size;
  label.at = at;
  label.role = role;
  label.bold = bold;
  label.align = align;
  return label;
}

namespace {

constexpr double body = points(9);
constexpr double small = points(7);
constexpr double lineHeight = 4.3;
constexpr double smallLine = 3.3;
constexpr double symbolWidth = 20;
constexpr double besideFormula = 70; ///< symbol, result, unit and reference
constexpr double resultGap = 6;
constexpr double unitGap = 2;

/// Sets block after block.
class StripSetter {
public:
  StripSetter(double width, const Translate& translate) : m_width(width), m_translate(translate) {}

  std::vector<PageStrip> strips(const std::vector<SheetBlock>& blocks) {
    for (const SheetBlock& block : blocks)
      std::visit([this](const auto& one) { set(one); }, block);
    return std::move(m_strips);
  }

private:
  static Path rule(double fromX, double toX, double y, double width, Role role = Role::ink) {
    return {{{fromX, y}, {toX, y}}, false, Pen{role, width, Dash::solid}, std::nullopt};
  }

  void set(const SheetHeading& heading) {
    const bool first = heading.level == 1;
    const double size = points(first ? 11 : 9.5);
    const Text words =
        heading.number.empty() ? heading.words : symbol("%1  %2").with(heading.number).with(heading.words);
    PageStrip strip;
    strip.before = first ? 5 : 3.2;
    strip.keepsWithNext = true;
    double base = 0.9 * size;
    for (const Runs& line : brokenLines(runs(words, m_translate), m_width, size, true)) {
      strip.parts.emplace_back(lettering(line, size, {0, base}, Role::ink, true));
      base += 1.25 * size;
    }
    base -= 1.25 * size;
    strip.height = base + 1.2;
    if (first) {
      strip.parts.emplace_back(rule(0, m_width, strip.height + 0.2, 0.25));
      strip.height += 1.4;
    }
    m_strips.push_back(std::move(strip));
    m_afterHeading = true;
  }

  void set(const SheetText& text) {
    const bool strong = text.voice == Voice::strong;
    const Role role = text.voice == Voice::soft ? Role::soft : Role::ink;
    const double indent = text.voice == Voice::caution ? 4 : 0;
    const std::vector<Runs> lines =
        brokenLines(runs(text.words, m_translate), m_width - indent, body, strong);
    for (std::size_t i = 0; i < lines.size(); ++i) {
      PageStrip strip;
      strip.before = i == 0 ? 1.2 : 0;
      strip.height = lineHeight;
      strip.parts.emplace_back(lettering(lines[i], body, {indent, 0.76 * lineHeight}, role, strong));
      // Two lines stay together at either end of a paragraph.
      strip.keepsWithNext = i + 1 < lines.size() && (i == 0 || i + 2 == lines.size());
      if (text.voice == Voice::caution)
        strip.parts.emplace_back(Path{{{1.2, 0.4}, {1.2, lineHeight - (i + 1 == lines.size() ? 0.4 : 0)}},
                                      false,
                                      Pen{Role::limit, 0.7, Dash::solid},
                                      std::nullopt});
      add(std::move(strip));
    }
  }

  void set(const SheetBox& box) {
    constexpr double inner = 3;
    PageStrip strip;
    strip.before = 2;
    double y = inner;
    for (std::size_t i = 0; i < box.lines.size(); ++i) {
      const bool bold = i == 0;
      const double size = points(bold ? 10 : 9);
      for (const Runs& line : brokenLines(runs(box.lines[i], m_translate), m_width - 2 * inner, size, bold)) {
        strip.parts.emplace_back(lettering(line, size, {inner, y + 0.8 * size},
                                           bold && box.alarms ? Role::limit : Role::ink, bold));
        y += 1.42 * size;
      }
    }
    strip.height = y + inner - 1;
    strip.parts.emplace_back(
        Path{{{0, 0}, {m_width, 0}, {m_width, strip.height}, {0, strip.height}},
             true,
             Pen{box.alarms ? Role::limit : Role::ink, box.alarms ? 0.7 : 0.5, Dash::solid},
             std::nullopt});
    add(std::move(strip));
  }

  static void append(PageStrip& strip, const Typeset& set, Vec at) {
    const Typeset there = moved(set, at);
    for (const auto& part : there.parts)
      std::visit([&](const auto& one) { strip.parts.emplace_back(one); }, part);
  }

  /// Lines of a formula under each other, a sign of equality before the first; the base of the first.
  double addLines(PageStrip& strip, const std::vector<Typeset>& lines, Role role) const {
    double firstBase = 0;
    for (std::size_t i = 0; i < lines.size(); ++i) {
      const double above = std::max(lines[i].above, 0.8 * body);
      const double below = std::max(lines[i].below, 0.3 * body);
      const double base = strip.height + above;
      if (i == 0) {
        firstBase = base;
        strip.parts.emplace_back(lettering({{"=", false}}, body, {symbolWidth, base}, role));
      }
      append(strip, lines[i], {symbolWidth + 1.3 * body, base});
      strip.height = base + below + 0.8;
    }
    return firstBase;
  }

  void set(const SheetStep& block) {
    const Step& step = block.step;
    const double formulaWidth = m_width - besideFormula - 1.3 * body;
    PageStrip strip;
    strip.before = 1.4;
    strip.height = 0;
    if (!step.name.empty()) {
      const Runs name = elided(runs(step.name, m_translate), m_width, small, false);
      strip.parts.emplace_back(lettering(name, small, {symbolWidth, 0.8 * smallLine}, Role::soft));
      strip.height = smallLine + 0.5;
    }
    const double base = addLines(
        strip, setFormula(step.formula, nullptr, FormulaType(body, Role::ink), formulaWidth), Role::ink);
    const bool hasNumbers = !step.putIn.empty();
    if (hasNumbers)
      addLines(strip, setFormula(step.formula, &step.putIn, FormulaType(body, Role::soft), formulaWidth),
               Role::soft);
    const Runs symbolRuns = runs(step.symbol, m_translate);
    const double symbolSize = std::min(1.0, (symbolWidth - 1) / textWidth(symbolRuns, body, false)) * body;
    strip.parts.emplace_back(lettering(symbolRuns, symbolSize, {0, base}));
    const ShownValue shown = shownValue(step);
    const double right = m_width - besideFormula + symbolWidth + resultGap;
    strip.parts.emplace_back(
        lettering({{shown.number, false}}, body, {right, base}, Role::ink, true, Align::end));
    if (!shown.unit.empty())
      strip.parts.emplace_back(lettering({{shown.unit, false}}, body, {right + unitGap, base}));
    if (!block.reference.empty())
      strip.parts.emplace_back(
          lettering({{block.reference, false}}, small, {m_width, base}, Role::soft, false, Align::end));
    add(std::move(strip));
  }

  void set(const SheetTable& table) {
    for (PageStrip& strip : tableStrips(table, m_width, m_translate))
      add(std::move(strip));
  }

  void set(const SheetFigure& figure) {
    PageStrip strip;
    strip.before = 2.5;
    const double left = std::max(0.0, (m_width - figure.picture.width) / 2);
    for (const PicturePart& part : figure.picture.parts)
      strip.parts.push_back(moved(part, {left, 0}));
    strip.height = figure.picture.height;
    for (const Runs& line : brokenLines(runs(figure.caption, m_translate), m_width, small, false)) {
      strip.parts.emplace_back(lettering(line, small, {0, strip.height + smallLine}, Role::soft));
      strip.height += smallLine;
    }
    strip.height += 1.5;
    add(std::move(strip));
  }

  void set(const SheetSignatures& lines) {
    const std::vector<std::pair<Text, Text>> columns = {{PW_TEXT("Sheet", "Prepared"), lines.prepared},
                                                        {PW_TEXT("Sheet", "Checked"), lines.checked},
                                                        {PW_TEXT("Sheet", "Date"), lines.date}};
    PageStrip strip;
    strip.before = 3;
    strip.height = 22;
    const double across = m_width / 3;
    for (std::size_t i = 0; i < columns.size(); ++i) {
      const double left = across * static_cast<double>(i);
      strip.parts.emplace_back(rule(left, left + across - 5, 14, 0.25));
      strip.parts.emplace_back(
          lettering(runs(columns[i].first, m_translate), small, {left, 17.2}, Role::soft));
      double base = 12.6;
      const std::vector<Runs> name =
          brokenLines(runs(columns[i].second, m_translate), across - 5, body, false);
      for (std::size_t line = name.size(); line > 0; --line, base -= lineHeight)
        strip.parts.emplace_back(lettering(name[line - 1], body, {left, base}));
    }
    add(std::move(strip));
  }

  /// A heading keeps two strips with it.
  void add(PageStrip strip) {
    if (m_afterHeading) {
      strip.before = std::max(0.6, strip.before - 1);
      strip.keepsWithNext = true;
      m_afterHeading = false;
    }
    m_strips.push_back(std::move(strip));
  }

  double m_width;
  const Translate& m_translate;
  bool m_afterHeading = false;
  std::vector<PageStrip> m_strips;
};

} // namespace

std::vector<PageStrip> stripsOf(const Sheet& sheet, double width, const Translate& translate) {
  std::vector<PageStrip> strips = StripSetter(width, translate).strips(sheet.blocks);
  if (!strips.empty())
    strips.back().keepsWithNext = false;
  return strips;
}

} // namespace planewright

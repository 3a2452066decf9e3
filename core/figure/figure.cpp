// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/figure.h"

#include "core/figure/check_panel.h"
#include "core/figure/circle_panel.h"
#include "core/figure/element_panel.h"
#include "core/figure/figure_words.h"
#include "core/figure/planes_panel.h"
#include "core/quantity/format.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double margin = 0.6; // mm at the sides

Problem rangeProblem(const char* place, double value, const Text& what, double least, double greatest) {
  const std::string quoted = std::isfinite(value) ? exactNumber(value) : "?";
  return {
      place,
      0,
      0,
      quoted,
      what.with(quoted),
      PW_TEXT("Figure", "Take a number from %1 to %2.").with(exactNumber(least)).with(exactNumber(greatest))};
}

std::optional<Problem> problemIn(const FigureOrder& order) {
  if (!(order.width >= leastFigureWidth && order.width <= greatestFigureWidth))
    return rangeProblem("width", order.width, PW_TEXT("Figure", "A width of %1 mm is out of range."),
                        leastFigureWidth, greatestFigureWidth);
  if (!(order.textPoints >= leastFigureText && order.textPoints <= greatestFigureText))
    return rangeProblem("text", order.textPoints, PW_TEXT("Figure", "Text of %1 pt is out of range."),
                        leastFigureText, greatestFigureText);
  return std::nullopt;
}

Problem crowdedProblem(const FigureOrder& order) {
  return {"width",
          0,
          0,
          exactNumber(order.width),
          PW_TEXT("Figure", "At %1 mm the labels find no room.").with(exactNumber(order.width)),
          PW_TEXT("Figure", "Take a wider figure, smaller text or fewer lines.")};
}

/// One figure while it grows downwards.
struct Sheet {
  Picture picture;
  Setting setting;
  double left = margin;
  double right = 0;
  double bottom = 0; ///< of what stands already
  bool fits = true;
  std::size_t unnamed = 0; ///< watched planes without a label on the circle

  double width() const { return right - left; }
  const FigureParts& parts() const { return setting.order.parts; }
};

std::vector<ElementPanel> elementsBeside(const Sheet& sheet, double height) {
  std::vector<ElementPanel> panels;
  const bool both = sheet.parts().givenElement && sheet.parts().turnedElement;
  const double gap = 2;
  const double across = both ? (sheet.width() - gap) / 2 : sheet.width();
  double left = sheet.left;
  for (const bool turned : {false, true})
    if (turned ? sheet.parts().turnedElement : sheet.parts().givenElement) {
      panels.push_back({{left, sheet.bottom, left + across, sheet.bottom + height}, turned});
      left += across + gap;
    }
  return panels;
}

void drawCircle(Sheet& sheet, double left, double height) {
  const CircleLabels labels =
      drawCirclePanel(sheet.picture, sheet.setting, {left, sheet.bottom, sheet.right, sheet.bottom + height});
  sheet.fits = sheet.fits && labels.fit;
  sheet.unnamed = labels.unnamed;
  sheet.bottom += height;
}

/// Elements in a column at the left, circle at the right.
void drawWide(Sheet& sheet) {
  const double unit = sheet.width() / 160;
  const bool both = sheet.parts().givenElement && sheet.parts().turnedElement;
  const double height = (both ? 96 : 70) * unit;
  const double column = sheet.left + 58 * unit;
  std::vector<ElementPanel> panels;
  double top = sheet.bottom;
  for (const bool turned : {false, true})
    if (turned ? sheet.parts().turnedElement : sheet.parts().givenElement) {
      panels.push_back({{sheet.left, top, column, top + (both ? 48 * unit : height)}, turned});
      top += 48 * unit;
    }
  sheet.fits = drawElementPanels(sheet.picture, sheet.setting, panels) && sheet.fits;
  drawCircle(sheet, panels.empty() ? sheet.left : column + 2 * unit, height);
}

/// Elements side by side, the circle under them.
void drawUpright(Sheet& sheet) {
  const double unit = sheet.width() / (sheet.setting.isNarrow ? 90 : 160);
  const std::vector<ElementPanel> panels = elementsBeside(sheet, (sheet.setting.isNarrow ? 37 : 60) * unit);
  sheet.fits = drawElementPanels(sheet.picture, sheet.setting, panels) && sheet.fits;
  if (!panels.empty())
    sheet.bottom = panels.front().area.bottom + 0.5 * sheet.setting.text;
  if (sheet.parts().circle)
    drawCircle(sheet, sheet.left, (sheet.setting.isNarrow ? 56 : 90) * unit);
}

void drawPictures(Sheet& sheet) {
  const FigureParts& parts = sheet.parts();
  if (!parts.circle && !parts.givenElement && !parts.turnedElement)
    return;
  if (!sheet.setting.isNarrow && parts.circle)
    drawWide(sheet);
  else
    drawUpright(sheet);
  sheet.bottom += 0.7 * sheet.setting.text;
}

} // namespace

Palette paletteOf(const FigureOrder& order) {
  return order.mono ? Palette::mono : Palette::paper;
}

Result<Picture> figureOf(const Study& study, const Readout& readout, const FigureOrder& order) {
  if (const std::optional<Problem> problem = problemIn(order))
    return tl::unexpected(*problem);
  Sheet sheet{{}, settingOf(study, readout, order)};
  sheet.right = order.width - margin;
  Picture& picture = sheet.picture;
  picture.width = order.width;
  picture.title = figureTitle(sheet.setting);
  picture.description = figureDescription(sheet.setting);
  sheet.bottom = drawTitle(picture, sheet.setting, sheet.left, sheet.right);
  drawPictures(sheet);
  if (order.parts.planes)
    sheet.bottom = drawPlanes(picture, sheet.setting, sheet.left, sheet.right, sheet.bottom);
  if (order.parts.check || order.parts.utilisation)
    sheet.bottom = drawCheck(picture, sheet.setting, sheet.left, sheet.right, sheet.bottom);
  sheet.bottom = drawClosing(picture, sheet.setting, sheet.left, sheet.right, sheet.bottom, sheet.unnamed);
  if (!sheet.fits)
    return tl::unexpected(crowdedProblem(order));
  picture.height = std::ceil(sheet.bottom * 10) / 10;
  // Words lie over all strokes, so that their grounds cover what runs under them.
  std::stable_partition(picture.parts.begin(), picture.parts.end(),
                        [](const auto& part) { return !std::holds_alternative<Label>(part); });
  return picture;
}

} // namespace planewright

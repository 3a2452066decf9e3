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

Problem besideProblem(const FigureOrder& order) {
  return {"width",
          0,
          0,
          exactNumber(order.width),
          PW_TEXT("Figure", "A width of %1 mm does not hold elements and circle beside one another.")
              .with(exactNumber(order.width)),
          PW_TEXT("Figure", "Take %1 mm or more, or set them one below another.")
              .with(exactNumber(leastWidthBeside))};
}

std::optional<Problem> problemIn(const FigureOrder& order) {
  if (!(order.width >= leastFigureWidth && order.width <= greatestFigureWidth))
    return rangeProblem("width", order.width, PW_TEXT("Figure", "A width of %1 mm is out of range."),
                        leastFigureWidth, greatestFigureWidth);
  if (!(order.textPoints >= leastFigureText && order.textPoints <= greatestFigureText))
    return rangeProblem("text", order.textPoints, PW_TEXT("Figure", "Text of %1 pt is out of range."),
                        leastFigureText, greatestFigureText);
  const bool hasElements = order.parts.givenElement || order.parts.turnedElement;
  if (order.arrangement == Arrangement::beside && order.width < leastWidthBeside && hasElements &&
      order.parts.circle)
    return besideProblem(order);
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

void drawCircle(Sheet& sheet, double left, double right, double height) {
  const CircleLabels labels =
      drawCirclePanel(sheet.picture, sheet.setting, {left, sheet.bottom, right, sheet.bottom + height});
  sheet.fits = sheet.fits && labels.fit;
  sheet.unnamed = labels.unnamed;
  sheet.bottom += height;
}

/// Elements in a column, the circle at its side.
void drawBeside(Sheet& sheet, bool circleFirst) {
  const double unit = sheet.width() / 160;
  const bool both = sheet.parts().givenElement && sheet.parts().turnedElement;
  const double height = (both ? 96 : 70) * unit;
  const double across = 58 * unit;
  const double gap = 2 * unit;
  const double left = circleFirst ? sheet.right - across : sheet.left;
  std::vector<ElementPanel> panels;
  double top = sheet.bottom;
  for (const bool turned : {false, true})
    if (turned ? sheet.parts().turnedElement : sheet.parts().givenElement) {
      panels.push_back({{left, top, left + across, top + (both ? 48 * unit : height)}, turned});
      top += 48 * unit;
    }
  sheet.fits = drawElementPanels(sheet.picture, sheet.setting, panels) && sheet.fits;
  if (panels.empty())
    drawCircle(sheet, sheet.left, sheet.right, height);
  else if (circleFirst)
    drawCircle(sheet, sheet.left, left - gap, height);
  else
    drawCircle(sheet, left + across + gap, sheet.right, height);
}

/// Elements side by side in a row of their own.
void drawElements(Sheet& sheet) {
  const double unit = sheet.width() / (sheet.setting.isNarrow ? 90 : 160);
  const std::vector<ElementPanel> panels = elementsBeside(sheet, (sheet.setting.isNarrow ? 37 : 60) * unit);
  sheet.fits = drawElementPanels(sheet.picture, sheet.setting, panels) && sheet.fits;
  sheet.bottom = panels.front().area.bottom + 0.5 * sheet.setting.text;
}

void drawCircleBelow(Sheet& sheet) {
  const double unit = sheet.width() / (sheet.setting.isNarrow ? 90 : 160);
  drawCircle(sheet, sheet.left, sheet.right, (sheet.setting.isNarrow ? 56 : 90) * unit);
}

/// Whether a circle shares its row with the elements; alone it has the height of such a row.
bool standsBeside(const Setting& setting) {
  return setting.order.parts.circle && setting.order.arrangement != Arrangement::below && !setting.isNarrow;
}

bool isDrawing(FigureBlock block) {
  return block == FigureBlock::elements || block == FigureBlock::circle;
}

/// The blocks that the figure has. Of elements and circle in one row only the first is left.
std::vector<FigureBlock> blocksOf(const Setting& setting) {
  const FigureParts& parts = setting.order.parts;
  bool hasRow = false;
  std::vector<FigureBlock> blocks;
  for (const FigureBlock block : setting.order.blocks) {
    const bool wanted = block == FigureBlock::elements ? parts.givenElement || parts.turnedElement
                        : block == FigureBlock::circle ? parts.circle
                        : block == FigureBlock::planes
                            ? parts.planes
                            : (parts.check || parts.utilisation) && !setting.readout.checks.empty();
    if (!wanted || (isDrawing(block) && standsBeside(setting) && hasRow))
      continue;
    hasRow = hasRow || isDrawing(block);
    blocks.push_back(block);
  }
  return blocks;
}

void drawBlock(Sheet& sheet, FigureBlock block) {
  const auto drawn = [&](auto draw) {
    sheet.bottom = draw(sheet.picture, sheet.setting, sheet.left, sheet.right, sheet.bottom);
  };
  if (block == FigureBlock::planes)
    drawn(drawPlanes);
  else if (block == FigureBlock::check)
    drawn(drawCheck);
  else if (standsBeside(sheet.setting))
    drawBeside(sheet, block == FigureBlock::circle);
  else if (block == FigureBlock::elements)
    drawElements(sheet);
  else
    drawCircleBelow(sheet);
}

/// One block under the other, with the room between them that each needs: the table ends with a rule, the
/// check has room above and below it, and drawings that follow one another stand close.
void drawBlocks(Sheet& sheet) {
  const std::vector<FigureBlock> blocks = blocksOf(sheet.setting);
  for (std::size_t i = 0; i < blocks.size(); ++i) {
    drawBlock(sheet, blocks[i]);
    const bool drawingFollows = i + 1 < blocks.size() && isDrawing(blocks[i + 1]);
    if (isDrawing(blocks[i]) && !(drawingFollows && blocks[i] == FigureBlock::elements))
      sheet.bottom += 0.7 * sheet.setting.text;
    if (blocks[i] == FigureBlock::planes && drawingFollows)
      sheet.bottom += 0.6 * sheet.setting.text;
  }
}

} // namespace

Palette paletteOf(const FigureOrder& order) {
  return order.mono ? Palette::mono : Palette::paper;
}

Result<Picture> figureOf(const Study& study, const Readout& readout, const FigureOrder& order) {
  if (const std::optional<Problem> problem = problemIn(order))
    return tl::unexpected(*problem);
  const WritesDecimals decimals(order.decimal);
  Sheet sheet{{}, settingOf(study, readout, order)};
  sheet.right = order.width - margin;
  Picture& picture = sheet.picture;
  picture.width = order.width;
  picture.title = figureTitle(sheet.setting);
  picture.description = figureDescription(sheet.setting);
  sheet.bottom = drawTitle(picture, sheet.setting, sheet.left, sheet.right);
  drawBlocks(sheet);
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

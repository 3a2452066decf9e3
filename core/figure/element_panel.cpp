// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_panel.h"

#include "core/figure/element.h"
#include "core/figure/extent.h"
#include "core/figure/text_lines.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double headingHeight = 1.5; // ems
constexpr double leaderRoom = 0.9;    // ems between drawing and labels

/// Distances from the centre of a drawing to its edges, and the widths of its two columns of labels.
struct Reach {
  double left = 0;
  double right = 0;
  double up = 0;
  double down = 0;
  double leftLabels = 0;
  double rightLabels = 0;

  double across() const { return leftLabels + left + right + rightLabels; }
};

ElementOrder orderOf(const Setting& setting, bool turned, Vec centre, double outer) {
  ElementOrder order;
  order.centre = centre;
  order.outer = outer;
  order.turned = turned;
  order.wide = setting.wide;
  order.cut = setting.cut;
  order.medium = setting.medium;
  order.narrow = setting.narrow;
  order.hair = setting.hair;
  order.textSize = setting.text;
  order.translate = setting.order.translate;
  return order;
}

Reach reachOf(const Setting& setting, bool turned, double outer, double mostLabel) {
  Picture trial;
  const auto wishes = drawElement(trial, setting.study, setting.readout, orderOf(setting, turned, {}, outer));
  const Box box = extentOf(trial);
  Reach reach{-box.left, box.right, -box.top, box.bottom};
  for (const LabelWish& wish : wishes) {
    const double longWidth = textWidth(wish.longForm, setting.text, wish.bold);
    const double width =
        longWidth <= mostLabel ? longWidth : textWidth(wish.shortForm, setting.text, wish.bold);
    double& column = wish.mark.x < 0 ? reach.leftLabels : reach.rightLabels;
    column = std::max(column, width + leaderRoom * setting.text);
  }
  return reach;
}

/// Room for the drawing under the heading.
Box roomOf(const Setting& setting, const ElementPanel& panel) {
  return {panel.area.left, panel.area.top + headingHeight * setting.text, panel.area.right,
          panel.area.bottom};
}

Reach greatest(const Setting& setting, const std::vector<ElementPanel>& panels, double outer,
               double mostLabel) {
  Reach result;
  for (const ElementPanel& panel : panels) {
    const Reach reach = reachOf(setting, panel.turned, outer, mostLabel);
    result.left = std::max(result.left, reach.left);
    result.right = std::max(result.right, reach.right);
    result.up = std::max(result.up, reach.up);
    result.down = std::max(result.down, reach.down);
    result.leftLabels = std::max(result.leftLabels, reach.leftLabels);
    result.rightLabels = std::max(result.rightLabels, reach.rightLabels);
  }
  return result;
}

bool drawPanel(Picture& picture, const Setting& setting, const ElementPanel& panel, Vec centre, double outer,
               const Reach& reach) {
  const double size = setting.text;
  setWords(
      picture, {panel.area.left + boxSide * size, panel.area.top + capHeight * size},
      setting.runsOf(panel.turned ? PW_TEXT("Figure", "Reading plane") : PW_TEXT("Figure", "Given axes")),
      size, Align::start, Role::soft);
  const std::size_t before = picture.parts.size();
  const auto wishes =
      drawElement(picture, setting.study, setting.readout, orderOf(setting, panel.turned, centre, outer));
  // A leader may run under a letter of the axes: it stands on ground.
  for (std::size_t i = before; i < picture.parts.size(); ++i)
    if (Label* letter = std::get_if<Label>(&picture.parts[i]))
      letter->ground = true;
  const Box room = roomOf(setting, panel);
  LabelColumns columns;
  columns.centre = centre.x;
  columns.leftEnd = centre.x - reach.left - leaderRoom * size;
  columns.rightStart = centre.x + reach.right + leaderRoom * size;
  columns.top = room.top;
  columns.bottom = room.bottom;
  columns.size = size;
  columns.leaderWidth = setting.hair;
  columns.leftStart = panel.area.left + boxSide * size;
  columns.rightEnd = panel.area.right - boxSide * size;
  const PlacedLabels placed = placeLabels(wishes, columns);
  picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
  picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
  return placed.fits;
}

} // namespace

bool drawElementPanels(Picture& picture, const Setting& setting, const std::vector<ElementPanel>& panels) {
  if (panels.empty())
    return true;
  const double width = panels.front().area.right - panels.front().area.left - 2 * boxSide * setting.text;
  double height = 1e9;
  for (const ElementPanel& panel : panels)
    height = std::min(height, roomOf(setting, panel).bottom - roomOf(setting, panel).top);
  // The element keeps a quarter of the width; labels that would take more go short.
  const double mostLabel = 0.36 * width - leaderRoom * setting.text;
  double least = 0;
  double most = height;
  for (int i = 0; i < 24; ++i) {
    const double outer = (least + most) / 2;
    const Reach reach = greatest(setting, panels, outer, mostLabel);
    (reach.across() <= width && reach.up + reach.down <= height ? least : most) = outer;
  }
  const Reach reach = greatest(setting, panels, least, mostLabel);
  const double slack = (width - reach.across()) / 2;
  bool fits = true;
  for (const ElementPanel& panel : panels) {
    const Box room = roomOf(setting, panel);
    const double spare = room.bottom - room.top - reach.up - reach.down;
    const Vec centre{panel.area.left + boxSide * setting.text + slack + reach.leftLabels + reach.left,
                     room.top + spare / 2 + reach.up};
    fits = drawPanel(picture, setting, panel, centre, least, reach) && fits;
  }
  return fits;
}

} // namespace planewright

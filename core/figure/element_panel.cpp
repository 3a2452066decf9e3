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

/// Distances from the centre of a drawing to the edges of its strokes, and the width of its labels.
struct Reach {
  double left = 0;
  double right = 0;
  double up = 0;
  double down = 0;
  double labels = 0;

  double across() const { return left + right + labels; }
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

/// All labels stand in one column at the right: what acts on a face acts on the opposite one as well, and a
/// line has two ends, so a mark at the left has its like at the right. Only the angle theta has not.
std::vector<LabelWish> toTheRight(std::vector<LabelWish> wishes, Vec centre) {
  for (LabelWish& wish : wishes)
    if (wish.mark.x < centre.x && wish.key != "theta")
      wish.mark = 2 * centre - wish.mark;
  return wishes;
}

/// The pictures' strokes without the letters of the axes, which may stand between labels.
Box strokesOf(Picture picture) {
  std::erase_if(picture.parts, [](const auto& part) { return std::holds_alternative<Label>(part); });
  return extentOf(picture);
}

Reach reachOf(const Setting& setting, bool turned, double outer, double mostLabel) {
  Picture trial;
  const auto wishes = drawElement(trial, setting.study, setting.readout, orderOf(setting, turned, {}, outer));
  const Box strokes = strokesOf(trial);
  const Box all = extentOf(trial);
  Reach reach{-all.left, strokes.right, -all.top, all.bottom};
  for (const LabelWish& wish : wishes) {
    const double longWidth = textWidth(wish.longForm, setting.text, wish.bold);
    const double width =
        longWidth <= mostLabel ? longWidth : textWidth(wish.shortForm, setting.text, wish.bold);
    reach.labels = std::max(reach.labels, width + leaderRoom * setting.text);
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
    result.labels = std::max(result.labels, reach.labels);
  }
  return result;
}

/// Which wishes stand over a letter of the axes at this height: those that begin over it, and of those level
/// with it the upper half. `wishes` ascend by height.
std::size_t countAbove(const std::vector<LabelWish>& wishes, double letter, double half) {
  const auto under = [&](double height) {
    return static_cast<std::size_t>(std::count_if(
        wishes.begin(), wishes.end(), [&](const LabelWish& wish) { return wish.mark.y < height; }));
  };
  return (under(letter - half) + under(letter + half) + 1) / 2;
}

/// Places the wishes in bands of the column between the letters of the axes, so that no leader runs under
/// one.
bool placeBetween(Picture& picture, std::vector<LabelWish> wishes, LabelColumns columns,
                  std::vector<double> letters) {
  const double half = 0.6 * columns.size;
  const double bottom = columns.bottom;
  std::sort(letters.begin(), letters.end());
  std::stable_sort(wishes.begin(), wishes.end(),
                   [](const LabelWish& a, const LabelWish& b) { return a.mark.y < b.mark.y; });
  std::size_t from = 0;
  bool fits = true;
  for (std::size_t band = 0; band <= letters.size(); ++band) {
    const bool last = band == letters.size();
    const std::size_t to = last ? wishes.size() : std::max(from, countAbove(wishes, letters[band], half));
    columns.bottom = last ? bottom : letters[band] - half;
    const PlacedLabels placed = placeLabels({wishes.begin() + static_cast<std::ptrdiff_t>(from),
                                             wishes.begin() + static_cast<std::ptrdiff_t>(to)},
                                            columns);
    picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
    picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
    fits = fits && placed.fits;
    if (!last)
      columns.top = letters[band] + half;
    from = to;
  }
  return fits;
}

bool drawPanel(Picture& picture, const Setting& setting, const ElementPanel& panel, Vec centre, double outer,
               const Reach& reach) {
  const double size = setting.text;
  setWords(
      picture, {panel.area.left, panel.area.top + capHeight * size},
      setting.runsOf(panel.turned ? PW_TEXT("Figure", "Reading plane") : PW_TEXT("Figure", "Given axes")),
      size, Align::start, Role::soft);
  Picture element;
  const auto wishes = toTheRight(
      drawElement(element, setting.study, setting.readout, orderOf(setting, panel.turned, centre, outer)),
      centre);
  std::vector<double> letters;
  for (auto& part : element.parts)
    if (Label* letter = std::get_if<Label>(&part)) {
      letter->ground = true;
      if (letter->at.x > centre.x + 0.4 * outer)
        letters.push_back(letter->at.y - capHeight / 2 * size);
    }
  const Box room = roomOf(setting, panel);
  LabelColumns columns;
  columns.centre = -1e9; // all at the right
  columns.rightStart = centre.x + reach.right + leaderRoom * size;
  columns.top = room.top;
  columns.bottom = room.bottom;
  columns.size = size;
  columns.leaderWidth = setting.hair;
  columns.rightEnd = panel.area.right;
  picture.parts.insert(picture.parts.end(), element.parts.begin(), element.parts.end());
  return placeBetween(picture, wishes, columns, letters);
}

} // namespace

bool drawElementPanels(Picture& picture, const Setting& setting, const std::vector<ElementPanel>& panels) {
  if (panels.empty())
    return true;
  const double width = panels.front().area.right - panels.front().area.left;
  double height = 1e9;
  for (const ElementPanel& panel : panels)
    height = std::min(height, roomOf(setting, panel).bottom - roomOf(setting, panel).top);
  // The drawing keeps the greater half of the width; labels that would take more go short.
  const double mostLabel = 0.45 * width - leaderRoom * setting.text;
  double least = 0;
  double most = height;
  for (int i = 0; i < 14; ++i) {
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
    const Vec centre{panel.area.left + slack + reach.left, room.top + spare / 2 + reach.up};
    fits = drawPanel(picture, setting, panel, centre, least, reach) && fits;
  }
  return fits;
}

} // namespace planewright

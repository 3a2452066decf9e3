// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_panel.h"

#include "core/figure/element.h"
#include "core/figure/extent.h"
#include "core/figure/text_lines.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double headingHeight = 1.5; // ems
constexpr double edgeRoom = 0.3;      // ems under the drawing
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
  Reach reach{setting.wide - all.left, strokes.right, -all.top, all.bottom}; // a band is twice as wide
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
          panel.area.bottom - edgeRoom * setting.text};
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

/// A stretch of the column between letters of the axes.
struct Band {
  double top = 0;
  double bottom = 0;
  std::size_t count = 0; ///< of labels in it
};

/// How many rows of labels a band holds.
std::size_t rowsIn(const Band& band, double size) {
  const double room = (band.bottom - band.top) / size - boxOver - boxUnderIndex;
  return room < 0 ? 0 : static_cast<std::size_t>(room / labelPitch) + 1;
}

std::vector<Band> bandsOf(const LabelColumns& columns, std::vector<double> letters) {
  const double half = 0.6 * columns.size;
  std::sort(letters.begin(), letters.end());
  std::vector<Band> bands;
  double top = columns.top;
  for (const double letter : letters) {
    bands.push_back({top, letter - half});
    top = letter + half;
  }
  bands.push_back({top, columns.bottom});
  return bands;
}

/// Shares `wishes`, which ascend by height, out to the bands: over a letter those that begin over it, and of
/// those level with it the upper half, as far as the bands hold them.
void shareOut(std::vector<Band>& bands, const std::vector<LabelWish>& wishes, double size) {
  std::size_t room = 0;
  for (const Band& band : bands)
    room += rowsIn(band, size);
  const auto under = [&](double height) {
    return static_cast<std::size_t>(std::count_if(
        wishes.begin(), wishes.end(), [&](const LabelWish& wish) { return wish.mark.y < height; }));
  };
  std::size_t from = 0;
  for (Band& band : bands) {
    const std::size_t rows = rowsIn(band, size);
    room -= rows;
    const std::size_t wished = (under(band.bottom) + under(band.bottom + 1.2 * size) + 1) / 2;
    const std::size_t needed = wishes.size() > room ? wishes.size() - room : 0;
    const bool last = &band == &bands.back();
    const std::size_t to = last ? wishes.size() : std::min(std::max({from, wished, needed}), from + rows);
    band.count = to - from;
    from = to;
  }
}

/// Places the wishes in bands of the column between the letters of the axes, so that no leader runs under
/// one.
bool placeBetween(Picture& picture, std::vector<LabelWish> wishes, LabelColumns columns,
                  const std::vector<double>& letters) {
  std::stable_sort(wishes.begin(), wishes.end(),
                   [](const LabelWish& a, const LabelWish& b) { return a.mark.y < b.mark.y; });
  std::vector<Band> bands = bandsOf(columns, letters);
  shareOut(bands, wishes, columns.size);
  auto from = wishes.begin();
  bool fits = true;
  for (const Band& band : bands) {
    const auto to = from + static_cast<std::ptrdiff_t>(band.count);
    columns.top = band.top;
    columns.bottom = band.bottom;
    const PlacedLabels placed = placeLabels({from, to}, columns);
    picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
    picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
    noteShortened(picture, placed);
    fits = fits && placed.fits;
    from = to;
  }
  return fits;
}

bool drawPanel(Picture& picture, const Setting& setting, const ElementPanel& panel, Vec centre, double outer,
               const Reach& reach) {
  const double size = setting.text;
  setWords(
      picture, {panel.area.left, panel.area.top + boxOver * size},
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

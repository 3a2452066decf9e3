// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/labels.h"

#include "core/figure/label_rows.h"
#include "core/figure/metrics.h"

#include <algorithm>
#include <cmath>
#include <numeric>

namespace planewright {

namespace {

/// Space between label and leader, and between labels that share a row, in ems.
constexpr double leaderGap = 0.3;
constexpr double rowGap = 0.6;
/// What a width may exceed its room by, for rounding.
constexpr double rounding = 1e-6;

/// One side of the drawing while its labels find their places.
struct Side {
  const std::vector<LabelWish>& all;
  bool isLeft = false;
  double edge = 0;  ///< x at which the labels begin, or end on the left
  double width = 0; ///< that a row may take
  double lowest = 0;
  double highest = 0; ///< bounds of the middle of a row, y down
  double size = 0;
  std::size_t capacity = 0;
  std::vector<std::size_t> order;
  std::vector<bool> isShort; ///< of each of `all`
  std::vector<double> longWidths;
  std::vector<double> shortWidths;

  const Runs& form(std::size_t wish) const {
    return isShort[wish] ? all[wish].shortForm : all[wish].longForm;
  }
  double formWidth(std::size_t wish) const { return isShort[wish] ? shortWidths[wish] : longWidths[wish]; }
  double leaderEnd() const { return edge + (isLeft ? leaderGap : -leaderGap) * size; }
  bool hasLeader(std::size_t wish) const {
    return isLeft ? all[wish].mark.x > leaderEnd() : all[wish].mark.x < leaderEnd();
  }
};

using Row = std::vector<std::size_t>;

double widthOf(const Side& side, const Row& row) {
  double width = rowGap * side.size * static_cast<double>(row.size() - 1);
  for (const std::size_t wish : row)
    width += side.formWidth(wish);
  return width;
}

/// One row for each label; with `sharing`, neighbours that are short stand in one row as far as it holds
/// them.
std::vector<Row> rowsOf(const Side& side, bool sharing) {
  std::vector<Row> rows;
  bool open = false;
  for (const std::size_t wish : side.order) {
    const bool joins = sharing && open && side.isShort[wish];
    if (joins)
      rows.back().push_back(wish);
    if (!joins || widthOf(side, rows.back()) > side.width) {
      if (joins)
        rows.back().pop_back();
      rows.push_back({wish});
    }
    open = side.isShort[wish];
  }
  return rows;
}

/// The member of `order` with the greatest priority number among those that `counts`.
template <class Counts>
std::vector<std::size_t>::iterator leastWanted(Side& side, Counts counts) {
  auto result = side.order.end();
  for (auto i = side.order.begin(); i != side.order.end(); ++i)
    if (counts(*i) && (result == side.order.end() || side.all[*i].priority >= side.all[*result].priority))
      result = i;
  return result;
}

/// Shortens, joins and at last leaves out until the rows find room.
std::vector<Row> rowsThatFit(Side& side, bool& fits) {
  const auto tooWide = [&](std::size_t wish) { return side.formWidth(wish) > side.width; };
  for (const std::size_t wish : side.order)
    side.isShort[wish] = tooWide(wish);
  const auto kept = std::remove_if(side.order.begin(), side.order.end(), tooWide);
  fits = fits && kept == side.order.end();
  side.order.erase(kept, side.order.end());

  std::vector<Row> rows = rowsOf(side, false);
  while (rows.size() > side.capacity) {
    const auto next = leastWanted(side, [&](std::size_t wish) { return !side.isShort[wish]; });
    if (next != side.order.end()) {
      side.isShort[*next] = true;
    } else {
      side.order.erase(leastWanted(side, [](std::size_t) { return true; }));
      fits = false;
    }
    rows = rowsOf(side, true);
  }
  return rows;
}

std::vector<double> heightsOf(const Side& side, const std::vector<Row>& rows) {
  std::vector<WishedHeight> wished;
  for (const Row& row : rows) {
    double sum = 0;
    for (const std::size_t wish : row)
      sum += side.all[wish].mark.y;
    const auto count = static_cast<double>(row.size());
    wished.push_back({sum / count, count});
  }
  return spacedHeights(wished, labelPitch * side.size, side.lowest, side.highest);
}

bool leadersCross(const Side& side, std::size_t a, double heightA, std::size_t b, double heightB) {
  if (!side.hasLeader(a) || !side.hasLeader(b))
    return false;
  const double end = side.leaderEnd();
  return segmentsCross(side.all[a].mark, {end, heightA}, side.all[b].mark, {end, heightB});
}

/// Lets labels whose leaders cross change places until none does. Each change shortens the leaders' total
/// length, so it ends; the bound on the passes is for rounding.
void uncross(const Side& side, std::vector<Row>& rows, const std::vector<double>& heights) {
  const auto exchanged = [&](std::size_t i, std::size_t j) {
    for (std::size_t& a : rows[i])
      for (std::size_t& b : rows[j])
        if (leadersCross(side, a, heights[i], b, heights[j])) {
          std::swap(a, b);
          if (widthOf(side, rows[i]) <= side.width && widthOf(side, rows[j]) <= side.width)
            return true;
          std::swap(a, b);
        }
    return false;
  };
  bool changed = true;
  for (std::size_t pass = 0; changed && pass <= side.order.size() * side.order.size(); ++pass) {
    changed = false;
    for (std::size_t i = 0; i < rows.size(); ++i)
      for (std::size_t j = i + 1; j < rows.size(); ++j)
        changed = exchanged(i, j) || changed;
  }
}

void setRow(const Side& side, const Row& row, double height, double leaderWidth, PlacedLabels& placed) {
  const double baseline = height + capHeight / 2 * side.size;
  double x = side.isLeft ? side.edge - widthOf(side, row) : side.edge;
  for (const std::size_t wish : row) {
    const LabelWish& label = side.all[wish];
    if (side.hasLeader(wish))
      placed.leaders.push_back(
          {{label.mark, {side.leaderEnd(), height}}, false, Pen{label.role, leaderWidth, Dash::solid}, {}});
    const double width = side.formWidth(wish);
    placed.labels.push_back({{side.isLeft ? x + width : x, baseline},
                             side.form(wish),
                             side.size,
                             side.isLeft ? Align::end : Align::start,
                             label.role,
                             label.bold,
                             true,
                             label.key});
    x += width + rowGap * side.size;
    if (side.isShort[wish] && label.shortForm != label.longForm)
      placed.shortened.push_back(label.key);
  }
}

Side sideOf(const std::vector<LabelWish>& wishes, const LabelColumns& columns, bool isLeft) {
  const double room = columns.bottom - columns.top - (boxOver + boxUnderIndex) * columns.size;
  const double edge = isLeft ? columns.leftEnd : columns.rightStart;
  Side side{wishes,
            isLeft,
            edge,
            rounding + (isLeft ? edge - columns.leftStart : columns.rightEnd - edge),
            columns.top + (boxOver - capHeight / 2) * columns.size,
            columns.bottom - (boxUnderIndex + capHeight / 2) * columns.size,
            columns.size,
            room < 0 ? 0
                     : static_cast<std::size_t>(std::floor(room / (labelPitch * columns.size) + 1e-9)) + 1,
            {},
            std::vector<bool>(wishes.size(), false),
            {},
            {}};
  for (const LabelWish& wish : wishes) {
    side.longWidths.push_back(textWidth(wish.longForm, columns.size, wish.bold));
    side.shortWidths.push_back(textWidth(wish.shortForm, columns.size, wish.bold));
  }
  for (std::size_t i = 0; i < wishes.size(); ++i)
    if ((wishes[i].mark.x < columns.centre) == isLeft)
      side.order.push_back(i);
  std::stable_sort(side.order.begin(), side.order.end(),
                   [&](std::size_t a, std::size_t b) { return wishes[a].mark.y < wishes[b].mark.y; });
  return side;
}

} // namespace

PlacedLabels placeLabels(const std::vector<LabelWish>& wishes, const LabelColumns& columns) {
  PlacedLabels placed;
  for (const bool isLeft : {true, false}) {
    Side side = sideOf(wishes, columns, isLeft);
    std::vector<Row> rows = rowsThatFit(side, placed.fits);
    const std::vector<double> heights = heightsOf(side, rows);
    uncross(side, rows, heights);
    for (std::size_t i = 0; i < rows.size(); ++i)
      setRow(side, rows[i], heights[i], columns.leaderWidth, placed);
  }
  return placed;
}

void noteShortened(Picture& picture, const PlacedLabels& placed) {
  for (const Label& label : placed.labels)
    if (std::find(placed.shortened.begin(), placed.shortened.end(), label.key) != placed.shortened.end())
      picture.shortened.push_back(plain(label.runs));
}

} // namespace planewright

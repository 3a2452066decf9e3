// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/side_labels.h"

#include "core/figure/metrics.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double edge = 6; ///< between a label and the window's border
constexpr double gap = 10; ///< between ring and label

void append(PlacedLabels& all, PlacedLabels more) {
  std::ranges::move(more.leaders, std::back_inserter(all.leaders));
  std::ranges::move(more.labels, std::back_inserter(all.labels));
}

double widestOf(const std::vector<LabelWish>& wishes, double least, double textSize) {
  double widest = least;
  for (const LabelWish& wish : wishes)
    widest = std::max(widest, textWidth(wish.longForm, textSize, wish.bold));
  return widest;
}

} // namespace

Sides sidesOf(const std::vector<LabelWish>& wishes, const ElementGeometry& geometry, const Sides* before) {
  Sides sides;
  for (const LabelWish& wish : wishes) {
    const double off = (wish.mark.x - geometry.frame.centre.x) / geometry.frame.outer;
    const bool prefersLeft = wish.key == "sigma_t" || wish.key == "phi";
    const bool atCentre = std::abs(off) < 1e-9;
    bool left = atCentre ? prefersLeft : off < 0;
    constexpr double lag = 0.25;
    if (before && std::abs(off) < lag)
      if (const auto was = before->find(wish.key); was != before->end())
        left = was->second;
    sides[wish.key] = left;
  }
  return sides;
}

PlacedLabels sideLabels(const std::vector<LabelWish>& wishes, const Sides& sides,
                        const ElementGeometry& geometry, QSizeF size, double widest, double textSize) {
  PlacedLabels all;
  for (const bool left : {true, false}) {
    std::vector<LabelWish> ours;
    std::ranges::copy_if(wishes, std::back_inserter(ours),
                         [&](const LabelWish& wish) { return sides.at(wish.key) == left; });
    const double room = edge + widestOf(ours, widest, textSize);
    const double centre = geometry.frame.centre.x;
    LabelColumns columns;
    columns.centre = left ? size.width() * 2 : -size.width();
    columns.leftEnd = std::max(centre - geometry.frame.outer - gap, room);
    columns.rightStart = std::min(centre + geometry.frame.outer + gap, size.width() - room);
    columns.leftStart = 2;
    columns.rightEnd = size.width() - 2;
    columns.top = headingHeight;
    columns.bottom = size.height() - captionHeight;
    columns.size = textSize;
    columns.leaderWidth = 1;
    append(all, placeLabels(ours, columns));
  }
  return all;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/others.h"

#include <algorithm>
#include <cmath>
#include <utility>

namespace planewright {

namespace {

using States = std::vector<const StateReading*>;

States extremesOf(const States& others) {
  const auto s1 = [](const StateReading* state) { return state->circle.s1; };
  const auto s2 = [](const StateReading* state) { return state->circle.s2; };
  return {*std::ranges::max_element(others, {}, s1), *std::ranges::min_element(others, {}, s2)};
}

void addCircle(QPainterPath& path, const Round& round) {
  path.addEllipse(round.centre, round.radius, round.radius);
}

/// Half of the height at `x`; negative where no disc is.
double halfHeight(const std::vector<Round>& rounds, double x) {
  double greatest = -1;
  for (const Round& round : rounds)
    greatest =
        std::max(greatest, round.radius * round.radius - (x - round.centre.x()) * (x - round.centre.x()));
  constexpr double rounding = -1e-6; // the end of a disc is its edge
  return greatest < rounding ? -1 : std::sqrt(std::max(0.0, greatest));
}

/// There and back along one connected piece.
void addPiece(QPainterPath& path, const std::vector<QPointF>& upper, double level) {
  QPolygonF polygon(QList<QPointF>(upper.begin(), upper.end()));
  for (auto point = upper.rbegin(); point != upper.rend(); ++point)
    polygon << QPointF(point->x(), 2 * level - point->y());
  path.addPolygon(polygon);
  path.closeSubpath();
}

} // namespace

QPainterPath unionOfDiscs(const std::vector<Round>& rounds, double from, double to) {
  constexpr double fineness = 0.5;
  std::vector<double> places;
  for (const Round& round : rounds)
    for (const double end : {-round.radius, round.radius})
      places.push_back(std::clamp(round.centre.x() + end, from, to));
  if (places.empty())
    return {};
  const auto [least, greatest] = std::ranges::minmax(places);
  for (double x = std::ceil(least / fineness) * fineness; x < greatest; x += fineness)
    places.push_back(x);
  std::ranges::sort(places);

  QPainterPath path;
  const double level = rounds.front().centre.y();
  std::vector<QPointF> upper;
  for (const double x : places) {
    const double half = halfHeight(rounds, x);
    if (half >= 0)
      upper.emplace_back(x, level - half);
    else if (!upper.empty())
      addPiece(path, std::exchange(upper, {}), level);
  }
  addPiece(path, upper, level);
  return path;
}

OthersDrawing drawingOfOthers(const Stage& stage) {
  OthersDrawing drawing;
  const States others = othersOf(stage.readout);
  if (others.size() <= mostHairlines) {
    for (const StateReading* other : others)
      addCircle(drawing.hairlines, stage.roundOf(*other));
    return drawing;
  }
  std::vector<Round> rounds{stage.round()};
  for (const StateReading* other : others)
    rounds.push_back(stage.roundOf(*other));
  const QRectF& plot = stage.scale.plot();
  constexpr double beyond = 2; // so that the outline does not run along the edge of the plot
  drawing.shape = unionOfDiscs(rounds, plot.left() - beyond, plot.right() + beyond);
  for (const StateReading* extreme : extremesOf(others))
    addCircle(drawing.extremes, stage.roundOf(*extreme));
  return drawing;
}

const StateReading* nearestOther(const Stage& stage, QPointF pixel, double reach) {
  States others = othersOf(stage.readout);
  if (others.size() > mostHairlines)
    others = extremesOf(others);
  const StateReading* nearest = nullptr;
  double least = reach;
  for (const StateReading* other : others) {
    const Round round = stage.roundOf(*other);
    const QPointF away = pixel - round.centre;
    const double distance = std::abs(std::hypot(away.x(), away.y()) - round.radius);
    if (distance <= least) {
      least = distance;
      nearest = other;
    }
  }
  return nearest;
}

} // namespace planewright

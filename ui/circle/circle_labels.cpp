// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_labels.h"

#include "core/figure/failure_line.h"
#include "core/figure/metrics.h"
#include "ui/circle/circle_fit.h"
#include "ui/look/look.h"

#include <algorithm>
#include <ranges>

namespace planewright {

namespace {

constexpr double leaderWidth = 1;
/// Labels keep clear of the words in the corners of the plot.
constexpr double corner = 20;
/// From a mark on the circle to the label that goes round with it, beside the mark and above or below it.
constexpr double beside = 16;
constexpr double above = 20;

bool isBold(PlaneKind kind) {
  return kind == PlaneKind::reading || kind == PlaneKind::s1 || kind == PlaneKind::s2 ||
         kind == PlaneKind::x || kind == PlaneKind::y;
}

std::string keyOf(PlaneKind kind, const std::string& name) {
  return std::to_string(static_cast<int>(kind)) + " " + name;
}

std::vector<LabelWish> wishesOf(const Stage& stage) {
  std::vector<LabelWish> wishes;
  for (const Mark& mark : marksOf(stage.study, stage.readout))
    wishes.push_back(wishOf(mark, stage.pixelOf(mark.at)));
  for (const TouchLabel& touch : touchLabelsOf(stage.readout))
    wishes.push_back({vecOf(stage.pixelOf(touch.at)), runs(touch.longForm, translation()),
                      runs(touch.shortForm, translation()), touch.role, false, touchPriority, touch.key});
  return wishes;
}

LabelColumns columnsOf(const Stage& stage) {
  const QRectF& plot = stage.scale.plot();
  const Round round = stage.round();
  LabelColumns columns;
  columns.centre = round.centre.x();
  columns.leftStart = plot.left() - circle_size::leftOverhang;
  columns.leftEnd = std::max(columns.leftStart, round.centre.x() - round.radius - circle_size::labelGap);
  columns.rightEnd = plot.right() + circle_size::overhang;
  columns.rightStart = std::min(columns.rightEnd, round.centre.x() + round.radius + circle_size::labelGap);
  columns.top = plot.top() + corner;
  columns.bottom = plot.bottom() - corner;
  columns.size = circle_size::text;
  columns.leaderWidth = leaderWidth;
  return columns;
}

/// Keeps the whole box of a label inside the plot.
void clampInto(Label& label, const QRectF& plot) {
  const Box box = boxOf(label);
  const double left = plot.left() - circle_size::leftOverhang;
  const double right = plot.right() + circle_size::overhang;
  label.at.x += std::max(0.0, left - box.left) - std::max(0.0, box.right - right);
  label.at.y += std::max(0.0, plot.top() - box.top) - std::max(0.0, box.bottom - plot.bottom());
}

/// A label that rides on its mark, with its leader; a lesser rank is wanted more.
struct Rider {
  Label label;
  std::optional<Path> leader;
  int rank = 0;
};

/// In a motion labels run into each other; the more wanted ones are shown whole, the others not at all.
std::vector<Rider> withoutCovered(std::vector<Rider> riders) {
  std::ranges::stable_sort(riders, {}, &Rider::rank);
  std::vector<Box> taken;
  std::erase_if(riders, [&taken](const Rider& rider) {
    const Box box = boxOf(rider.label);
    if (std::ranges::any_of(taken, [&box](const Box& other) { return overlap(box, other); }))
      return true;
    taken.push_back(box);
    return false;
  });
  return riders;
}

/// Beside its mark, outside the circle; its place changes without a step as the mark goes round.
void putOutside(Label& label, const Stage& stage, QPointF mark) {
  const Round round = stage.round();
  const QPointF out = round.radius > 0 ? (mark - round.centre) / round.radius : QPointF(1, 0);
  const QPointF at = mark + QPointF(beside * out.x(), above * out.y());
  const double width = textWidth(label.runs, label.size, label.bold);
  label.align = Align::start;
  label.at = vecOf(at + QPointF((out.x() - 1) / 2 * width, capHeight / 2 * label.size));
}

} // namespace

LabelWish wishOf(const Mark& mark, QPointF at) {
  return {vecOf(at),
          runs(mark.longForm, translation()),
          runs(mark.shortForm, translation()),
          roleOf(mark.kind),
          isBold(mark.kind),
          mark.priority,
          keyOf(mark.kind, mark.name)};
}

std::string readingKey() {
  return keyOf(PlaneKind::reading, {});
}

CircleLabels placedLabels(const Stage& stage) {
  std::vector<LabelWish> wishes = wishesOf(stage);
  PlacedLabels placed = placeLabels(wishes, columnsOf(stage));
  return {stage.readout.reading, false, std::move(wishes), std::move(placed)};
}

CircleLabels riddenLabels(const Stage& stage, const CircleLabels& before, const CircleLabels& latest) {
  const bool goesRound = latest.goesRound || stage.readout.reading != before.reading;
  CircleLabels now{stage.readout.reading, goesRound, wishesOf(stage), {}};
  std::vector<Rider> riders;
  for (const Label& label : before.placed.labels) {
    const auto old = std::ranges::find(before.wishes, label.key, &LabelWish::key);
    const auto wish = std::ranges::find(now.wishes, label.key, &LabelWish::key);
    if (old == before.wishes.end() || wish == now.wishes.end())
      continue;
    Rider rider{label, std::nullopt, label.key == readingKey() ? -1 : wish->priority};
    const bool isShort = std::ranges::count(before.placed.shortened, label.key) > 0;
    const Vec motion = wish->mark - old->mark;
    rider.label.runs = isShort ? wish->shortForm : wish->longForm;
    rider.label.at = label.at + motion;
    const bool turned = label.key == readingKey() && goesRound;
    if (turned)
      putOutside(rider.label, stage, pointOf(wish->mark));
    clampInto(rider.label, stage.scale.plot());
    const auto leader = std::ranges::find_if(before.placed.leaders, [&](const Path& path) {
      return path.points.front() == old->mark && path.pen->role == label.role;
    });
    if (!turned && leader != before.placed.leaders.end()) {
      rider.leader = *leader;
      for (Vec& point : rider.leader->points)
        point = point + motion;
    }
    riders.push_back(std::move(rider));
  }
  for (Rider& rider : withoutCovered(std::move(riders))) {
    now.placed.labels.push_back(std::move(rider.label));
    if (rider.leader)
      now.placed.leaders.push_back(*std::move(rider.leader));
  }
  now.placed.shortened = before.placed.shortened;
  return now;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_words.h"

#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "ui/circle/circle_fit.h"
#include "ui/circle/others.h"
#include "ui/circle/signs.h"
#include "ui/look/look.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double size = circle_size::text;
/// Base lines of the top row, from above, and of the bottom row, from below.
constexpr double topBase = 16;
constexpr double bottomBase = 7;
constexpr double side = 8;
/// Of a pointer with the space behind it.
constexpr double pointerRoom = 10;

Label labelOf(const Text& text, Vec at, Align align, Role role) {
  return {at, runs(text, translation()), size, align, role, false, true, {}};
}

double widthOf(const Text& text) {
  return textWidth(runs(text, translation()), size, false);
}

Text shearTitle(const Study& study) {
  const Text title = study.convention.shearAxis == ShearAxis::tensorDown
                         ? PW_TEXT("Circle", "τ_{nt} (%1), + down")
                         : PW_TEXT("Circle", "τ_{nt} (%1), + up");
  return title.with(study.units.stress);
}

/// A triangle as large as a small letter, since not every font has one.
void drawPointer(Picture& picture, double tip, double base, bool toLeft) {
  const double wide = toLeft ? 6 : -6;
  picture.parts.push_back(
      Path{{{tip, base - 4}, {tip + wide, base - 8}, {tip + wide, base}}, true, std::nullopt, Role::soft});
}

/// The word with a triangle that points to its end of the axis.
void drawEnd(Picture& picture, const Text& word, double end, double base, bool toLeft) {
  drawPointer(picture, end, base, toLeft);
  picture.parts.push_back(labelOf(word, {end + (toLeft ? pointerRoom : -pointerRoom), base},
                                  toLeft ? Align::start : Align::end, Role::soft));
}

/// The title of the level axis between the words for its ends; the words are left out where the row has no
/// room for all three.
void drawBottomRow(Picture& picture, const Stage& stage, QSizeF extent) {
  const QRectF& plot = stage.scale.plot();
  const bool swapped = stage.study.convention.positive == Positive::compression;
  const Text tension = PW_TEXT("Circle", "tension");
  const Text compression = PW_TEXT("Circle", "compression");
  const Text& least = swapped ? tension : compression;
  const Text& greatest = swapped ? compression : tension;
  const Text title = PW_TEXT("Circle", "σ_{n} (%1)").with(stage.study.units.stress);
  const double base = extent.height() - bottomBase;
  const double from = plot.left() + pointerRoom + widthOf(least) + size;
  const double to = plot.right() - pointerRoom - widthOf(greatest) - size;
  const bool fits = to - from >= widthOf(title);
  if (fits) {
    drawEnd(picture, least, plot.left(), base, true);
    drawEnd(picture, greatest, plot.right(), base, false);
  }
  const double middle = fits ? (from + to) / 2 : plot.center().x();
  picture.parts.push_back(labelOf(title, {middle, base}, Align::middle, Role::ink));
}

/// A small element that feels positive or negative shear: arrows along its n face and the face opposite, and
/// the square turned a little the way they turn it.
void drawSense(Picture& picture, Vec centre, bool positive) {
  constexpr double half = 5.5;
  constexpr double reach = 9.5;
  const Angle lean = Angle::fromDegrees(positive ? 12 : -12);
  const CosSin d = cosSin(lean);
  const auto at = [&](double x, double y) {
    return centre + Vec{x * d.cos - y * d.sin, -x * d.sin - y * d.cos};
  };
  const Pen pen{Role::soft, 1, Dash::solid};
  picture.parts.push_back(
      Path{{at(-half, -half), at(half, -half), at(half, half), at(-half, half)}, true, pen, Role::canvas});
  for (const double face : {1.0, -1.0}) {
    const double sense = face * (positive ? 1 : -1);
    const Vec tip = at(face * reach, sense * 6);
    drawStroke(picture, at(face * reach, -sense * 6), tip, pen);
    drawHead(picture, tip, lean + Angle::fromDegrees(sense * 90), 5, Role::soft);
  }
}

void drawSenses(Picture& picture, const Stage& stage) {
  const QRectF& plot = stage.scale.plot();
  const bool down = stage.scale.yDown();
  constexpr double room = 16;
  const double axis = stage.scale.pixelOf({0, 0}).x();
  const bool meetsAxis = axis > plot.right() - 2 * room - 2 && axis < plot.right() + room;
  const double x = (meetsAxis ? axis - 4 : plot.right() + 2) - room;
  drawSense(picture, {x, plot.top() + 13}, !down);
  drawSense(picture, {x, plot.bottom() - 13}, down);
}

void drawWayToZero(Picture& picture, const Stage& stage) {
  const QRectF range = stage.scale.range();
  const QRectF& plot = stage.scale.plot();
  const bool toLeft = range.left() > 0;
  if (!toLeft && range.right() >= 0)
    return;
  const double way = toLeft ? range.left() : -range.right();
  const std::string number = shownNumber(way, decimalsFor(way, 3)) + " " + stage.study.units.stress;
  const Text words =
      (toLeft ? PW_TEXT("Circle", "0 is %1 to the left") : PW_TEXT("Circle", "0 is %1 to the right"))
          .with(number);
  const double base = plot.bottom() - 8;
  drawEnd(picture, words, toLeft ? plot.left() + 4 : plot.right() - 34, base, toLeft);
}

Text withoutCircle(const Circle& circle) {
  return circle.mean == 0 ? PW_TEXT("Circle", "zero stress: every direction is principal")
                          : PW_TEXT("Circle", "equal stress on every plane: every direction is principal");
}

void drawSentence(Picture& picture, const Stage& stage) {
  const StateReading& state = stage.readout.state();
  if (state.circle.radius > 0)
    return;
  const QRectF& plot = stage.scale.plot();
  const Vec at{plot.center().x(), plot.center().y() + plot.height() / 4};
  picture.parts.push_back(labelOf(withoutCircle(state.circle), at, Align::middle, Role::soft));
}

void drawTag(Picture& picture, const Stage& stage) {
  if (othersOf(stage.readout).size() <= mostHairlines)
    return;
  const auto judged = std::ranges::count_if(stage.readout.states, &StateReading::judged);
  const Text words = PW_TEXT("Circle", "all %1 combinations").with(std::to_string(judged));
  const QRectF& plot = stage.scale.plot();
  picture.parts.push_back(labelOf(words, {plot.left() + 4, plot.top() + 14}, Align::start, Role::soft));
}

/// At the right of the top row, or left out where the row has no room for it.
void drawNote(Picture& picture, const Stage& stage, QSizeF extent, const Text& note) {
  const bool turns = stage.study.convention.shearAxis == ShearAxis::tensorUp;
  const Text words = note.empty() && turns ? PW_TEXT("Circle", "2θ turns the other way") : note;
  const double room = extent.width() - 3 * side - widthOf(shearTitle(stage.study));
  if (!words.empty() && widthOf(words) < room)
    picture.parts.push_back(labelOf(words, {extent.width() - side, topBase}, Align::end, Role::reading));
}

} // namespace

Picture wordsLayer(const Stage& stage, QSizeF extent, const Text& note) {
  Picture picture;
  picture.parts.push_back(labelOf(shearTitle(stage.study), {side, topBase}, Align::start, Role::ink));
  drawBottomRow(picture, stage, extent);
  drawSenses(picture, stage);
  drawWayToZero(picture, stage);
  drawSentence(picture, stage);
  drawTag(picture, stage);
  drawNote(picture, stage, extent, note);
  return picture;
}

Text snapNote(const std::vector<Text>& on) {
  if (on.empty())
    return {};
  Text names = on.front();
  for (std::size_t i = 1; i < on.size(); ++i)
    names = PW_TEXT("Circle", "%1, %2").with(std::move(names)).with(on[i]);
  return PW_TEXT("Circle", "on %1").with(std::move(names));
}

} // namespace planewright

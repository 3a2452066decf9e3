// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/scene.h"

#include "core/figure/element_line.h"
#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "core/study/named_directions.h"
#include "core/table/table.h"
#include "ui/element/caption.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr Angle halfTurn = Angle::fromDegrees(180);

/// What one painting of the panel needs at hand.
struct Staging {
  const Study& study;
  const Readout& readout;
  const ElementGlance& glance;
  const Translate& translate;
  ElementGeometry geometry;
  Angle knob;

  const LineReading* line() const { return readout.lines.empty() ? nullptr : &readout.lines.front(); }
};

ElementOrder orderFor(const Staging& staging) {
  ElementOrder order;
  order.centre = staging.geometry.frame.centre;
  order.outer = staging.geometry.frame.outer;
  order.handles = true;
  order.letters = false;
  order.knob = false;
  order.givenArrows = staging.glance.givenArrows;
  order.otherFace = staging.glance.knob.isOther(staging.readout.reading.value);
  if (const LineReading* line = staging.line())
    order.otherEnd = staging.glance.end.isOther(line->angle.value);
  order.lineArc = staging.glance.held == ElementHandle::line || staging.glance.focused == ElementHandle::line;
  order.wide = 2;
  order.cut = 3.5;
  order.medium = 1.5;
  order.narrow = 1;
  order.hair = 1;
  order.textSize = elementText;
  order.translate = staging.translate;
  return order;
}

/// Ticks outside the ring at the named directions of the held handle; the one it rests on is longer.
void addNamedTicks(Picture& picture, const Staging& staging) {
  const bool reading = staging.glance.held == ElementHandle::reading;
  if (!reading && !(staging.glance.held == ElementHandle::line && staging.line()))
    return;
  const Angle held = reading ? staging.readout.reading.value : staging.line()->angle.value;
  const Pen pen{reading ? Role::reading : Role::line, 1.5, Dash::solid};
  for (const NamedDirection& direction :
       reading ? directionsForNormal(staging.readout) : directionsForLine(staging.readout)) {
    const bool rests = staging.glance.onSnap && coincide(direction.angle, held);
    if (!direction.byName && !rests)
      continue;
    for (const Angle end : {direction.angle, direction.angle + halfTurn})
      picture.parts.push_back(
          Path{{staging.geometry.pixel(end, 1),
                staging.geometry.pixel(end, 1 + (rests ? 8 : 5) / staging.geometry.frame.outer)},
               false,
               pen,
               {}});
  }
}

/// A rectangle round a bar, `off` pixels outside it.
Path roundBar(const Staging& staging, Angle end, double off, const Pen& pen) {
  const ElementFrame& frame = staging.geometry.frame;
  const double from = part::barFrom - off / frame.outer;
  const double to = part::barTo + off / frame.outer;
  const double half = part::barHalfWidth + off / frame.outer;
  return Path{{frame.in(end, from, half), frame.in(end, to, half), frame.in(end, to, -half),
               frame.in(end, from, -half)},
              true,
              pen,
              {}};
}

void addRound(Picture& picture, const Staging& staging, ElementHandle handle, double off, const Pen& pen) {
  if (handle == ElementHandle::reading)
    picture.parts.push_back(Arc{staging.geometry.pixel(staging.knob, part::knob),
                                part::knobRadius * staging.geometry.frame.outer + off,
                                0,
                                360,
                                pen,
                                {}});
  if (handle == ElementHandle::line && staging.line())
    for (const Angle end : {staging.line()->angle.value, staging.line()->angle.value + halfTurn})
      picture.parts.push_back(roundBar(staging, end, off, pen));
}

/// The second ring of a handle on a snap, and round it the ring of the keyboard's focus.
void addRings(Picture& picture, const Staging& staging) {
  const Role role = staging.glance.held == ElementHandle::line ? Role::line : Role::reading;
  if (staging.glance.onSnap)
    addRound(picture, staging, staging.glance.held, 3, {role, 1.5, Dash::solid});
  addRound(picture, staging, staging.glance.focused, staging.glance.onSnap ? 6 : 4,
           {Role::focus, 2, Dash::solid});
}

bool meetsKnob(const Staging& staging, const Box& box) {
  const Vec knob = staging.geometry.pixel(staging.knob, part::knob);
  const double reach = part::knobRadius * staging.geometry.frame.outer + 3;
  const double x = std::clamp(knob.x, box.left, box.right) - knob.x;
  const double y = std::clamp(knob.y, box.top, box.bottom) - knob.y;
  return std::hypot(x, y) < reach;
}

/// The letter of an axis stands outside the ring; where a label is in its way, inside beside the axis.
void addLetter(Picture& picture, const Staging& staging, Angle axis, const char* name,
               const std::vector<Label>& labels) {
  const ElementFrame& frame = staging.geometry.frame;
  const double outside = 1.02 + 11 / frame.outer;
  const double beside = 11 / frame.outer;
  const Vec places[] = {frame.in(axis, outside, 0), frame.in(axis, 0.92, -beside),
                        frame.in(axis, 0.92, beside), frame.in(axis, 0.66, -beside)};
  for (const Vec place : places) {
    const Label letter{place + Vec{0, 0.26 * elementText},
                       {{name, false}},
                       elementText,
                       Align::middle,
                       Role::soft,
                       false,
                       true,
                       name};
    const Box box = boxOf(letter);
    const bool taken = meetsKnob(staging, box) || std::ranges::any_of(labels, [&](const Label& label) {
                         return overlap(box, boxOf(label));
                       });
    if (taken && place != places[3])
      continue;
    picture.parts.push_back(letter);
    return;
  }
}

bool isZero(const Staging& staging) {
  return staging.readout.state().stress == PlaneStress{};
}

/// The labels that stand beside the ring: none in a narrow panel, no stresses where there are none yet, and
/// phi without its tolerance, which the band shows, where it would lie on a bar.
std::vector<LabelWish> wishesBeside(const Staging& staging, std::vector<LabelWish> wishes) {
  if (staging.geometry.compact)
    return {};
  const double room =
      staging.geometry.frame.centre.x - part::barTo * staging.geometry.frame.outer - 2 * elementText;
  for (LabelWish& wish : wishes)
    if (wish.key == "phi" && textWidth(wish.longForm, elementText, wish.bold) > room)
      wish.longForm = runs(symbol("φ %1").with(shownDegrees(staging.line()->angle.value, 1)));
  if (isZero(staging))
    std::erase_if(wishes, [](const LabelWish& wish) { return wish.key != "theta" && wish.key != "phi"; });
  return wishes;
}

/// The width of the widest stress that this state can show, so that columns stand still while it turns.
double widestStress(const Staging& staging) {
  const StateReading& state = staging.readout.state();
  const double largest = std::max(std::abs(state.circle.s1), std::abs(state.circle.s2));
  const Text words = symbol("τ_{nt} %1").with(shownStress(staging.study, state, -largest));
  return textWidth(runs(words), elementText, true);
}

template <class Part>
void addAll(Picture& picture, const std::vector<Part>& parts) {
  picture.parts.insert(picture.parts.end(), parts.begin(), parts.end());
}

} // namespace

ElementScene elementScene(const Study& study, const Readout& readout, const ElementGlance& glance,
                          const Translate& translate) {
  const Staging staging{study,
                        readout,
                        glance,
                        translate,
                        fittedElement(glance.size, readout.axes),
                        glance.knob.shown(readout.reading.value)};
  ElementScene scene;
  const ElementOrder order = orderFor(staging);
  Picture element;
  const std::vector<LabelWish> wishes = wishesBeside(staging, drawElement(element, study, readout, order));
  scene.sides = sidesOf(wishes, staging.geometry, glance.sides ? &*glance.sides : nullptr);
  const PlacedLabels placed = sideLabels(wishes, scene.sides, staging.geometry, glance.size,
                                         isZero(staging) ? 0 : widestStress(staging), elementText);
  Picture& picture = scene.picture;
  picture.width = glance.size.width();
  picture.height = glance.size.height();
  addAll(picture, placed.leaders);
  picture.parts.insert(picture.parts.end(), element.parts.begin(), element.parts.end());
  addNamedTicks(picture, staging);
  addAll(picture, placed.labels);
  addLetter(picture, staging, Angle(), "x", placed.labels);
  addLetter(picture, staging, Angle::fromDegrees(90), "y", placed.labels);
  drawKnob(picture, staging.geometry.frame, staging.knob, order);
  addRings(picture, staging);
  const ElementCaption caption{study, readout, staging.geometry.compact, glance.size, translate};
  addHeading(picture, caption, glance.snapping);
  addCaption(picture, caption, glance.held == ElementHandle::line);
  return scene;
}

} // namespace planewright

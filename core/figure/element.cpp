// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element.h"

#include "core/figure/element_arrows.h"
#include "core/figure/element_line.h"
#include "core/figure/element_texture.h"
#include "core/quantity/format.h"
#include "core/study/stress_form.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr Angle quarterTurn = Angle::fromDegrees(90);
constexpr Angle halfTurn = Angle::fromDegrees(180);
/// Turns (deg) by which an arc stops short of a handle that would cover its head.
constexpr double behindKnob = 3.2;
constexpr double behindBar = 2.8;

/// What one drawing of an element needs at hand.
struct Drawing {
  Picture& picture;
  const Study& study;
  const Readout& readout;
  const ElementOrder& order;
  ElementFrame frame;
  Angle normal; ///< of the n face as drawn
  StressForm stresses;

  void stroke(std::vector<Vec> points, const Pen& pen) const {
    picture.parts.push_back(Path{std::move(points), false, pen, {}});
  }
  const LineReading* line() const { return readout.lines.empty() ? nullptr : &readout.lines.front(); }
};

Pen solid(Role role, double width) {
  return {role, width, Dash::solid};
}

double arrowLength(const Drawing& drawing, double stress) {
  const StateReading& state = drawing.readout.state();
  const double shown = std::abs(drawing.stresses.inUnit(stress));
  if (2 * shown * std::pow(10.0, drawing.stresses.decimals) < 1)
    return 0;
  // In a study with compression positive the numbers are those of the negated tensor; the body is not.
  const double sense = drawing.study.convention.positive == Positive::tension ? 1 : -1;
  const double scaled = std::abs(stress) * arrowScale(state, part::arrowFull);
  return std::copysign(std::clamp(scaled, part::arrowLeast, part::arrowFull), sense * stress);
}

ElementArrows arrowsAt(const Drawing& drawing, Angle first) {
  ElementArrows arrows{first, {}};
  for (std::size_t i = 0; i < arrows.faces.size(); ++i) {
    const Angle face = i == 0 ? first : first + quarterTurn;
    const Traction acts = tractionOn(drawing.readout.state().stress, {face});
    arrows.faces[i] = {arrowLength(drawing, acts.sn), arrowLength(drawing, acts.tnt)};
  }
  return arrows;
}

std::vector<Vec> square(const ElementFrame& frame, Angle face) {
  const double half = part::halfSide;
  return {frame.in(face, half, -half), frame.in(face, half, half), frame.in(face, -half, half),
          frame.in(face, -half, -half)};
}

void drawAxes(const Drawing& drawing) {
  const ElementFrame& frame = drawing.frame;
  const double end = drawing.order.handles ? 1 : part::axisEnd;
  const double size = drawing.order.textSize;
  const double letter =
      (drawing.order.handles ? part::knob + part::knobRadius : end) + 0.75 * size / frame.outer;
  const Pen pen{Role::soft, drawing.order.narrow, Dash::shortDash};
  const std::pair<Angle, const char*> axes[] = {{Angle(), "x"}, {quarterTurn, "y"}};
  for (const auto& [direction, name] : axes) {
    drawing.stroke({frame.centre, frame.at(direction, end)}, pen);
    if (drawing.order.letters)
      drawing.picture.parts.push_back(Label{frame.at(direction, letter) + Vec{0, 0.26 * size},
                                            {{name, false}},
                                            size,
                                            Align::middle,
                                            Role::soft,
                                            false,
                                            false,
                                            name});
  }
}

void drawGivenSquare(const Drawing& drawing) {
  drawing.picture.parts.push_back(Path{
      square(drawing.frame, Angle()), true, Pen{Role::other, drawing.order.narrow, Dash::shortDash}, {}});
}

/// Arrows of the given axes under the turned ones, unless both would lie on each other.
void drawPaleArrows(const Drawing& drawing) {
  constexpr double least = 14;
  const double off = apart(drawing.normal, Angle()).degrees();
  if (std::min(off, 90 - off) >= least)
    drawArrows(drawing.picture, drawing.frame, arrowsAt(drawing, Angle()),
               solid(Role::other, drawing.order.medium), ArrowHead::open);
}

/// The spoke from the centre along the normal, dashed inside the body, and the angle theta.
void drawNormal(const Drawing& drawing) {
  const ElementFrame& frame = drawing.frame;
  const ElementOrder& order = drawing.order;
  const Angle theta = drawing.readout.reading.value;
  const double end = order.handles ? part::knob - part::knobRadius : part::axisEnd;
  drawing.stroke({frame.centre, frame.at(drawing.normal, part::halfSide)},
                 {Role::reading, order.narrow, Dash::shortDash});
  drawing.stroke({frame.at(drawing.normal, part::halfSide), frame.at(drawing.normal, end)},
                 solid(Role::reading, order.narrow));
  if (order.otherFace)
    drawing.stroke({frame.centre, frame.at(theta, order.handles ? 1 : part::axisEnd)},
                   {Role::reading, order.narrow, Dash::shortDash});
  const bool knobCovers = order.handles && !order.otherFace;
  drawAngle(drawing.picture, frame, theta, order.handles ? 1 : part::axisEnd, knobCovers ? behindKnob : 0,
            solid(Role::reading, order.medium));
}

/// The turned square; its n face is the cut, with the right angle where the normal leaves it.
void drawTurnedSquare(const Drawing& drawing) {
  const ElementFrame& frame = drawing.frame;
  const ElementOrder& order = drawing.order;
  const PlaneStress& stress = drawing.readout.state().stress;
  const std::vector<Vec> corners = square(frame, drawing.normal);
  const Pen outline =
      stress == PlaneStress{} ? Pen{Role::other, order.narrow, Dash::dotted} : solid(Role::state, order.wide);
  drawing.picture.parts.push_back(Path{corners, true, outline, {}});
  drawing.stroke({corners[0], corners[1]}, solid(Role::reading, order.cut));
  constexpr double leg = 0.055;
  const double face = part::halfSide;
  drawing.stroke({frame.in(drawing.normal, face, leg), frame.in(drawing.normal, face - leg, leg),
                  frame.in(drawing.normal, face - leg, 0)},
                 solid(Role::reading, order.narrow));
}

LabelWish wish(const Drawing& drawing, const char* key, Vec mark, const Text& longForm, const char* shortForm,
               Role role, int priority) {
  return {mark,
          runs(longForm, drawing.order.translate),
          runs(symbol(shortForm), drawing.order.translate),
          role,
          role != Role::ink,
          priority,
          key};
}

LabelWish stressWish(const Drawing& drawing, const char* key, const std::string& name, double stress,
                     Vec mark, Role role, int priority) {
  const std::string value = drawing.stresses.shown(stress);
  return wish(drawing, key, mark, symbol(name + " %1").with(value), name.c_str(), role, priority);
}

LabelWish lineWish(const Drawing& drawing) {
  const LineReading& line = *drawing.line();
  const Angle end = drawing.order.otherEnd ? line.angle.value : line.angle.value + halfTurn;
  const std::string phi = shownDegrees(line.angle.value, 1);
  const bool whole = std::round(line.tolerance.degrees()) == line.tolerance.degrees();
  const std::string tolerance = shownDegrees(line.tolerance, whole ? 0 : 1);
  const Text words =
      line.tolerance == Angle() ? symbol("φ %1").with(phi) : symbol("φ %1 ± %2").with(phi).with(tolerance);
  const double radius = drawing.order.handles ? part::barTo + 0.01 : part::lineEnd;
  return wish(drawing, "phi", drawing.frame.at(end, radius), words, "φ", Role::line, 2);
}

/// A further line goes by its name; nothing turns it here.
LabelWish furtherLineWish(const Drawing& drawing, const LineReading& line) {
  const Text words = PW_TEXT("Figure", "%1 %2").with(line.name).with(shownDegrees(line.angle.value, 1));
  return {drawing.frame.at(line.angle.value + halfTurn, part::lineEnd),
          runs(words, drawing.order.translate),
          runs(verbatim(line.name), drawing.order.translate),
          Role::line,
          true,
          4,
          "line"};
}

/// The tip of the shear arrow on a face.
Vec shearTip(const Drawing& drawing, Angle face, const FaceArrows& acts) {
  return drawing.frame.in(face, part::shear, acts.shear / 2);
}

std::vector<LabelWish> turnedWishes(const Drawing& drawing, const ElementArrows& arrows) {
  const ElementFrame& frame = drawing.frame;
  const Angle n = drawing.normal;
  const Angle t = n + quarterTurn;
  const Traction acts = drawing.readout.state().reading;
  const double onT = tractionOn(drawing.readout.state().stress, {t}).sn;
  const Angle theta = drawing.readout.reading.value;
  const Angle half = Angle::fromDegrees(theta.degrees() / 2);
  const double ring = drawing.order.handles ? 1 : part::axisEnd;
  return {
      stressWish(drawing, "sigma_n", "σ_{n}", acts.sn, frame.at(n, normalEnd(arrows.faces[0])), Role::state,
                 0),
      stressWish(drawing, "tau_nt", "τ_{nt}", acts.tnt, shearTip(drawing, n, arrows.faces[0]), Role::state,
                 1),
      wish(drawing, "theta", frame.at(half, ring), symbol("θ %1").with(shownDegrees(theta, 1)), "θ",
           Role::reading, 1),
      stressWish(drawing, "sigma_t", "σ_{t}", onT, frame.at(t, normalEnd(arrows.faces[1])), Role::state, 3)};
}

std::vector<LabelWish> givenWishes(const Drawing& drawing, const ElementArrows& arrows) {
  const ElementFrame& frame = drawing.frame;
  const PlaneStress& stress = drawing.readout.state().stress;
  return {stressWish(drawing, "sigma_x", "σ_{x}", stress.sx, frame.at(Angle(), normalEnd(arrows.faces[0])),
                     Role::ink, 0),
          stressWish(drawing, "tau_xy", "τ_{xy}", stress.txy, shearTip(drawing, Angle(), arrows.faces[0]),
                     Role::ink, 1),
          stressWish(drawing, "sigma_y", "σ_{y}", stress.sy,
                     frame.at(quarterTurn, normalEnd(arrows.faces[1])), Role::ink, 0)};
}

std::vector<LabelWish> drawTurned(const Drawing& drawing) {
  const ElementArrows arrows = arrowsAt(drawing, drawing.normal);
  drawNormal(drawing);
  if (drawing.order.givenArrows)
    drawPaleArrows(drawing);
  drawTurnedSquare(drawing);
  drawArrows(drawing.picture, drawing.frame, arrows, solid(Role::state, drawing.order.medium),
             ArrowHead::filled);
  return turnedWishes(drawing, arrows);
}

std::vector<LabelWish> drawGiven(const Drawing& drawing) {
  const ElementArrows arrows = arrowsAt(drawing, Angle());
  drawGivenSquare(drawing);
  drawArrows(drawing.picture, drawing.frame, arrows, solid(Role::state, drawing.order.medium),
             ArrowHead::filled);
  return givenWishes(drawing, arrows);
}

} // namespace

double arrowScale(const StateReading& state, double full) {
  const double largest = std::max(std::abs(state.circle.s1), std::abs(state.circle.s2));
  return largest < 1e-300 ? 0 : full / largest;
}

std::vector<LabelWish> drawElement(Picture& picture, const Study& study, const Readout& readout,
                                   const ElementOrder& order) {
  const ElementFrame frame{order.centre, order.outer, readout.axes};
  const Angle normal =
      !order.turned ? Angle() : readout.reading.value + (order.otherFace ? halfTurn : Angle());
  const Drawing drawing{picture, study, readout, order, frame, normal, stressFormOf(study, readout.state())};
  const LineReading* line = drawing.line();
  if (order.handles)
    drawRing(picture, frame, order);
  drawAxes(drawing);
  if (order.turned && order.givenSquare)
    drawGivenSquare(drawing);
  if (line) {
    drawTexture(picture, frame, line->kind, line->angle.value, normal, solid(Role::grain, order.hair));
    drawLine(picture, frame, *line, order);
  }
  for (std::size_t i = 1; i < readout.lines.size(); ++i) {
    const Angle phi = readout.lines[i].angle.value;
    drawing.stroke({frame.at(phi + halfTurn, part::lineEnd), frame.at(phi, part::lineEnd)},
                   Pen{Role::line, order.hair, Dash::longDashDot});
  }
  std::vector<LabelWish> wishes = order.turned ? drawTurned(drawing) : drawGiven(drawing);
  if (line) {
    wishes.push_back(lineWish(drawing));
    if (order.lineArc)
      drawAngle(picture, frame, line->angle.value, part::lineEnd, order.handles ? behindBar : 0,
                solid(Role::line, order.medium));
    if (order.handles)
      drawBars(picture, frame, line->angle.value, order);
  }
  for (std::size_t i = 1; i < readout.lines.size(); ++i)
    wishes.push_back(furtherLineWish(drawing, readout.lines[i]));
  if (order.handles && order.knob)
    drawKnob(picture, frame, normal, order);
  return wishes;
}

} // namespace planewright

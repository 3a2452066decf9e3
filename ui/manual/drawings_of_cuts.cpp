// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/drawings_of_cuts.h"

#include "core/quantity/angle.h"

#include <cmath>

namespace planewright {

namespace {

constexpr double thin = 1;
constexpr double medium = 1.6;
constexpr double textSize = 14;

/// A place `along` a direction and `left` of it from the centre; angles run counter-clockwise from +x.
struct Frame {
  Vec centre;
  Vec in(double degrees, double along, double left = 0) const {
    const CosSin d = cosSin(Angle::fromDegrees(degrees));
    return centre + Vec{along * d.cos - left * d.sin, -along * d.sin - left * d.cos};
  }
};

void line(Picture& picture, Vec from, Vec to, const Pen& pen) {
  picture.parts.emplace_back(Path{{from, to}, false, pen, {}});
}

void label(Picture& picture, Vec at, std::string_view words, Role role, Align align = Align::start) {
  Label written;
  written.at = at;
  written.runs = runs(symbol(words));
  written.size = textSize;
  written.align = align;
  written.role = role;
  written.ground = true;
  picture.parts.emplace_back(written);
}

/// The head of an arrow that ends in `tip`, as seen in a direction.
void head(Picture& picture, const Frame& frame, double degrees, double tip, Role role) {
  picture.parts.emplace_back(
      Path{{frame.in(degrees, tip), frame.in(degrees, tip - 11, 4), frame.in(degrees, tip - 11, -4)},
           true,
           {},
           role});
}

/// The arc of an angle from +x, with its head.
void angleArc(Picture& picture, const Frame& frame, double radius, double degrees, Role role) {
  picture.parts.emplace_back(Arc{frame.centre, radius, 0, degrees, Pen{role, thin, Dash::solid}, {}});
  const double back = 10 / radius * 57.29578;
  const Vec root = frame.in(degrees - back, radius);
  const Vec across = frame.in(degrees - back, radius + 3.5) - root;
  picture.parts.emplace_back(Path{{frame.in(degrees, radius), root + across, root - across}, true, {}, role});
}

void axisX(Picture& picture, const Frame& frame, double length) {
  line(picture, frame.centre, frame.in(0, length), {Role::soft, thin, Dash::shortDash});
  label(picture, frame.in(0, length + 5, -5), "x", Role::soft);
}

/// The line's direction as strokes in the half of a disc that the cut leaves, its normal at `normal`.
void texture(Picture& picture, const Frame& frame, double phi, bool crosses, double radius) {
  constexpr double step = 11;
  for (int row = -6; row <= 6; ++row) {
    const double left = step * row;
    if (std::abs(left) >= radius || (!crosses && row > -1))
      continue;
    const double half = std::sqrt(radius * radius - left * left) - 2;
    line(picture, frame.in(phi, -half, left), frame.in(phi, crosses ? -3 : half, left),
         {Role::grain, medium, Dash::solid});
  }
}

} // namespace

Picture cutByLine(bool crosses) {
  constexpr double phi = 20;
  constexpr double radius = 78;
  const double normal = crosses ? phi : phi + 90;
  Picture picture;
  picture.width = 300;
  picture.height = 250;
  const Frame frame{{crosses ? 125.0 : 140.0, 140}};
  picture.parts.emplace_back(
      Arc{frame.centre, radius, normal + 90, 180, Pen{Role::state, medium, Dash::solid}, {}});
  texture(picture, frame, phi, crosses, radius);
  line(picture, frame.in(phi, -radius - 22), frame.in(phi, crosses ? 140 : radius + 22),
       {Role::line, medium, Dash::longDashDot});
  axisX(picture, frame, crosses ? 130 : 118);
  angleArc(picture, frame, crosses ? 96 : 92, phi, Role::line);
  label(picture, frame.in(phi / 2, crosses ? 102 : 98, -4), "φ", Role::line);
  if (!crosses) {
    angleArc(picture, frame, 52, normal, Role::reading);
    label(picture, frame.in(52, 58, -2), "θ = φ + 90°", Role::reading);
  }
  line(picture, frame.in(normal - 90, radius), frame.in(normal + 90, radius),
       {Role::reading, 4, Dash::solid});
  const double tip = crosses ? 72 : 100;
  line(picture, frame.centre, frame.in(normal, tip - 8), {Role::reading, 2, Dash::solid});
  head(picture, frame, normal, tip, Role::reading);
  label(picture, frame.in(normal, crosses ? 60 : tip + 4, crosses ? 12 : -8), crosses ? "n, θ = φ" : "n",
        Role::reading, crosses ? Align::middle : Align::start);
  picture.parts.emplace_back(Path{{frame.in(normal, 10), frame.in(normal, 10, 10), frame.in(normal, 0, 10)},
                                  false,
                                  Pen{Role::reading, thin, Dash::solid},
                                  {}});
  return picture;
}

Picture slopeOfOneInTen() {
  Picture picture;
  picture.width = 300;
  picture.height = 76;
  const Vec low{24, 50};
  const Vec right{264, 50};
  const Vec high{264, 26};
  picture.parts.emplace_back(Path{{low, right, high}, true, Pen{Role::soft, thin, Dash::solid}, Role::band});
  line(picture, low, high, {Role::line, 2, Dash::solid});
  label(picture, {144, 68}, "10", Role::ink, Align::middle);
  label(picture, {272, 43}, "1", Role::ink);
  label(picture, {70, 32}, "φ = atan(1/10) = 5.71°", Role::line);
  return picture;
}

Picture gaugesOfRosette() {
  Picture picture;
  picture.width = 300;
  picture.height = 190;
  const Frame frame{{110, 150}};
  struct Gauge {
    double angle;
    const char* name;
  };
  axisX(picture, frame, 150);
  angleArc(picture, frame, 66, 45, Role::soft);
  angleArc(picture, frame, 44, 90, Role::soft);
  label(picture, frame.in(24, 72, -4), "α_{b}", Role::soft);
  label(picture, frame.in(60, 26), "α_{c}", Role::soft, Align::middle);
  for (const Gauge& gauge : {Gauge{0, "a"}, Gauge{45, "b"}, Gauge{90, "c"}}) {
    line(picture, frame.in(gauge.angle, 78), frame.in(gauge.angle, 118), {Role::state, 7, Dash::solid});
    label(picture, frame.in(gauge.angle, 96, gauge.angle == 0 ? 12 : 14), gauge.name, Role::state,
          Align::end);
  }
  return picture;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element_texture.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>

namespace planewright {

namespace {

/// A stroke in the line's own axes, parts of R: `u` along the line, `v` to its left.
struct Stroke {
  double u0, v0, u1, v1;
};

constexpr double spacing = 0.05;
constexpr double reach = 0.54; ///< half diagonal of the square
constexpr double inset = 0.02; ///< strokes stay off the outline

// Grain must not look like a regular hatch: lengths and starts come from these tables, always the same.
constexpr std::array lengths = {0.31, 0.22, 0.40, 0.18, 0.35, 0.27, 0.42, 0.20, 0.38, 0.25, 0.29};
constexpr std::array starts = {0.00, 0.17, 0.06, 0.29, 0.11, 0.23, 0.03};
constexpr double gap = 0.045;

void addBothWays(std::vector<Stroke>& strokes, const Stroke& stroke) {
  strokes.push_back(stroke);
  strokes.push_back({-stroke.u0, -stroke.v0, -stroke.u1, -stroke.v1});
}

std::vector<Stroke> grainStrokes() {
  std::vector<Stroke> strokes;
  std::size_t row = 0;
  for (double v = spacing / 2; v < reach; v += spacing, ++row) {
    double u = -reach - starts[row % starts.size()];
    for (std::size_t i = 4 * row; u < reach; ++i) {
      const double length = lengths[i % lengths.size()];
      addBothWays(strokes, {u, v, u + length, v});
      u += length + gap;
    }
  }
  return strokes;
}

std::vector<Stroke> fibreStrokes() {
  std::vector<Stroke> strokes;
  for (double v = spacing / 2; v < reach; v += spacing)
    addBothWays(strokes, {-reach, v, reach, v});
  return strokes;
}

std::vector<Stroke> weldStrokes() {
  constexpr double tick = 0.05;
  constexpr double pitch = 0.07;
  std::vector<Stroke> strokes = {{-reach, 0, reach, 0}};
  for (double u = pitch / 2; u < reach; u += pitch)
    addBothWays(strokes, {u, -tick, u, tick});
  return strokes;
}

std::vector<Stroke> bondStrokes() {
  constexpr double half = 0.03;
  std::vector<Stroke> strokes;
  addBothWays(strokes, {-reach, half, reach, half});
  return strokes;
}

std::vector<Stroke> strokesOf(LineKind kind) {
  switch (kind) {
  case LineKind::grain:
    return grainStrokes();
  case LineKind::fibre:
    return fibreStrokes();
  case LineKind::weld:
    return weldStrokes();
  case LineKind::bond:
    return bondStrokes();
  case LineKind::other:
    break;
  }
  return {};
}

/// Narrows [from, to] to the parameters at which start + parameter * step lies within +-limit.
bool narrow(double start, double step, double limit, double& from, double& to) {
  if (step == 0)
    return std::abs(start) <= limit;
  const auto [enter, leave] = std::minmax({(-limit - start) / step, (limit - start) / step});
  from = std::max(from, enter);
  to = std::min(to, leave);
  return from < to;
}

/// The part of the stroke inside the square that is turned by `relative` against the line.
std::optional<Stroke> clipped(const Stroke& stroke, CosSin relative) {
  const auto x = [&](double u, double v) { return u * relative.cos + v * relative.sin; };
  const auto y = [&](double u, double v) { return v * relative.cos - u * relative.sin; };
  const double du = stroke.u1 - stroke.u0;
  const double dv = stroke.v1 - stroke.v0;
  const double limit = part::halfSide - inset;
  double from = 0;
  double to = 1;
  if (!narrow(x(stroke.u0, stroke.v0), x(du, dv), limit, from, to) ||
      !narrow(y(stroke.u0, stroke.v0), y(du, dv), limit, from, to))
    return std::nullopt;
  return Stroke{stroke.u0 + from * du, stroke.v0 + from * dv, stroke.u0 + to * du, stroke.v0 + to * dv};
}

} // namespace

void drawTexture(Picture& picture, const ElementFrame& frame, LineKind kind, Angle line, Angle square,
                 const Pen& pen) {
  const CosSin relative = cosSin(square - line);
  for (const Stroke& stroke : strokesOf(kind))
    if (const std::optional<Stroke> inside = clipped(stroke, relative))
      picture.parts.push_back(Path{
          {frame.in(line, inside->u0, inside->v0), frame.in(line, inside->u1, inside->v1)}, false, pen, {}});
}

} // namespace planewright

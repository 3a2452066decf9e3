// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/failure_drawing.h"

#include "core/figure/metrics.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

// In pixels of the window.
constexpr double lineWidth = 2;
constexpr double hatchStep = 14;
constexpr double hatchLength = 7;
constexpr double triangle = 5;
constexpr double headLength = 6;

struct Stretch {
  Vec from, to;
  double length() const { return std::hypot(to.x - from.x, to.y - from.y); }
  Vec along() const { return (1 / length()) * (to - from); }
};

/// The part of a stretch inside a box; none where it passes by (the parametric clipping of Liang and Barsky).
std::optional<Stretch> clipped(const Stretch& line, const Box& box) {
  double from = 0;
  double to = 1;
  const auto cut = [&](double step, double room) {
    if (step == 0)
      return room >= 0;
    double& end = step < 0 ? from : to;
    end = step < 0 ? std::max(end, room / step) : std::min(end, room / step);
    return from <= to;
  };
  const Vec d = line.to - line.from;
  if (!cut(-d.x, line.from.x - box.left) || !cut(d.x, box.right - line.from.x) ||
      !cut(-d.y, line.from.y - box.top) || !cut(d.y, box.bottom - line.from.y))
    return std::nullopt;
  const Stretch part{line.from + from * d, line.from + to * d};
  return part.length() > 0 ? std::optional(part) : std::nullopt;
}

bool contains(const Box& box, Vec at) {
  return at.x >= box.left && at.x <= box.right && at.y >= box.top && at.y <= box.bottom;
}

class Drawing {
public:
  explicit Drawing(const FailureFrame& frame) : m_frame(frame) {}

  Picture drawn(const std::vector<FailureLine>& lines) {
    for (const FailureLine& line : lines) {
      m_role = roleOf(line);
      for (const double side : {1.0, -1.0})
        drawLine(line, side);
      drawMargin(line);
      drawTouch(line);
    }
    return std::move(m_picture);
  }

private:
  double px(double pixels) const { return pixels * m_frame.unit; }

  void stroke(const Stretch& part, double width) {
    m_picture.parts.emplace_back(Path{{part.from, part.to}, false, Pen{m_role, px(width)}, std::nullopt});
  }

  void drawLine(const FailureLine& line, double side) {
    const auto place = [&](const Traction& at) { return m_frame.at({at.sn, side * at.tnt}); };
    const Vec within = m_frame.at({line.upper.front().sn, 0});
    double walked = px(hatchStep) / 2;
    for (std::size_t i = 1; i < line.upper.size(); ++i) {
      const auto part = clipped({place(line.upper[i - 1]), place(line.upper[i])}, m_frame.plot);
      if (!part)
        continue;
      stroke(*part, line.leads ? lineWidth : 1);
      hatch(*part, within, walked);
    }
  }

  /// Strokes on the side away from what holds.
  void hatch(const Stretch& part, Vec within, double& walked) {
    const Vec along = part.along();
    const Vec across{-along.y, along.x};
    const Vec away = 0.5 * (part.from + part.to) - within;
    const double sense = across.x * away.x + across.y * away.y < 0 ? -1 : 1;
    const Vec slant = sense * across + 0.6 * along;
    for (; walked < part.length(); walked += px(hatchStep)) {
      const Vec at = part.from + walked * along;
      if (const auto one = clipped({at, at + px(hatchLength) * slant}, m_frame.plot))
        stroke(*one, 1);
    }
    walked -= part.length();
  }

  void head(Vec tip, Vec from) {
    const Vec along = Stretch{from, tip}.along();
    const Vec across{-along.y, along.x};
    const Vec base = tip - px(headLength) * along;
    m_picture.parts.emplace_back(
        Path{{tip, base + px(0.4 * headLength) * across, base - px(0.4 * headLength) * across},
             true,
             std::nullopt,
             m_role});
  }

  void drawMargin(const FailureLine& line) {
    if (!line.marginEnd)
      return;
    const Stretch whole{m_frame.at(line.planeAt), m_frame.at(*line.marginEnd)};
    const auto part = clipped(whole, m_frame.plot);
    if (!part || part->length() < px(3 * headLength))
      return;
    stroke(*part, 1);
    for (const auto& [tip, from] : {std::pair{part->from, part->to}, std::pair{part->to, part->from}})
      head(tip, from);
  }

  void drawTouch(const FailureLine& line) {
    if (!line.touch)
      return;
    const Vec tip = m_frame.at(line.touchAt);
    if (!contains(m_frame.plot, tip))
      return;
    const double side = px(triangle);
    m_picture.parts.emplace_back(
        Path{{tip, tip + Vec{-side, -1.7 * side}, tip + Vec{side, -1.7 * side}}, true, std::nullopt, m_role});
  }

  const FailureFrame& m_frame;
  Picture m_picture;
  Role m_role = Role::limit; ///< of the line that is drawn
};

} // namespace

Picture failureDrawing(const FailureFrame& frame, const std::vector<FailureLine>& lines) {
  return Drawing(frame).drawn(lines);
}

} // namespace planewright

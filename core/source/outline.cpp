// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/pieces.h"

namespace planewright {

namespace {

/// Walks along an outline by points and by corners rounded inwards.
class Walk {
public:
  explicit Walk(const SectionPoint& start) : m_start(start), m_at(start) {}

  Walk& to(const SectionPoint& point) {
    m_contour.push_back({m_at, point});
    m_at = point;
    return *this;
  }
  /// To a point over a quarter circle about the centre.
  Walk& around(const SectionPoint& centre, double radius, const SectionPoint& point) {
    if (radius > 0)
      m_contour.push_back({m_at, point, centre, radius});
    m_at = point;
    return *this;
  }
  Contour closed() {
    to(m_start);
    return std::move(m_contour);
  }

private:
  SectionPoint m_start;
  SectionPoint m_at;
  Contour m_contour;
};

Contour ofI(const Section& s) {
  const double h = s.size("h");
  const double low = s.size("t_bottom");
  const double high = h - s.size("t_top");
  const double bottom = s.size("b_bottom") / 2;
  const double top = s.size("b_top") / 2;
  const double web = s.size("t_w") / 2;
  const double r = s.size("r");
  return Walk({0, -bottom})
      .to({0, bottom})
      .to({low, bottom})
      .to({low, web + r})
      .around({low + r, web + r}, r, {low + r, web})
      .to({high - r, web})
      .around({high - r, web + r}, r, {high, web + r})
      .to({high, top})
      .to({h, top})
      .to({h, -top})
      .to({high, -top})
      .to({high, -web - r})
      .around({high - r, -web - r}, r, {high - r, -web})
      .to({low + r, -web})
      .around({low + r, -web - r}, r, {low, -web - r})
      .to({low, -bottom})
      .closed();
}

Contour ofT(const Section& s) {
  const double h = s.size("h");
  const double junction = h - s.size("t_f");
  const double web = s.size("t_w") / 2;
  const double flange = s.size("b") / 2;
  return polygon({{0, -web},
                  {0, web},
                  {junction, web},
                  {junction, flange},
                  {h, flange},
                  {h, -flange},
                  {junction, -flange},
                  {junction, -web}});
}

Contour ofChannel(const Section& s) {
  const double h = s.size("h");
  const double b = s.size("b");
  const double web = s.size("t_w");
  const double t = s.size("t_f");
  return polygon({{0, 0}, {0, b}, {t, b}, {t, web}, {h - t, web}, {h - t, b}, {h, b}, {h, 0}});
}

Contour rectangleOf(double b, double h) {
  return polygon({{-h / 2, -b / 2}, {-h / 2, b / 2}, {h / 2, b / 2}, {h / 2, -b / 2}});
}

std::vector<Contour> placedOutline(const Section& s) {
  switch (s.shape) {
  case SectionShape::box:
    return {rectangleOf(s.size("b"), s.size("h")),
            reversed(rectangleOf(s.size("b") - 2 * s.size("t_w"), s.size("h") - 2 * s.size("t_f")))};
  case SectionShape::tube:
    return {circle(s.size("d") / 2), reversed(circle(s.size("d") / 2 - s.size("t")))};
  case SectionShape::i:
    return {ofI(s)};
  case SectionShape::t:
    return {ofT(s)};
  case SectionShape::channel:
    return {ofChannel(s)};
  default:
    break;
  }
  std::vector<Contour> contours;
  for (const Piece& piece : piecesOf(s))
    contours.push_back(piece.contour);
  return contours;
}

} // namespace

std::vector<Contour> outlineOf(const Section& section) {
  std::vector<Contour> contours = placedOutline(section);
  AreaMoments moments;
  for (const Contour& contour : contours)
    moments = moments + momentsOf(contour);
  for (Contour& contour : contours)
    contour = moved(contour, -moments.y / moments.area, -moments.z / moments.area);
  return contours;
}

} // namespace planewright

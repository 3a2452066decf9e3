// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/section_drawing.h"

#include "core/figure/setting.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

constexpr double wide = 1.5;
constexpr double narrow = 0.75;
constexpr double margin = 8;
constexpr double leastSide = 60; ///< below it nothing can be told apart
constexpr int arcSteps = 8;      ///< of an arc of at most a quarter circle

/// Where the curves of one stress run: the zero line and the reach of its greatest value.
struct Strip {
  Text name;
  const std::vector<Curve>& curves;
  double here = 0; ///< the value at the fibre
};

class Drawing {
public:
  Drawing(const LoadedSection& section, const StressForm& stresses, double width, double height, double size)
      : m_section(section), m_stresses(stresses), m_size(size), m_seesSide(section.fibre.view == View::side) {
    m_drawing.picture.width = width;
    m_drawing.picture.height = height;
    layOut();
  }

  SectionDrawing drawn() {
    drawOutline();
    drawAxes();
    drawStrips();
    drawMark();
    describe();
    return std::move(m_drawing);
  }

private:
  const Region& region() const { return m_section.model.region; }
  Picture& picture() { return m_drawing.picture; }
  const SectionFrame& frame() const { return m_drawing.frame; }

  /// The outline takes the first 45 of 100 of the room along which the strips follow.
  void layOut() {
    const double room = 2.0 * margin;
    const double share = 0.45;
    const double head = 1.6 * m_size;
    const double width = m_seesSide ? share * picture().width : picture().width;
    const double height = m_seesSide ? picture().height - head : share * picture().height;
    const double scale = std::min((width - room) / (region().zHigh - region().zLow),
                                  (height - room) / (region().yHigh - region().yLow));
    const Vec middle{width / 2, (m_seesSide ? head : 0) + height / 2};
    m_drawing.frame = {{middle.x - scale * (region().zHigh + region().zLow) / 2,
                        middle.y + scale * (region().yHigh + region().yLow) / 2},
                       scale};
    m_end = m_seesSide ? width : height;
  }

  Path outlinePath(const Contour& contour, std::optional<Role> fill) const {
    Path path{{}, true, Pen{Role::state, wide, Dash::solid}, fill};
    for (const Edge& edge : contour) {
      path.points.push_back(frame().at(edge.from));
      if (edge.radius == 0)
        continue;
      const double start = std::atan2(edge.from.y - edge.centre.y, edge.from.z - edge.centre.z);
      const double end = std::atan2(edge.to.y - edge.centre.y, edge.to.z - edge.centre.z);
      const double sweep = std::remainder(end - start, 2 * std::numbers::pi);
      for (int i = 1; i < arcSteps; ++i) {
        const double angle = start + sweep * i / arcSteps;
        path.points.push_back(frame().at(
            {edge.centre.y + edge.radius * std::sin(angle), edge.centre.z + edge.radius * std::cos(angle)}));
      }
    }
    return path;
  }

  // The second contour of a hollow shape is its hole.
  void drawOutline() {
    const std::vector<Contour> outlines = outlineOf(m_section.model.section);
    const bool isBuilt = m_section.model.section.shape == SectionShape::built;
    for (std::size_t i = 0; i < outlines.size(); ++i)
      picture().parts.push_back(outlinePath(outlines[i], i == 0 || isBuilt ? Role::grid : Role::canvas));
  }

  void drawAxes() {
    const Pen pen{Role::soft, narrow, Dash::longDashDot};
    const SectionFrame& at = frame();
    setLine(picture(), at.at({0, region().zLow}) - Vec{margin, 0},
            at.at({0, region().zHigh}) + Vec{margin, 0}, pen);
    setLine(picture(), at.at({region().yLow, 0}) + Vec{0, margin},
            at.at({region().yHigh, 0}) - Vec{0, margin}, pen);
  }

  void drawStrips() {
    const Result<Distribution> distribution =
        distributionThrough(m_section.model, m_section.forces, m_section.fibre, m_section.rule);
    if (!distribution)
      return;
    const Result<FibreStress> here =
        stressAt(m_section.model, m_section.forces, m_section.fibre, m_section.rule);
    const double sx = here ? m_section.sense * here->stress.sx : 0;
    const double txy = here ? m_section.sense * here->stress.txy : 0;
    const double end = m_seesSide ? picture().width : picture().height;
    const double room = (end - m_end) / 2;
    drawStrip({symbol("σ_{x}"), distribution->sx, sx}, m_end, room);
    drawStrip({symbol("τ_{xy}"), distribution->txy, txy}, m_end + room, room);
  }

  /// A place along the depth and a distance across it, on the sheet.
  Vec place(double along, double across) const {
    const Vec at = m_seesSide ? frame().at({along, 0}) : frame().at({0, along});
    return m_seesSide ? Vec{across, at.y} : Vec{at.x, across};
  }

  void drawStrip(const Strip& strip, double start, double room) {
    const double zero = start + room / 2;
    const double reach = 0.5 * room - margin;
    double greatest = 0;
    for (const Curve& curve : strip.curves)
      for (const CurvePoint& point : curve)
        greatest = std::max(greatest, std::abs(point.value));
    // Values count to the right, and upwards below the section.
    const double perValue = greatest > 0 ? (m_seesSide ? reach : -reach) / greatest : 0;
    const double low = m_seesSide ? region().yLow : region().zLow;
    const double high = m_seesSide ? region().yHigh : region().zHigh;
    for (const Curve& curve : strip.curves) {
      Path path{{}, true, Pen{Role::state, narrow, Dash::solid}, Role::hush};
      if (curve.empty())
        continue;
      path.points.push_back(place(curve.front().at, zero));
      for (const CurvePoint& point : curve)
        path.points.push_back(place(point.at, zero + perValue * m_section.sense * point.value));
      path.points.push_back(place(curve.back().at, zero));
      picture().parts.push_back(std::move(path));
    }
    setLine(picture(), place(low, zero), place(high, zero), {Role::ink, narrow, Dash::solid});
    const double level = m_seesSide ? m_section.fibre.y : m_section.fibre.z;
    setLine(picture(), place(level, zero), place(level, zero + perValue * strip.here),
            {Role::reading, wide, Dash::solid});
    setStripWords(strip, start, room);
  }

  void setStripWords(const Strip& strip, double start, double room) {
    const Text words = PW_TEXT("Section", "%1 %2").with(strip.name).with(m_stresses.shown(strip.here));
    const Vec at = m_seesSide ? Vec{start + room / 2, 1.1 * m_size} : Vec{margin, start + 1.1 * m_size};
    setWords(picture(), at, runs(words), m_size, m_seesSide ? Align::middle : Align::start, Role::ink);
  }

  void drawMark() {
    const Vec at = frame().at({m_section.fibre.y, m_section.fibre.z});
    picture().parts.push_back(Arc{at, 4.5, 0, 360, Pen{Role::canvas, narrow, Dash::solid}, Role::reading});
    // The side that is looked at: a stroke from where the viewer stands.
    const Vec towards = m_seesSide ? Vec{12, 0} : Vec{0, -12};
    setLine(picture(), at, at + towards, {Role::reading, wide, Dash::solid});
  }

  void describe() { picture().description = plain(labelOf(m_section.model.section.shape)); }

  const LoadedSection& m_section;
  const StressForm& m_stresses;
  double m_size;
  bool m_seesSide;
  double m_end = 0; ///< of the outline's share, where the strips begin
  SectionDrawing m_drawing;
};

} // namespace

std::optional<SectionDrawing> drawnSection(const LoadedSection& section, const StressForm& stresses,
                                           double width, double height, double size) {
  if (section.model.isTabled() || width < leastSide || height < leastSide)
    return std::nullopt;
  return Drawing(section, stresses, width, height, size).drawn();
}

} // namespace planewright

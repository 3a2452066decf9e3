// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/shear_at.h"

#include "core/quantity/format.h"
#include "core/source/seen.h"
#include "core/words/decimal_sign.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

View acrossOf(View view) {
  return view == View::side ? View::top : View::side;
}

/// The wall around a fibre in one view: what the level line through it meets on either side of the level.
std::array<std::optional<Span>, 2> levelSpans(const Seen& seen) {
  const double level = nearestLevelOr(seen.region, seen.v);
  return {spanHolding(seen.region, level, seen.w, Side::below),
          spanHolding(seen.region, level, seen.w, Side::above)};
}

class ShearAtFibre {
public:
  ShearAtFibre(const SectionModel& model, const Gradient& gradient, const Fibre& fibre)
      : m_model(model), m_fibre(fibre), m_seen(model, fibre),
        m_across(model, {fibre.y, fibre.z, acrossOf(fibre.view)}), m_gradient(gradient) {}

  Result<ShearOfV> shear() {
    addAcross();
    if (isOnFreeEdge()) {
      m_result.path = ShearPath::freeEdge;
      return m_result;
    }
    if (const std::optional<Cut> cut = wallCutAt(m_seen.region, m_seen.v, m_seen.w)) {
      m_result.path = ShearPath::wall;
      m_result.cut = *cut;
      return inWall();
    }
    return inClosedSection();
  }

private:
  bool seesSide() const { return m_seen.view == View::side; }
  /// Of the force that shears the view's plane, and of the one across it.
  double own() const { return seesSide() ? m_gradient.y : m_gradient.z; }
  double other() const { return seesSide() ? m_gradient.z : m_gradient.y; }

  double flowOf(const Cut& cut) const { return own() * cut.S + other() * cut.across; }

  /// Whether no material follows beyond the fibre along the shear: on an edge along the line of sight.
  bool isOnFreeEdge() const {
    const double slack = m_seen.slack();
    const auto isAt = [&](double end) { return std::abs(m_seen.v - end) <= slack; };
    if (isAt(m_seen.region.yLow) || isAt(m_seen.region.yHigh))
      return true;
    if (!m_seen.region.upright)
      return false;
    const auto spans = levelSpans(m_across);
    return std::ranges::all_of(
        spans, [&](const std::optional<Span>& span) { return !span || isAt(span->from) || isAt(span->to); });
  }

  Result<ShearOfV> inWall() {
    const double flow = flowOf(m_result.cut);
    if (flow != 0 && overhangs())
      return tl::unexpected(Problem{
          {},
          0,
          0,
          {},
          seesSide() ? PW_TEXT("Source", "V S/(I b) does not hold in a flange that overhangs the web: its "
                                         "shear runs across the plane that is seen.")
                     : PW_TEXT("Source", "V S/(I b) does not hold here: the wall runs across the plane that "
                                         "is seen from the top."),
          seesSide() ? PW_TEXT("Source", "Take the fibre in the web, or look from the top.")
                     : PW_TEXT("Source", "Take the fibre in a flange, or look from the side.")});
    addCautionsOfCut();
    m_result.value = (m_result.cut.width > 0 ? flow / m_result.cut.width : 0) + m_result.alongWall;
    return m_result;
  }

  /// In a wall along the line of sight that does not reach through the section.
  bool overhangs() const {
    if (!m_seen.region.upright)
      return false;
    const auto spans = levelSpans(m_across);
    double reach = 0;
    for (const std::optional<Span>& span : spans)
      reach = std::max(reach, span ? span->length() : 0);
    const double depth = m_seen.region.yHigh - m_seen.region.yLow;
    return reach < m_result.cut.width - m_seen.slack() && reach < depth - m_seen.slack();
  }

  Result<ShearOfV> inClosedSection() {
    m_result.path = ShearPath::mean;
    m_result.cut = cutAt(m_seen.region, m_seen.v);
    const bool isInMiddle = std::abs(m_seen.v) <= m_seen.slack() && isMirroredAcross();
    if (other() != 0 && !isInMiddle) {
      const Piece* wall = isMirrored() && isMirroredAcross() ? wallAcrossTheMiddle() : nullptr;
      if (!wall)
        return tl::unexpected(Problem{
            {},
            0,
            0,
            {},
            seesSide() ? PW_TEXT("Source", "The shear of V_{z} along this wall of a closed section is not "
                                           "given, except in the middle of its height.")
                       : PW_TEXT("Source", "The shear of V_{y} along this wall of a closed section is not "
                                           "given, except in the middle of its width."),
            PW_TEXT("Source", "Take the fibre in the middle of the wall.")});
      m_result.wallMiddle = (wall->zLow + wall->zHigh) / 2;
      m_result.alongWall = -other() * m_seen.v * m_result.wallMiddle;
    }
    if (!isMirrored())
      m_result.cautions.push_back(
          PW_TEXT("Source", "The cut meets several walls: V S/(I b) is the mean of their shears."));
    return inWall();
  }

  /// Where a cut is balanced only rounding is left of its flow.
  bool isRounding(double flow) const {
    const Region& region = m_seen.region;
    const double extent = std::max(region.yHigh - region.yLow, region.zHigh - region.zLow);
    return std::abs(flow) <= 1e-8 * (std::abs(own()) + std::abs(other())) * extent * m_model.properties.A;
  }

  /// About the axis along the shear, and about the one across it.
  bool isMirrored() const { return seesSide() ? m_model.isMirroredAboutY : m_model.isMirroredAboutZ; }
  bool isMirroredAcross() const { return seesSide() ? m_model.isMirroredAboutZ : m_model.isMirroredAboutY; }

  /// The wall of the fibre where it runs equally far to both sides of the middle.
  const Piece* wallAcrossTheMiddle() const {
    const double slack = m_seen.slack();
    for (const Piece& piece : m_seen.region.pieces)
      if (piece.kind == Piece::Kind::plate && std::abs(piece.yLow + piece.yHigh) <= slack &&
          std::abs(m_seen.v) <= piece.yHigh + slack && piece.zLow - slack <= m_seen.w &&
          m_seen.w <= piece.zHigh + slack)
        return &piece;
    return nullptr;
  }

  void addCautionsOfCut() {
    const Cut& cut = m_result.cut;
    if (cut.isAtJunction())
      m_result.cautions.push_back(PW_TEXT("Source",
                                          "The cut lies at a junction: the thinner side is taken, b = %1 "
                                          "mm; on the other side b = %2 mm.")
                                      .with(numberText(shownNumber(cut.width, decimalsFor(cut.width))))
                                      .with(numberText(shownNumber(cut.wider, decimalsFor(cut.wider)))));
    const bool isOnAnAxis = std::abs(m_seen.v) <= m_seen.slack() || std::abs(m_seen.w) <= m_seen.slack();
    const bool isTurned = m_model.section.shape == SectionShape::built;
    if (!m_seen.region.upright && (isTurned || !isOnAnAxis))
      m_result.cautions.push_back(PW_TEXT("Source",
                                          "An edge is inclined here: V S/(I b) is the mean over the cut; "
                                          "along the edge the shear is greater."));
    const double depth = m_seen.region.yHigh - m_seen.region.yLow;
    if (m_model.section.shape == SectionShape::rectangle && cut.width > depth)
      m_result.cautions.push_back(PW_TEXT(
          "Source", "The cut is wider than the section is deep: V S/(I b) is the mean over it; at its ends "
                    "the shear is greater."));
  }

  /// The shear of V across the plane that is seen: 0 on faces that look at the viewer or away.
  void addAcross() {
    const auto spans = levelSpans(m_seen);
    const double slack = m_seen.slack();
    const bool isOnFace = std::ranges::any_of(spans, [&](const std::optional<Span>& span) {
      return span && (std::abs(m_seen.w - span->from) <= slack || std::abs(m_seen.w - span->to) <= slack);
    });
    if (isOnFace && (m_seen.region.upright || std::abs(m_seen.v) <= slack))
      return;
    std::optional<Cut> cut = wallCutAt(m_across.region, m_across.v, m_across.w);
    if (!cut && std::abs(m_seen.w) <= slack && isMirrored())
      cut = cutAt(m_across.region, m_across.v);
    if (!cut) {
      m_result.cautions.push_back(
          PW_TEXT("Source", "Shear of V across the plane that is seen is not judged here."));
      return;
    }
    const double flow = other() * cut->S + own() * cut->across;
    if (isRounding(flow) || cut->width <= slack)
      return;
    const double value = flow / cut->width;
    m_result.cautions.push_back(
        (seesSide()
             ? PW_TEXT("Source", "V also gives τ_{xz} = %1 MPa at this fibre, across the plane that is seen.")
             : PW_TEXT("Source",
                       "V also gives τ_{xy} = %1 MPa at this fibre, across the plane that is seen."))
            .with(numberText(shownNumber(value, decimalsFor(std::abs(value))))));
  }

  const SectionModel& m_model;
  Fibre m_fibre;
  Seen m_seen;
  Seen m_across;
  Gradient m_gradient;
  ShearOfV m_result;
};

} // namespace

Gradient gradientOf(const SectionProperties& p, double VyUpwards, double Vz) {
  const double determinant = p.Iy * p.Iz - p.Iyz * p.Iyz;
  return {(VyUpwards * p.Iy - Vz * p.Iyz) / determinant, (Vz * p.Iz - VyUpwards * p.Iyz) / determinant};
}

Result<ShearOfV> shearAt(const SectionModel& model, const Gradient& gradient, const Fibre& fibre) {
  if (gradient.isZero())
    return ShearOfV{};
  return ShearAtFibre(model, gradient, fibre).shear();
}

} // namespace planewright

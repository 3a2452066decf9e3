// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/torsion.h"

#include "core/source/seen.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

Problem problem(Text what, Text mend) {
  return {{}, 0, 0, {}, std::move(what), std::move(mend)};
}

double openConstant(const Region& region) {
  double J = 0;
  for (const Piece& piece : region.pieces)
    if (piece.kind == Piece::Kind::plate) {
      const auto [thin, wide] = std::minmax({piece.width(), piece.height()});
      J += wide * thin * thin * thin / 3;
    }
  return J;
}

/// Whether plates enclose a cell: whether some place without material cannot be reached from outside.
class Cells {
public:
  explicit Cells(const Region& region)
      : m_y(withMargin(levelsOf(region))), m_z(withMargin(levelsOf(planewright::transposed(region)))) {
    m_taken.assign((m_y.size() - 1) * columns(), false);
    for (std::size_t i = 0; i < m_taken.size(); ++i)
      m_taken[i] = contains(region, middle(m_y, i / columns()), middle(m_z, i % columns()));
  }

  bool enclosed() {
    std::vector<std::size_t> queue = {0};
    m_taken[0] = true;
    for (std::size_t next = 0; next < queue.size(); ++next)
      for (const std::size_t neighbour : neighboursOf(queue[next]))
        if (!m_taken[neighbour]) {
          m_taken[neighbour] = true;
          queue.push_back(neighbour);
        }
    return std::ranges::find(m_taken, false) != m_taken.end();
  }

private:
  static std::vector<double> withMargin(std::vector<double> levels) {
    const double margin = levels.back() - levels.front();
    levels.insert(levels.begin(), levels.front() - margin);
    levels.push_back(levels.back() + margin);
    return levels;
  }
  static double middle(const std::vector<double>& levels, std::size_t i) {
    return (levels[i] + levels[i + 1]) / 2;
  }
  std::size_t columns() const { return m_z.size() - 1; }
  std::vector<std::size_t> neighboursOf(std::size_t cell) const {
    std::vector<std::size_t> neighbours;
    if (cell >= columns())
      neighbours.push_back(cell - columns());
    if (cell + columns() < m_taken.size())
      neighbours.push_back(cell + columns());
    if (cell % columns() > 0)
      neighbours.push_back(cell - 1);
    if (cell % columns() + 1 < columns())
      neighbours.push_back(cell + 1);
    return neighbours;
  }

  std::vector<double> m_y;
  std::vector<double> m_z;
  std::vector<bool> m_taken;
};

Result<TorsionConstant> ofBuilt(const Region& region) {
  if (!region.upright)
    return tl::unexpected(problem(PW_TEXT("Source", "The torsion of turned blocks is not given here."),
                                  PW_TEXT("Source", "Leave T out, or type J as a tabled value.")));
  if (Cells(region).enclosed())
    return tl::unexpected(problem(
        PW_TEXT("Source", "These blocks enclose a cell: the sum of b t³/3 is not their torsion constant."),
        PW_TEXT("Source", "Choose the hollow section, or leave T out.")));
  return TorsionConstant{TorsionRule::open, openConstant(region), 0, {}};
}

TorsionConstant ofBox(const Section& s) {
  const double width = s.size("b") - s.size("t_w");
  const double depth = s.size("h") - s.size("t_f");
  const double cell = width * depth;
  return {TorsionRule::closed,
          4 * cell * cell / (2 * depth / s.size("t_w") + 2 * width / s.size("t_f")),
          cell,
          {}};
}

TorsionConstant ofRectangle(const Section& s) {
  const auto [thin, wide] = std::minmax({s.size("b"), s.size("h")});
  const RectangleTorsion torsion = rectangleTorsion(wide / thin);
  return {TorsionRule::rectangle, torsion.c2 * wide * thin * thin * thin, 0, torsion};
}

/// The shear at one fibre.
class AtFibre {
public:
  AtFibre(const SectionModel& model, const TorsionConstant& constant, double T, const Fibre& fibre)
      : m_model(model), m_seen(model, fibre), m_T(T), m_result{constant, 0, 0, 0, 0, {}} {}

  Result<TorsionShear> shear() {
    switch (m_result.constant.rule) {
    case TorsionRule::circular:
      return ofCircle();
    case TorsionRule::closed:
      return ofClosed();
    case TorsionRule::open:
      return ofOpen();
    case TorsionRule::rectangle:
      return ofRectangle();
    case TorsionRule::tabled:
      break;
    }
    m_result.cautions.push_back(PW_TEXT(
        "Source", "T r/J holds for circular sections; for another one J and r must belong together."));
    return proportional();
  }

private:
  bool isZero(double distance) const { return std::abs(distance) <= m_seen.slack(); }
  bool areEqual(double a, double b) const { return isZero(a - b); }

  Result<TorsionShear> proportional() {
    m_result.at = m_seen.w;
    m_result.txy = -m_T * m_seen.w / m_result.constant.J;
    return m_result;
  }

  tl::unexpected<Problem> outOfPlane() const {
    return tl::unexpected(problem(
        PW_TEXT("Source", "The shear of torsion at this fibre does not lie in the plane that is seen."),
        m_seen.view == View::side
            ? PW_TEXT("Source", "Look from the top, or take a fibre on a face that looks to the side.")
            : PW_TEXT("Source", "Look from the side, or take a fibre on a face that looks up or down.")));
  }

  Result<TorsionShear> ofCircle() {
    if (!isZero(m_seen.v))
      return outOfPlane();
    return proportional();
  }

  Result<TorsionShear> ofClosed() {
    const Section& s = m_model.section;
    const bool side = m_seen.view == View::side;
    const double thickness = s.size(side ? "t_w" : "t_f");
    const double other = s.size(side ? "t_f" : "t_w");
    const double outer = s.size(side ? "b" : "h") / 2;
    if (std::abs(m_seen.w) < outer - thickness - m_seen.slack())
      return outOfPlane();
    m_result.wall = thickness;
    m_result.at = m_seen.w;
    m_result.txy = (m_seen.w > 0 ? -m_T : m_T) / (2 * m_result.constant.cell * thickness);
    if (std::max(s.size("t_w"), s.size("t_f")) > std::min(s.size("b"), s.size("h")) / 10)
      m_result.cautions.push_back(PW_TEXT(
          "Source",
          "A wall is thicker than a tenth of the smaller side: Bredt's formula for thin walls is rough "
          "here (the limit is common practice, no source)."));
    if (std::abs(m_seen.v) > s.size(side ? "h" : "b") / 2 - other + m_seen.slack())
      m_result.cautions.push_back(PW_TEXT(
          "Source", "At a corner the shear of torsion is taken as along the wall; at inner corners it is "
                    "greater, by a factor that depends on the radius."));
    return m_result;
  }

  Result<TorsionShear> ofOpen() {
    const Piece* wall = nullptr;
    for (const Piece& piece : m_seen.region.pieces)
      if (piece.kind == Piece::Kind::plate && piece.width() <= piece.height() && holds(piece) &&
          (!wall || piece.width() > wall->width()))
        wall = &piece;
    if (!wall)
      return outOfPlane();
    m_result.wall = wall->width();
    m_result.at = m_seen.w - (wall->zLow + wall->zHigh) / 2;
    m_result.txy = -2 * m_T * m_result.at / m_result.constant.J;
    m_result.cautions.push_back(PW_TEXT(
        "Source", "J = Σ b t³/3 is approximate: for thin open walls, without fillets, free to warp."));
    return m_result;
  }

  bool holds(const Piece& piece) const {
    const double slack = m_seen.slack();
    return piece.yLow - slack <= m_seen.v && m_seen.v <= piece.yHigh + slack &&
           piece.zLow - slack <= m_seen.w && m_seen.w <= piece.zHigh + slack;
  }

  Result<TorsionShear> ofRectangle() {
    const Region& region = m_seen.region;
    const double depth = region.yHigh - region.yLow;
    const double width = region.zHigh - region.zLow;
    const bool onFace = areEqual(std::abs(m_seen.w), width / 2);
    m_result.at = m_seen.w;
    if (onFace && areEqual(std::abs(m_seen.v), depth / 2))
      return m_result;
    if (!onFace || !isZero(m_seen.v))
      return tl::unexpected(problem(
          PW_TEXT("Source",
                  "The torsion of a solid rectangle is given at the middle of its sides alone, and is 0 "
                  "at its corners."),
          PW_TEXT("Source", "Take the fibre at the middle of a face that is seen, or at a corner.")));
    const RectangleTorsion& torsion = m_result.constant.ofRectangle;
    m_result.c = depth >= width ? torsion.c1 : torsion.c3;
    const auto [thin, wide] = std::minmax({depth, width});
    m_result.txy = (m_seen.w > 0 ? -m_T : m_T) / (m_result.c * wide * thin * thin);
    return m_result;
  }

  const SectionModel& m_model;
  Seen m_seen;
  double m_T;
  TorsionShear m_result;
};

} // namespace

Result<TorsionConstant> torsionConstantOf(const SectionModel& model) {
  const Section& s = model.section;
  switch (s.shape) {
  case SectionShape::circle:
  case SectionShape::tube: {
    const double inner = s.shape == SectionShape::tube ? s.size("d") - 2 * s.size("t") : 0;
    return TorsionConstant{TorsionRule::circular,
                           std::numbers::pi * (std::pow(s.size("d"), 4) - std::pow(inner, 4)) / 32,
                           0,
                           {}};
  }
  case SectionShape::box:
    return ofBox(s);
  case SectionShape::rectangle:
    return ofRectangle(s);
  case SectionShape::built:
    return ofBuilt(model.region);
  case SectionShape::tabled:
    if (!s.sizes.contains("J"))
      return tl::unexpected(problem(PW_TEXT("Source", "The torsion constant J is not given."),
                                    PW_TEXT("Source", "Give J, or leave T out.")));
    return TorsionConstant{TorsionRule::tabled, s.size("J"), 0, {}};
  default:
    return TorsionConstant{TorsionRule::open, openConstant(model.region), 0, {}};
  }
}

Result<TorsionShear> torsionAt(const SectionModel& model, double T, const Fibre& fibre) {
  return torsionConstantOf(model).and_then(
      [&](const TorsionConstant& constant) { return AtFibre(model, constant, T, fibre).shear(); });
}

} // namespace planewright

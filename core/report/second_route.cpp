// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/second_route.h"

#include "core/study/judge_checks.h"

#include <Eigen/Dense>
#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

using Matrix = Eigen::Matrix2d;

constexpr std::size_t mostDisagreements = 20;
constexpr int scanSteps = 2000;

Matrix tensorOf(const PlaneStress& stress) {
  return Matrix{{stress.sx, stress.txy}, {stress.txy, stress.sy}};
}

/// The tensor in axes turned by an angle: R^T S R.
Matrix turned(const Matrix& tensor, Angle angle) {
  const double radians = angle.radians();
  const double c = std::cos(radians);
  const double s = std::sin(radians);
  const Matrix rotation{{c, -s}, {s, c}};
  return rotation.transpose() * tensor * rotation;
}

/// Collects the rows of one state.
class Route {
public:
  Route(const Readout& readout, const StateReading& state)
      : m_readout(readout), m_state(state),
        m_scale(std::max({state.scale, scaleOf(state.stress), std::abs(state.sz)})) {}

  std::vector<RouteRow> rows() {
    const Matrix tensor = summed();
    components(tensor);
    principal(tensor);
    traction(PW_TEXT("Route", "reading plane"), tensor, m_readout.reading.value, m_state.reading);
    for (std::size_t i = 0; i < m_readout.watched.size(); ++i)
      traction(verbatim(m_readout.watched[i].name), tensor, m_readout.watched[i].normal.value,
               m_state.watched[i]);
    for (std::size_t i = 0; i < m_readout.lines.size(); ++i)
      line(m_readout.lines[i], tensor, m_state.lines[i]);
    for (std::size_t i = 0; i < m_state.checks.size(); ++i)
      check(i);
    return std::move(m_rows);
  }

private:
  void add(Text quantity, const char* unit, double first, double second, double scale) {
    m_rows.push_back({m_readout.point, m_state.combination, std::move(quantity), unit, first, second,
                      scale == 0 ? 1 : scale});
  }
  void stress(Text quantity, double first, double second) {
    add(std::move(quantity), "MPa", first, second, m_scale);
  }

  Matrix summed() const {
    Matrix sum = Matrix::Zero();
    for (const ActingCase& acting : m_state.acting)
      sum += acting.factor * tensorOf(m_readout.cases[acting.index].stress);
    return sum;
  }

  void components(const Matrix& tensor) {
    stress(symbol("σ_{x}"), m_state.stress.sx, tensor(0, 0));
    stress(symbol("σ_{y}"), m_state.stress.sy, tensor(1, 1));
    stress(symbol("τ_{xy}"), m_state.stress.txy, tensor(0, 1));
  }

  void principal(const Matrix& tensor) {
    const Circle& circle = m_state.circle;
    const Eigen::SelfAdjointEigenSolver<Matrix> solver(tensor);
    stress(symbol("σ_{1}"), circle.s1, solver.eigenvalues()(1));
    stress(symbol("σ_{2}"), circle.s2, solver.eigenvalues()(0));
    stress(PW_TEXT("Route", "trace σ_{1} + σ_{2}"), circle.s1 + circle.s2, tensor.trace());
    add(PW_TEXT("Route", "determinant σ_{1} σ_{2}"), "MPa²", circle.s1 * circle.s2, tensor.determinant(),
        m_scale * m_scale);
    if (!circle.theta1)
      return;
    const Matrix inAxes = turned(tensor, circle.theta1->value);
    stress(PW_TEXT("Route", "σ on the plane at θ_{1}"), circle.s1, inAxes(0, 0));
    stress(PW_TEXT("Route", "τ on the plane at θ_{1}"), 0, inAxes(0, 1));
    stress(PW_TEXT("Route", "greatest τ_{nt}"), circle.radius,
           turned(tensor, circle.thetaTauMax->value)(0, 1));
  }

  void traction(const Text& name, const Matrix& tensor, Angle normal, const Traction& first) {
    const Matrix inAxes = turned(tensor, normal);
    stress(PW_TEXT("Route", "σ_{n}, %1").with(name), first.sn, inAxes(0, 0));
    stress(PW_TEXT("Route", "τ_{nt}, %1").with(name), first.tnt, inAxes(0, 1));
  }

  void line(const LineReading& line, const Matrix& tensor, const LineStress& first) {
    const Matrix inAxes = turned(tensor, line.angle.value);
    stress(PW_TEXT("Route", "along the %1").with(line.name), first.along, inAxes(0, 0));
    stress(PW_TEXT("Route", "across the %1").with(line.name), first.across, inAxes(1, 1));
    stress(PW_TEXT("Route", "shear in the axes of the %1").with(line.name), first.shear, inAxes(0, 1));
  }

  void check(std::size_t index) {
    const CheckReading& reading = m_state.checks[index];
    const CheckSetup& setup = m_readout.checks[index];
    if (reading.problem || !std::isfinite(reading.worst.utilisation))
      return;
    if (reading.first)
      loaded(setup, *reading.first, index);
    if (setup.band && setup.band->tolerance != Angle())
      scanned(setup, reading.worst.utilisation, index);
  }

  /// The state times its load multiplier stands at the limit.
  void loaded(const CheckSetup& setup, const FirstInBand& first, std::size_t index) {
    if (first.multiplier > 1e6)
      return;
    StateReading atLimit = m_state;
    atLimit.stress = first.multiplier * m_state.stress;
    atLimit.sz *= first.multiplier;
    atLimit.axial *= first.multiplier;
    atLimit.bending *= first.multiplier;
    atLimit.scale *= first.multiplier;
    atLimit.circle = circleOf(atLimit.stress, atLimit.scale, atLimit.sz);
    if (const Result<Judge> judge = judgeOf(m_readout, atLimit, index))
      add(PW_TEXT("Route", "%1: utilisation at the load multiplier").with(setup.id), "", 1,
          judge->utilisation(first.angle), 1);
  }

  void scanned(const CheckSetup& setup, double worst, std::size_t index) {
    const Result<Judge> judge = judgeOf(m_readout, m_state, index);
    if (!judge)
      return;
    double found = 0;
    for (int i = 0; i <= scanSteps; ++i)
      found = std::max(found, judge->utilisation(setup.band->nominal +
                                                 Angle::fromDegrees((2.0 * i / scanSteps - 1) *
                                                                    setup.band->tolerance.degrees())));
    // A scan may miss the worst, never beat it.
    add(PW_TEXT("Route", "%1: worst in the band is reached by no direction of a scan").with(setup.id), "",
        worst, std::max(found, worst), std::max(1.0, worst));
  }

  const Readout& m_readout;
  const StateReading& m_state;
  double m_scale;
  std::vector<RouteRow> m_rows;
};

} // namespace

double RouteRow::difference() const {
  return std::abs(first - second) / scale;
}

std::vector<RouteRow> secondRouteOf(const Readout& readout, const StateReading& state) {
  return Route(readout, state).rows();
}

RouteComparison comparedRoutes(const std::vector<Readout>& points) {
  RouteComparison all;
  for (const Readout& readout : points)
    for (const StateReading& state : readout.states) {
      if (!state.judged)
        continue;
      for (RouteRow& row : secondRouteOf(readout, state)) {
        ++all.compared;
        all.greatest = std::max(all.greatest, row.difference());
        if (!(row.difference() <= routesAgreeWithin) && all.disagree.size() < mostDisagreements)
          all.disagree.push_back(std::move(row));
      }
    }
  return all;
}

} // namespace planewright

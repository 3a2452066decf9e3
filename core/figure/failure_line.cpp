// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/failure_line.h"

#include "core/quantity/format.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

constexpr int steps = 48;
constexpr double unbounded = std::numeric_limits<double>::infinity();

/// Tension positive, tnt >= 0.
using Upper = std::vector<Traction>;

/// How far sn may go on the side of a piece where there is no shear.
double endOf(const Interaction& piece) {
  if (piece.a11 > 0)
    return 1 / std::sqrt(piece.a11);
  return piece.b1 != 0 ? 1 / std::abs(piece.b1) : unbounded;
}

/// What the parts of a criterion of a plane, taken together, allow.
struct Limit {
  double from = -unbounded; ///< the least and the greatest sn
  double to = unbounded;
  const Mobilised* plane = nullptr; ///< of these two one bounds the shear
  const SignedForm* form = nullptr;

  explicit Limit(const Judge& judge) {
    for (const Branch& branch : judge.branches()) {
      if (const auto* cutOff = std::get_if<CutOff>(&branch))
        to = std::min(to, cutOff->limit);
      if (const auto* mobilised = std::get_if<Mobilised>(&branch)) {
        plane = mobilised;
        to = std::min(to, mobilised->cohesion / mobilised->tanPhi);
      }
      if (const auto* signs = std::get_if<SignedForm>(&branch)) {
        from = std::max(from, -endOf(signs->pieces[1][0]));
        to = std::min(to, endOf(signs->pieces[0][0]));
        if (signs->pieces[0][0].a66 > 0)
          form = signs;
      }
    }
  }

  /// The greatest |tnt| at sn.
  double tntAt(double sn) const {
    if (plane)
      return std::max(plane->cohesion - sn * plane->tanPhi, 0.0);
    const Interaction& piece = form->pieces[sn < 0 ? 1 : 0][0];
    return std::sqrt(std::max(0.0, 1 - piece.a11 * sn * sn) / piece.a66);
  }

  /// Where the line is drawn through, ascending; straight between the first two unless all of it is an arc.
  std::vector<double> through(double reach) const {
    if (plane)
      return {-reach, to};
    const bool isArc = std::isfinite(from);
    const double start = isArc ? from : 0;
    std::vector<double> all;
    if (!isArc)
      all.push_back(-reach);
    for (int i = 0; i <= steps; ++i)
      all.push_back(start + (to - start) * i / steps);
    return all;
  }
};

Upper upperLine(const Limit& limit, double reach) {
  Upper line;
  if (std::isfinite(limit.from))
    line.push_back({limit.from, 0});
  for (const double sn : limit.through(reach))
    line.push_back({sn, limit.tntAt(sn)});
  if (line.back().tnt > 0)
    line.push_back({limit.to, 0});
  return line;
}

std::optional<Traction> marginEndOf(const Limit& limit, const Judge& judge, Angle normal) {
  const LineStress at = judge.state().at(normal);
  if (limit.plane) {
    const double tnt = limit.tntAt(at.along);
    return tnt > 0 && at.along <= limit.to ? std::optional(Traction{at.along, std::copysign(tnt, at.shear)})
                                           : std::nullopt;
  }
  const std::optional<double> multiplier = judge.at(normal).multiplier;
  if (!multiplier)
    return std::nullopt;
  return Traction{*multiplier * at.along, *multiplier * at.shear};
}

/// The plane that loads growing together bring to its limit first.
std::optional<NormalAngle> firstTouchOf(const Judge& judge, Angle normal) {
  const auto first = worstIn(judge, bandOf(normal, Angle::fromDegrees(90))).first;
  if (!first || first->multiplier == 0)
    return std::nullopt;
  return NormalAngle{folded(first->angle)};
}

} // namespace

std::vector<FailureLine> failureLinesOf(const Readout& readout, double reach) {
  std::vector<FailureLine> lines;
  double greatest = 0;
  const StateReading& state = readout.state();
  const double sense = readout.positive == Positive::tension ? 1 : -1;
  for (std::size_t i = 0; i < state.checks.size(); ++i) {
    const CheckSetup& check = readout.checks[i];
    if (check.plane.empty())
      continue;
    const Result<Judge> judge = judgeOf(readout, state, i);
    if (!judge)
      continue;
    const Limit limit(*judge);
    const Angle normal = check.band->nominal;
    FailureLine line;
    line.check = check.id;
    line.material = check.material;
    const double utilisation = state.checks[i].worst.utilisation;
    if (lines.empty() || utilisation > greatest) {
      for (FailureLine& other : lines)
        other.leads = false;
      line.leads = true;
      greatest = utilisation;
    }
    line.upper = upperLine(limit, reach);
    line.planeAt = tractionOn(state.stress, NormalAngle{normal});
    line.marginEnd = marginEndOf(limit, *judge, normal);
    line.touch = firstTouchOf(*judge, normal);
    if (line.touch)
      line.touchAt = tractionOn(state.stress, *line.touch);
    // The tensor of a study that counts compression positive is the negated one.
    for (Traction& at : line.upper)
      at.sn *= sense;
    if (line.marginEnd)
      line.marginEnd = Traction{sense * line.marginEnd->sn, sense * line.marginEnd->tnt};
    lines.push_back(std::move(line));
  }
  return lines;
}

std::vector<TouchLabel> touchLabelsOf(const Readout& readout) {
  std::vector<TouchLabel> labels;
  const std::vector<FailureLine> lines = failureLinesOf(readout, 0);
  for (const FailureLine& line : lines) {
    if (!line.touch)
      continue;
    const std::string angle = shownDegrees(line.touch->value, 1);
    const Text name = verbatim(lines.size() > 1 ? line.material + " " + angle : angle);
    labels.push_back({line.touchAt, PW_TEXT("Figure", "first touch %1").with(name), name, roleOf(line),
                      "touch " + line.check});
  }
  return labels;
}

Role roleOf(const FailureLine& line) {
  return line.leads ? Role::limit : Role::other;
}

} // namespace planewright

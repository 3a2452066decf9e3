// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/principals.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

constexpr double none = std::numeric_limits<double>::quiet_NaN();
using Lane = std::array<double, laneSize>;

/// The sum of the combination that governs a point, with the size of its terms.
struct Governing {
  PlaneStress stress;
  double scale = 0;
};

Governing governingAt(const ScreenPlan& plan, const Field& field, const PointResult& result,
                      std::size_t point) {
  Governing governing;
  const std::vector<ActingCase>& acting = plan.combinations[result.combination].acting;
  for (const ActingCase& one : acting) {
    const PlaneStress stress = field.stressOf(one.index, point);
    governing.stress = governing.stress + one.factor * stress;
    governing.scale += std::abs(one.factor) * scaleOf(stress);
  }
  if (acting.size() > 1)
    governing.stress = withoutRounding(governing.stress, governing.scale);
  return governing;
}

bool isBorne(double size) {
  return size == 0 || (size >= bornStresses.least && size <= bornStresses.greatest);
}

} // namespace

FieldPrincipals principalsOf(const ScreenPlan& plan, const Field& field, const FieldResults& results) {
  const auto all = [&] { return WideVector<double>(field.size(), none); };
  FieldPrincipals principals{all(), all(), all()};
  Lane sx{}, sy{}, txy{}, s1{}, s2{}, radius{}, theta1{};
  std::array<double, laneSize> scales{};
  for (std::size_t from = 0; from < field.size(); from += laneSize) {
    const std::size_t count = std::min(laneSize, field.size() - from);
    bool areBorne = true;
    for (std::size_t i = 0; i < count; ++i) {
      const Governing one = governingAt(plan, field, results[from + i], from + i);
      sx[i] = one.stress.sx;
      sy[i] = one.stress.sy;
      txy[i] = one.stress.txy;
      scales[i] = one.scale;
      areBorne = areBorne && isBorne(scaleOf(one.stress));
    }
    principalLane(sx.data(), sy.data(), txy.data(), s1.data(), s2.data(), radius.data(), theta1.data());
    for (std::size_t i = 0; i < count; ++i) {
      if (std::isnan(results.utilisations()[from + i]))
        continue;
      if (!areBorne) {
        const Circle circle = circleOf({sx[i], sy[i], txy[i]}, scales[i]);
        s1[i] = circle.s1;
        s2[i] = circle.s2;
        theta1[i] = circle.theta1 ? circle.theta1->value.degrees() : none;
      } else if (isRounding(radius[i], scales[i])) {
        s1[i] = s2[i] = sx[i] / 2 + sy[i] / 2;
        theta1[i] = none;
      }
      principals.s1[from + i] = s1[i];
      principals.s2[from + i] = s2[i];
      principals.theta1[from + i] = theta1[i];
    }
  }
  return principals;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/quantity.h"
#include "core/stress/circle.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

struct Computed {
  PlaneStress stress;
  std::optional<PlaneStress> turned;
  Circle circle;
};
using Value = std::optional<double>;

Value degrees(const std::optional<NormalAngle>& normal) {
  return normal ? Value(normal->value.degrees()) : std::nullopt;
}

/// What a word means and how it follows; none where the state or its inputs do not have it.
struct Word {
  std::string_view word;
  Value (*value)(const Computed&);
  bool isAngle = false;
};
constexpr std::array words = {
    Word{"sxp", [](const Computed& c) { return c.turned ? Value(c.turned->sx) : std::nullopt; }},
    Word{"syp", [](const Computed& c) { return c.turned ? Value(c.turned->sy) : std::nullopt; }},
    Word{"txyp", [](const Computed& c) { return c.turned ? Value(c.turned->txy) : std::nullopt; }},
    Word{"s1", [](const Computed& c) { return Value(c.circle.s1); }},
    Word{"s2", [](const Computed& c) { return Value(c.circle.s2); }},
    Word{"tmax", [](const Computed& c) { return Value(c.circle.radius); }},
    Word{"tabs", [](const Computed& c) { return Value(c.circle.tauAbsMax); }},
    Word{"savg", [](const Computed& c) { return Value(c.circle.mean); }},
    Word{"txy", [](const Computed& c) { return Value(c.stress.txy); }},
    Word{"thp1", [](const Computed& c) { return degrees(c.circle.theta1); }, true},
    Word{"thp2", [](const Computed& c) { return degrees(c.circle.theta2()); }, true},
    Word{"ths", [](const Computed& c) { return degrees(c.circle.thetaTauMax); }, true}};

/// Where s1 is given in place of txy, txy = sqrt((s1 - sx)(s1 - sy)), from s1 as a root of
/// (s - sx)(s - sy) = txy^2 (common practice, no source).
std::optional<PlaneStress> stressIn(const CheckInputs& inputs) {
  const auto sx = inputs.number("sx");
  const auto sy = inputs.number("sy");
  const auto txy = inputs.number("txy");
  const auto s1 = inputs.number("s1");
  if (!sx || !sy || (!txy && !s1))
    return std::nullopt;
  return PlaneStress{*sx, *sy, txy ? *txy : std::sqrt((*s1 - *sx) * (*s1 - *sy))};
}

} // namespace

Result<Quantity> quantityOfState(const CheckInputs& inputs, std::string_view word) {
  const std::optional<PlaneStress> stress = stressIn(inputs);
  if (!stress)
    return tl::unexpected(
        Problem{{}, 0, 0, {}, PW_TEXT("Check", "These inputs make no state of stress."), {}});
  Computed computed{*stress, std::nullopt, circleOf(*stress)};
  if (const std::optional<double> theta = inputs.number("theta"))
    computed.turned = inTurnedAxes(*stress, Angle::fromDegrees(*theta));
  const auto row = std::ranges::find(words, word, &Word::word);
  const Value value = row == words.end() ? std::nullopt : row->value(computed);
  if (!value)
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  std::string(word),
                                  PW_TEXT("Check", "This quantity does not follow from these inputs."),
                                  {}});
  return Quantity{*value, row->isAngle, row->isAngle ? 180 : scaleOf(*stress)};
}

} // namespace planewright

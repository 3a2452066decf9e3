// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/quantity.h"
#include "core/source/measured.h"
#include "core/stress/circle.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

constexpr double micro = 1e-6;
constexpr double perGiga = 1e3; // MPa in GPa

using Value = std::optional<double>;

struct Computed {
  PlaneStrain strain;
  PrincipalStrains principal;
  std::optional<PlaneStrain> turned;
  std::optional<Circle> circle; ///< of the stresses, where E and nu are given
  std::optional<double> third;  ///< strain across a free surface, -nu/(1 - nu) (ex + ey)
};

struct Word {
  std::string_view word;
  Value (*value)(const Computed&);
  bool isAngle = false;
};

Value inMicro(double strain) {
  return strain / micro;
}

Value spread(const Computed& c) {
  if (!c.third)
    return std::nullopt;
  const auto [least, greatest] = std::minmax({c.principal.e1, c.principal.e2, *c.third});
  return inMicro(greatest - least);
}

Value directionOf(const Computed& c, double turn) {
  return c.principal.direction ? Value(folded(*c.principal.direction + Angle::fromDegrees(turn)).degrees())
                               : std::nullopt;
}

constexpr std::array words = {
    Word{"ex", [](const Computed& c) { return inMicro(c.strain.ex); }},
    Word{"ey", [](const Computed& c) { return inMicro(c.strain.ey); }},
    Word{"gxy", [](const Computed& c) { return inMicro(c.strain.gxy); }},
    Word{"e1", [](const Computed& c) { return inMicro(c.principal.e1); }},
    Word{"e2", [](const Computed& c) { return inMicro(c.principal.e2); }},
    Word{"e3", [](const Computed& c) { return c.third ? inMicro(*c.third) : std::nullopt; }},
    Word{"gabs", spread},
    Word{"thp1", [](const Computed& c) { return directionOf(c, 0); }, true},
    Word{"thp2", [](const Computed& c) { return directionOf(c, 90); }, true},
    Word{"exp_x", [](const Computed& c) { return c.turned ? inMicro(c.turned->ex) : std::nullopt; }},
    Word{"exp_y", [](const Computed& c) { return c.turned ? inMicro(c.turned->ey) : std::nullopt; }},
    Word{"gxpyp", [](const Computed& c) { return c.turned ? inMicro(c.turned->gxy) : std::nullopt; }},
    Word{"s1", [](const Computed& c) { return c.circle ? Value(c.circle->s1) : std::nullopt; }},
    Word{"s2", [](const Computed& c) { return c.circle ? Value(c.circle->s2) : std::nullopt; }},
    Word{"tmax", [](const Computed& c) { return c.circle ? Value(c.circle->radius) : std::nullopt; }}};

std::optional<PlaneStrain> strainIn(const CheckInputs& inputs) {
  Rosette rosette;
  constexpr std::array<std::array<std::string_view, 2>, 3> gauges = {{{"a", "ea"}, {"b", "eb"}, {"c", "ec"}}};
  bool isRosette = true;
  for (std::size_t i = 0; i < gauges.size(); ++i) {
    const auto angle = inputs.number(gauges[i][0]);
    const auto reading = inputs.number(gauges[i][1]);
    isRosette = isRosette && angle && reading;
    rosette[i] = {Angle::fromDegrees(angle.value_or(0)), reading.value_or(0) * micro};
  }
  if (isRosette) {
    const Result<RosetteSolution> solution = solved(rosette);
    return solution ? std::optional(solution->strain) : std::nullopt;
  }
  const auto ex = inputs.number("ex");
  const auto ey = inputs.number("ey");
  const auto gxy = inputs.number("gxy");
  return ex && ey && gxy ? std::optional(PlaneStrain{*ex * micro, *ey * micro, *gxy * micro}) : std::nullopt;
}

Problem fault(std::string_view quoted, Text what) {
  return {{}, 0, 0, std::string(quoted), std::move(what), {}};
}

} // namespace

Result<Quantity> quantityOfStrain(const CheckInputs& inputs, std::string_view word) {
  const std::optional<PlaneStrain> strain = strainIn(inputs);
  if (!strain)
    return tl::unexpected(fault({}, PW_TEXT("Check", "These inputs make no state of strain.")));
  Computed computed{*strain, principalOf(*strain), {}, {}, {}};
  if (const auto theta = inputs.number("theta"))
    computed.turned = inTurnedAxes(*strain, Angle::fromDegrees(*theta));
  const auto E = inputs.number("E");
  const auto nu = inputs.number("nu");
  if (E && nu) {
    computed.circle = circleOf(stressOf(*strain, Isotropic{*E * perGiga, *nu}));
    computed.third = -*nu / (1 - *nu) * (strain->ex + strain->ey);
  }
  const auto row = std::ranges::find(words, word, &Word::word);
  const Value value = row == words.end() ? std::nullopt : row->value(computed);
  if (!value)
    return tl::unexpected(fault(word, PW_TEXT("Check", "“%1” is no quantity of a strain.").with(word)));
  const double scale = std::max({std::abs(computed.principal.e1), std::abs(computed.principal.e2)}) / micro;
  return Quantity{*value, row->isAngle, row->isAngle ? 180 : std::max(scale, std::abs(*value))};
}

} // namespace planewright

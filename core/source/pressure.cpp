// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/pressure.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

namespace planewright {

namespace {

constexpr double thinFrom = 10; // of r/t

Text theory() {
  return PW_TEXT("Source", "thin wall, inner radius (Lord et al. 2026, chapter 13)");
}

Problems problemsOf(const Vessel& vessel) {
  Problems problems;
  const auto positive = [&problems](const char* key, double length, const Text& meaning) {
    if (!(length > 0))
      problems.push_back({key,
                          0,
                          0,
                          {},
                          PW_TEXT("Source", "The %1 is not greater than 0.").with(meaning),
                          PW_TEXT("Source", "Give a positive length.")});
  };
  positive("r", vessel.innerRadius, PW_TEXT("Source", "inner radius"));
  positive("t", vessel.thickness, PW_TEXT("Source", "thickness of the wall"));
  return problems;
}

/// Hoop stress at the inner face of a thick wall over p r/t.
double innerFaceShare(const Vessel& vessel) {
  const double r = vessel.innerRadius;
  const double R = r + vessel.thickness;
  return (R * R + r * r) / ((R + r) * r);
}

std::vector<Text> cautionsOf(const Vessel& vessel) {
  std::vector<Text> cautions;
  if (vessel.innerRadius / vessel.thickness < thinFrom)
    cautions.push_back(PW_TEXT("Source", "r/t = %1 is below 10: the wall is not thin, and its inner face has "
                                         "%2 times this hoop stress (thick wall, Lamé).")
                           .with(numberText(shownNumber(vessel.innerRadius / vessel.thickness, 1)))
                           .with(numberText(shownNumber(innerFaceShare(vessel), 2))));
  if (vessel.pressure < 0)
    cautions.push_back(PW_TEXT("Source", "Pressure from outside: buckling of the wall is not seen here."));
  if (vessel.pressure != 0)
    cautions.push_back(PW_TEXT("Source",
                               "The pressure on the face itself is left out (σ_{z} = 0), and so are "
                               "ends, nozzles and supports."));
  return cautions;
}

} // namespace

Results<Contribution> contributionOf(const Vessel& vessel, const WrittenUnits& units) {
  if (Problems problems = problemsOf(vessel); !problems.empty())
    return tl::unexpected(std::move(problems));
  const double hoop = vessel.pressure * vessel.innerRadius / vessel.thickness;
  const double axial = vessel.closedEnds ? hoop / 2 : 0;
  const Formula p = Formula::symbol("p");
  const Formula r = Formula::symbol("r");
  const Formula t = Formula::symbol("t");
  const NumbersPutIn numbers = {units.put("p", vessel.pressure, dimension::stress),
                                units.put("r", vessel.innerRadius, dimension::length),
                                units.put("t", vessel.thickness, dimension::length)};
  Contribution result;
  result.stress = {axial, hoop, 0};
  result.axial = axial;
  result.steps.push_back(units.step(PW_TEXT("Source", "hoop stress"), "σ_{y}", p * r / t, numbers, hoop,
                                    dimension::stress, theory()));
  if (vessel.closedEnds)
    result.steps.push_back(units.step(PW_TEXT("Source", "axial stress, closed ends"), "σ_{x}",
                                      p * r / (2 * t), numbers, axial, dimension::stress, theory()));
  result.signRules = {
      PW_TEXT("Source", "p is positive where the pressure inside is the greater one; x runs along "
                        "the axis of the vessel."),
      vessel.closedEnds ? PW_TEXT("Source", "The ends are closed: their pressure is carried by the wall.")
                        : PW_TEXT("Source", "The ends are open: pressure gives no axial stress.")};
  result.cautions = cautionsOf(vessel);
  return result;
}

} // namespace planewright

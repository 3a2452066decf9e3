// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/measured.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <cmath>
#include <string>

namespace planewright {

namespace {

constexpr double micro = 1e-6;
constexpr int strainDecimals = 1;

const Formula ex = Formula::symbol("ε_{x}");
const Formula ey = Formula::symbol("ε_{y}");
const Formula gxy = Formula::symbol("γ_{xy}");

NumberPutIn strainPutIn(const Formula& symbol, double strain) {
  return {symbol.symbol(), strain, strainDecimals, false, "µε", micro};
}

/// Writes the steps from strains to stresses.
class Working {
public:
  Working(const RosetteSolution& solution, const Elastic& elastic, const WrittenUnits& units)
      : m_solution(solution), m_elastic(elastic), m_units(units) {}

  std::vector<Step> steps(const Rosette& rosette, const PrincipalStrains& principal,
                          const PlaneStress& stress) {
    addGauges(rosette);
    addPrincipal(principal);
    if (const auto* isotropic = std::get_if<Isotropic>(&m_elastic))
      addIsotropic(*isotropic, stress);
    else
      addOrthotropic(std::get<Orthotropic>(m_elastic), stress);
    return std::move(m_steps);
  }

private:
  NumbersPutIn strains() const {
    return {strainPutIn(ex, m_solution.strain.ex), strainPutIn(ey, m_solution.strain.ey),
            strainPutIn(gxy, m_solution.strain.gxy)};
  }

  void addStrain(Text name, Text symbol, Formula formula, NumbersPutIn numbers, double result, Text source) {
    m_steps.push_back({std::move(name), std::move(symbol), std::move(formula), std::move(numbers), result,
                       strainDecimals, "µε", std::move(source), micro});
  }

  void addStress(Text name, const char* symbol, Formula formula, NumbersPutIn numbers, double result) {
    m_steps.push_back(m_units.step(std::move(name), symbol, std::move(formula), std::move(numbers), result,
                                   dimension::stress, PW_TEXT("Source", "Hooke's law in plane stress")));
  }

  /// The solution put back into the equation of each gauge, which any checker can do by hand.
  void addGauges(const Rosette& rosette) {
    for (std::size_t i = 0; i < rosette.size(); ++i) {
      const std::string letter(1, static_cast<char>('a' + i));
      const Formula angle = Formula::symbol("α_{" + letter + "}");
      NumbersPutIn numbers = strains();
      numbers.push_back(WrittenUnits::angle(angle.symbol(), rosette[i].direction.degrees()));
      addStrain(PW_TEXT("Source", "reading of gauge %1, from the strains found").with(letter),
                symbol("ε_{" + letter + "}"),
                ex * power(cosine(angle), 2) + ey * power(sine(angle), 2) + gxy * sine(angle) * cosine(angle),
                std::move(numbers), rosette[i].strain, PW_TEXT("Source", "equation of a gauge"));
    }
  }

  void addPrincipal(const PrincipalStrains& principal) {
    const Text source = PW_TEXT("Source", "circle of strain");
    const Formula mean = (ex + ey) / 2;
    const Formula radius = hypotenuse((ex - ey) / 2, gxy / 2);
    addStrain(PW_TEXT("Source", "greater principal strain"), symbol("ε_{1}"), mean + radius, strains(),
              principal.e1, source);
    addStrain(PW_TEXT("Source", "lesser principal strain"), symbol("ε_{2}"), mean - radius, strains(),
              principal.e2, source);
    if (principal.direction)
      m_steps.push_back({PW_TEXT("Source", "direction of ε_{1}"), symbol("θ_{ε}"),
                         arcTangent(gxy, ex - ey) / 2, strains(), principal.direction->degrees(), 2, "°",
                         source});
  }

  void addIsotropic(const Isotropic& material, const PlaneStress& stress) {
    const Formula E = Formula::symbol("E");
    const Formula nu = Formula::symbol("ν");
    NumbersPutIn numbers = strains();
    numbers.push_back(m_units.put("E", material.E, dimension::stress));
    numbers.push_back(WrittenUnits::plainNumber("ν", material.nu));
    const Formula stiffness = E / (1 - power(nu, 2));
    addStress(PW_TEXT("Source", "normal stress in x"), "σ_{x}", stiffness * (ex + nu * ey), numbers,
              stress.sx);
    addStress(PW_TEXT("Source", "normal stress in y"), "σ_{y}", stiffness * (ey + nu * ex), numbers,
              stress.sy);
    addStress(PW_TEXT("Source", "shear stress"), "τ_{xy}", E / (2 * (1 + nu)) * gxy, numbers, stress.txy);
  }

  void addOrthotropic(const Orthotropic& material, const PlaneStress& stress) {
    const PlaneStrain ofLine = inTurnedAxes(m_solution.strain, material.line);
    const PlaneStress inLine = inTurnedAxes(stress, material.line);
    const Formula e1 = Formula::symbol("ε_{φ}");
    const Formula e2 = Formula::symbol("ε_{φ+90°}");
    const Formula g12 = Formula::symbol("γ_{φ}");
    addStrainsOfLine(material, ofLine);
    const Formula E1 = Formula::symbol("E_{φ}");
    const Formula E2 = Formula::symbol("E_{φ+90°}");
    const Formula nu = Formula::symbol("ν_{12}");
    const Formula G = Formula::symbol("G");
    const NumbersPutIn numbers = {strainPutIn(e1, ofLine.ex),
                                  strainPutIn(e2, ofLine.ey),
                                  strainPutIn(g12, ofLine.gxy),
                                  m_units.put(E1.symbol(), material.along, dimension::stress),
                                  m_units.put(E2.symbol(), material.across, dimension::stress),
                                  WrittenUnits::plainNumber(nu.symbol(), material.nu12),
                                  m_units.put(G.symbol(), material.G, dimension::stress)};
    const Formula rest = 1 - power(nu, 2) * E2 / E1;
    addStress(PW_TEXT("Source", "stress along the line"), "σ_{φ}", (E1 * e1 + nu * E2 * e2) / rest, numbers,
              inLine.sx);
    addStress(PW_TEXT("Source", "stress across the line"), "σ_{φ+90°}", E2 * (e2 + nu * e1) / rest, numbers,
              inLine.sy);
    addStress(PW_TEXT("Source", "shear in the axes of the line"), "τ_{φ}", G * g12, numbers, inLine.txy);
    addTurnedBack(material, inLine, stress);
  }

  void addStrainsOfLine(const Orthotropic& material, const PlaneStrain& ofLine) {
    const Text source = PW_TEXT("Source", "strains in turned axes");
    const Formula phi = Formula::symbol("φ");
    NumbersPutIn numbers = strains();
    numbers.push_back(WrittenUnits::angle("φ", material.line.degrees()));
    const Formula mean = (ex + ey) / 2;
    const Formula turned = (ex - ey) / 2 * cosine(2 * phi) + gxy / 2 * sine(2 * phi);
    addStrain(PW_TEXT("Source", "strain along the line"), symbol("ε_{φ}"), mean + turned, numbers, ofLine.ex,
              source);
    addStrain(PW_TEXT("Source", "strain across the line"), symbol("ε_{φ+90°}"), mean - turned, numbers,
              ofLine.ey, source);
    addStrain(PW_TEXT("Source", "shear strain in the axes of the line"), symbol("γ_{φ}"),
              -(ex - ey) * sine(2 * phi) + gxy * cosine(2 * phi), numbers, ofLine.gxy, source);
  }

  void addTurnedBack(const Orthotropic& material, const PlaneStress& inLine, const PlaneStress& stress) {
    const Formula s1 = Formula::symbol("σ_{φ}");
    const Formula s2 = Formula::symbol("σ_{φ+90°}");
    const Formula t12 = Formula::symbol("τ_{φ}");
    const Formula phi = Formula::symbol("φ");
    const NumbersPutIn numbers = {m_units.put(s1.symbol(), inLine.sx, dimension::stress),
                                  m_units.put(s2.symbol(), inLine.sy, dimension::stress),
                                  m_units.put(t12.symbol(), inLine.txy, dimension::stress),
                                  WrittenUnits::angle("φ", material.line.degrees())};
    const Formula mean = (s1 + s2) / 2;
    const Formula turned = (s1 - s2) / 2 * cosine(2 * phi) - t12 * sine(2 * phi);
    addStress(PW_TEXT("Source", "normal stress in x"), "σ_{x}", mean + turned, numbers, stress.sx);
    addStress(PW_TEXT("Source", "normal stress in y"), "σ_{y}", mean - turned, numbers, stress.sy);
    addStress(PW_TEXT("Source", "shear stress"), "τ_{xy}",
              (s1 - s2) / 2 * sine(2 * phi) + t12 * cosine(2 * phi), numbers, stress.txy);
  }

  const RosetteSolution& m_solution;
  const Elastic& m_elastic;
  const WrittenUnits& m_units;
  std::vector<Step> m_steps;
};

std::vector<Text> cautionsOf(const RosetteSolution& solution, const Elastic& elastic) {
  std::vector<Text> cautions;
  if (solution.errorGain > cautionedErrorGain)
    cautions.push_back(
        PW_TEXT("Source", "The gauges are nearly parallel: an error of reading can grow %1 times.")
            .with(numberText(shownNumber(solution.errorGain, 0))));
  cautions.push_back(PW_TEXT("Source",
                             "Gauges see the surface alone, and strains of temperature and moisture as "
                             "well as those of stress."));
  if (std::holds_alternative<Orthotropic>(elastic))
    cautions.push_back(PW_TEXT("Source",
                               "The principal axes of stress differ from those of strain in a material "
                               "with a line."));
  return cautions;
}

} // namespace

Results<Measured> measuredBy(const Rosette& rosette, const Elastic& elastic, const WrittenUnits& units) {
  Problems problems = problemsOf(elastic);
  Result<RosetteSolution> solution = solved(rosette);
  if (!solution)
    problems.push_back(solution.error());
  if (!problems.empty())
    return tl::unexpected(std::move(problems));
  Measured measured{*solution, principalOf(solution->strain), {}};
  Contribution& contribution = measured.contribution;
  contribution.stress = stressOf(solution->strain, elastic);
  // Strains at one place do not tell a normal force from bending, so sx is in neither part.
  contribution.steps =
      Working(measured.solution, elastic, units).steps(rosette, measured.principal, contribution.stress);
  contribution.signRules = {PW_TEXT("Source",
                                    "Strains are positive in extension; the directions of the gauges are "
                                    "counter-clockwise from +x.")};
  contribution.cautions = cautionsOf(measured.solution, elastic);
  return measured;
}

} // namespace planewright

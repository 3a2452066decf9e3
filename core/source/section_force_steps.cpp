// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_force_steps.h"

#include "core/quantity/format.h"
#include "core/source/seen.h"

#include <cmath>

namespace planewright {

namespace {

Text lord(std::string_view where) {
  return PW_TEXT("Source", "Lord, Richardson, Davison, Dillard: Strength of Materials (2026), %1")
      .with(where);
}
Text commonPractice() {
  return PW_TEXT("Source", "common practice, no source");
}

Formula sym(std::string_view name) {
  return Formula::symbol(name);
}

/// A sum of terms with their signs.
class Sum {
public:
  void add(double sign, const Formula& term) {
    if (!m_total)
      m_total = sign < 0 ? -term : term;
    else
      m_total = sign < 0 ? *m_total - term : *m_total + term;
  }
  bool empty() const { return !m_total; }
  const Formula& total() const { return *m_total; }

private:
  std::optional<Formula> m_total;
};

class Working {
public:
  Working(const SectionModel& model, const SectionForces& forces, const Fibre& fibre, ShearRule rule,
          const FibreStress& stress, const WrittenUnits& units)
      : m_model(model), m_forces(forces), m_fibre(fibre), m_rule(rule), m_stress(stress), m_units(units) {
    putInForces();
    putInSection();
  }

  std::vector<Step> steps() {
    addNormal();
    addShear();
    if (m_stress.torsion && m_stress.torsion->txy != 0)
      addTorsion();
    addSums();
    return std::move(m_steps);
  }

private:
  bool seesSide() const { return m_fibre.view == View::side; }

  void put(std::string_view symbolOf, double value, Dimension dimension) {
    m_numbers.push_back(m_units.put(symbolOf, value, dimension));
  }

  void putInForces() {
    put("N", m_forces.N, dimension::force);
    put("V_{y}", m_forces.Vy, dimension::force);
    put("V_{z}", m_forces.Vz, dimension::force);
    put("T", m_forces.T, dimension::moment);
    put("M_{y}", m_forces.My, dimension::moment);
    put("M_{z}", m_forces.Mz, dimension::moment);
    put("y", m_fibre.y, dimension::length);
    put("z", m_fibre.z, dimension::length);
  }

  void putInSection() {
    if (m_model.isTabled()) {
      for (const SizeKind& kind : sizesOf(SectionShape::tabled))
        if (const auto row = m_model.section.sizes.find(kind.key); row != m_model.section.sizes.end())
          put(kind.symbol.source, row->second, kind.dimension);
      return;
    }
    put("A", m_model.properties.A, dimension::area);
    put("I_{z}", m_model.properties.Iz, dimension::secondMoment);
    put("I_{y}", m_model.properties.Iy, dimension::secondMoment);
    put("I_{yz}", m_model.properties.Iyz, dimension::secondMoment);
  }

  void add(Text name, std::string_view symbolOf, const Formula& formula, double result, Dimension dimension,
           Text source) {
    m_steps.push_back(
        m_units.step(std::move(name), symbolOf, formula, m_numbers, result, dimension, std::move(source)));
  }

  void addStress(Text name, std::string_view symbolOf, const Formula& formula, double result, Text source) {
    add(std::move(name), symbolOf, formula, result, dimension::stress, std::move(source));
    m_numbers.push_back(m_units.put(symbolOf, result, dimension::stress));
  }

  void addNormal() {
    if (m_forces.N != 0)
      addStress(PW_TEXT("Source", "stress of the normal force"), "σ_{N}", sym("N") / sym("A"), m_stress.axial,
                lord("Example 14.2"));
    if (m_forces.My == 0 && m_forces.Mz == 0)
      return;
    const bool isGeneral = m_model.properties.Iyz != 0;
    addStress(PW_TEXT("Source", "stress of bending"), "σ_{M}", isGeneral ? generalBending() : bending(),
              m_stress.bending, isGeneral ? commonPractice() : lord("chapter 9"));
  }

  Formula bending() const {
    Sum sum;
    if (m_forces.Mz != 0)
      sum.add(-1, ofMoment("M_{z}", "y", "I_{z}", "W_{z}", m_fibre.y));
    if (m_forces.My != 0)
      sum.add(+1, ofMoment("M_{y}", "z", "I_{y}", "W_{y}", m_fibre.z));
    return sum.total();
  }

  /// M y/I, or M/W where only W is tabled, negative below the axis.
  Formula ofMoment(const char* moment, const char* lever, const char* second, const char* modulus,
                   double place) const {
    if (!m_model.isTabled() || has(second))
      return sym(moment) * sym(lever) / sym(second);
    const Formula byModulus = sym(moment) / sym(modulus);
    return place < 0 ? -byModulus : byModulus;
  }

  bool has(std::string_view symbolOf) const {
    for (const NumberPutIn& number : m_numbers)
      if (number.symbol == symbolOf)
        return true;
    return false;
  }

  static Formula determinant() { return sym("I_{y}") * sym("I_{z}") - power(sym("I_{yz}"), 2); }

  static Formula generalBending() {
    const Formula perY = sym("M_{z}") * sym("I_{y}") + sym("M_{y}") * sym("I_{yz}");
    const Formula perZ = sym("M_{y}") * sym("I_{z}") + sym("M_{z}") * sym("I_{yz}");
    return (perZ * sym("z") - perY * sym("y")) / determinant();
  }

  /// V_y as it acts upwards.
  Formula upwards() const { return m_rule == ShearRule::upward ? sym("V_{y}") : -sym("V_{y}"); }
  double upwardsSign() const { return m_rule == ShearRule::upward ? 1 : -1; }
  /// Of the shear in the axes of the view.
  double viewSign() const { return seesSide() ? 1 : -1; }

  void addShear() {
    const ShearOfV& shear = m_stress.ofV;
    if (shear.value == 0)
      return;
    const double first = seesSide() ? shear.cut.S : shear.cut.across;
    const double second = seesSide() ? shear.cut.across : shear.cut.S;
    if (shear.path != ShearPath::tabled) {
      addFirstMoment("S_{z}", "y", first, m_forces.Vy != 0 || m_model.properties.Iyz != 0);
      addFirstMoment("S_{y}", "z", second, m_forces.Vz != 0 || m_model.properties.Iyz != 0);
      put("b", shear.cut.width, dimension::length);
    }
    const bool isGeneral = m_model.properties.Iyz != 0;
    addStress(PW_TEXT("Source", "shear of V"), "τ_{V}",
              isGeneral ? generalShear(first, second) : plainShear(first, second), m_stress.shear,
              isGeneral ? commonPractice() : lord("Example 10.3"));
  }

  /// The area beyond the cut times the distance of its centroid.
  void addFirstMoment(const char* symbolOf, const char* axis, double value, bool isNeeded) {
    if (value == 0 || !isNeeded)
      return;
    const std::string place = std::string(axis) + "_{*}";
    if (!has("A_{*}"))
      put("A_{*}", m_stress.ofV.cut.area, dimension::area);
    put(place, value / m_stress.ofV.cut.area, dimension::length);
    add(seesSide() ? PW_TEXT("Source", "first moment of the part above the cut")
                   : PW_TEXT("Source", "first moment of the part to the right of the cut"),
        symbolOf, sym("A_{*}") * sym(place), value, dimension::firstMoment, lord("Example 10.1"));
    put(symbolOf, value, dimension::firstMoment);
  }

  Formula plainShear(double first, double second) {
    Sum sum;
    const char* width = m_stress.ofV.path != ShearPath::tabled ? "b" : seesSide() ? "b_{y}" : "b_{z}";
    const bool isTabled = m_stress.ofV.path == ShearPath::tabled;
    if (m_forces.Vy != 0 && first != 0 && (!isTabled || seesSide()))
      sum.add(viewSign() * upwardsSign(), sym("V_{y}") * sym("S_{z}") / (sym("I_{z}") * sym(width)));
    if (m_forces.Vz != 0 && (isTabled ? !seesSide() : second != 0))
      sum.add(viewSign(), sym("V_{z}") * sym("S_{y}") / (sym("I_{y}") * sym(width)));
    if (m_stress.ofV.alongWall != 0)
      addAlongWall(sum);
    return sum.total();
  }

  void addAlongWall(Sum& sum) {
    const char* middle = seesSide() ? "z_{m}" : "y_{m}";
    put(middle, m_stress.ofV.wallMiddle, dimension::length);
    if (seesSide())
      sum.add(-1, sym("V_{z}") * sym("y") * sym(middle) / sym("I_{y}"));
    else
      sum.add(upwardsSign(), sym("V_{y}") * sym("z") * sym(middle) / sym("I_{z}"));
  }

  Formula generalShear(double first, double second) {
    const Formula perY = upwards() * sym("I_{y}") - sym("V_{z}") * sym("I_{yz}");
    const Formula perZ = sym("V_{z}") * sym("I_{z}") - upwards() * sym("I_{yz}");
    Sum sum;
    if (first != 0)
      sum.add(1, perY * sym("S_{z}"));
    if (second != 0)
      sum.add(1, perZ * sym("S_{y}"));
    const Formula shear = sum.total() / (determinant() * sym("b"));
    return seesSide() ? shear : -shear;
  }

  void addTorsion() {
    const TorsionShear& torsion = *m_stress.torsion;
    const double sign = torsion.at > 0 ? -1 : 1;
    switch (torsion.constant.rule) {
    case TorsionRule::circular:
      addRoundConstant();
      [[fallthrough]];
    case TorsionRule::tabled:
      put("r", torsion.at, dimension::length);
      return addOfTorsion(-(sym("T") * sym("r") / sym("J")), lord("Example 6.2"));
    case TorsionRule::closed: {
      addCell();
      put("t", torsion.wall, dimension::length);
      const Formula size = sym("T") / (2 * sym("A_{m}") * sym("t"));
      return addOfTorsion(sign < 0 ? -size : size, PW_TEXT("Source", "Bredt's formula, from memory"));
    }
    case TorsionRule::open:
      addOpenConstant();
      put("e", torsion.at, dimension::length);
      return addOfTorsion(-(2 * sym("T") * sym("e") / sym("J")),
                          PW_TEXT("Source", "thin open walls, e from the middle of the wall; from memory"));
    case TorsionRule::rectangle: {
      putInSides();
      m_numbers.push_back(WrittenUnits::plainNumber("c", torsion.c));
      const Formula size = sym("T") / (sym("c") * sym("a") * power(sym("t"), 2));
      return addOfTorsion(sign < 0 ? -size : size,
                          PW_TEXT("Source", "Saint-Venant's series for c, a the longer side; from memory"));
    }
    }
  }

  void addOfTorsion(const Formula& formula, Text source) {
    addStress(PW_TEXT("Source", "shear of torsion"), "τ_{T}", formula, m_stress.torsion->txy,
              std::move(source));
  }

  void putInSizes() {
    for (const SizeKind& kind : sizesOf(m_model.section.shape))
      put(kind.symbol.source, m_model.section.size(kind.key), kind.dimension);
  }

  void addConstant(const Formula& formula, Text source) {
    add(PW_TEXT("Source", "torsion constant"), "J", formula, m_stress.torsion->constant.J,
        dimension::secondMoment, std::move(source));
    put("J", m_stress.torsion->constant.J, dimension::secondMoment);
  }

  void addRoundConstant() {
    putInSizes();
    m_numbers.push_back(WrittenUnits::pi());
    const Formula d = power(sym("d"), 4);
    const bool isTube = m_model.section.shape == SectionShape::tube;
    addConstant(sym("π") * (isTube ? d - power(sym("d") - 2 * sym("t"), 4) : d) / 32, lord("Example 14.5"));
  }

  void addCell() {
    const Section& s = m_model.section;
    put("b_{m}", s.size("b") - s.size("t_w"), dimension::length);
    put("h_{m}", s.size("h") - s.size("t_f"), dimension::length);
    add(PW_TEXT("Source", "area inside the middle line of the walls"), "A_{m}", sym("b_{m}") * sym("h_{m}"),
        m_stress.torsion->constant.cell, dimension::area, commonPractice());
    put("A_{m}", m_stress.torsion->constant.cell, dimension::area);
  }

  void addOpenConstant() {
    Sum sum;
    int n = 0;
    for (const Piece& piece : m_model.region.pieces) {
      if (piece.kind != Piece::Kind::plate)
        continue;
      const std::string index = "_{" + exactNumber(++n) + "}";
      put("l" + index, std::max(piece.width(), piece.height()), dimension::length);
      put("t" + index, std::min(piece.width(), piece.height()), dimension::length);
      sum.add(1, sym("l" + index) * power(sym("t" + index), 3) / 3);
    }
    addConstant(sum.total(), PW_TEXT("Source", "thin open walls, approximate; from memory"));
  }

  void putInSides() {
    const Section& s = m_model.section;
    put("a", std::max(s.size("b"), s.size("h")), dimension::length);
    put("t", std::min(s.size("b"), s.size("h")), dimension::length);
  }

  void addSums() {
    addSum(PW_TEXT("Source", "normal stress"), "σ_{x}", "σ_{N}", "σ_{M}", m_stress.stress.sx);
    addSum(PW_TEXT("Source", "shear stress"), "τ_{xy}", "τ_{V}", "τ_{T}", m_stress.stress.txy);
  }

  void addSum(Text name, std::string_view symbolOf, std::string_view first, std::string_view second,
              double result) {
    if (has(first) && has(second))
      add(std::move(name), symbolOf, sym(first) + sym(second), result, dimension::stress, lord("chapter 14"));
  }

  const SectionModel& m_model;
  const SectionForces& m_forces;
  const Fibre& m_fibre;
  ShearRule m_rule;
  const FibreStress& m_stress;
  const WrittenUnits& m_units;
  NumbersPutIn m_numbers; ///< of everything found so far
  std::vector<Step> m_steps;
};

} // namespace

std::vector<Step> stepsOf(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                          ShearRule rule, const FibreStress& stress, const WrittenUnits& units) {
  return Working(model, forces, fibre, rule, stress, units).steps();
}

std::vector<Text> signRulesOf(const SectionForces& forces, const Fibre& fibre, ShearRule rule) {
  std::vector<Text> rules;
  if (forces.N != 0)
    rules.push_back(PW_TEXT("Source", "N is positive in tension."));
  if (forces.Mz != 0)
    rules.push_back(PW_TEXT("Source", "M_{z} is positive when it sags: it pulls at y < 0."));
  if (forces.My != 0)
    rules.push_back(PW_TEXT("Source", "M_{y} is positive when it pulls at z > 0."));
  if (forces.Vy != 0)
    rules.push_back(rule == ShearRule::upward
                        ? PW_TEXT("Source",
                                  "V_{y} is positive when it acts in +y on the +x face, so that dM_{z}/dx = "
                                  "−V_{y} and τ_{xy} = +V_{y} S/(I b).")
                        : PW_TEXT("Source", "V_{y} = dM_{z}/dx, so that τ_{xy} = −V_{y} S/(I b)."));
  if (forces.Vz != 0)
    rules.push_back(PW_TEXT(
        "Source", "V_{z} is positive when it acts in +z on the +x face, which is dM_{y}/dx = V_{z}."));
  if (forces.T != 0)
    rules.push_back(PW_TEXT("Source",
                            "T is right-handed about +x: its shear is −T r/J on the face towards the viewer "
                            "and + on the far face."));
  if (fibre.view == View::top)
    rules.push_back(PW_TEXT("Source",
                            "Seen from the top, x to the right and −z as the second axis: τ is positive in "
                            "−z on the +x face."));
  return rules;
}

Results<Contribution> contributionOf(const Section& section, const SectionForces& forces, const Fibre& fibre,
                                     ShearRule rule, const WrittenUnits& units) {
  const Results<SectionModel> model = modelOf(section);
  if (!model)
    return tl::unexpected(model.error());
  Result<FibreStress> stress = stressAt(*model, forces, fibre, rule);
  if (!stress)
    return tl::unexpected(Problems{std::move(stress).error()});
  return Contribution{stress->stress,
                      stress->axial,
                      stress->bending,
                      stepsOf(*model, forces, fibre, rule, *stress, units),
                      signRulesOf(forces, fibre, rule),
                      std::move(stress->cautions)};
}

} // namespace planewright

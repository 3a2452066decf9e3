// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_forces.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <algorithm>
#include <cmath>

namespace planewright {

SectionForces operator+(const SectionForces& a, const SectionForces& b) {
  return {a.N + b.N, a.Vy + b.Vy, a.Vz + b.Vz, a.T + b.T, a.My + b.My, a.Mz + b.Mz};
}

SectionForces operator*(double factor, const SectionForces& f) {
  return {factor * f.N, factor * f.Vy, factor * f.Vz, factor * f.T, factor * f.My, factor * f.Mz};
}

namespace {

Problem problem(Text what, Text mend) {
  return {{}, 0, 0, {}, std::move(what), std::move(mend)};
}

Text inMillimetres(double length) {
  return numberText(shownNumber(length, decimalsFor(std::abs(length))));
}

Text ofTaperedMembers() {
  return PW_TEXT(
      "Source",
      "V S/(I b) is for members of constant section: in a tapered one N and M shear the fibre too.");
}

double upwards(double Vy, ShearRule rule) {
  return rule == ShearRule::upward ? Vy : -Vy;
}

/// The forces at one fibre of a section that is drawn.
class Drawn {
public:
  Drawn(const SectionModel& model, const SectionForces& forces, const Fibre& fibre, ShearRule rule)
      : m_model(model), m_p(model.properties), m_forces(forces), m_fibre(fibre), m_rule(rule) {}

  Result<FibreStress> stress() {
    if (!contains(m_model.region, m_fibre.y, m_fibre.z))
      return tl::unexpected(outside());
    addNormal();
    if (const Result<void> added = addShear(); !added)
      return tl::unexpected(added.error());
    if (m_forces.T != 0) {
      Result<TorsionShear> torsion = torsionAt(m_model, m_forces.T, m_fibre);
      if (!torsion)
        return tl::unexpected(std::move(torsion).error());
      m_result.torsion = *std::move(torsion);
      caution(m_result.torsion->cautions);
    }
    m_result.stress = {m_result.axial + m_result.bending, 0,
                       m_result.shear + (m_result.torsion ? m_result.torsion->txy : 0)};
    return std::move(m_result);
  }

private:
  Problem outside() const {
    const Region& region = m_model.region;
    return problem(PW_TEXT("Source", "y = %1, z = %2 mm is outside the material.")
                       .with(inMillimetres(m_fibre.y))
                       .with(inMillimetres(m_fibre.z)),
                   PW_TEXT("Source", "Stay in it: from the centroid y is %1 to %2, z %3 to %4 mm at most.")
                       .with(inMillimetres(region.yLow))
                       .with(inMillimetres(region.yHigh))
                       .with(inMillimetres(region.zLow))
                       .with(inMillimetres(region.zHigh)));
  }

  void caution(const std::vector<Text>& cautions) {
    m_result.cautions.insert(m_result.cautions.end(), cautions.begin(), cautions.end());
  }

  void addNormal() {
    const double determinant = m_p.Iy * m_p.Iz - m_p.Iyz * m_p.Iyz;
    const double perY = -(m_forces.Mz * m_p.Iy + m_forces.My * m_p.Iyz) / determinant;
    const double perZ = (m_forces.My * m_p.Iz + m_forces.Mz * m_p.Iyz) / determinant;
    m_result.axial = m_forces.N / m_p.A;
    m_result.bending = perY * m_fibre.y + perZ * m_fibre.z;
  }

  Result<void> addShear() {
    const Gradient gradient = gradientOf(m_p, upwards(m_forces.Vy, m_rule), m_forces.Vz);
    if (gradient.isZero())
      return {};
    Result<ShearOfV> shear = shearAt(m_model, gradient, m_fibre);
    if (!shear)
      return tl::unexpected(std::move(shear).error());
    m_result.ofV = *std::move(shear);
    m_result.shear = m_fibre.view == View::side ? m_result.ofV.value : -m_result.ofV.value;
    caution(m_result.ofV.cautions);
    if ((m_forces.Vy != 0 && !m_model.isMirroredAboutY) || (m_forces.Vz != 0 && !m_model.isMirroredAboutZ))
      m_result.cautions.push_back(PW_TEXT(
          "Source", "V is taken through the centre of shear; where it acts elsewhere, T has to say so."));
    m_result.cautions.push_back(ofTaperedMembers());
    return {};
  }

  const SectionModel& m_model;
  const SectionProperties& m_p;
  const SectionForces& m_forces;
  const Fibre& m_fibre;
  ShearRule m_rule;
  FibreStress m_result;
};

/// The forces at the fibre that tabled values mean.
class Tabled {
public:
  Tabled(const SectionModel& model, const SectionForces& forces, const Fibre& fibre, ShearRule rule)
      : m_model(model), m_forces(forces), m_fibre(fibre), m_rule(rule) {}

  Result<FibreStress> stress() {
    if (m_forces.N != 0)
      m_result.axial = m_forces.N / needed("A");
    m_result.bending =
        bending(m_forces.Mz, "I_z", "W_z", -m_fibre.y) + bending(m_forces.My, "I_y", "W_y", m_fibre.z);
    addShear();
    if (m_forces.T != 0)
      addTorsion();
    if (m_missing)
      return tl::unexpected(std::move(*m_missing));
    m_result.stress = {m_result.axial + m_result.bending, 0,
                       m_result.shear + (m_result.torsion ? m_result.torsion->txy : 0)};
    return std::move(m_result);
  }

private:
  bool has(std::string_view key) const { return m_model.section.sizes.contains(key); }

  /// The value, or 1 and a Problem that is kept.
  double needed(std::string_view key) {
    if (has(key))
      return m_model.section.size(key);
    if (!m_missing)
      m_missing = Problem{std::string(key),
                          0,
                          0,
                          {},
                          PW_TEXT("Source", "The %1 is needed here and not given.").with(kindOf(key).meaning),
                          PW_TEXT("Source", "Give it, or leave out the force that needs it.")};
    return 1;
  }

  static const SizeKind& kindOf(std::string_view key) {
    return *std::ranges::find(sizesOf(SectionShape::tabled), key, &SizeKind::key);
  }
  static Text symbolOf(std::string_view key) { return kindOf(key).symbol; }

  /// M/W at the fibre where I is not given, with the sign of its side.
  double bending(double moment, std::string_view second, std::string_view modulus, double lever) {
    if (moment == 0)
      return 0;
    if (has(second) || !has(modulus)) {
      if (has(modulus))
        m_result.cautions.push_back(PW_TEXT("Source", "%1 is not used, since %2 is given.")
                                        .with(symbolOf(modulus))
                                        .with(symbolOf(second)));
      return moment * lever / needed(second);
    }
    if (lever == 0 && !m_missing)
      m_missing = problem(PW_TEXT("Source", "%1 does not say on which side of the axis the fibre lies.")
                              .with(symbolOf(modulus)),
                          PW_TEXT("Source", "Give the place of the fibre, y up and z to the viewer."));
    return (lever < 0 ? -moment : moment) / needed(modulus);
  }

  void addShear() {
    const bool side = m_fibre.view == View::side;
    const double V = side ? upwards(m_forces.Vy, m_rule) : m_forces.Vz;
    const double across = side ? m_forces.Vz : m_forces.Vy;
    if (across != 0)
      m_result.cautions.push_back(
          PW_TEXT("Source", "Shear of V across the plane that is seen is not judged with tabled values."));
    if (V == 0)
      return;
    m_result.ofV.path = ShearPath::tabled;
    m_result.ofV.cut.S = needed(side ? "S_z" : "S_y");
    m_result.ofV.cut.width = m_result.ofV.cut.wider = needed(side ? "b_y" : "b_z");
    m_result.ofV.value = V * m_result.ofV.cut.S / (needed(side ? "I_z" : "I_y") * m_result.ofV.cut.width);
    m_result.shear = side ? m_result.ofV.value : -m_result.ofV.value;
    m_result.cautions.push_back(ofTaperedMembers());
  }

  void addTorsion() {
    Result<TorsionShear> torsion = torsionAt(m_model, m_forces.T, m_fibre);
    if (torsion) {
      m_result.torsion = *std::move(torsion);
      m_result.cautions.insert(m_result.cautions.end(), m_result.torsion->cautions.begin(),
                               m_result.torsion->cautions.end());
    } else if (!m_missing) {
      m_missing = std::move(torsion).error();
    }
  }

  const SectionModel& m_model;
  const SectionForces& m_forces;
  const Fibre& m_fibre;
  ShearRule m_rule;
  std::optional<Problem> m_missing;
  FibreStress m_result;
};

} // namespace

Result<FibreStress> stressAt(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                             ShearRule rule) {
  return model.isTabled() ? Tabled(model, forces, fibre, rule).stress()
                          : Drawn(model, forces, fibre, rule).stress();
}

} // namespace planewright

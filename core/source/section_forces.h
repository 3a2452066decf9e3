// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/contribution.h"
#include "core/source/shear_at.h"
#include "core/source/torsion.h"

namespace planewright {

/// Forces on the +x face of a cross section; N, N mm. N tension positive. M_z sagging positive: it pulls at
/// y < 0; M_y positive when it pulls at z > 0. V_z positive in +z, V_y by a ShearRule. T right-handed about
/// +x.
struct SectionForces {
  double N = 0;
  double Vy = 0;
  double Vz = 0;
  double T = 0;
  double My = 0;
  double Mz = 0;
  bool operator==(const SectionForces&) const = default;
};
SectionForces operator+(const SectionForces& a, const SectionForces& b);
SectionForces operator*(double factor, const SectionForces& forces);

/// The stress at a fibre with its parts, MPa.
struct FibreStress {
  PlaneStress stress;                  ///< in the axes of the fibre's view; sy = 0
  double axial = 0;                    ///< N/A, part of sx
  double bending = 0;                  ///< part of sx
  double shear = 0;                    ///< of V, part of txy
  ShearOfV ofV;                        ///< how the shear of V follows, in the axes of the section
  std::optional<TorsionShear> torsion; ///< where T is not 0; its txy is the rest of txy
  std::vector<Text> cautions;
};

/// The stress at a fibre, with tension positive. Plane sections:
/// sx = N/A - Mz y/Iz + My z/Iy; where Iyz is not 0 the general formula
/// sx = N/A - ((Mz Iy + My Iyz) y - (My Iz + Mz Iyz) z)/(Iy Iz - Iyz^2).
/// From the side txy = +-Vy Sz/(Iz b) + Vz Sy/(Iy b) with the moments of the part above the level cut; from
/// the top txy = -(Vz Sy/(Iy b) +- Vy Sz/(Iz b)) with those of the part to the right of the upright cut; the
/// upper sign for the upward rule. All of prismatic members; V through the centre of shear.
///
/// A Problem: a fibre outside the section; an overhanging flange, whose shear runs across the view; shear of
/// torsion that is not given or runs across the view; a tabled value that is needed and not there. A caution:
/// shear of V across the view, a mean over unlike walls, a wide or inclined cut.
/// Formulas: Lord, Richardson, Davison, Dillard: Strength of Materials (2026), chapters 6, 9, 10 and 14; the
/// general formula common practice, no source.
Result<FibreStress> stressAt(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                             ShearRule rule);

/// What section forces add to the stress at a point; bending is the part of sx that moments make.
Results<Contribution> contributionOf(const Section& section, const SectionForces& forces, const Fibre& fibre,
                                     ShearRule rule, const WrittenUnits& units = {});

} // namespace planewright

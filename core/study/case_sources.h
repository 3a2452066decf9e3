// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/contribution.h"
#include "core/source/section_forces.h"
#include "core/source/written_units.h"
#include "core/study/place.h"

namespace planewright {

/// What the sources of a case (section forces, pressure, measured strains) make at a point: MPa, tension
/// positive, in the axes of the point. Stresses that are typed directly are not in it.
struct SourceStress {
  PlaneStress stress;
  double axial = 0;    ///< part of sx from normal forces and closed ends
  double bending = 0;  ///< part of sx from bending moments
  double measured = 0; ///< part of sx from measured strains
  double scale = 0;    ///< sum of the greatest |component| of each part, before parts cancel
  std::vector<Text> cautions;
};

/// What one source adds to a case, under its name.
struct NamedContribution {
  Text name; ///< "section forces on beam"
  Contribution contribution;
};

/// The section of a study with its texts read, or everything that keeps it from being one, each with the path
/// of its size.
Results<SectionModel> modelOf(const Study& study, const TypedSection& section);

/// The forces of a case at a point in N and N mm.
SectionForces forcesOf(const Study& study, const ForceTexts& forces);

/// The units in which a study's workings are written.
WrittenUnits writtenUnitsOf(const Study& study);

/// What the cases of one point are made of, with the section of its fibre worked out once. Of a study whose
/// texts read and whose rules between places hold; it keeps references to study and point.
class PointSources {
public:
  /// Problems where the section cannot be worked out or the fibre lies outside it.
  static Results<PointSources> of(const Study& study, const Point& point);

  /// The sum of what the sources of a case give. Problems carry the path of their place.
  Results<SourceStress> stressOf(const CaseStress& stress) const;
  /// The same, one by one and with the working.
  Results<std::vector<NamedContribution>> contributionsOf(const CaseStress& stress) const;

  /// None for a point without a fibre.
  const std::optional<SectionModel>& model() const { return m_model; }
  const Fibre& fibre() const { return m_fibre; }

private:
  PointSources(const Study& study, const Point& point) : m_study(&study), m_point(&point) {}

  Results<SourceStress> ofForces(const CaseStress& stress) const;

  const Study* m_study;
  const Point* m_point;
  std::optional<SectionModel> m_model;
  Fibre m_fibre;
};

/// What makes the stresses of a case at a point of a valid study; empty where it is all typed as stresses.
std::vector<NamedContribution> contributionsOf(const Study& study, const Point& point,
                                               const CaseStress& stress);

} // namespace planewright

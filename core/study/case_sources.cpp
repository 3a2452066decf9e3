// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/case_sources.h"

#include "core/source/measured.h"
#include "core/source/pressure.h"
#include "core/stress/circle.h"
#include "core/study/text_fields.h"
#include "core/study/typed.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace planewright {

namespace {

/// Beyond this a stress is a slip of typing, and what follows from it may not be finite.
constexpr double greatestStress = 1e100;

Angle readAngle(const Study& study, Spot spot, const std::string& text) {
  return Angle::fromDegrees(valueOf(study, spot, text));
}

Vessel vesselOf(const Study& study, const PressureTexts& typed) {
  return {valueOf(study, Spot::pressureP, typed.p), valueOf(study, Spot::pressureR, typed.r),
          valueOf(study, Spot::pressureT, typed.t), typed.ends == Ends::closed};
}

Rosette rosetteOf(const Study& study, const RosetteTexts& typed) {
  return {Gauge{readAngle(study, Spot::gaugeAngleA, typed.angleA),
                valueOf(study, Spot::gaugeStrainA, typed.strainA)},
          Gauge{readAngle(study, Spot::gaugeAngleB, typed.angleB),
                valueOf(study, Spot::gaugeStrainB, typed.strainB)},
          Gauge{readAngle(study, Spot::gaugeAngleC, typed.angleC),
                valueOf(study, Spot::gaugeStrainC, typed.strainC)}};
}

Elastic elasticOf(const Study& study, const Point& point, const RosetteTexts& typed) {
  if (typed.material == Elasticity::isotropic)
    return Isotropic{valueOf(study, Spot::rosetteE, typed.E), valueOf(study, Spot::rosetteNu, typed.nu)};
  assert(!point.lines.empty());
  return Orthotropic{valueOf(study, Spot::rosetteAlong, typed.along),
                     valueOf(study, Spot::rosetteAcross, typed.across),
                     valueOf(study, Spot::rosetteNu12, typed.nu12), valueOf(study, Spot::rosetteG, typed.G),
                     readAngle(study, Spot::lineAngle, point.lines.front().angle)};
}

/// Gives each Problem that names a text of `thing` by its key the path of that text, others that of the
/// thing.
template <class Texts>
Problems placed(Problems problems, const Place& thing) {
  for (Problem& problem : problems) {
    Place place = thing;
    for (const TextField<Texts>& field : textFieldsOf<Texts>())
      if (rowOf(field.spot).key() == problem.place)
        place.spot = field.spot;
    problem.place = pathOf(place);
  }
  return problems;
}

Problems placed(Problem problem, const Place& place) {
  problem.place = pathOf(place);
  return {std::move(problem)};
}

SourceStress summed(const Contribution& contribution, bool isMeasured) {
  return {contribution.stress,          contribution.axial,
          contribution.bending,         isMeasured ? contribution.stress.sx : 0,
          scaleOf(contribution.stress), contribution.cautions};
}

void add(SourceStress& sum, SourceStress more) {
  sum.stress = sum.stress + more.stress;
  sum.axial += more.axial;
  sum.bending += more.bending;
  sum.measured += more.measured;
  sum.scale += more.scale;
  sum.cautions.insert(sum.cautions.end(), more.cautions.begin(), more.cautions.end());
}

Results<Contribution> ofPressure(const Study& study, const Point& point, const CaseStress& stress) {
  return contributionOf(vesselOf(study, *stress.pressure), writtenUnitsOf(study))
      .map_error([&](Problems problems) {
        return placed<PressureTexts>(std::move(problems), {Spot::pressure, point.name, stress.caseId});
      });
}

Results<Contribution> ofRosette(const Study& study, const Point& point, const CaseStress& stress) {
  const RosetteTexts& typed = *stress.rosette;
  return measuredBy(rosetteOf(study, typed), elasticOf(study, point, typed), writtenUnitsOf(study))
      .map([](Measured measured) { return std::move(measured.contribution); })
      .map_error([&](Problems problems) {
        return placed<RosetteTexts>(std::move(problems), {Spot::rosette, point.name, stress.caseId});
      });
}

Problem tooLarge() {
  return {{},
          0,
          0,
          {},
          PW_TEXT("Study", "The stress that follows is too large to be meant."),
          PW_TEXT("Study", "Check the units of sizes and forces.")};
}

} // namespace

Results<SectionModel> modelOf(const Study& study, const TypedSection& section) {
  const auto placeOfSize = [&](const std::string& key) { return Place{Spot::size, section.name, key}; };
  Section evaluated{section.shape, {}};
  for (const TypedSize& size : section.sizes) {
    const Result<Entry> entry = readEntry(size.text, entryKindOf(study, placeOfSize(size.key)));
    if (!entry)
      return tl::unexpected(placed(entry.error(), placeOfSize(size.key)));
    evaluated.sizes[size.key] = entry->value;
  }
  return modelOf(evaluated).map_error([&](Problems problems) {
    for (Problem& problem : problems)
      problem.place = pathOf(placeOfSize(problem.place));
    return problems;
  });
}

SectionForces forcesOf(const Study& study, const ForceTexts& typed) {
  return {valueOf(study, Spot::forceN, typed.N),   valueOf(study, Spot::forceVy, typed.Vy),
          valueOf(study, Spot::forceVz, typed.Vz), valueOf(study, Spot::forceT, typed.T),
          valueOf(study, Spot::forceMy, typed.My), valueOf(study, Spot::forceMz, typed.Mz)};
}

WrittenUnits writtenUnitsOf(const Study& study) {
  return {entryKindOf(study, Spot::sx).unit, entryKindOf(study, Spot::forceN).unit,
          entryKindOf(study, Spot::fibreY).unit, entryKindOf(study, Spot::forceMz).unit};
}

Results<PointSources> PointSources::of(const Study& study, const Point& point) {
  PointSources sources(study, point);
  if (!point.fibre)
    return sources;
  const TypedSection* section = findSection(study, point.fibre->section);
  assert(section);
  Results<SectionModel> model = modelOf(study, *section);
  if (!model)
    return tl::unexpected(std::move(model).error());
  sources.m_model = *std::move(model);
  sources.m_fibre = {valueOf(study, Spot::fibreY, point.fibre->y),
                     valueOf(study, Spot::fibreZ, point.fibre->z), point.fibre->view};
  const Result<FibreStress> unloaded =
      planewright::stressAt(*sources.m_model, {}, sources.m_fibre, study.convention.shearForce);
  if (!unloaded)
    return tl::unexpected(placed(unloaded.error(), {Spot::fibre, point.name, {}}));
  return sources;
}

Results<SourceStress> PointSources::ofForces(const CaseStress& stress) const {
  assert(m_model);
  const Place place{Spot::forces, m_point->name, stress.caseId};
  const Result<FibreStress> at =
      stressAt(*m_model, forcesOf(*m_study, *stress.forces), m_fibre, m_study->convention.shearForce);
  if (!at)
    return tl::unexpected(placed(at.error(), place));
  const double shear = std::abs(at->shear) + std::abs(at->stress.txy - at->shear);
  return SourceStress{
      at->stress,  at->axial, at->bending, 0, std::max(std::abs(at->axial) + std::abs(at->bending), shear),
      at->cautions};
}

Results<SourceStress> PointSources::stressOf(const CaseStress& stress) const {
  SourceStress sum;
  if (stress.forces) {
    Results<SourceStress> forces = ofForces(stress);
    if (!forces)
      return forces;
    add(sum, *std::move(forces));
  }
  for (const bool rosette : {false, true}) {
    if (rosette ? !stress.rosette : !stress.pressure)
      continue;
    const Results<Contribution> one =
        rosette ? ofRosette(*m_study, *m_point, stress) : ofPressure(*m_study, *m_point, stress);
    if (!one)
      return tl::unexpected(one.error());
    add(sum, summed(*one, rosette));
  }
  for (const double component : {sum.stress.sx, sum.stress.sy, sum.stress.txy})
    if (!(std::abs(component) <= greatestStress))
      return tl::unexpected(placed(tooLarge(), {Spot::caseStress, m_point->name, stress.caseId}));
  return sum;
}

Results<std::vector<NamedContribution>> PointSources::contributionsOf(const CaseStress& stress) const {
  std::vector<NamedContribution> contributions;
  if (stress.forces) {
    Results<Contribution> forces =
        contributionOf(m_model->section, forcesOf(*m_study, *stress.forces), m_fibre,
                       m_study->convention.shearForce, writtenUnitsOf(*m_study));
    if (!forces)
      return tl::unexpected(std::move(forces).error());
    contributions.push_back(
        {PW_TEXT("Source", "section forces on %1").with(m_point->fibre->section), *std::move(forces)});
  }
  if (stress.pressure) {
    Results<Contribution> pressure = ofPressure(*m_study, *m_point, stress);
    if (!pressure)
      return tl::unexpected(std::move(pressure).error());
    contributions.push_back({PW_TEXT("Source", "pressure in a thin wall"), *std::move(pressure)});
  }
  if (stress.rosette) {
    Results<Contribution> rosette = ofRosette(*m_study, *m_point, stress);
    if (!rosette)
      return tl::unexpected(std::move(rosette).error());
    contributions.push_back({PW_TEXT("Source", "strains measured by a rosette"), *std::move(rosette)});
  }
  return contributions;
}

std::vector<NamedContribution> contributionsOf(const Study& study, const Point& point,
                                               const CaseStress& stress) {
  if (stress.isDirect())
    return {};
  const Results<PointSources> sources = PointSources::of(study, point);
  assert(sources && "a valid study has only sources that can be worked out");
  Results<std::vector<NamedContribution>> contributions = sources->contributionsOf(stress);
  assert(contributions);
  return *std::move(contributions);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/fibre_of_state.h"

#include "core/study/case_sources.h"

#include <cassert>
#include <cmath>

namespace planewright {

std::optional<LoadedSection> loadedSectionOf(const Study& study, const Readout& readout,
                                             const StateReading& state) {
  const Point* point = findPoint(study, readout.point);
  assert(point);
  if (!point->fibre)
    return std::nullopt;
  const Results<PointSources> sources = PointSources::of(study, *point);
  assert(sources && "a valid study has only sources that can be worked out");
  LoadedSection loaded{*sources->model(), sources->fibre(), study.convention.shearForce, {}, {}};
  loaded.sense = study.convention.positive == Positive::tension ? 1 : -1;
  for (const ActingCase& acting : state.acting) {
    const CaseStress* stress = findStress(*point, readout.cases[acting.index].id);
    if (stress && stress->forces)
      loaded.forces = loaded.forces + acting.factor * forcesOf(study, *stress->forces);
  }
  const Result<FibreStress> here = stressAt(loaded.model, loaded.forces, loaded.fibre, loaded.rule);
  assert(here);
  loaded.rest = loaded.sense * state.stress + -1.0 * here->stress;
  return loaded;
}

Fibre readablePlace(const Study& study, const LoadedSection& section, const Fibre& fibre) {
  const Unit unit = entryKindOf(study, Spot::fibreY).unit;
  const double perUnit = std::pow(10, std::ceil(std::log10(unit.toBase(1) / 0.001) - 1e-9));
  const auto read = [&](double length, double (*to)(double)) {
    return unit.toBase(to(unit.fromBase(length) * perUnit) / perUnit);
  };
  const auto nearest = [](double value) { return std::round(value); };
  const auto inwards = [](double value) { return std::trunc(value); };
  for (double (*to)(double) : {+nearest, +inwards}) {
    const Fibre place{read(fibre.y, to), read(fibre.z, to), fibre.view};
    if (contains(section.model.region, place.y, place.z) &&
        stressAt(section.model, section.forces, place, section.rule))
      return place;
  }
  return fibre;
}

Result<WorstFibres> worstFibresOf(const LoadedSection& section) {
  const auto worstBy = [&](double Circle::*measure) {
    return worstFibre(section.model, section.forces, section.fibre, section.rule,
                      [&section, measure](const PlaneStress& stress) {
                        return circleOf(stress + section.rest, scaleOf(stress) + scaleOf(section.rest)).*
                               measure;
                      });
  };
  Result<WorstFibre> principal = worstBy(&Circle::s1);
  if (!principal)
    return tl::unexpected(std::move(principal).error());
  Result<WorstFibre> shear = worstBy(&Circle::radius);
  if (!shear)
    return tl::unexpected(std::move(shear).error());
  return WorstFibres{*std::move(principal), *std::move(shear)};
}

} // namespace planewright

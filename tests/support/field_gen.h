// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/format.h"
#include "core/screen/screened.h"
#include "tests/support/dice.h"
#include "tests/support/strength_gen.h"

#include <cmath>

namespace planewright {

/// A study with cases A, B, ... and a point with a check `check` by a criterion of a line, named "field".
inline Study fieldStudy(Criterion criterion, const Strengths& strengths, Angle line, Angle tolerance,
                        const std::vector<std::vector<double>>& factors) {
  Study study = newStudy();
  study.cases.clear();
  for (std::size_t k = 0; k < factors.front().size(); ++k)
    study.cases.push_back({std::string(1, static_cast<char>('A' + k)),
                           "",
                           Nature::variable,
                           k % 2 ? Duration::shortTerm : Duration::permanent,
                           {}});
  for (const std::vector<double>& row : factors) {
    Combination& combination = study.combinations.emplace_back();
    combination.name = "C" + exactNumber(static_cast<double>(study.combinations.size()));
    for (std::size_t k = 0; k < row.size(); ++k)
      combination.factors.push_back({study.cases[k].id, shortestNumber(row[k])});
  }
  const auto text = [&](StrengthKey key) { return shortestNumber(*strengths[key]) + " MPa"; };
  Material material;
  material.name = "stuff";
  material.kind = strengths.kind;
  material.source = "invented";
  material.alongTension = text(StrengthKey::alongTension);
  material.alongCompression = text(StrengthKey::alongCompression);
  material.acrossTension = text(StrengthKey::acrossTension);
  material.acrossCompression = text(StrengthKey::acrossCompression);
  material.shear = text(StrengthKey::shear);
  material.partialFactor = "1.3";
  material.durations = {"0.6", "0.7", "0.8", "0.9", "1.1"};
  study.materials = {material};
  Point& point = study.points.front();
  point.name = "field";
  point.stress.clear();
  point.lines = {{"grain", LineKind::grain, shortestNumber(line.degrees()) + " deg",
                  tolerance == Angle() ? std::string() : shortestNumber(tolerance.degrees()) + " deg"}};
  point.checks = {{"check", "stuff", criterion, "grain", "", {}}};
  return study;
}

/// A field of `size` points named by their number, with stresses of a generator.
template <class Stress>
Field fieldOf(const ScreenPlan& plan, std::size_t size, Stress stress, Field::Columns columns = {}) {
  Field field(plan.cases, columns);
  for (std::size_t i = 0; i < size; ++i) {
    field.add(exactNumber(static_cast<double>(i)), Layer::none, static_cast<std::uint32_t>(i + 2));
    for (std::size_t k = 0; k < plan.cases.size(); ++k)
      field.setStress(k, i, stress(k, i));
  }
  return field;
}

/// What the utilisation of a point's terms before they cancel could be at most, against its least strength.
inline double sizeOfTerms(const ScreenPlan& plan, const Field& field, std::size_t point) {
  double scale = 0;
  for (const ScreenedCombination& combination : plan.combinations) {
    double sum = 0;
    for (const ActingCase& acting : combination.acting)
      sum += std::abs(acting.factor) * scaleOf(field.stressOf(acting.index, point));
    scale = std::max(scale, sum);
  }
  double least = INFINITY;
  for (const ScreenedCheck& check : plan.checks)
    for (const ScreenedForms& forms : check.forms)
      least = std::min({least, forms.strengths.Yt, forms.strengths.Yc, forms.strengths.S, forms.strengths.Xt,
                        forms.strengths.Xc});
  return scale / least;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/quantity.h"
#include "core/source/section_forces.h"
#include "core/stress/circle.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace planewright {

namespace {

Problem fault(std::string_view quoted, Text what) {
  return {{}, 0, 0, std::string(quoted), std::move(what), {}};
}

Problem doesNotFollow(std::string_view word) {
  return fault(word, PW_TEXT("Check", "This quantity does not follow from these inputs."));
}

/// A section with its forces and the fibre that is looked at.
struct Given {
  SectionModel model;
  SectionForces forces;
  Fibre fibre;
  ShearRule rule = ShearRule::upward;
};

using Value = Result<double>;

Value fibreStress(const Given& given, double (*value)(const PlaneStress&)) {
  return stressAt(given.model, given.forces, given.fibre, given.rule).map([&](const FibreStress& fibre) {
    return value(fibre.stress);
  });
}

Value torsionConstant(const Given& given, double divisor) {
  return torsionConstantOf(given.model).map([&](const TorsionConstant& constant) {
    return constant.J / divisor;
  });
}

/// Of the outstand of the top flange beside the web.
Value firstMomentOfFlange(const Given& given) {
  const Section& s = given.model.section;
  if (s.shape != SectionShape::i)
    return tl::unexpected(doesNotFollow("S_flange"));
  const double y = given.model.region.yHigh - s.size("t_top") / 2;
  return wallCutAt(given.model.transposed, s.size("t_w") / 2, y).value().across;
}

struct Word {
  std::string_view word;
  Value (*value)(const Given&);
};
constexpr std::array words = {
    Word{"A", [](const Given& g) { return Value(g.model.properties.A); }},
    Word{"Iz", [](const Given& g) { return Value(g.model.properties.Iz); }},
    Word{"Iy", [](const Given& g) { return Value(g.model.properties.Iy); }},
    Word{"ys", [](const Given& g) { return Value(g.model.properties.centroidFromBottom()); }},
    Word{"Wz",
         [](const Given& g) {
           return Value(std::min(g.model.properties.WzTop(), g.model.properties.WzBottom()));
         }},
    // The plastic modulus of a section that is mirrored about z: both halves at the axis.
    Word{"Wpl",
         [](const Given& g) {
           return g.model.isMirroredAboutZ ? Value(2 * cutAt(g.model.region, 0).S)
                                           : Value(tl::unexpected(doesNotFollow("Wpl")));
         }},
    Word{"S", [](const Given& g) { return Value(cutAt(g.model.region, g.fibre.y).S); }},
    Word{"S_flange", firstMomentOfFlange}, Word{"J", [](const Given& g) { return torsionConstant(g, 1); }},
    Word{"Wt", [](const Given& g) { return torsionConstant(g, g.model.region.yHigh); }},
    Word{"sx", [](const Given& g) { return fibreStress(g, [](const PlaneStress& s) { return s.sx; }); }},
    Word{"txy", [](const Given& g) { return fibreStress(g, [](const PlaneStress& s) { return s.txy; }); }},
    Word{"s1",
         [](const Given& g) { return fibreStress(g, [](const PlaneStress& s) { return circleOf(s).s1; }); }},
    Word{"s2",
         [](const Given& g) { return fibreStress(g, [](const PlaneStress& s) { return circleOf(s).s2; }); }}};

/// Of one mm, N, MPa in units that are printed beside sizes in mm.
struct PrintedUnit {
  std::string_view name;
  double perBase;
};
constexpr std::array printedUnits = {PrintedUnit{"cm2", 1e-2}, PrintedUnit{"cm3", 1e-3},
                                     PrintedUnit{"cm4", 1e-4}, PrintedUnit{"m4", 1e-12},
                                     PrintedUnit{"kPa", 1e3}};

double perBase(std::string_view unit) {
  const auto row = std::ranges::find(printedUnits, unit, &PrintedUnit::name);
  return row == printedUnits.end() ? 1 : row->perBase;
}

/// What the inputs name besides the sizes of the section.
double* forceOrPlace(std::string_view name, SectionForces& forces, Fibre& fibre) {
  const std::array<std::pair<std::string_view, double*>, 8> rows = {{{"N", &forces.N},
                                                                     {"Vy", &forces.Vy},
                                                                     {"Vz", &forces.Vz},
                                                                     {"T", &forces.T},
                                                                     {"My", &forces.My},
                                                                     {"Mz", &forces.Mz},
                                                                     {"y", &fibre.y},
                                                                     {"z", &fibre.z}}};
  const auto row = std::ranges::find(rows, name, &std::pair<std::string_view, double*>::first);
  return row == rows.end() ? nullptr : row->second;
}

Result<void> readNumbers(const CheckInputs& inputs, Section& section, Given& given) {
  for (const std::string_view name : inputs.names()) {
    if (name == "shape" || name == "at" || name == "view" || name == "rule")
      continue;
    const std::optional<double> value = inputs.number(name);
    if (!value)
      return tl::unexpected(fault(name, PW_TEXT("Check", "This input is no number.")));
    if (double* place = forceOrPlace(name, given.forces, given.fibre))
      *place = *value;
    else
      section.sizes.emplace(name, *value);
  }
  return {};
}

Result<void> readWords(const CheckInputs& inputs, Given& given) {
  const std::string_view viewWord = inputs.word("view").value_or("side");
  const std::optional<View> view = fromWord<View>(viewWord);
  if (!view)
    return tl::unexpected(fault(viewWord, PW_TEXT("Check", "This view is not known.")));
  given.fibre.view = *view;
  const std::string_view ruleWord = inputs.word("rule").value_or("upward");
  const std::optional<ShearRule> rule = fromWord<ShearRule>(ruleWord);
  if (!rule)
    return tl::unexpected(fault(ruleWord, PW_TEXT("Check", "This rule of signs is not known.")));
  given.rule = *rule;
  const std::optional<std::string_view> at = inputs.word("at");
  if (at == "bottom")
    given.fibre.y = given.model.region.yLow;
  else if (at == "junction")
    given.fibre.y = levelsOf(given.model.region).end()[-2];
  else if (at)
    return tl::unexpected(fault(*at, PW_TEXT("Check", "This place in the section is not known.")));
  return {};
}

Result<Given> givenBy(const CheckInputs& inputs) {
  const std::string_view shapeWord = inputs.word("shape").value_or("");
  const std::optional<SectionShape> shape = fromWord<SectionShape>(shapeWord);
  if (!shape || *shape == SectionShape::tabled)
    return tl::unexpected(fault(shapeWord, PW_TEXT("Check", "Checks know no such shape.")));
  Given given;
  Section section{*shape, {}};
  if (const Result<void> read = readNumbers(inputs, section, given); !read)
    return tl::unexpected(read.error());
  Results<SectionModel> model = modelOf(section);
  if (!model)
    return tl::unexpected(fault(model.error().front().place, model.error().front().what));
  given.model = *std::move(model);
  if (const Result<void> read = readWords(inputs, given); !read)
    return tl::unexpected(read.error());
  return given;
}

} // namespace

Result<Quantity> quantityOfSection(const CheckInputs& inputs, std::string_view word, std::string_view unit) {
  const Result<Given> given = givenBy(inputs);
  if (!given)
    return tl::unexpected(given.error());
  const auto row = std::ranges::find(words, word, &Word::word);
  if (row == words.end())
    return tl::unexpected(doesNotFollow(word));
  return row->value(*given).map([&](double value) {
    return Quantity{value * perBase(unit), false, std::abs(value) * perBase(unit)};
  });
}

} // namespace planewright

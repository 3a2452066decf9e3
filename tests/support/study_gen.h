// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/study_file.h"
#include "core/study/text_fields.h"

#include <algorithm>
#include <rapidcheck.h>

namespace planewright {

/// Shows a failing study as its file.
inline void showValue(const Study& study, std::ostream& out) {
  out << writeStudy(study);
}

namespace study_gen {

using std::string;

inline string oneOf(std::initializer_list<const char*> words) {
  return *rc::gen::elementOf(std::vector<string>(words.begin(), words.end()));
}

inline int upTo(int most) {
  return *rc::gen::inRange(0, most + 1);
}

template <class Enum>
Enum anyWord() {
  return (*rc::gen::elementOf(namesOf<Enum>())).value;
}

/// Names with what trips writers of files and paths; the number keeps them apart.
inline string anyName(int number) {
  return oneOf({"P", "G", "seat cut", "1.35 G + 1.5 S", "a/b", "~0", "~1/", "“q\"", "back\\slash", "σ𝜎",
                "x,y;z", "=1", "%1", "_{n}", "{\"a\":[", "\xC2\xAD", "-", "points/P1"}) +
         std::to_string(number);
}

/// The id of a case: a name without a comma.
inline string anyCaseId(int number) {
  string id = anyName(number);
  std::erase(id, ',');
  return id;
}

inline string anyFreeText() {
  return oneOf({"", "", "plain", "two\nlines\tand a tab", "\"quoted\" \\ / ~", "Grüße σ 𝜎 \xE2\x80\xA8 end",
                " blank ends ", "{\"format\": 1}", "null", "%1 _{x}"});
}

inline string anyStressText() {
  if (upTo(2) == 0)
    return oneOf({"0 MPa", "1.5*12 kN/(90 mm*240 mm)",
                  "-18.6 kN/(90 mm*240 mm) - 3.2 kN*m/(90 mm*(240 mm)^2/6)", "0.4*sqrt(3) MPa",
                  "12 kN / 100 mm^2", "(2+3) MPa", "1e-30 GPa", "-1.2e20 Pa", "3 N/mm²", "1450 psi"});
  const int thousandths = *rc::gen::inRange(-100000, 100001);
  return std::to_string(thousandths / 1000) + "." + std::to_string(std::abs(thousandths % 1000)) +
         oneOf({" MPa", " kPa", " psi", " N/mm^2"});
}

inline string anyAngleText() {
  if (upTo(2) == 0)
    return oneOf(
        {"0 deg", "90 deg", "-90 deg", "45 deg", "(pi/6) rad", "30 deg + 0.1 rad", "360 deg", "-22.5°"});
  return std::to_string(*rc::gen::inRange(-360, 361)) + "." + std::to_string(upTo(999)) + " deg";
}

inline string anyToleranceText(bool slopes) {
  if (slopes && upTo(3) == 0)
    return oneOf({"1 in 20", "1:15"});
  return oneOf({"", "", "0 deg", "3 deg", "0.05 rad", "95 deg"});
}

inline string anyLineAngleText() {
  return upTo(2) == 0 ? oneOf({"1 in 12", "-1 in 8", "1:12", "8 %"}) : anyAngleText();
}

inline Title anyTitle() {
  Title title;
  for (const TextField<Title>& field : textFieldsOf<Title>())
    title.*field.text = anyFreeText();
  return title;
}

inline Units anyUnits() {
  return {oneOf({"MPa", "kPa", "psi", "ksi", "N/mm^2"}), oneOf({"N", "kN", "lbf"}), oneOf({"mm", "m", "in"}),
          oneOf({"kN*m", "N*mm", "lbf*in"})};
}

inline std::vector<LoadCase> anyCases() {
  std::vector<LoadCase> cases;
  const int count = 1 + upTo(3);
  for (int i = 0; i < count; ++i) {
    LoadCase one{anyCaseId(i), anyFreeText(), anyWord<Nature>(), anyWord<Duration>(), {}};
    if (i > 0 && upTo(2) == 0)
      one.excludes.push_back(cases[static_cast<std::size_t>(upTo(i - 1))].id);
    cases.push_back(one);
  }
  return cases;
}

/// Cases exclude earlier ones only.
inline bool excludesAny(const LoadCase& loadCase, const Combination& combination) {
  for (const Factor& factor : combination.factors)
    if (std::ranges::find(loadCase.excludes, factor.caseId) != loadCase.excludes.end())
      return true;
  return false;
}

/// Their numbers keep their names apart from those of the cases.
inline std::vector<Combination> anyCombinations(const std::vector<LoadCase>& cases) {
  std::vector<Combination> combinations;
  const int count = upTo(3);
  for (int i = 0; i < count; ++i) {
    Combination one{anyName(90 + i), {}, anyWord<Basis>()};
    for (const LoadCase& loadCase : cases)
      if (upTo(3) > 0 && !excludesAny(loadCase, one))
        one.factors.push_back({loadCase.id, loadCase.nature == Nature::measured
                                                ? "1"
                                                : oneOf({"1", "1.35", "1.5", "0", "-1", "1.5*0.7", "0.9"})});
    combinations.push_back(one);
  }
  return combinations;
}

inline string maybe(std::initializer_list<const char*> words) {
  return upTo(2) == 0 ? "" : oneOf(words);
}

/// Strengths of a kind, some of them left out.
inline void giveStrengths(Material& material) {
  for (const TextField<Material>& field : textFieldsOf<Material>())
    for (const StrengthKey key : keysOf(material.kind))
      if (field.spot == spotOf(key))
        material.*field.text = key == StrengthKey::friction ? maybe({"30 deg", "0.6 rad"})
                               : rowOf(key).dimension.force == 0
                                   ? maybe({"1.25", "0.8"})
                                   : maybe({"14.5 MPa", "2 ksi", "0.4*sqrt(3) MPa"});
}

inline std::vector<Material> anyMaterials() {
  std::vector<Material> materials;
  const int count = upTo(3);
  for (int i = 0; i < count; ++i) {
    Material one;
    one.name = anyName(i);
    one.kind = anyWord<MaterialKind>();
    one.source = anyFreeText();
    one.edition = anyFreeText();
    one.trust = anyFreeText();
    one.basis = anyWord<StrengthBasis>();
    giveStrengths(one);
    if (one.kind == MaterialKind::throat)
      one.seam = anyWord<Seam>();
    one.partialFactor = maybe({"1.3", "1.25"});
    one.factor = upTo(3) == 0 ? "0.5" : "";
    one.serviceClass = anyFreeText();
    one.durations = {maybe({"0.6"}), maybe({"0.7"}), maybe({"0.8"}), maybe({"0.9", "1.1*0.8"}),
                     maybe({"1.1"})};
    materials.push_back(one);
  }
  return materials;
}

/// A check of any criterion that the point and the material have what it needs for.
inline std::optional<Check> anyCheck(int number, const Point& point, const Study& study) {
  if (study.materials.empty())
    return std::nullopt;
  const Material material = *rc::gen::elementOf(study.materials);
  Check check;
  check.id = anyName(number);
  check.material = material.name;
  check.criterion = *rc::gen::elementOf(criteriaFor(material.kind));
  const ActsOn actsOn = rowOf(check.criterion).actsOn;
  if ((actsOn == ActsOn::line && point.lines.empty()) || (actsOn == ActsOn::plane && point.planes.empty()))
    return std::nullopt;
  if (actsOn == ActsOn::line)
    check.line = (*rc::gen::elementOf(point.lines)).name;
  if (actsOn == ActsOn::plane)
    check.plane = (*rc::gen::elementOf(point.planes)).name;
  if (check.criterion == Criterion::hankinson)
    check.parameters.n = maybe({"1.5", "2.5"});
  if (check.criterion == Criterion::tsaiWu)
    check.parameters.F12 = maybe({"-0.0008 MPa^-2", "1e-9 psi^-2"});
  if (check.criterion == Criterion::compressionAtAngle)
    check.parameters.kc90 = maybe({"1.5"});
  if (check.criterion == Criterion::taperedEdge)
    check.parameters.edge = maybe({"0 deg", "1 in 8"});
  return check;
}

inline std::vector<TypedSection> anySections() {
  const std::vector<TypedSection> known = {
      {"", SectionShape::rectangle, {{"b", "140 mm"}, {"h", "0.6 m"}}},
      {"", SectionShape::circle, {{"d", "12 in"}}},
      {"", SectionShape::tube, {{"d", "200 mm"}, {"t", "(200/25) mm"}}},
      {"", SectionShape::box, {{"b", "100 mm"}, {"h", "200 mm"}, {"t_w", "6 mm"}, {"t_f", "8 mm"}}},
      {"", SectionShape::tabled, {{"A", "84000 mm^2"}, {"I_z", "2.52e9 mm^4"}, {"W_z", "8.4e6 mm^3"}}}};
  std::vector<TypedSection> sections;
  const int count = upTo(2);
  for (int i = 0; i < count; ++i) {
    sections.push_back(*rc::gen::elementOf(known));
    sections.back().name = anyName(i);
  }
  return sections;
}

inline std::string anyForceText() {
  return oneOf({"0 kN", "-18.6 kN", "1.5*12 kN", "4 kip", "-2500 N", "12.5 kN*m/2 m"});
}

inline std::string anyMomentText() {
  return oneOf({"0 kN*m", "24.5 kN*m", "-12 kN * 1.3 m", "30 kip*ft", "1e6 N*mm"});
}

/// Of a shape that theory covers whole, or without shear where it does not.
inline ForceTexts anyForces(const TypedSection& section) {
  ForceTexts forces;
  forces.N = anyForceText();
  forces.Mz = anyMomentText();
  if (section.shape == SectionShape::tabled)
    return forces;
  forces.My = anyMomentText();
  forces.Vy = anyForceText();
  if (section.shape == SectionShape::circle || section.shape == SectionShape::tube)
    forces.T = anyMomentText();
  return forces;
}

inline RosetteTexts anyRosette(bool hasLine) {
  RosetteTexts rosette;
  rosette.strainA = oneOf({"0 ustrain", "412 ustrain", "-0.02 %", "150e-6*1e6 ustrain"});
  rosette.strainB = oneOf({"0 ustrain", "-87 ustrain", "(120+3) ustrain"});
  rosette.strainC = oneOf({"0 ustrain", "655 ustrain"});
  rosette.angleB = oneOf({"45 deg", "60 deg", "-30 deg"});
  if (hasLine && upTo(1) == 0)
    rosette.material = Elasticity::orthotropic;
  return rosette;
}

inline CaseStress anyStress(const LoadCase& loadCase, const Point& point, const Study& study) {
  CaseStress stress{loadCase.id, anyStressText(), anyStressText(), anyStressText(),
                    upTo(3) == 0 ? anyStressText() : "0 MPa"};
  if (point.fibre && upTo(1) == 0)
    stress.forces = anyForces(*findSection(study, point.fibre->section));
  if (upTo(5) == 0)
    stress.pressure = PressureTexts{anyStressText(), oneOf({"500 mm", "20 in"}), oneOf({"8 mm", "0.25 in"}),
                                    anyWord<Ends>()};
  if (loadCase.nature == Nature::measured && upTo(1) == 0)
    stress.rosette = anyRosette(!point.lines.empty());
  return stress;
}

inline Point anyPoint(int number, const Study& study) {
  Point point;
  point.name = anyName(number);
  point.note = anyFreeText();
  point.axes = anyAngleText();
  if (!study.sections.empty() && upTo(1) == 0) {
    const TypedSection section = *rc::gen::elementOf(study.sections);
    const bool isHollow = section.shape == SectionShape::tube || section.shape == SectionShape::box;
    // Inside the wall at mid-height, in the axis of solid ones.
    const char* z = section.shape == SectionShape::tube ? "96 mm" : "47 mm";
    point.fibre = FibreTexts{section.name, "0 mm", isHollow ? z : "0 mm", View::side};
  }
  point.freeEdge = oneOf({"", "", "0 deg", "1 in 8", "(pi/4) rad"});
  const int lines = upTo(2);
  for (int i = 0; i < lines; ++i)
    point.lines.push_back({anyName(i), anyWord<LineKind>(), anyLineAngleText(), anyToleranceText(true)});
  for (const LoadCase& loadCase : study.cases)
    if (upTo(4) > 0)
      point.stress.push_back(anyStress(loadCase, point, study));
  const int planes = upTo(3);
  for (int i = 0; i < planes; ++i)
    point.planes.push_back({anyName(i), anyAngleText(), anyToleranceText(false)});
  const int checks = upTo(2);
  for (int i = 0; i < checks; ++i)
    if (auto check = anyCheck(i, point, study))
      point.checks.push_back(*check);
  point.reading = anyAngleText();
  return point;
}

inline Shown anyShown(const Study& study) {
  Shown shown;
  if (upTo(1) == 0)
    shown.point = (*rc::gen::elementOf(study.points)).name;
  const int kinds = study.combinations.empty() ? 1 : 2;
  const int kind = upTo(kinds);
  if (kind == 1)
    shown.combination = (*rc::gen::elementOf(study.cases)).id;
  if (kind == 2)
    shown.combination = (*rc::gen::elementOf(study.combinations)).name;
  return shown;
}

} // namespace study_gen

/// Valid studies of a few cases, combinations and points, with names and texts that are hard on files.
inline rc::Gen<Study> anyStudy() {
  return rc::gen::exec([] {
    using namespace study_gen;
    Study study;
    study.title = anyTitle();
    study.units = anyUnits();
    study.convention = {anyWord<Positive>(), anyWord<ShearAxis>(), anyWord<ShearRule>(), anyWord<Digits>()};
    study.cases = anyCases();
    study.combinations = anyCombinations(study.cases);
    study.materials = anyMaterials();
    study.sections = anySections();
    const int points = 1 + upTo(3);
    for (int i = 0; i < points; ++i)
      study.points.push_back(anyPoint(i, study));
    study.shown = anyShown(study);
    return study;
  });
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section_shape.h"
#include "core/study/material.h"
#include "core/study/point.h"

namespace planewright {

/// The title block, all free text. `preparedFor` and `checkedFor` are the fingerprints of the study at which
/// the names were given.
struct Title {
  std::string project, subject, number, revision, prepared, preparedFor, checked, checkedFor, date, purpose,
      notes;
  bool operator==(const Title&) const = default;
};

/// Units of bare numbers and of reported results.
struct Units {
  std::string stress = "MPa";
  std::string force = "kN";
  std::string length = "mm";
  std::string moment = "kN*m";
  bool operator==(const Units&) const = default;
};

struct Convention {
  Positive positive = Positive::tension;
  ShearAxis shearAxis = ShearAxis::tensorDown;
  ShearRule shearForce = ShearRule::upward; ///< sense of V_y in section forces
  Digits digits = Digits::four;
  bool operator==(const Convention&) const = default;
};

/// A load case; `id` is its key: the letter of the action (G, Q, S, W; the next of a kind G2).
struct LoadCase {
  std::string id;
  std::string name;
  Nature nature = Nature::permanent;
  Duration duration = Duration::permanent;
  std::vector<std::string> excludes; ///< ids of cases that never act together with this one
  bool operator==(const LoadCase&) const = default;
};

/// One term of a combination; the factor is a typed text without a dimension.
struct Factor {
  std::string caseId;
  std::string factor = "1";
  bool operator==(const Factor&) const = default;
};

/// A combination of load cases; `name` is its key.
struct Combination {
  std::string name;
  std::vector<Factor> factors;
  Basis basis = Basis::design;
  bool operator==(const Combination&) const = default;
};

/// One size of a section; `key` is that of the shape's SizeKind, with the number of the block in a built
/// section ("2.turn").
struct TypedSize {
  std::string key;
  std::string text;
  bool operator==(const TypedSize&) const = default;
};

/// A cross section of the member; `name` is its key.
struct TypedSection {
  std::string name;
  SectionShape shape = SectionShape::rectangle;
  std::vector<TypedSize> sizes = {{"b", "100 mm"}, {"h", "200 mm"}};
  bool operator==(const TypedSection&) const = default;
};

/// The point and combination that the window shows; empty: the first.
struct Shown {
  std::string point;
  std::string combination;
  bool operator==(const Shown&) const = default;
};

/// Everything the engineer said; one file. A value: names are keys inside their lists and unique there,
/// dimensional numbers are typed texts that carry their unit. `problemsIn` is empty for every Study that
/// the edits and the file reader let pass.
struct Study {
  Title title;
  Units units;
  Convention convention;
  std::vector<LoadCase> cases;
  std::vector<Combination> combinations;
  std::vector<Material> materials;
  std::vector<TypedSection> sections;
  std::vector<Point> points;
  Shown shown;
  bool operator==(const Study&) const = default;
};

/// A study with one case G and one point P1: three components of 0 MPa, a grain at 0 deg without a
/// tolerance, the reading plane at 0 deg.
Study newStudy();

const LoadCase* findCase(const Study& study, std::string_view id);
const Combination* findCombination(const Study& study, std::string_view name);
const Material* findMaterial(const Study& study, std::string_view name);
const TypedSection* findSection(const Study& study, std::string_view name);
const Point* findPoint(const Study& study, std::string_view name);
/// The shown point, or the first.
const Point& shownPoint(const Study& study);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

namespace planewright {

/// An invented tie of C24 under two cases, in a grain of 1 in 15 known to 3 deg, and a bond on a plane at
/// 60 deg. Strengths: EN 338:2016, from memory.
inline Study judgedStudy() {
  Study study = newStudy();
  study.cases = {{"G", "Permanent", Nature::permanent, Duration::permanent, {}},
                 {"S", "Snow", Nature::variable, Duration::shortTerm, {}}};
  study.combinations = {{"1.35 G", {{"G", "1.35"}}, Basis::design},
                        {"1.35 G + 1.5 S", {{"G", "1.35"}, {"S", "1.5"}}, Basis::design}};
  Material c24;
  c24.name = "C24";
  c24.source = "EN 338:2016";
  c24.edition = "2016";
  c24.trust = "from memory";
  c24.alongTension = "14.5 MPa";
  c24.alongCompression = "21 MPa";
  c24.alongBending = "24 MPa";
  c24.acrossTension = "0.4 MPa";
  c24.acrossCompression = "2.5 MPa";
  c24.shear = "4 MPa";
  c24.partialFactor = "1.3";
  c24.durations = {"0.6", "0.7", "0.8", "0.9", "1.1"};
  Material glue;
  glue.name = "glue";
  glue.kind = MaterialKind::bond;
  glue.basis = StrengthBasis::allowable;
  glue.source = "invented";
  glue.tension = "2 MPa";
  glue.shear = "3 MPa";
  study.materials = {c24, glue};
  Point& point = study.points.front();
  point.stress = {CaseStress{"G", "1.6 MPa", "0 MPa", "0.1 MPa"},
                  CaseStress{"S", "0.9 MPa", "0 MPa", "0.05 MPa"}};
  point.lines = {{"grain", LineKind::grain, "1 in 15", "3 deg"}};
  point.planes = {{"scarf", "60 deg", ""}};
  point.checks = {{"grain", "C24", Criterion::sumOfSquares, "grain", "", {}},
                  {"scarf", "glue", Criterion::bond, "", "scarf", {}}};
  return study;
}

} // namespace planewright

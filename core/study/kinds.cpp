// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/kinds.h"

namespace planewright {

template <>
const std::vector<Named<Positive>>& namesOf() {
  static const std::vector<Named<Positive>> names = {
      {Positive::tension, "tension", PW_TEXT("Convention", "tension positive")},
      {Positive::compression, "compression", PW_TEXT("Convention", "compression positive")}};
  return names;
}

template <>
const std::vector<Named<ShearAxis>>& namesOf() {
  static const std::vector<Named<ShearAxis>> names = {
      {ShearAxis::tensorDown, "tensor-down", PW_TEXT("Convention", "τ_{nt} drawn + down")},
      {ShearAxis::tensorUp, "tensor-up", PW_TEXT("Convention", "τ_{nt} drawn + up")}};
  return names;
}

template <>
const std::vector<Named<Digits>>& namesOf() {
  static const std::vector<Named<Digits>> names = {
      {Digits::three, "3", PW_TEXT("Convention", "3 significant digits")},
      {Digits::four, "4", PW_TEXT("Convention", "4 significant digits")},
      {Digits::five, "5", PW_TEXT("Convention", "5 significant digits")},
      {Digits::six, "6", PW_TEXT("Convention", "6 significant digits")}};
  return names;
}

template <>
const std::vector<Named<LineKind>>& namesOf() {
  static const std::vector<Named<LineKind>> names = {{LineKind::grain, "grain", PW_TEXT("Line", "grain")},
                                                     {LineKind::fibre, "fibre", PW_TEXT("Line", "fibre")},
                                                     {LineKind::weld, "weld", PW_TEXT("Line", "weld")},
                                                     {LineKind::bond, "bond", PW_TEXT("Line", "bond")},
                                                     {LineKind::other, "other", PW_TEXT("Line", "line")}};
  return names;
}

template <>
const std::vector<Named<Nature>>& namesOf() {
  static const std::vector<Named<Nature>> names = {
      {Nature::permanent, "permanent", PW_TEXT("Case", "permanent")},
      {Nature::variable, "variable", PW_TEXT("Case", "variable")},
      {Nature::accidental, "accidental", PW_TEXT("Case", "accidental")},
      {Nature::measured, "measured", PW_TEXT("Case", "measured")}};
  return names;
}

template <>
const std::vector<Named<Duration>>& namesOf() {
  static const std::vector<Named<Duration>> names = {
      {Duration::permanent, "permanent", PW_TEXT("Case", "permanent")},
      {Duration::longTerm, "long", PW_TEXT("Case", "long term")},
      {Duration::medium, "medium", PW_TEXT("Case", "medium term")},
      {Duration::shortTerm, "short", PW_TEXT("Case", "short term")},
      {Duration::instantaneous, "instantaneous", PW_TEXT("Case", "instantaneous")}};
  return names;
}

template <>
const std::vector<Named<Basis>>& namesOf() {
  static const std::vector<Named<Basis>> names = {
      {Basis::design, "design", PW_TEXT("Combination", "design")},
      {Basis::characteristic, "characteristic", PW_TEXT("Combination", "characteristic")},
      {Basis::allowable, "allowable", PW_TEXT("Combination", "allowable")}};
  return names;
}

template <>
const std::vector<Named<Ends>>& namesOf() {
  static const std::vector<Named<Ends>> names = {{Ends::closed, "closed", PW_TEXT("Vessel", "closed ends")},
                                                 {Ends::open, "open", PW_TEXT("Vessel", "open ends")}};
  return names;
}

template <>
const std::vector<Named<Elasticity>>& namesOf() {
  static const std::vector<Named<Elasticity>> names = {
      {Elasticity::isotropic, "isotropic", PW_TEXT("Rosette", "the same in all directions")},
      {Elasticity::orthotropic, "orthotropic", PW_TEXT("Rosette", "with a line")}};
  return names;
}

} // namespace planewright

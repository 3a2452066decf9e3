// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/text_fields.h"

namespace planewright {

template <>
const std::vector<TextField<Title>>& textFieldsOf() {
  static const std::vector<TextField<Title>> fields = {
      {Spot::titleProject, &Title::project},   {Spot::titleSubject, &Title::subject},
      {Spot::titleNumber, &Title::number},     {Spot::titleRevision, &Title::revision},
      {Spot::titlePrepared, &Title::prepared}, {Spot::titleChecked, &Title::checked},
      {Spot::titleDate, &Title::date},         {Spot::titleNotes, &Title::notes}};
  return fields;
}

template <>
const std::vector<TextField<Units>>& textFieldsOf() {
  static const std::vector<TextField<Units>> fields = {{Spot::unitStress, &Units::stress},
                                                       {Spot::unitForce, &Units::force},
                                                       {Spot::unitLength, &Units::length},
                                                       {Spot::unitMoment, &Units::moment}};
  return fields;
}

template <>
const std::vector<TextField<Shown>>& textFieldsOf() {
  static const std::vector<TextField<Shown>> fields = {{Spot::shownPoint, &Shown::point},
                                                       {Spot::shownCombination, &Shown::combination}};
  return fields;
}

template <>
const std::vector<TextField<FibreTexts>>& textFieldsOf() {
  static const std::vector<TextField<FibreTexts>> fields = {{Spot::fibreSection, &FibreTexts::section},
                                                            {Spot::fibreY, &FibreTexts::y},
                                                            {Spot::fibreZ, &FibreTexts::z}};
  return fields;
}

template <>
const std::vector<TextField<CaseStress>>& textFieldsOf() {
  static const std::vector<TextField<CaseStress>> fields = {{Spot::sx, &CaseStress::sx},
                                                            {Spot::sy, &CaseStress::sy},
                                                            {Spot::txy, &CaseStress::txy},
                                                            {Spot::sz, &CaseStress::sz}};
  return fields;
}

template <>
const std::vector<TextField<ForceTexts>>& textFieldsOf() {
  static const std::vector<TextField<ForceTexts>> fields = {
      {Spot::forceN, &ForceTexts::N}, {Spot::forceVy, &ForceTexts::Vy}, {Spot::forceVz, &ForceTexts::Vz},
      {Spot::forceT, &ForceTexts::T}, {Spot::forceMy, &ForceTexts::My}, {Spot::forceMz, &ForceTexts::Mz}};
  return fields;
}

template <>
const std::vector<TextField<PressureTexts>>& textFieldsOf() {
  static const std::vector<TextField<PressureTexts>> fields = {{Spot::pressureP, &PressureTexts::p},
                                                               {Spot::pressureR, &PressureTexts::r},
                                                               {Spot::pressureT, &PressureTexts::t}};
  return fields;
}

template <>
const std::vector<TextField<RosetteTexts>>& textFieldsOf() {
  static const std::vector<TextField<RosetteTexts>> fields = {
      {Spot::gaugeAngleA, &RosetteTexts::angleA},   {Spot::gaugeAngleB, &RosetteTexts::angleB},
      {Spot::gaugeAngleC, &RosetteTexts::angleC},   {Spot::gaugeStrainA, &RosetteTexts::strainA},
      {Spot::gaugeStrainB, &RosetteTexts::strainB}, {Spot::gaugeStrainC, &RosetteTexts::strainC},
      {Spot::rosetteE, &RosetteTexts::E},           {Spot::rosetteNu, &RosetteTexts::nu},
      {Spot::rosetteAlong, &RosetteTexts::along},   {Spot::rosetteAcross, &RosetteTexts::across},
      {Spot::rosetteNu12, &RosetteTexts::nu12},     {Spot::rosetteG, &RosetteTexts::G}};
  return fields;
}

template <>
const std::vector<TextField<Line>>& textFieldsOf() {
  static const std::vector<TextField<Line>> fields = {{Spot::lineAngle, &Line::angle},
                                                      {Spot::lineTolerance, &Line::tolerance}};
  return fields;
}

template <>
const std::vector<TextField<WatchedPlane>>& textFieldsOf() {
  static const std::vector<TextField<WatchedPlane>> fields = {
      {Spot::planeNormal, &WatchedPlane::normal}, {Spot::planeTolerance, &WatchedPlane::tolerance}};
  return fields;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/text_fields.h"

#include <algorithm>

namespace planewright {

template <>
const std::vector<TextField<Title>>& textFieldsOf() {
  static const std::vector<TextField<Title>> fields = {
      {Spot::titleProject, &Title::project},   {Spot::titleSubject, &Title::subject},
      {Spot::titleNumber, &Title::number},     {Spot::titleRevision, &Title::revision},
      {Spot::titlePrepared, &Title::prepared}, {Spot::titlePreparedFor, &Title::preparedFor},
      {Spot::titleChecked, &Title::checked},   {Spot::titleCheckedFor, &Title::checkedFor},
      {Spot::titleDate, &Title::date},         {Spot::titlePurpose, &Title::purpose},
      {Spot::titleNotes, &Title::notes}};
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

template <>
const std::vector<TextField<Material>>& textFieldsOf() {
  static const std::vector<TextField<Material>> fields = {
      {Spot::materialSource, &Material::source},
      {Spot::materialEdition, &Material::edition},
      {Spot::materialTrust, &Material::trust},
      {Spot::alongTension, &Material::alongTension},
      {Spot::alongCompression, &Material::alongCompression},
      {Spot::alongBending, &Material::alongBending},
      {Spot::acrossTension, &Material::acrossTension},
      {Spot::acrossCompression, &Material::acrossCompression},
      {Spot::strengthShear, &Material::shear},
      {Spot::strengthTension, &Material::tension},
      {Spot::strengthCompression, &Material::compression},
      {Spot::cohesion, &Material::cohesion},
      {Spot::friction, &Material::friction},
      {Spot::cutoff, &Material::cutoff},
      {Spot::fu, &Material::fu},
      {Spot::betaW, &Material::betaW},
      {Spot::gammaM2, &Material::gammaM2},
      {Spot::partialFactor, &Material::partialFactor},
      {Spot::strengthFactor, &Material::factor},
      {Spot::serviceClass, &Material::serviceClass}};
  return fields;
}

template <>
const std::vector<TextField<DurationTexts>>& textFieldsOf() {
  static const std::vector<TextField<DurationTexts>> fields = {
      {Spot::durationPermanent, &DurationTexts::permanent},
      {Spot::durationLong, &DurationTexts::longTerm},
      {Spot::durationMedium, &DurationTexts::medium},
      {Spot::durationShort, &DurationTexts::shortTerm},
      {Spot::durationInstantaneous, &DurationTexts::instantaneous}};
  return fields;
}

template <>
const std::vector<TextField<Check>>& textFieldsOf() {
  static const std::vector<TextField<Check>> fields = {{Spot::checkMaterial, &Check::material},
                                                       {Spot::checkLine, &Check::line},
                                                       {Spot::checkPlane, &Check::plane}};
  return fields;
}

template <>
const std::vector<TextField<ParameterTexts>>& textFieldsOf() {
  static const std::vector<TextField<ParameterTexts>> fields = {{Spot::checkN, &ParameterTexts::n},
                                                                {Spot::checkF12, &ParameterTexts::F12},
                                                                {Spot::checkKc90, &ParameterTexts::kc90},
                                                                {Spot::checkEdge, &ParameterTexts::edge}};
  return fields;
}

const std::string& strengthText(const Material& material, StrengthKey key) {
  return material.*std::ranges::find(textFieldsOf<Material>(), spotOf(key), &TextField<Material>::spot)->text;
}

} // namespace planewright

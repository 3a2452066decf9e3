// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

namespace planewright {

/// A typed text of a thing and its spot: the one row from which edits, lists of places and files know it.
template <class Thing>
struct TextField {
  Spot spot;
  std::string Thing::*text;
};

/// All typed texts of a thing in the order of the file; words of an enum and lists are not among them.
template <class Thing>
const std::vector<TextField<Thing>>& textFieldsOf();

template <>
const std::vector<TextField<Title>>& textFieldsOf();
template <>
const std::vector<TextField<Units>>& textFieldsOf();
template <>
const std::vector<TextField<Shown>>& textFieldsOf();
template <>
const std::vector<TextField<FibreTexts>>& textFieldsOf();
template <>
const std::vector<TextField<CaseStress>>& textFieldsOf();
template <>
const std::vector<TextField<ForceTexts>>& textFieldsOf();
template <>
const std::vector<TextField<PressureTexts>>& textFieldsOf();
template <>
const std::vector<TextField<RosetteTexts>>& textFieldsOf();
template <>
const std::vector<TextField<Line>>& textFieldsOf();
template <>
const std::vector<TextField<WatchedPlane>>& textFieldsOf();
template <>
const std::vector<TextField<Material>>& textFieldsOf();
template <>
const std::vector<TextField<DurationTexts>>& textFieldsOf();
template <>
const std::vector<TextField<Check>>& textFieldsOf();
template <>
const std::vector<TextField<ParameterTexts>>& textFieldsOf();

/// The text of one strength of a material; empty where it is not given.
const std::string& strengthText(const Material& material, StrengthKey key);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"

namespace planewright {

/// Which normal stress counts positive in everything typed and reported.
enum class Positive { tension, compression };
/// How the shear axis of the circle is drawn: tnt positive downwards, so that the circle turns the way the
/// element turns, or upwards, so that it turns the other way.
enum class ShearAxis { tensorDown, tensorUp };
/// Significant digits of the greatest stress of a state, after which all stresses of it are written.
enum class Digits { three, four, five, six };
/// What a line in the plane of stress is.
enum class LineKind { grain, fibre, weld, bond, other };
/// The nature of an action; `measured`: its stresses come from strains that were measured.
enum class Nature { permanent, variable, accidental, measured };
/// Classes of duration of an action, longest first.
enum class Duration { permanent, longTerm, medium, shortTerm, instantaneous };
/// What the factors of a combination make of the actions.
enum class Basis { design, characteristic, allowable };
/// Whether the ends of a vessel are closed, so that its wall carries their pressure along the axis.
enum class Ends { closed, open };
/// What the material under a rosette is.
enum class Elasticity { isotropic, orthotropic };

template <>
const std::vector<Named<Positive>>& namesOf<Positive>();
template <>
const std::vector<Named<ShearAxis>>& namesOf<ShearAxis>();
template <>
const std::vector<Named<Digits>>& namesOf<Digits>();
template <>
const std::vector<Named<LineKind>>& namesOf<LineKind>();
template <>
const std::vector<Named<Nature>>& namesOf<Nature>();
template <>
const std::vector<Named<Duration>>& namesOf<Duration>();
template <>
const std::vector<Named<Basis>>& namesOf<Basis>();
template <>
const std::vector<Named<Ends>>& namesOf<Ends>();
template <>
const std::vector<Named<Elasticity>>& namesOf<Elasticity>();

} // namespace planewright

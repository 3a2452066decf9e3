// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"
#include "core/words/problem.h"

namespace planewright {

/// What keeps a material from being one: strengths that its kind does not have, values that are not greater
/// than 0 (cohesion and cut-off: less than 0) or beyond 1e-9 to 1e9, an angle of friction that is not between
/// 0 and 90 deg. Of texts that do not read nothing is said: that is a Problem of its own.
Problems brokenStrengths(const Study& study, const Material& material);

/// What keeps a check from being one: a material, line or plane that is not there, a criterion that is not
/// for the kind of its material, a parameter that its criterion does not know or that is not greater than 0.
Problems brokenCheck(const Study& study, const Point& point, const Check& check);

/// The spots of the parameters that a criterion may have.
std::vector<Spot> parametersOf(Criterion criterion);

} // namespace planewright

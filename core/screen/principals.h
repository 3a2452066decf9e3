// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"

namespace planewright {

/// Principal values of the governing combination of each judged point, in N/mm2 and the study's sign, with
/// the direction of s1 from the point's own x axis in degrees, NaN where every direction is principal. They
/// are those of circleOf but for rounding.
struct FieldPrincipals {
  WideVector<double> s1, s2, theta1;
};
FieldPrincipals principalsOf(const ScreenPlan& plan, const Field& field, const FieldResults& results);

} // namespace planewright

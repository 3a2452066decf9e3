// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/cursor.h"
#include "core/quantity/expression.h"

#include <optional>

namespace planewright {

/// The angle in degrees of a text that is one of the forms of a slope, whole: "n in m", "n:m" (atan n/m) and,
/// where `slopes` is `line`, "p %" (atan p/100). None when it is no slope; a Problem when it is one that the
/// field does not take: of a plane's normal, negative as a tolerance, over nothing.
std::optional<Result<double>> readSlope(std::string_view text, const Tokens& tokens, Slopes slopes);

} // namespace planewright

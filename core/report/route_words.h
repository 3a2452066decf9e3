// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/second_route.h"

namespace planewright {

/// "2e−15": one digit, rounded upwards; "0" for none.
std::string shownDifference(double difference);
/// "Second route agrees within 2e−15.", or how many results disagree.
Text routesSentence(const RouteComparison& routes);

} // namespace planewright

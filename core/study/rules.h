// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/problem.h"

namespace planewright {

/// The rules between the places of a study: at least one case and one point, at most so many of each; keys
/// that can be names, each once in its list; every name that is referred to exists.
Problems brokenRules(const Study& study);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/problem.h"

namespace planewright {

/// The lists that are longer than a study may have them. Nothing else is looked at in such a study, so that
/// checking takes a bounded time.
Problems excessIn(const Study& study);

/// The rules between the places of a study: at least one case and one point, at most so many of each; keys
/// that can be names, each once in its list; no combination goes by the id of a case, so that a state has a
/// name of its own; every name that is referred to exists, and none is excluded twice; no combination has two
/// cases that exclude each other, or a measured one with another factor than 1; section forces have a fibre,
/// and rosettes stand in measured cases; strengths and checks as strength_rules.h has them. No more than the
/// first 100.
Problems brokenRules(const Study& study);

} // namespace planewright

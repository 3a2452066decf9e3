// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/json.h"
#include "core/study/study.h"

namespace planewright {

/// Where the offending piece of a Problem of a study stands in the file that the study was read from: the
/// character of the text that its column counts, the item of a list or the key that it quotes, the value at
/// its place, or the nearest thing around it that the file has.
std::size_t offsetOf(const Problem& problem, const Json& root, std::string_view bytes);

/// Adds what keeps a study from being valid, each where it stands in the file.
void addProblemsOf(const Study& study, const Json& root, std::string_view bytes, FileProblems& problems);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "core/words/problem.h"

namespace planewright {

/// What "format" says in a study file.
inline constexpr std::string_view studyFormat = "planewright-study";
/// Version of the study file that this program writes and the newest that it reads.
inline constexpr int studyFileVersion = 1;
/// Bytes of the largest study file that is read.
inline constexpr std::size_t greatestStudyFile = 16u << 20;

/// The study as a `.planewright` file: UTF-8 JSON, stable key order, one value a line, a newline at the end.
std::string writeStudy(const Study& study);

/// Reads such a file strictly: unknown, misspelt, doubled or missing keys, wrong types, dangling names and
/// texts that do not evaluate are Problems with path, line and column (at most 100 of them). At most
/// greatestStudyFile bytes and 64 levels. Never throws, never guesses.
Results<Study> readStudy(std::string_view bytes);

} // namespace planewright

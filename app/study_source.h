// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/outcome.h"
#include "core/study/study.h"

namespace planewright {

/// The study in a file, or ("-") on standard input; also the one that a figure carries.
Outcome<Study> studyIn(const std::string& file);

/// The name by which outputs call the study: the file's without folder and ending; empty for "-".
std::string studyNameOf(const std::string& file);

} // namespace planewright

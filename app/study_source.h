// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/outcome.h"
#include "core/study/study.h"

namespace planewright {

/// The study in a file, or ("-") on standard input; also the one that a figure carries.
Outcome<Study> studyIn(const std::string& file);

/// What it means that a file could not be read: one that is there is the machine's fault, one that is not
/// there the caller's.
Failure failedToRead(const std::string& file, Problem problem);

/// The name by which outputs call the study: the file's without folder and ending; empty for "-".
std::string studyNameOf(const std::string& file);

} // namespace planewright

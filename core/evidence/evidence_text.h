// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"

namespace planewright {

/// How many published values there are, and which the program does not meet.
struct EvidenceCount {
  std::size_t values = 0;
  std::size_t printed = 0; ///< of them with a value that the source prints
  std::size_t disagreeing = 0;
};
EvidenceCount countOf(const std::vector<CheckResult>& checks);

/// Every published value beside the computed one, a line each, with source, place and how far the value can
/// be trusted; what disagrees is marked and stands once more at the end.
std::string evidenceText(const std::vector<CheckResult>& checks, const Translate& translate = {});

} // namespace planewright

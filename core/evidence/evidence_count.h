// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/trust.h"

namespace planewright {

/// How many published values there are, and how many of them the program does not meet.
struct EvidenceCount {
  std::size_t values = 0;
  std::size_t disagreeing = 0;
  bool operator==(const EvidenceCount&) const = default;
};

EvidenceCount countOf(const std::vector<CheckResult>& checks);
EvidenceCount countOf(const std::vector<CheckResult>& checks, Trust trust);
/// Of those that are evidence from outside the program.
EvidenceCount outsideCountOf(const std::vector<CheckResult>& checks);

/// "All 326 values agree; 240 of them are evidence from outside the program, 86 are not."
std::vector<Text> wordsOfCount(const std::vector<CheckResult>& checks);

} // namespace planewright

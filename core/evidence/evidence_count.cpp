// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/evidence_count.h"

#include "core/quantity/shown_count.h"

#include <algorithm>

namespace planewright {

namespace {

template <class Counts>
EvidenceCount counted(const std::vector<CheckResult>& checks, Counts counts) {
  EvidenceCount count;
  for (const CheckResult& check : checks)
    if (counts(check)) {
      ++count.values;
      count.disagreeing += check.agrees ? 0 : 1;
    }
  return count;
}

} // namespace

EvidenceCount countOf(const std::vector<CheckResult>& checks) {
  return counted(checks, [](const CheckResult&) { return true; });
}

EvidenceCount countOf(const std::vector<CheckResult>& checks, Trust trust) {
  return counted(checks, [trust](const CheckResult& check) { return trustOf(check) == trust; });
}

EvidenceCount outsideCountOf(const std::vector<CheckResult>& checks) {
  return counted(checks, [](const CheckResult& check) { return isOutside(trustOf(check)); });
}

std::vector<Text> wordsOfCount(const std::vector<CheckResult>& checks) {
  const EvidenceCount all = countOf(checks);
  const EvidenceCount outside = outsideCountOf(checks);
  return {all.disagreeing == 0 ? PW_TEXT("Validate", "All %1 values agree.").with(shownCount(all.values))
                               : PW_TEXT("Validate", "%1 of %2 values disagree.")
                                     .with(shownCount(all.disagreeing))
                                     .with(shownCount(all.values)),
          PW_TEXT("Validate", "%1 of them are evidence from outside the program; %2 are not.")
              .with(shownCount(outside.values))
              .with(shownCount(all.values - outside.values))};
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/evidence_sheet.h"

#include "core/evidence/misprints.h"
#include "core/evidence/trust.h"
#include "core/report/sheet_html.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

TEST(EvidenceSheet, countsWhatIsFromOutsideApart) {
  const std::vector<CheckResult> checks = *publishedChecks();
  const auto of = [&](Trust trust) {
    return std::ranges::count_if(checks, [&](const CheckResult& check) { return trustOf(check) == trust; });
  };
  EXPECT_GE(of(Trust::work), 50);
  EXPECT_GE(of(Trust::own), 30);
  for (const CheckResult& check : checks)
    if (check.basis.find("memory") != std::string::npos) {
      EXPECT_GE(trustOf(check), Trust::memory) << check.id;
    }
  const std::string html = sheetHtml(evidenceSheet(checks, "test"));
  EXPECT_NE(html.find("All " + std::to_string(checks.size()) + " values agree."), std::string::npos);
  const auto outside = std::to_string(of(Trust::work) + of(Trust::companion));
  EXPECT_NE(html.find(outside + " of them are evidence from outside the program"), std::string::npos);
}

TEST(EvidenceSheet, standsWhatDisagreesFirst) {
  std::vector<CheckResult> checks = *publishedChecks();
  checks[3].agrees = false;
  const Sheet sheet = evidenceSheet(checks, "test");
  EXPECT_TRUE(sheet.disagrees);
  EXPECT_TRUE(std::get<SheetBox>(sheet.blocks.front()).alarms);
  EXPECT_NE(sheetHtml(sheet).find("DISAGREES"), std::string::npos);
}

TEST(EvidenceSheet, listsTheMisprints) {
  const std::vector<Misprint> misprints = knownMisprints();
  EXPECT_GE(misprints.size(), 7u);
  for (const Misprint& one : misprints) {
    EXPECT_FALSE(one.source.empty());
    EXPECT_FALSE(one.reason.empty());
  }
}

} // namespace
} // namespace planewright

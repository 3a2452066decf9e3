// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/evidence_sheet.h"

#include "core/evidence/evidence_count.h"
#include "core/evidence/misprints.h"
#include "core/quantity/shown_count.h"
#include "core/report/route_words.h"
#include "core/report/sheet_writer.h"
#include "core/words/version.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

std::string number(double value) {
  return shownNumber(value, decimalsFor(std::abs(value), 6));
}

SheetTable tableOf(const std::vector<const CheckResult*>& checks) {
  SheetTable table;
  table.columns = {{PW_TEXT("Validate", "Check"), false},  {PW_TEXT("Validate", "Quantity"), false},
                   {PW_TEXT("Validate", "Inputs"), false}, {PW_TEXT("Validate", "Printed")},
                   {PW_TEXT("Validate", "Computed")},      {PW_TEXT("Validate", "Difference")},
                   {PW_TEXT("Validate", "Tolerance")},     {PW_TEXT("Validate", "Verdict"), false},
                   {PW_TEXT("Validate", "Where"), false}};
  for (const CheckResult* check : checks) {
    const bool isSize = check->status == CheckStatus::sign;
    const double against = check->printed.value_or(check->recomputed);
    const double difference = isSize ? std::abs(std::abs(check->computed) - std::abs(against))
                                     : std::abs(check->computed - against);
    table.rows.push_back(
        {verbatim(check->id), symbol("%1 (%2)").with(check->quantity).with(check->unit),
         verbatim(check->inputs),
         check->printed ? verbatim(exactNumber(*check->printed)) : PW_TEXT("Validate", "none"),
         verbatim(number(check->computed)), verbatim(shownDifference(difference)),
         check->printed ? verbatim(exactNumber(check->tolerance)) : Text(),
         check->agrees ? symbol("%1, %2").with(PW_TEXT("Validate", "agrees")).with(labelOf(check->status))
                       : PW_TEXT("Validate", "DISAGREES"),
         verbatim(check->locator)});
  }
  return table;
}

void writeSummary(SheetWriter& sheet, const std::vector<CheckResult>& checks, const std::string& platform) {
  std::vector<Text> box = wordsOfCount(checks);
  box.push_back(PW_TEXT("Validate", "Planewright %1 on %2").with(programVersion()).with(platform));
  sheet.box(std::move(box), countOf(checks).disagreeing > 0);
  sheet.heading(PW_TEXT("Validate", "By what the values rest on"));
  SheetTable table;
  table.columns = {{PW_TEXT("Validate", "Basis"), false},
                   {PW_TEXT("Validate", "Outside evidence"), false},
                   {PW_TEXT("Validate", "Values")},
                   {PW_TEXT("Validate", "Disagree")}};
  for (const Named<Trust>& row : namesOf<Trust>()) {
    const EvidenceCount count = countOf(checks, row.value);
    table.rows.push_back({row.label,
                          isOutside(row.value) ? PW_TEXT("Validate", "yes") : PW_TEXT("Validate", "no"),
                          verbatim(shownCount(count.values)), verbatim(shownCount(count.disagreeing))});
  }
  sheet.table(std::move(table));
  sheet.text(PW_TEXT("Validate",
                     "A value without a printed one, or one that its source rounded on its way, is "
                     "judged by own arithmetic; of some sources only the size without its sign."),
             Voice::soft);
}

} // namespace

Sheet evidenceSheet(const std::vector<CheckResult>& checks, const std::string& platform) {
  SheetWriter writer;
  writeSummary(writer, checks, platform);
  std::vector<const CheckResult*> wrong;
  for (const CheckResult& check : checks)
    if (!check.agrees)
      wrong.push_back(&check);
  if (!wrong.empty()) {
    writer.heading(PW_TEXT("Validate", "What disagrees"));
    writer.table(tableOf(wrong));
  }
  writer.heading(PW_TEXT("Validate", "All values, by source"));
  for (std::size_t from = 0; from < checks.size();) {
    std::vector<const CheckResult*> ofSource;
    const std::string& source = checks[from].source;
    for (; from < checks.size() && checks[from].source == source; ++from)
      ofSource.push_back(&checks[from]);
    writer.subheading(verbatim(source));
    writer.text(PW_TEXT("Validate", "Basis: %1.").with(ofSource.front()->basis), Voice::soft);
    writer.table(tableOf(ofSource));
  }
  writer.heading(PW_TEXT("Validate", "Known misprints of the sources"));
  writer.text(PW_TEXT("Validate",
                      "Printed answers that do not follow from their own inputs; nothing is judged "
                      "against them."));
  SheetTable misprints;
  misprints.columns = {{PW_TEXT("Validate", "Source"), false},
                       {PW_TEXT("Validate", "Printed"), false},
                       {PW_TEXT("Validate", "Recomputed"), false},
                       {PW_TEXT("Validate", "Reason"), false}};
  for (const Misprint& one : knownMisprints())
    misprints.rows.push_back(
        {verbatim(one.source), verbatim(one.printed), verbatim(one.recomputed), verbatim(one.reason)});
  writer.table(std::move(misprints));

  Sheet sheet;
  sheet.title.project = plain(PW_TEXT("Validate", "Planewright %1").with(programVersion()));
  sheet.title.subject = plain(PW_TEXT("Validate", "Published values, recomputed"));
  sheet.blocks = writer.taken();
  sheet.caution =
      PW_TEXT("Validate", "Evidence for the transformations and criteria alone. Local codes and a "
                          "licensed engineer decide.");
  sheet.identity = PW_TEXT("Validate", "Planewright %1 · %2").with(programVersion()).with(platform);
  sheet.disagrees = !wrong.empty();
  return sheet;
}

} // namespace planewright

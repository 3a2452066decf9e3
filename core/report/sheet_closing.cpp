// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/record/fingerprint.h"
#include "core/report/comparison.h"
#include "core/report/route_words.h"
#include "core/report/sheet_writer.h"
#include "core/study/verdict.h"
#include "core/table/cautions.h"
#include "core/table/check_words.h"

#include <algorithm>

namespace planewright {

namespace {

SheetTable routeTable(const std::vector<RouteRow>& rows, bool withPlace) {
  SheetTable table;
  if (withPlace)
    table.columns = {{PW_TEXT("Sheet", "Point, combination"), false}};
  table.columns.push_back({PW_TEXT("Sheet", "Quantity"), false});
  table.columns.push_back({PW_TEXT("Sheet", "First route")});
  table.columns.push_back({PW_TEXT("Sheet", "Second route")});
  table.columns.push_back({PW_TEXT("Sheet", "Difference")});
  constexpr int decimals = 9;
  for (const RouteRow& row : rows) {
    std::vector<Text>& cells = table.rows.emplace_back();
    if (withPlace)
      cells.push_back(symbol("%1, %2").with(row.point).with(row.combination));
    cells.push_back(withUnit(row.quantity, row.unit));
    cells.push_back(verbatim(shownNumber(row.first, decimals)));
    cells.push_back(verbatim(shownNumber(row.second, decimals)));
    cells.push_back(verbatim(shownDifference(row.difference())));
  }
  return table;
}

} // namespace

void writeRoutes(SheetWriter& sheet, const std::vector<Readout>& points, const RouteComparison& routes) {
  sheet.heading(PW_TEXT("Sheet", "Second route within this program"));
  sheet.text(PW_TEXT(
      "Sheet", "Every result is worked out again by another way: the stress tensor as a matrix, summed "
               "over the cases, turned by rotation matrices, its principal values by an eigenvalue "
               "solver; trace and determinant; the state times its load multiplier, which must stand at "
               "the limit; a scan of each band, which must find nothing worse. It reads the same study "
               "and is no substitute for a checking person."));
  sheet.text(routesSentence(routes), routes.agrees() ? Voice::plain : Voice::strong);
  if (!routes.agrees()) {
    sheet.subheading(PW_TEXT("Sheet", "Where the two routes disagree"));
    sheet.table(routeTable(routes.disagree, true));
  }
  for (const Readout& readout : points) {
    const std::size_t governing = governingStateOf(readout);
    sheet.subheading(PW_TEXT("Sheet", "Both routes at %1").with(pointAndState(readout, governing)));
    sheet.table(routeTable(secondRouteOf(readout, readout.states[governing]), false));
  }
  sheet.text(PW_TEXT("Sheet", "Differences are parts of the size of the terms. Compared: %1 results.")
                 .with(shownCount(routes.compared)),
             Voice::soft);
}

void writeChanges(SheetWriter& sheet, const Study& earlier, const Study& study,
                  const std::string& earlierName) {
  sheet.heading(PW_TEXT("Sheet", "Changes since another revision"));
  const Text name = earlierName.empty() ? PW_TEXT("Sheet", "another study") : verbatim(earlierName);
  sheet.text(PW_TEXT("Sheet", "Compared with %1, revision “%2”, study %3.")
                 .with(name)
                 .with(earlier.title.revision)
                 .with(fingerprintOf(earlier)));
  const Comparison comparison = compared(earlier, study);
  if (comparison.empty())
    return sheet.text(PW_TEXT("Sheet", "Nothing differs."));
  const auto list = [&](Text heading, const std::vector<Change>& changes) {
    sheet.subheading(std::move(heading));
    if (changes.empty())
      return sheet.text(PW_TEXT("Sheet", "None."));
    SheetTable table;
    table.columns = {{PW_TEXT("Sheet", "What"), false},
                     {PW_TEXT("Sheet", "Was"), false},
                     {PW_TEXT("Sheet", "Is now"), false}};
    for (const Change& change : changes)
      table.rows.push_back({change.what, change.before, change.after});
    sheet.table(std::move(table));
  };
  list(PW_TEXT("Sheet", "Inputs that differ"), comparison.inputs);
  list(PW_TEXT("Sheet", "Results that differ"), comparison.results);
}

namespace {

/// What each check comes to, in words.
void writeConclusion(SheetWriter& sheet, const std::vector<Readout>& points) {
  sheet.heading(PW_TEXT("Sheet", "Conclusion"));
  sheet.text(verdictSentence(verdictOf(points)), Voice::strong);
  SheetTable table;
  table.columns = {{PW_TEXT("Sheet", "Point"), false},
                   {PW_TEXT("Sheet", "Check"), false},
                   {PW_TEXT("Sheet", "Verdict"), false},
                   {PW_TEXT("Sheet", "Combination"), false}};
  for (const Readout& readout : points)
    for (std::size_t i = 0; i < readout.checks.size(); ++i) {
      const Verdict verdict = verdictOfCheck(readout, i);
      const std::optional<JudgedCheck>& told = toldOf(verdict);
      table.rows.push_back({verbatim(readout.point),
                            symbol("%1: %2").with(readout.checks[i].id).with(checkName(readout.checks[i])),
                            shortVerdict(verdict),
                            told ? verbatim(readout.states[told->state].combination) : Text()});
    }
  sheet.table(std::move(table));
  for (const Readout& readout : points)
    if (readout.checks.empty())
      sheet.text(PW_TEXT("Sheet", "Point %1 has no check: its stresses are reported, not judged.")
                     .with(readout.point));
}

/// Each once, whichever point it comes from.
void writeCautions(SheetWriter& sheet, const std::vector<Readout>& points) {
  std::vector<Text> cautions;
  const auto add = [&](const std::vector<Text>& some) {
    for (const Text& caution : some)
      if (std::ranges::find(cautions, caution) == cautions.end())
        cautions.push_back(caution);
  };
  for (const Readout& readout : points) {
    add(cautionsOf(readout));
    for (std::size_t i = 0; i < readout.checks.size(); ++i)
      add(cautionsOf(readout, i));
  }
  sheet.subheading(PW_TEXT("Sheet", "Cautions"));
  for (const Text& caution : cautions)
    sheet.text(caution, Voice::caution);
  sheet.subheading(PW_TEXT("Sheet", "What is not covered"));
  sheet.text(PW_TEXT("Sheet",
                     "The sheet sees stresses at single points in plane stress, found elsewhere and taken as "
                     "given. It does not see the volume that is stressed, gradients, notches and corners, "
                     "moisture, temperature, fatigue, creep, stability, stress through the thickness beyond "
                     "σ_{z}, nor whether the load cases are complete. The code in force and a licensed "
                     "engineer decide."));
}

} // namespace

void writeClosing(SheetWriter& sheet, const Study& study, const std::vector<Readout>& points) {
  writeConclusion(sheet, points);
  writeCautions(sheet, points);
  sheet.sources();
  sheet.subheading(PW_TEXT("Sheet", "Signatures"));
  sheet.signatures({shownPrepared(study), shownChecked(study), verbatim(study.title.date)});
}

} // namespace planewright

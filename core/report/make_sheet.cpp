// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/make_sheet.h"

#include "core/record/fingerprint.h"
#include "core/report/route_words.h"
#include "core/report/sheet_writer.h"
#include "core/strength/shown_ratio.h"
#include "core/study/governing.h"
#include "core/study/verdict.h"
#include "core/table/check_words.h"
#include "core/words/version.h"

#include <algorithm>

namespace planewright {

template <>
const std::vector<Named<Depth>>& namesOf<Depth>() {
  static const std::vector<Named<Depth>> names = {
      {Depth::results, "results", PW_TEXT("Sheet", "inputs and results")},
      {Depth::governing, "governing", PW_TEXT("Sheet", "working of what governs")},
      {Depth::all, "all", PW_TEXT("Sheet", "working of all combinations")}};
  return names;
}

std::vector<Readout> readoutsOf(const Study& study, const std::vector<std::string>& names) {
  std::vector<Readout> readouts;
  for (const Point& point : study.points)
    if (names.empty() || std::ranges::find(names, point.name) != names.end())
      readouts.push_back(evaluate(study, point.name));
  return readouts;
}

namespace {

const Readout& readoutAt(const std::vector<Readout>& points, const std::string& name) {
  return *std::ranges::find(points, name, &Readout::point);
}

/// The three lines of the first page.
std::vector<Text> governingLines(const Study& study, const std::vector<Readout>& points,
                                 const Verdict& verdict) {
  std::vector<Text> lines = {verdictSentence(verdict)};
  if (verdict.unjudged) {
    const Readout& readout = readoutAt(points, verdict.unjudged->point);
    lines.push_back(PW_TEXT("Sheet", "Not judged: %1, check %2")
                        .with(pointAndState(readout, verdict.unjudged->state))
                        .with(readout.checks[verdict.unjudged->check].id));
  }
  if (verdict.governing) {
    const Readout& readout = readoutAt(points, verdict.governing->point);
    const CheckReading& reading = readingOf(readout, *verdict.governing);
    lines.push_back(PW_TEXT("Sheet", "Utilisation %1: %2, check %3")
                        .with(shownWorst(reading))
                        .with(pointAndState(readout, verdict.governing->state))
                        .with(checkName(readout.checks[verdict.governing->check])));
    const Text worst = worstSentence(readout.checks[verdict.governing->check], reading);
    lines.push_back(worst.empty() ? multiplierSentence(reading)
                                  : symbol("%1 %2").with(multiplierSentence(reading)).with(worst));
  } else if (const std::optional<GoverningStates> worst = governingOf(points)) {
    const auto told = [&](const Text& name, const Governing& one) {
      const Readout& readout = readoutAt(points, one.point);
      lines.push_back(PW_TEXT("Sheet", "Greatest %1: %2, %3")
                          .with(name)
                          .with(stressFormOf(study, readout.states[one.state]).withUnit(one.stress))
                          .with(pointAndState(readout, one.state)));
    };
    told(symbol("σ_{1}"), worst->principal);
    told(PW_TEXT("Sheet", "shear in the plane"), worst->shear);
  }
  return lines;
}

void writeBasis(SheetWriter& sheet, const Study& study, const SheetOrder& order) {
  sheet.heading(PW_TEXT("Sheet", "Purpose, method and conventions"));
  sheet.text(study.title.purpose.empty() ? PW_TEXT("Sheet", "Purpose: not stated.")
                                         : PW_TEXT("Sheet", "Purpose: %1").with(study.title.purpose));
  if (!study.title.notes.empty())
    sheet.text(PW_TEXT("Sheet", "Assumptions and notes: %1").with(study.title.notes));
  sheet.text(PW_TEXT(
      "Sheet", "Method: the stresses of each load case at a point are summed over the combinations, "
               "transformed to the planes and lines that matter (plane stress, small displacements) and "
               "held against strengths in those directions, the direction of a line over the whole of "
               "its tolerance."));
  sheet.text(
      PW_TEXT("Sheet",
              "Positive: %1. τ_{xy} acts on the +x face in the direction of +y. Angles from +x, "
              "counter-clockwise, seen from +z; a plane is named by its normal, the cut itself runs at "
              "90° to it. Cuts cross or follow a line; stresses act along or across it.")
          .with(labelOf(study.convention.positive)));
  sheet.text(PW_TEXT("Sheet",
                     "Rounding: results have four significant digits of the greatest stress of their state, "
                     "numbers put in at least one digit more, and as many as the result needs where terms "
                     "cancel. Utilisations are rounded upwards, load multipliers downwards. The program "
                     "calculates with about 16 digits."));
  sheet.text(PW_TEXT("Sheet", "Shown: %1; %2.")
                 .with(order.points.empty() ? PW_TEXT("Sheet", "all points of the study")
                                            : PW_TEXT("Sheet", "chosen points of the study"))
                 .with(labelOf(order.depth)),
             Voice::soft);
}

Text identityOf(const Study& study, const SheetOrder& order) {
  const Text identity = PW_TEXT("Sheet", "study %1 · Planewright %2")
                            .with(fingerprintOf(study))
                            .with(std::string(programVersion()));
  return order.studyName.empty() ? identity : symbol("%1 · %2").with(order.studyName).with(identity);
}

} // namespace

Sheet sheetOf(const Study& study, const SheetOrder& order) {
  const WritesDecimals decimals(order.decimal);
  return sheetOf(study, readoutsOf(study, order.points), order);
}

Sheet sheetOf(const Study& study, const std::vector<Readout>& points, const SheetOrder& order) {
  const WritesDecimals decimals(order.decimal);
  const RouteComparison routes = comparedRoutes(points);
  const Verdict verdict = verdictOf(points);
  SheetWriter writer;
  if (!routes.agrees())
    writer.box({routesSentence(routes)}, true);
  writer.box(governingLines(study, points, verdict),
             verdict.standing == Standing::exceeds || verdict.standing == Standing::unjudged);
  writeBasis(writer, study, order);
  writeInputs(writer, study, points);
  for (const Readout& readout : points)
    writePoint(writer, study, readout, order);
  writeRoutes(writer, points, routes);
  if (order.earlier)
    writeChanges(writer, *order.earlier, study, order.earlierName);
  writeClosing(writer, study, points);

  const Title& title = study.title;
  Sheet sheet;
  sheet.title = {title.project,        title.subject,       title.number, title.revision,
                 shownPrepared(study), shownChecked(study), title.date};
  sheet.blocks = writer.taken();
  sheet.caution = PW_TEXT("Sheet", "Sees single points in plane stress: not volume, size, moisture, notches. "
                                   "Local codes and a licensed engineer decide.");
  sheet.identity = identityOf(study, order);
  sheet.routes = routesSentence(routes);
  sheet.decimal = order.decimal;
  sheet.disagrees = !routes.agrees();
  sheet.exceeds = verdict.standing == Standing::exceeds || verdict.standing == Standing::unjudged ||
                  verdict.unjudged.has_value();
  return sheet;
}

} // namespace planewright

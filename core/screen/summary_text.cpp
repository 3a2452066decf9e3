// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/summary_text.h"

#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/strength/cautions.h"
#include "core/strength/shown_ratio.h"
#include "core/table/aligned_rows.h"
#include "core/table/check_words.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr std::size_t shownPoints = 10;
constexpr std::size_t longestBar = 40;
constexpr int angleDecimals = 2;
constexpr std::string_view indent = "  ";

using Cells = std::vector<std::string>;

/// Writes the summary in one language.
class SummaryWriter {
public:
  SummaryWriter(const ScreenPlan& plan, const FieldReading& reading, const FieldResults& results,
                const FieldSummary& summary, const Translate& translate)
      : m_plan(plan), m_field(reading.field), m_reading(reading), m_results(results), m_summary(summary),
        m_sentences(outcomeSentences(reading.field, results, summary)), m_translate(translate) {}

  std::string written(const Readout& readout, const std::vector<LeftOut>& leftOut) {
    judgedBy(readout);
    read(leftOut);
    outcome();
    worst();
    histogram();
    cautions(readout);
    return std::move(m_out);
  }

  std::string notes(const Readout& readout, const std::vector<LeftOut>& leftOut) {
    judgedBy(readout);
    read(leftOut);
    cautions(readout);
    return std::move(m_out);
  }

private:
  std::string words(const Text& text) const { return plain(text, m_translate); }
  void line(const Text& text) { m_out += words(text) + "\n"; }
  void indented(const Text& text) { m_out += std::string(indent) + words(text) + "\n"; }

  void judgedBy(const Readout& readout) {
    line(PW_TEXT("Screen", "Judged by point %1, over %2 combinations.")
             .with(readout.point)
             .with(shownCount(m_plan.combinations.size())));
    for (const ScreenedCheck& check : m_plan.checks)
      indented(PW_TEXT("Screen", "Check %1: %2, line %3 ± %4")
                   .with(check.setup.id)
                   .with(checkName(check.setup))
                   .with(shownDegrees(check.band.nominal, angleDecimals))
                   .with(shownDegrees(check.band.tolerance, angleDecimals)));
    for (const UnscreenedCheck& check : m_plan.unscreened)
      indented(PW_TEXT("Screen", "Check %1 is not used: %2.").with(check.id).with(check.reason));
  }

  void read(const std::vector<LeftOut>& leftOut) {
    line(PW_TEXT("Screen", "Rows: %1, of them faulty and left out: %2, of these not finite: %3.")
             .with(shownCount(m_reading.rows))
             .with(shownCount(m_reading.faultyRows))
             .with(shownCount(m_reading.notFinite)));
    line(m_sentences[0]);
    for (const LeftOut& one : leftOut)
      indented(PW_TEXT("Screen", "Points left out by “%1”: %2").with(one.name).with(shownCount(one.points)));
    for (const FieldColumn& column : m_reading.columns.columns)
      if (column.role == FieldRole::unread)
        indented(PW_TEXT("Screen", "Column not read: %1").with(column.heading));
  }

  void outcome() {
    line(m_sentences[1]);
    line(m_sentences[2]);
    indented(m_sentences[3]);
  }

  void worst() {
    std::vector<Cells> rows(1);
    const auto head = [&](const Text& text) { rows[0].push_back(words(text)); };
    head(PW_TEXT("Screen", "point"));
    if (m_field.columns().layer)
      head(PW_TEXT("Screen", "layer"));
    head(PW_TEXT("Screen", "utilisation"));
    head(PW_TEXT("Screen", "load multiplier"));
    head(PW_TEXT("Screen", "combination"));
    head(PW_TEXT("Screen", "check"));
    head(PW_TEXT("Screen", "mode"));
    head(PW_TEXT("Screen", "worst angle"));
    for (const std::uint32_t point : worstOf(m_results, shownPoints))
      rows.push_back(cellsOf(point));
    line(PW_TEXT("Screen", "Worst points:"));
    m_out += alignedRows(rows, indent);
  }

  Cells cellsOf(std::size_t point) const {
    const PointResult result = m_results[point];
    Cells cells = {std::string(m_field.nameOf(point))};
    if (m_field.columns().layer)
      cells.push_back(words(labelOf(m_field.layerOf(point))));
    cells.push_back(shownUtilisation(result.utilisation));
    const std::optional<double> multiplier = result.multiplier();
    cells.push_back(multiplier ? shownMultiplier(*multiplier) : std::string());
    cells.push_back(m_plan.combinations[result.combination].name);
    cells.push_back(m_plan.checks[result.check].setup.id);
    cells.push_back(result.mode ? words(labelOf(*result.mode)) : std::string());
    cells.push_back(shownDegrees(Angle::fromDegrees(result.worstAngle), angleDecimals));
    return cells;
  }

  void histogram() {
    line(PW_TEXT("Screen", "Points by utilisation:"));
    const std::size_t most = *std::ranges::max_element(m_summary.histogram);
    std::vector<Cells> rows;
    for (std::size_t bin = 0; bin < m_summary.histogram.size(); ++bin) {
      const bool isLast = bin == binEnds.size();
      const std::string end = shownNumber(binEnds[isLast ? bin - 1 : bin], 1);
      rows.push_back(
          {words((isLast ? PW_TEXT("Screen", "above %1") : PW_TEXT("Screen", "up to %1")).with(end)),
           shownCount(m_summary.histogram[bin])});
    }
    // The bars stand behind the aligned numbers; any point at all has a stroke.
    const std::string lines = alignedRows(rows, indent);
    std::size_t from = 0;
    for (const std::size_t points : m_summary.histogram) {
      const std::size_t end = lines.find('\n', from);
      m_out += lines.substr(from, end - from);
      if (points > 0)
        m_out += " " + std::string(std::max<std::size_t>(points * longestBar / most, 1), '#');
      m_out += '\n';
      from = end + 1;
    }
  }

  void cautions(const Readout& readout) {
    std::vector<Text> all;
    const auto add = [&](const Text& caution) {
      if (std::ranges::find(all, caution) == all.end())
        all.push_back(caution);
    };
    for (const ScreenedCheck& check : m_plan.checks) {
      const auto setup = std::ranges::find(readout.checks, check.setup.id, &CheckSetup::id);
      for (const Text& one : mismatchesOf(readout, static_cast<std::size_t>(setup - readout.checks.begin())))
        add(one);
      for (const Text& one : check.setup.cautions)
        add(one);
      if (const std::optional<Text> one = cautionOfTensionAcross(check.setup.strengths.kind))
        add(*one);
    }
    for (const Text& one : all)
      line(PW_TEXT("Screen", "Caution: %1").with(one));
    line(limitOfAllPoints());
  }

  const ScreenPlan& m_plan;
  const Field& m_field;
  const FieldReading& m_reading;
  const FieldResults& m_results;
  const FieldSummary& m_summary;
  std::vector<Text> m_sentences;
  const Translate& m_translate;
  std::string m_out;
};

} // namespace

Text withFaultCounts(const Text& words, const FieldReading& reading) {
  return words.with(shownCount(reading.faultyRows))
      .with(shownCount(reading.rows))
      .with(shownCount(reading.incompletePoints))
      .with(shownCount(reading.field.size()));
}

std::vector<Text> outcomeSentences(const Field& field, const FieldResults& results,
                                   const FieldSummary& summary) {
  const std::size_t greatest = worstOf(results, 1).front();
  return {PW_TEXT("Screen", "Points: %1, judged: %2, incomplete and not judged: %3, left out on request: %4.")
              .with(shownCount(summary.points))
              .with(shownCount(summary.judged))
              .with(shownCount(summary.incomplete))
              .with(shownCount(summary.leftOut)),
          PW_TEXT("Screen", "Exceeding: %1 of %2 judged points.")
              .with(shownCount(summary.exceeding))
              .with(shownCount(summary.judged)),
          PW_TEXT("Screen", "Greatest utilisation: %1 at point %2; 99.9 % of the points do not exceed %3.")
              .with(shownUtilisation(results[greatest].utilisation))
              .with(field.nameOf(greatest))
              .with(shownUtilisation(summary.nearlyAll)),
          PW_TEXT("Screen", "Where these are far apart the greatest stands for few points, as at a singular "
                            "corner, and is no verdict by itself.")};
}

std::string summaryText(const Study& study, std::string_view point, const ScreenPlan& plan,
                        const FieldReading& reading, const FieldResults& results, const FieldSummary& summary,
                        const std::vector<LeftOut>& leftOut, const Translate& translate) {
  return SummaryWriter(plan, reading, results, summary, translate).written(evaluate(study, point), leftOut);
}

std::string fieldNotes(const Study& study, std::string_view point, const ScreenPlan& plan,
                       const FieldReading& reading, const FieldResults& results, const FieldSummary& summary,
                       const std::vector<LeftOut>& leftOut, const Translate& translate) {
  return SummaryWriter(plan, reading, results, summary, translate).notes(evaluate(study, point), leftOut);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/record/readout_file.h"
#include "core/study/envelope.h"
#include "core/study/governing.h"
#include "core/study/sum_of_case.h"
#include "core/study/working_of_check.h"
#include "core/study/working_of_state.h"
#include "core/table/aligned_rows.h"
#include "core/table/cautions.h"
#include "core/table/check_words.h"
#include "core/table/parts_of_sx.h"
#include "core/table/table.h"

#include <algorithm>

namespace planewright {

namespace {

using Cells = std::vector<std::string>;

/// Writes the readout in one language.
class TextWriter {
public:
  TextWriter(const Study& study, const Translate& translate) : m_study(study), m_translate(translate) {}

  std::string written(const std::vector<Readout>& points) {
    line("", PW_TEXT("Readout", "Stresses in %1, %2. Angles from +x, counter-clockwise, seen from +z.")
                 .with(m_study.units.stress)
                 .with(labelOf(m_study.convention.positive)));
    governing(points);
    for (const Readout& readout : points)
      point(readout);
    m_out += '\n';
    line("", PW_TEXT("Readout", "Stresses at single points, not a design check: the code in force and a "
                                "licensed engineer decide."));
    return std::move(m_out);
  }

  std::string working(const Readout& readout) {
    const StateReading& shown = readout.state();
    line("", PW_TEXT("Readout", "Point %1").with(readout.point));
    sources(*findPoint(m_study, readout.point));
    m_out += '\n';
    line("  ", nameOf(shown, readout.shown < m_study.combinations.size()));
    components(stressFormOf(m_study, shown), shown);
    steps(workingOf(m_study, readout, shown));
    for (std::size_t i = 0; i < shown.checks.size(); ++i) {
      nameAndLimit(readout.checks[i]);
      outcome(readout, verdictOf(readout, readout.shown, i));
      workingOfCheckIn(readout, shown, i);
    }
    return std::move(m_out);
  }

private:
  std::string words(const Text& text) const { return plain(text, m_translate); }
  void line(std::string_view indent, const Text& text) { m_out += std::string(indent) + words(text) + "\n"; }

  void verdict(const std::vector<Readout>& points) {
    const Verdict verdict = verdictOf(points);
    line("", verdictSentence(verdict));
    if (!verdict.governing)
      return;
    const Readout& readout = *std::ranges::find(points, verdict.governing->point, &Readout::point);
    line("",
         (verdict.unjudged ? PW_TEXT("Readout", "Governing among those judged: %1, point %2, check %3, %4")
                           : PW_TEXT("Readout", "Governing: %1, point %2, check %3, %4"))
             .with(shownWorst(readingOf(readout, *verdict.governing)))
             .with(readout.point)
             .with(readout.checks[verdict.governing->check].id)
             .with(readout.states[verdict.governing->state].combination));
  }

  void nameAndLimit(const CheckSetup& setup) {
    m_out += '\n';
    line("  ", PW_TEXT("Readout", "Check %1: %2").with(setup.id).with(checkName(setup)));
    line("    ", PW_TEXT("Readout", "Limit: %1 (%2)")
                     .with(symbol(rowOf(setup.criterion).equation))
                     .with(rowOf(setup.criterion).source));
  }

  void outcome(const Readout& readout, const Verdict& verdict) {
    if (verdict.unjudged)
      line("    ", notJudgedSentence(readout, *verdict.unjudged));
    if (verdict.governing)
      judged(readout, *verdict.governing);
  }

  /// A check of a point over all combinations, and what follows for other directions.
  void check(const Readout& readout, std::size_t index) {
    const CheckSetup& setup = readout.checks[index];
    const Verdict verdict = verdictOfCheck(readout, index);
    nameAndLimit(setup);
    outcome(readout, verdict);
    if (const auto directions = directionsOf(readout, index))
      for (const Text& sentence : sentencesOf(setup, *directions))
        line("    ", sentence);
    for (const Text& caution : cautionsOf(readout, index))
      line("    ", PW_TEXT("Readout", "Caution: %1").with(caution));
    if (verdict.governing)
      workingOfCheckIn(readout, readout.states[verdict.governing->state], index);
  }

  void workingOfCheckIn(const Readout& readout, const StateReading& state, std::size_t check) {
    const std::vector<Step> steps = workingOfCheck(m_study, readout, state, check);
    if (steps.empty())
      return;
    line("    ", PW_TEXT("Readout", "Working of the check in %1, tension positive").with(state.combination));
    for (const Step& one : steps)
      step(one, PW_TEXT("Readout", "%1 (%2)").with(one.name).with(one.source));
  }

  void judged(const Readout& readout, const JudgedCheck& told) {
    const CheckSetup& setup = readout.checks[told.check];
    const CheckReading& reading = readingOf(readout, told);
    line("    ", PW_TEXT("Readout", "%1: %2")
                     .with(readout.states[told.state].combination)
                     .with(shortVerdict(verdictOf(readout, told.state, told.check))));
    line("    ", factorSentence(reading.factor));
    line("    ", multiplierSentence(reading));
    if (const Text worst = worstSentence(setup, reading); !worst.empty())
      line("    ", worst);
    if (reading.worst.mode)
      line("    ", PW_TEXT("Readout", "Mode: %1").with(labelOf(*reading.worst.mode)));
  }

  /// Without strengths the greatest stresses govern.
  void governing(const std::vector<Readout>& points) {
    const std::optional<GoverningStates> worst = governingOf(points);
    if (!worst)
      return;
    const auto told = [&](const Text& name, const Governing& one) {
      const auto readout = std::ranges::find(points, one.point, &Readout::point);
      line("", PW_TEXT("Readout", "Greatest %1: %2, point %3, %4")
                   .with(name)
                   .with(stressFormOf(m_study, readout->states[one.state]).withUnit(one.stress))
                   .with(one.point)
                   .with(one.combination));
    };
    told(symbol("σ_{1}"), worst->principal);
    told(PW_TEXT("Readout", "shear in the plane"), worst->shear);
    verdict(points);
  }

  /// The name, with the kind where it says more, the angle both ways and the tolerance.
  static Text described(const LineReading& line) {
    const bool namesKind = line.kind == LineKind::other || line.name == wordOf(line.kind);
    const Text name = namesKind ? PW_TEXT("Readout", "Line %1").with(line.name)
                                : PW_TEXT("Readout", "Line %1 (%2)").with(line.name).with(labelOf(line.kind));
    const std::string angle = shownDegrees(line.angle.value, angleDecimals);
    if (line.tolerance == Angle())
      return PW_TEXT("Readout", "%1: %2, given as %3, without tolerance")
          .with(name)
          .with(angle)
          .with(line.typed);
    return PW_TEXT("Readout", "%1: %2 ± %3, given as %4")
        .with(name)
        .with(angle)
        .with(shownDegrees(line.tolerance, angleDecimals))
        .with(line.typed);
  }

  void point(const Readout& readout) {
    m_out += '\n';
    line("", PW_TEXT("Readout", "Point %1").with(readout.point));
    for (const LineReading& one : readout.lines)
      line("  ", described(one));
    for (const Text& caution : cautionsOf(readout))
      line("  ", PW_TEXT("Readout", "Caution: %1").with(caution));
    if (readout.edge)
      line("  ",
           PW_TEXT("Readout", "Free edge at %1").with(shownDegrees(readout.edge->value, angleDecimals)));
    sources(*findPoint(m_study, readout.point));
    if (judgedStates(readout) > 1) {
      m_out += '\n';
      line("  ", PW_TEXT("Readout", "Over all combinations"));
      m_out += '\n';
      const Table range = envelopeTable(m_study, readout);
      planes(range);
      for (const Text& caution : range.ofRange)
        line("    ", PW_TEXT("Readout", "Caution: %1").with(caution));
    }
    for (std::size_t i = 0; i < readout.checks.size(); ++i)
      check(readout, i);
    for (std::size_t i = 0; i < readout.states.size(); ++i)
      state(readout, readout.states[i], i < m_study.combinations.size());
  }

  /// Where the stresses of the cases come from, with the working.
  void sources(const Point& point) {
    for (const CaseStress& stress : point.stress) {
      const std::vector<NamedContribution> sources = contributionsOf(m_study, point, stress);
      for (const NamedContribution& made : sources) {
        m_out += '\n';
        line("  ", PW_TEXT("Readout", "Case %1: %2").with(stress.caseId).with(made.name));
        for (const Text& rule : made.contribution.signRules)
          line("    ", rule);
        for (const Text& caution : made.contribution.cautions)
          line("    ", PW_TEXT("Readout", "Limit: %1").with(caution));
        steps(made.contribution.steps);
      }
      sumOfSources(stress, sources);
    }
  }

  void sumOfSources(const CaseStress& stress, const std::vector<NamedContribution>& sources) {
    const std::vector<Step> sum = sumOfCase(m_study, stress, sources);
    if (sum.empty())
      return;
    m_out += '\n';
    line("  ", PW_TEXT("Readout", "Case %1 in all").with(stress.caseId));
    if (m_study.convention.positive == Positive::compression)
      line("    ", PW_TEXT("Readout", "Sources are worked out with tension positive; here the study counts "
                                      "compression positive."));
    for (std::size_t i = 0; i < sources.size() && sources.size() > 1; ++i)
      line("    ", PW_TEXT("Readout", "%1: %2").with(shownCount(i + 1)).with(sources[i].name));
    steps(sum);
  }

  Text nameOf(const StateReading& state, bool isCombination) const {
    if (isCombination)
      return PW_TEXT("Readout", "Combination %1").with(state.combination);
    return state.judged ? PW_TEXT("Readout", "Case %1").with(state.combination)
                        : PW_TEXT("Readout", "Case %1 alone").with(state.combination);
  }

  void state(const Readout& readout, const StateReading& state, bool isCombination) {
    const StressForm stresses = stressFormOf(m_study, state);
    m_out += '\n';
    line("  ", nameOf(state, isCombination));
    components(stresses, state);
    m_out += '\n';
    planes(planesTable(m_study, readout, state));
    for (std::size_t i = 0; i < state.checks.size(); ++i) {
      const CheckReading& reading = state.checks[i];
      line("    ", PW_TEXT("Readout", "Check %1: %2").with(readout.checks[i].id).with(shownWorst(reading)));
    }
    m_out += '\n';
    steps(workingOf(m_study, readout, state));
  }

  void components(const StressForm& stresses, const StateReading& state) {
    line("    ", symbol("σ_{x} = %1, σ_{y} = %2, τ_{xy} = %3, σ_{z} = %4")
                     .with(stresses.withUnit(state.stress.sx))
                     .with(stresses.withUnit(state.stress.sy))
                     .with(stresses.withUnit(state.stress.txy))
                     .with(stresses.withUnit(state.sz)));
    if (const Text parts = partsOfSx(stresses, state); !parts.empty())
      line("    ", parts);
    if (state.edge)
      line("    ", PW_TEXT("Readout", "left on the free edge: σ_{n} = %1, τ_{nt} = %2")
                       .with(stresses.withUnit(state.edge->traction.sn))
                       .with(stresses.withUnit(state.edge->traction.tnt)));
  }

  void planes(const Table& table) {
    std::vector<Cells> rows(1);
    for (const Column& column : table.columns)
      rows.front().push_back(words(column.heading) + (column.unit.empty() ? "" : " (" + column.unit + ")"));
    for (const Row& row : table.rows) {
      Cells& cells = rows.emplace_back();
      for (const Cell& cell : row.cells)
        cells.push_back(words(cell.shown));
    }
    m_out += alignedRows(rows, "    ");
  }

  void steps(const std::vector<Step>& steps) {
    if (steps.empty())
      return;
    const bool oneSource =
        std::ranges::all_of(steps, [&](const Step& step) { return step.source == steps.front().source; });
    if (oneSource)
      line("    ", PW_TEXT("Readout", "Working (formulas: %1)").with(steps.front().source));
    for (const Step& one : steps)
      step(one, oneSource ? one.name : PW_TEXT("Readout", "%1 (%2)").with(one.name).with(one.source));
  }

  void step(const Step& step, const Text& heading) {
    line("    ", heading);
    line("      ", planewright::written(step));
  }

  const Study& m_study;
  const Translate& m_translate;
  std::string m_out;
};

} // namespace

std::string workingText(const Study& study, const Readout& readout, const Translate& translate) {
  return TextWriter(study, translate).working(readout);
}

std::string readoutText(const Study& study, const std::vector<Readout>& points, const Translate& translate) {
  return TextWriter(study, translate).written(points);
}

} // namespace planewright

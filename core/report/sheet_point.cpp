// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/figure.h"
#include "core/quantity/format.h"
#include "core/report/sheet_writer.h"
#include "core/study/envelope.h"
#include "core/study/sum_of_case.h"
#include "core/study/verdict.h"
#include "core/study/working_of_check.h"
#include "core/study/working_of_state.h"
#include "core/study/working_of_sum.h"
#include "core/table/cautions.h"
#include "core/table/check_words.h"
#include "core/table/parts_of_sx.h"

namespace planewright {

namespace {

constexpr double figureWidth = 170;

/// The sections of one point.
class PointSection {
public:
  PointSection(SheetWriter& sheet, const Study& study, const Readout& readout, const SheetOrder& order)
      : m_sheet(sheet), m_study(study), m_readout(readout), m_order(order),
        m_governing(governingStateOf(readout)) {}

  void write() {
    m_sheet.heading(PW_TEXT("Sheet", "Point %1").with(m_readout.point));
    figure();
    if (m_order.depth != Depth::results)
      sources();
    for (std::size_t i = 0; i < m_readout.states.size(); ++i)
      if (m_readout.states[i].judged && (i == m_governing || m_order.depth == Depth::all))
        state(i);
    allStates();
    envelope();
  }

private:
  void figure() {
    if (!m_order.figures)
      return;
    Readout shown = m_readout;
    shown.shown = m_governing;
    FigureOrder order;
    order.decimal = m_order.decimal;
    order.width = figureWidth;
    order.parts = {false, false, true, true, false, false, false, false, true};
    order.translate = m_order.translate;
    // A figure whose labels find no room is left out; its numbers stand in the tables.
    if (Result<Picture> picture = figureOf(m_study, shown, order))
      m_sheet.figure(*std::move(picture),
                     PW_TEXT("Sheet", "Element and circle: %1").with(pointAndState(m_readout, m_governing)));
  }

  void sources() {
    const Point& point = *findPoint(m_study, m_readout.point);
    for (const CaseStress& stress : point.stress) {
      const std::vector<NamedContribution> made = contributionsOf(m_study, point, stress);
      for (const NamedContribution& one : made) {
        m_sheet.subheading(PW_TEXT("Sheet", "Case %1: %2").with(stress.caseId).with(one.name));
        for (const Text& rule : one.contribution.signRules)
          m_sheet.text(rule, Voice::soft);
        for (const Text& caution : one.contribution.cautions)
          m_sheet.text(PW_TEXT("Sheet", "Limit: %1").with(caution), Voice::caution);
        m_sheet.steps(one.contribution.steps);
      }
      const std::vector<Step> sum = sumOfCase(m_study, stress, made);
      if (!sum.empty())
        m_sheet.subheading(PW_TEXT("Sheet", "Case %1 in all").with(stress.caseId));
      m_sheet.steps(sum);
    }
  }

  void state(std::size_t index) {
    const StateReading& state = m_readout.states[index];
    const bool worked = m_order.depth != Depth::results;
    m_sheet.subheading(index == m_governing ? PW_TEXT("Sheet", "Governing: %1").with(state.combination)
                                            : PW_TEXT("Sheet", "Combination %1").with(state.combination));
    for (const Text& caution : cautionsOf(m_readout, state))
      m_sheet.text(PW_TEXT("Sheet", "Caution: %1").with(caution), Voice::caution);
    if (worked) {
      m_sheet.steps(workingOfSum(m_study, m_readout, state));
      m_sheet.text(partsOfSx(stressFormOf(m_study, state), state));
      m_sheet.steps(workingOf(m_study, m_readout, state));
    }
    m_sheet.table(planesTable(m_study, m_readout, state));
    for (std::size_t i = 0; i < state.checks.size(); ++i)
      check(index, i);
  }

  void check(std::size_t index, std::size_t number) {
    const CheckSetup& setup = m_readout.checks[number];
    const StateReading& state = m_readout.states[index];
    const CheckReading& reading = state.checks[number];
    m_sheet.subheading(
        PW_TEXT("Sheet", "Check %1 in %2: %3").with(setup.id).with(state.combination).with(checkName(setup)));
    const CriterionRow& row = rowOf(setup.criterion);
    m_sheet.text(PW_TEXT("Sheet", "Limit: %1 (%2)").with(symbol(row.equation)).with(row.source));
    if (!row.domain.empty())
      m_sheet.text(PW_TEXT("Sheet", "Meant for: %1").with(row.domain), Voice::soft);
    if (reading.problem)
      return m_sheet.text(
          PW_TEXT("Sheet", "Not judged: %1 %2").with(reading.problem->what).with(reading.problem->mend),
          Voice::caution);
    m_sheet.text(factorSentence(reading.factor));
    if (m_order.depth != Depth::results)
      m_sheet.steps(workingOfCheck(m_study, m_readout, state, number));
    m_sheet.text(PW_TEXT("Sheet", "%1: %2")
                     .with(state.combination)
                     .with(shortVerdict(verdictOf(m_readout, index, number))),
                 Voice::strong);
    m_sheet.text(multiplierSentence(reading));
    m_sheet.text(worstSentence(setup, reading));
    if (reading.worst.mode)
      m_sheet.text(PW_TEXT("Sheet", "Mode: %1").with(labelOf(*reading.worst.mode)));
    if (const auto directions = directionsOf(m_readout, number); directions && index == m_governing)
      for (const Text& sentence : sentencesOf(setup, *directions))
        m_sheet.text(sentence);
    for (const Text& caution : cautionsOf(setup, reading))
      m_sheet.text(PW_TEXT("Sheet", "Caution: %1").with(caution), Voice::caution);
  }

  /// Stresses and utilisations of all judged combinations beside each other.
  void allStates() {
    const StressForm form = stressFormOf(m_study, m_readout);
    SheetTable table;
    table.columns = {{PW_TEXT("Sheet", "Combination"), false}};
    for (const char* name : {"σ_{x}", "σ_{y}", "τ_{xy}", "σ_{1}", "σ_{2}"})
      table.columns.push_back({symbol(name)});
    if (!m_readout.lines.empty())
      for (const Text& name :
           {PW_TEXT("Sheet", "along"), PW_TEXT("Sheet", "across"), PW_TEXT("Sheet", "shear")})
        table.columns.push_back({name});
    SheetTable checks;
    checks.columns = {{PW_TEXT("Sheet", "Combination"), false}};
    for (const CheckSetup& check : m_readout.checks)
      checks.columns.push_back({verbatim(check.id)});
    for (const StateReading& state : m_readout.states) {
      if (!state.judged)
        continue;
      std::vector<Text>& row = table.rows.emplace_back();
      row.push_back(verbatim(state.combination));
      for (const double stress :
           {state.stress.sx, state.stress.sy, state.stress.txy, state.circle.s1, state.circle.s2})
        row.push_back(verbatim(form.shown(stress)));
      if (!state.lines.empty())
        for (const double stress : {state.lines[0].along, state.lines[0].across, state.lines[0].shear})
          row.push_back(verbatim(form.shown(stress)));
      std::vector<Text>& worst = checks.rows.emplace_back();
      worst.push_back(verbatim(state.combination));
      for (const CheckReading& reading : state.checks)
        worst.push_back(shownWorst(reading));
    }
    m_sheet.subheading(PW_TEXT("Sheet", "All combinations (%1)").with(form.unit.name));
    if (!m_readout.lines.empty())
      m_sheet.text(
          PW_TEXT("Sheet", "Along, across and shear are those of the %1.").with(m_readout.lines.front().name),
          Voice::soft);
    m_sheet.table(std::move(table));
    if (m_readout.checks.empty())
      return;
    m_sheet.subheading(PW_TEXT("Sheet", "Utilisation in all combinations, the worst of each band"));
    m_sheet.table(std::move(checks));
  }

  void envelope() {
    if (judgedStates(m_readout) < 2)
      return;
    m_sheet.subheading(PW_TEXT("Sheet", "Least and greatest over all combinations"));
    const Table range = envelopeTable(m_study, m_readout);
    for (const Text& caution : range.ofRange)
      m_sheet.text(PW_TEXT("Sheet", "Caution: %1").with(caution), Voice::caution);
    m_sheet.table(range);
  }

  SheetWriter& m_sheet;
  const Study& m_study;
  const Readout& m_readout;
  const SheetOrder& m_order;
  std::size_t m_governing;
};

} // namespace

void writePoint(SheetWriter& sheet, const Study& study, const Readout& readout, const SheetOrder& order) {
  PointSection(sheet, study, readout, order).write();
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/verdict.h"

#include <algorithm>
#include <cassert>

namespace planewright {

namespace {

void add(Verdict& sum, const Verdict& one) {
  sum.standing = std::max(sum.standing, one.standing);
  sum.stressed = sum.stressed || one.stressed;
  if (!sum.unjudged)
    sum.unjudged = one.unjudged;
  if (one.governing && (!sum.governing || one.governing->utilisation > sum.governing->utilisation))
    sum.governing = one.governing;
}

} // namespace

const std::optional<JudgedCheck>& toldOf(const Verdict& verdict) {
  return verdict.standing == Standing::unjudged ? verdict.unjudged : verdict.governing;
}

Verdict verdictOf(const Readout& readout, std::size_t state, std::size_t check) {
  if (check >= readout.states[state].checks.size())
    return {};
  const CheckReading& reading = readout.states[state].checks[check];
  const JudgedCheck judged{readout.point, state, check, reading.problem ? 0 : reading.worst.utilisation};
  if (reading.problem)
    return {Standing::unjudged, std::nullopt, judged, false};
  return {reading.exceeds() ? Standing::exceeds : Standing::within, judged, std::nullopt,
          !reading.worst.unstressed};
}

Verdict verdictOfState(const Readout& readout, std::size_t state) {
  Verdict sum;
  for (std::size_t check = 0; check < readout.checks.size(); ++check)
    add(sum, verdictOf(readout, state, check));
  return sum;
}

Verdict verdictOfCheck(const Readout& readout, std::size_t check) {
  Verdict sum;
  for (std::size_t state = 0; state < readout.states.size(); ++state)
    add(sum, verdictOf(readout, state, check));
  return sum;
}

Verdict verdictOf(const Readout& readout) {
  Verdict sum;
  for (std::size_t state = 0; state < readout.states.size(); ++state)
    add(sum, verdictOfState(readout, state));
  return sum;
}

Verdict verdictOf(const std::vector<Readout>& points) {
  Verdict sum;
  for (const Readout& readout : points)
    add(sum, verdictOf(readout));
  return sum;
}

const CheckReading& readingOf(const Readout& readout, const JudgedCheck& judged) {
  return readout.states[judged.state].checks[judged.check];
}

bool isJudgedAlike(const Readout& a, const Readout& b) {
  return a.point == b.point && a.positive == b.positive && a.shown == b.shown && a.checks == b.checks &&
         std::ranges::equal(a.states, b.states, [](const StateReading& one, const StateReading& other) {
           return one.combination == other.combination && one.judged == other.judged &&
                  one.stress == other.stress && one.sz == other.sz && one.scale == other.scale &&
                  one.axial == other.axial && one.bending == other.bending && one.checks == other.checks;
         });
}

Summary summarise(const Study& study) {
  Summary summary;
  for (const Point& point : study.points) {
    if (point.checks.empty()) {
      summary.unchecked.push_back(point.name);
      continue;
    }
    const Readout readout = evaluate(study, point.name);
    for (std::size_t check = 0; check < readout.checks.size(); ++check) {
      SummaryRow& row = summary.rows.emplace_back();
      row.point = point.name;
      row.check = readout.checks[check];
      row.verdict = verdictOfCheck(readout, check);
      const std::optional<JudgedCheck>& told = toldOf(row.verdict);
      assert(told && "a study has at least one state that is judged");
      row.combination = readout.states[told->state].combination;
      row.reading = readingOf(readout, *told);
      summary.standing = std::max(summary.standing, row.verdict.standing);
    }
  }
  return summary;
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/comparison.h"

#include "core/study/governing.h"
#include "core/study/place_list.h"
#include "core/study/stress_form.h"
#include "core/study/verdict.h"
#include "core/table/check_words.h"

#include <algorithm>
#include <map>

namespace planewright {

namespace {

/// What a typed text belongs to, as a place of its own; none for the head of a study.
std::optional<Place> thingOf(const Place& place) {
  const std::string_view path = rowOf(place.spot).path;
  for (const auto& [prefix, spot] : {std::pair{"cases/", Spot::loadCase},
                                     {"combinations/", Spot::combination},
                                     {"materials/", Spot::material},
                                     {"sections/", Spot::section},
                                     {"points/", Spot::point}})
    if (path.starts_with(prefix))
      return Place{spot, place.owner, {}};
  return std::nullopt;
}

bool isThere(const Study& study, const Place& thing) {
  switch (thing.spot) {
  case Spot::loadCase:
    return findCase(study, thing.owner) != nullptr;
  case Spot::combination:
    return findCombination(study, thing.owner) != nullptr;
  case Spot::material:
    return findMaterial(study, thing.owner) != nullptr;
  case Spot::section:
    return findSection(study, thing.owner) != nullptr;
  default:
    return findPoint(study, thing.owner) != nullptr;
  }
}

bool isCompared(Spot spot) {
  constexpr Spot left[] = {Spot::titlePreparedFor, Spot::titleCheckedFor, Spot::shownPoint,
                           Spot::shownCombination};
  return std::ranges::find(left, spot) == std::end(left);
}

Text nameOf(const Place& place) {
  const Text& label = rowOf(place.spot).label;
  if (place.owner.empty())
    return label;
  if (place.item.empty())
    return PW_TEXT("Comparison", "%1: %2").with(place.owner).with(label);
  return PW_TEXT("Comparison", "%1, %2: %3").with(place.owner).with(place.item).with(label);
}

/// Collects what was typed.
class Inputs {
public:
  Inputs(const Study& before, const Study& after) : m_before(before), m_after(after) {}

  std::vector<Change> changes() {
    for (const Place& place : typedPlacesIn(m_before))
      look(place);
    for (const Place& place : typedPlacesIn(m_after))
      look(place);
    return std::move(m_changes);
  }

private:
  void look(const Place& place) {
    const std::optional<Place> thing = thingOf(place);
    const bool isWhole = thing && isThere(m_before, *thing) != isThere(m_after, *thing);
    const Place& told = isWhole ? *thing : place;
    if (!isCompared(place.spot) || !m_seen.emplace(pathOf(told), true).second)
      return;
    if (isWhole) {
      const Text there = PW_TEXT("Comparison", "there");
      const bool came = isThere(m_after, told);
      m_changes.push_back({PW_TEXT("Comparison", "%1 %2").with(rowOf(told.spot).label).with(told.owner),
                           came ? Text() : there, came ? there : Text()});
      return;
    }
    const std::string before = textAt(m_before, place).value_or("");
    const std::string after = textAt(m_after, place).value_or("");
    if (before != after)
      m_changes.push_back({nameOf(place), verbatim(before), verbatim(after)});
  }

  const Study& m_before;
  const Study& m_after;
  std::map<std::string, bool> m_seen;
  std::vector<Change> m_changes;
};

/// Results of one study by what they are of, in their order.
using ResultRows = std::vector<std::pair<std::string, std::pair<Text, Text>>>;

class ResultList {
public:
  explicit ResultList(const Study& study) : m_study(study) {
    std::vector<Readout> points;
    points.reserve(study.points.size());
    for (const Point& point : study.points)
      points.push_back(evaluate(study, point.name));
    add("", PW_TEXT("Comparison", "verdict of the study"), verdictSentence(verdictOf(points)));
    for (const Readout& readout : points)
      point(readout);
  }

  const ResultRows& rows() const { return m_rows; }

private:
  void add(const std::string& key, Text what, Text value) {
    m_rows.push_back({key, {std::move(what), std::move(value)}});
  }

  void point(const Readout& readout) {
    if (const std::optional<GoverningStates> worst = governingOf(readout)) {
      const auto stress = [&](const char* key, const Text& name, const Governing& one) {
        add(readout.point + "/" + key,
            PW_TEXT("Comparison", "%1: greatest %2").with(readout.point).with(name),
            PW_TEXT("Comparison", "%1 (%2)")
                .with(stressFormOf(m_study, readout.states[one.state]).withUnit(one.stress))
                .with(one.combination));
      };
      stress("s1", symbol("σ_{1}"), worst->principal);
      stress("shear", PW_TEXT("Comparison", "shear in the plane"), worst->shear);
    }
    for (std::size_t i = 0; i < readout.checks.size(); ++i) {
      const Verdict verdict = verdictOfCheck(readout, i);
      const std::optional<JudgedCheck>& told = toldOf(verdict);
      add(readout.point + "/check/" + readout.checks[i].id,
          PW_TEXT("Comparison", "%1: check %2").with(readout.point).with(readout.checks[i].id),
          told ? PW_TEXT("Comparison", "%1 (%2)")
                     .with(shortVerdict(verdict))
                     .with(readout.states[told->state].combination)
               : shortVerdict(verdict));
    }
  }

  const Study& m_study;
  ResultRows m_rows;
};

std::vector<Change> resultChanges(const Study& before, const Study& after) {
  const ResultList first(before);
  const ResultList second(after);
  std::vector<Change> changes;
  const auto in = [](const ResultRows& rows, const std::string& key) {
    return std::ranges::find(rows, key, &ResultRows::value_type::first);
  };
  for (const auto& [key, row] : first.rows()) {
    const auto other = in(second.rows(), key);
    const Text now = other == second.rows().end() ? Text() : other->second.second;
    if (row.second != now)
      changes.push_back({row.first, row.second, now});
  }
  for (const auto& [key, row] : second.rows())
    if (in(first.rows(), key) == first.rows().end())
      changes.push_back({row.first, {}, row.second});
  return changes;
}

} // namespace

Comparison compared(const Study& before, const Study& after) {
  return {Inputs(before, after).changes(), resultChanges(before, after)};
}

std::string comparisonText(const Comparison& comparison, const Translate& translate) {
  if (comparison.empty())
    return plain(PW_TEXT("Comparison", "Nothing differs."), translate) + "\n";
  std::string lines;
  const auto list = [&](const Text& heading, const std::vector<Change>& changes) {
    lines += plain(heading, translate) + "\n";
    for (const Change& change : changes) {
      const Text none = PW_TEXT("Comparison", "nothing");
      lines += "  " +
               plain(PW_TEXT("Comparison", "%1: %2, was %3")
                         .with(change.what)
                         .with(change.after.empty() ? none : change.after)
                         .with(change.before.empty() ? none : change.before),
                     translate) +
               "\n";
    }
    if (changes.empty())
      lines += "  " + plain(PW_TEXT("Comparison", "none"), translate) + "\n";
  };
  list(PW_TEXT("Comparison", "Inputs that differ"), comparison.inputs);
  list(PW_TEXT("Comparison", "Results that differ"), comparison.results);
  return lines;
}

} // namespace planewright

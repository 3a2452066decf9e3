// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"
#include "core/study/place_list.h"
#include "core/study/rules.h"
#include "core/study/source_rules.h"
#include "core/study/typed.h"

namespace planewright {

namespace {

/// A text is good when it reads and stands as typing would have left it: with its unit.
std::optional<Problem> faultAt(Study& study, const Place& place) {
  const Slot slot = slotOf(study, place);
  const std::string text = written(slot).value_or("");
  Result<std::string> kept = keptText(study, place, slot, text);
  if (!kept)
    return std::move(kept).error();
  if (*kept == text)
    return std::nullopt;
  return problemAt(place, text, PW_TEXT("Study", "“%1” has no unit, or blanks round it.").with(text),
                   PW_TEXT("Study", "Write “%1”.").with(*kept));
}

void addFaults(Problems& problems, Study& study, const std::vector<Place>& places) {
  for (const Place& place : places)
    if (problems.size() < mostProblems)
      if (auto problem = faultAt(study, place))
        problems.push_back(*std::move(problem));
}

/// Looks at each item in a study of its own, so that finding its places does not search all the others.
template <class Item>
void addFaults(Problems& problems, const Study& study, std::vector<Item> Study::*list) {
  Study part;
  part.units = study.units;
  for (const Item& item : study.*list) {
    (part.*list).assign(1, item);
    addFaults(problems, part, typedPlacesIn(item));
  }
}

} // namespace

Problems problemsIn(const Study& study) {
  if (Problems excess = excessIn(study); !excess.empty())
    return excess;
  Problems problems = brokenRules(study);
  Study ends;
  ends.title = study.title;
  ends.units = study.units;
  ends.convention = study.convention;
  ends.shown = study.shown;
  addFaults(problems, ends, typedPlacesInHead());
  addFaults(problems, study, &Study::cases);
  addFaults(problems, study, &Study::combinations);
  addFaults(problems, study, &Study::materials);
  addFaults(problems, study, &Study::sections);
  addFaults(problems, study, &Study::points);
  addFaults(problems, ends, typedPlacesInFoot());
  // Sources are worked out only where all that they are made of is sound.
  return problems.empty() ? brokenSources(study) : problems;
}

} // namespace planewright

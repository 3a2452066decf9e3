// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"
#include "core/study/place_list.h"
#include "core/study/rules.h"
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

} // namespace

Problems problemsIn(const Study& study) {
  Problems problems = brokenRules(study);
  Study copy = study;
  for (const Place& place : typedPlacesIn(study))
    if (auto problem = faultAt(copy, place))
      problems.push_back(*std::move(problem));
  return problems;
}

} // namespace planewright

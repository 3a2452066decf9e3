// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"
#include "core/study/place_list.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

/// Few names, good and bad, so that edits often meet what is there.
std::string anyName() {
  return *rc::gen::element<std::string>("G", "S", "P1", "P2", "scarf", "1.35 G + 1.5 S", "a/b~c", "", " x",
                                        "é");
}

std::string anyText() {
  return *rc::gen::element<std::string>("0", "-18.6 kN/(90 mm*240 mm)", "1 in 10", "3 deg", "tension",
                                        "grain", "psi", "kN*m", "G", "S", "", "1e999", "12 kN", "long",
                                        "words\nof two lines", "P1", "scarf", "1.35", "\xFF");
}

Place anyPlace(const Study& study) {
  if (*rc::gen::inRange(0, 3) > 0)
    return *rc::gen::elementOf(typedPlacesIn(study));
  const auto spot = static_cast<Spot>(*rc::gen::inRange(0, static_cast<int>(Spot::shownCombination) + 1));
  const std::string path = rowOf(spot).path;
  const auto stars = std::ranges::count(path, '*');
  return {spot, stars > 0 ? anyName() : "", stars > 1 ? anyName() : ""};
}

Edit anyEdit(const Study& study) {
  const Place place = anyPlace(study);
  switch (*rc::gen::inRange(0, 6)) {
  case 0:
    return Insert{place, *rc::gen::element(std::optional<std::size_t>(), std::optional<std::size_t>(0))};
  case 1:
    return Remove{place};
  case 2:
    return Move{place, *rc::gen::inRange<std::size_t>(0, 3)};
  case 3:
    return Rename{place, anyName()};
  default:
    return Type{place, anyText()};
  }
}

RC_GTEST_PROP(Edit, neverYieldsAnInvalidStudyAndNeverTouchesTheOldOne, ()) {
  Study study = newStudy();
  const int steps = *rc::gen::inRange(1, 30);
  for (int i = 0; i < steps; ++i) {
    const Study before = study;
    const Result<Study> after = edited(study, anyEdit(study));
    RC_ASSERT(study == before);
    if (!after) {
      RC_ASSERT(!after.error().what.empty());
      continue;
    }
    const Problems problems = problemsIn(*after);
    if (!problems.empty())
      RC_FAIL(plain(problems.front()));
    study = *after;
  }
}

RC_GTEST_PROP(Edit, whatWasTypedStandsThere, ()) {
  const Study study = newStudy();
  const Place place = *rc::gen::elementOf(typedPlacesIn(study));
  const Result<Study> after = edited(study, Edit{Type{place, anyText()}});
  if (!after)
    return;
  // Typing what stands there changes nothing more.
  const std::optional<std::string> text = textAt(*after, place);
  RC_ASSERT(text);
  RC_ASSERT(edited(*after, Edit{Type{place, *text}}) == *after);
}

} // namespace
} // namespace planewright

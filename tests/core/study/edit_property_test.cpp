// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/place_list.h"

#include "tests/core/study/rich_study.h"

#include <rapidcheck/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

/// Few names, good and bad, so that edits often meet what is there.
std::string anyName() {
  return *rc::gen::element<std::string>("G", "S", "P1", "P2", "scarf", "W", sum, "a/b~c", "", " x", "é");
}

std::string anyText() {
  return *rc::gen::element<std::string>("0", "-18.6 kN/(90 mm*240 mm)", "1 in 10", "3 deg", "tension",
                                        "grain", "psi", "kN*m", "G", "S", "", "1e999", "12 kN", "long",
                                        "words\nof two lines", "P1", "scarf", "1.35", "\xFF");
}

/// The key of a case, combination or point that stands in the study, whichever has such spots.
std::string anyOwner(const Study& study, const std::string& path) {
  if (path.starts_with("combinations/") && !study.combinations.empty())
    return (*rc::gen::elementOf(study.combinations)).name;
  return path.starts_with("points/") ? (*rc::gen::elementOf(study.points)).name
                                     : (*rc::gen::elementOf(study.cases)).id;
}

/// A spot up to `last`: of what stands in the study, or with names that need not be there.
Place anyPlaceUpTo(Spot last, const Study& study) {
  const auto spot = static_cast<Spot>(*rc::gen::inRange(0, static_cast<int>(last) + 1));
  const std::string path = rowOf(spot).path;
  const auto stars = std::ranges::count(path, '*');
  if (stars == 0)
    return {spot, "", ""};
  const std::string owner = *rc::gen::arbitrary<bool>() ? anyOwner(study, path) : anyName();
  return {spot, owner, stars > 1 ? anyName() : ""};
}

Place anyPlace(const Study& study) {
  switch (*rc::gen::inRange(0, 3)) {
  case 0:
    return anyPlaceUpTo(Spot::shownCombination, study);
  case 1:
    // What is inserted, removed, moved and renamed.
    return anyPlaceUpTo(Spot::factor, study);
  default:
    return *rc::gen::elementOf(typedPlacesIn(study));
  }
}

/// A new study, or one in which there is something of each kind and a case that acts nowhere yet.
Study anyStart() {
  return *rc::gen::element(newStudy(), with(richStudy(), {Insert{{Spot::loadCase, "W", {}}, {}}}));
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
  Study study = anyStart();
  for (int i = 0; i < 40; ++i) {
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
  const Study study = anyStart();
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

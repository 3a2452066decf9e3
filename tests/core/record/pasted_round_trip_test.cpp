// SPDX-License-Identifier: GPL-3.0-or-later
// What is copied out of a study and pasted gives the same study, as far as the columns carry.
#include "core/record/copied_points.h"
#include "core/record/pasted_points.h"
#include "tests/support/study_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

/// Without what no column has.
Study carried(Study study) {
  for (Point& point : study.points) {
    point.checks.clear(); // of lines that go
    if (point.lines.size() > 1)
      point.lines.resize(1);
  }
  return study;
}

/// The points without all that the columns have, but for a line, which cells can leave as it is only where it
/// has no tolerance.
Study emptied(Study study) {
  for (Point& point : study.points) {
    point.stress.clear();
    point.note.clear();
    point.fibre.reset();
    for (Line& line : point.lines)
      line = Line{line.name, LineKind::grain, "0 deg", ""};
  }
  return study;
}

RC_GTEST_PROP(PastedRoundTrip, allPointsIntoTheSamePoints, ()) {
  const Study study = carried(*anyStudy());
  const char separator = *rc::gen::element('\t', ',');
  const Study bare = emptied(study);
  const PastedPoints pasted = pastedPoints(bare, copiedPoints(study.points, separator));
  RC_ASSERT(pasted.allProblems() == Problems());
  RC_ASSERT(edited(bare, pasted.edits).value() == study);
}

RC_GTEST_PROP(PastedRoundTrip, intoItselfChangesNothing, ()) {
  const Study study = *anyStudy();
  const PastedPoints pasted = pastedPoints(study, copiedPoints(study.points, '\t'));
  RC_ASSERT(pasted.isSound());
  RC_ASSERT(pasted.edits.empty());
}

RC_GTEST_PROP(PastedRoundTrip, intoANewStudyThatHasTheSections, ()) {
  const Study study = carried(*anyStudy());
  Study fresh = newStudy();
  fresh.points[0].name = "one of its own";
  fresh.sections = study.sections;
  const PastedPoints pasted = pastedPoints(fresh, copiedPoints(study.points, ','));
  const bool hasStress = std::ranges::any_of(study.points, [](const Point& p) { return !p.stress.empty(); });
  RC_ASSERT(pasted.allProblems() == Problems());
  const Study done = edited(fresh, pasted.edits).value();
  for (const Point& point : study.points) {
    const Point* there = findPoint(done, point.name);
    RC_ASSERT(there != nullptr);
    RC_ASSERT(there->note == point.note);
    RC_ASSERT(there->fibre == point.fibre);
    RC_ASSERT(there->lines == point.lines);
    RC_ASSERT(there->stress == point.stress);
  }
  RC_ASSERT(hasStress || (pasted.newCases.empty() && pasted.newMeasured.empty()));
}

} // namespace
} // namespace planewright

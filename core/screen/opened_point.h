// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/results.h"
#include "core/study/edit.h"

namespace planewright {

/// Whether what a field is judged by is the same in two studies: cases, combinations, materials, units,
/// convention, and the lines and checks of a point.
bool isScreenedAlike(const Study& a, const Study& b, std::string_view point);

/// A point of a field as a point of a study.
struct OpenedPoint {
  std::string name;
  std::string combination; ///< that governs it
  Edits edits;
};

/// Makes a point of a field one of the study, at the end of its points: the stresses of each case typed in
/// the study's unit, so that they read back as the same numbers, with the lines, watched planes and checks of
/// the point `judging` by which the plan was made. Lines turn into the point's own axes, which the drawing
/// shows at their turn: angles of the study start there, so that the worst angle is that of the field less
/// this turn. The note names `source` and the line of the file; the name of the field's point is counted on
/// where it is taken. A Problem where the point lacks a case that acts.
Result<OpenedPoint> openedPoint(const Study& study, std::string_view judging, const ScreenPlan& plan,
                                const Field& field, const FieldResults& results, std::size_t point,
                                const Text& source, const Translate& translate = {});

} // namespace planewright

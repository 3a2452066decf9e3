// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"
#include "core/study/verdict.h"

namespace planewright {

/// A new check of the point against a material by the usual criterion of its kind, on the point's first line
/// or watched plane. None where the point has no line or plane for it.
std::optional<Edits> insertionOfCheck(const Study& study, const Point& point, const std::string& material);

/// Another material, and with it the usual criterion of its kind where the present one is not for it.
Edits withMaterial(const Study& study, const Point& point, const Check& check, const std::string& material);
/// Another criterion; parameters that it does not know go.
Edits withCriterion(const Point& point, const Check& check, Criterion criterion);
/// Another line or plane, as the criterion acts on.
Edits withDirection(const Point& point, const Check& check, const std::string& name);

/// What another criterion says of the same stresses, strengths and directions, over all judged states.
struct SideBySide {
  Criterion criterion = Criterion::sumOfSquares;
  bool isChosen = false;
  std::optional<Problem> problem;   ///< of the first state that could not be judged
  std::optional<std::size_t> state; ///< that governs among those judged; of equals the first
  Judgement nominal;                ///< there
  Judgement worst;                  ///< there
  /// As the verdict of a check: what could not be judged is no reassurance.
  Standing standing() const;
};
/// Every criterion that applies to the material of a check, so that the spread is seen; parameters count for
/// the chosen one only, others have their usual values.
std::vector<SideBySide> criteriaSideBySide(const Readout& readout, std::size_t check);

} // namespace planewright

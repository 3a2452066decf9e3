// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/kernels.h"
#include "core/study/readout.h"

namespace planewright {

/// A check in one combination: its strengths times the factor of the combination, as the core judges by them
/// and as the kernels do.
struct ScreenedForms {
  StrengthFactor factor;
  LineStrengths strengths;
  std::vector<SignedForm> parts; ///< the greatest counts
  std::vector<SquaresForm> squares;
  std::vector<LinearForm> linears;
  std::vector<RatiosForm> ratios;
  std::vector<SumForm> sums;
};

/// A check of a line over all combinations of a plan.
struct ScreenedCheck {
  CheckSetup setup;
  Band band;                        ///< of the study's line
  std::vector<ScreenedForms> forms; ///< one for each combination
};

struct ScreenedCombination {
  std::string name;
  std::vector<ActingCase> acting; ///< index in the cases of the plan
};

/// A check of the point by which a field cannot be judged.
struct UnscreenedCheck {
  std::string id;
  Text reason;
};

/// What the points of a field are held against: the combinations of a study and the checks of one of its
/// points, read once for all of them.
struct ScreenPlan {
  Positive positive = Positive::tension;
  std::vector<std::string> cases; ///< ids, all of the study
  std::vector<bool> acts;         ///< of each case, whether it does in any combination
  std::vector<ScreenedCombination> combinations;
  std::vector<ScreenedCheck> checks;
  std::vector<UnscreenedCheck> unscreened;
  bool kernelsHold = true; ///< factors and forms are within the sizes that the kernels bear
};

/// The plan by the checks of a point with these ids, without any by all that can be: criteria of a line that
/// judge every state of plane stress and have a multiplier on all loads. The others are named with the
/// reason; a Problem where one was asked for by its id, where none is left, and where a combination has no
/// factor for the strengths of a material. The study is valid and has the point.
Result<ScreenPlan> screenPlanOf(const Study& study, std::string_view point,
                                const std::vector<std::string>& checks = {});

} // namespace planewright

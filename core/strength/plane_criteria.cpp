// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/line_criteria.h"

#include <cmath>

namespace planewright {

namespace {

Branch bySignOfNormal(const Interaction& tension, const Interaction& compression) {
  return SignedForm{{{{tension, tension}, {compression, compression}}}};
}

Result<std::vector<Branch>> coulomb(const Strengths& strengths) {
  const Result<double> cohesion = needed(strengths, StrengthKey::cohesion);
  if (!cohesion)
    return tl::unexpected(cohesion.error());
  const Result<double> friction = needed(strengths, StrengthKey::friction);
  if (!friction)
    return tl::unexpected(friction.error());
  const CosSin phi = cosSin(Angle::fromDegrees(*friction));
  return std::vector<Branch>{Mobilised{*cohesion, phi.sin / phi.cos},
                             CutOff{strengths[StrengthKey::cutoff].value_or(0)}};
}

Result<std::vector<Branch>> throat(const Strengths& strengths) {
  if (strengths.seam == Seam::butt)
    return tl::unexpected(
        Problem{{},
                0,
                0,
                {},
                PW_TEXT("Strength", "EN 1993-1-8, 4.5.3.2 is for fillet welds: at a butt weld the parent "
                                    "metal governs (4.7.1, from memory)."),
                PW_TEXT("Strength", "Check the parent metal instead.")});
  const Result<double> fu = needed(strengths, StrengthKey::fu);
  const Result<double> beta = needed(strengths, StrengthKey::betaW);
  const Result<double> gamma = needed(strengths, StrengthKey::gammaM2);
  for (const Result<double>* one : {&fu, &beta, &gamma})
    if (!*one)
      return tl::unexpected(one->error());
  const double combined = *fu / (*beta * *gamma);
  const double normal = 0.9 * *fu / *gamma;
  Interaction squares;
  squares.a11 = 1 / (combined * combined);
  squares.a66 = 3 * squares.a11;
  Interaction pulls;
  pulls.b1 = 1 / normal;
  Interaction presses;
  presses.b1 = -1 / normal;
  return std::vector{bySignOfNormal(squares, squares), bySignOfNormal(pulls, presses)};
}

Result<std::vector<Branch>> bond(const Strengths& strengths) {
  const Result<double> fn = needed(strengths, StrengthKey::tension);
  if (!fn)
    return tl::unexpected(fn.error());
  const Result<double> fs = needed(strengths, StrengthKey::shear);
  if (!fs)
    return tl::unexpected(fs.error());
  Interaction presses;
  presses.a66 = 1 / (*fs * *fs);
  Interaction pulls = presses;
  pulls.a11 = 1 / (*fn * *fn);
  return std::vector{bySignOfNormal(pulls, presses)};
}

} // namespace

Result<std::vector<Branch>> planeBranchesOf(Criterion criterion, const Strengths& strengths) {
  if (criterion == Criterion::coulomb)
    return coulomb(strengths);
  return criterion == Criterion::throat ? throat(strengths) : bond(strengths);
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/cautions.h"
#include "core/words/decimal_sign.h"

namespace planewright {

namespace {

constexpr double steepTaper = 10; // deg

std::optional<Text> ofTimber(Criterion criterion) {
  switch (criterion) {
  case Criterion::maximumStress:
  case Criterion::norrisPlane:
  case Criterion::norrisThreePlane:
    return PW_TEXT("Strength", "For timber pulled at a small angle to the grain this criterion promises more "
                               "than tests show: C24 at 1 in 10 keeps all of f_{t,0} by it, %1 to %2 by "
                               "published tests and rules. See the other criteria beside it.")
        .with(numberText("0.61"))
        .with(numberText("0.81"));
  case Criterion::tsaiWu:
  case Criterion::hoffman:
    return PW_TEXT("Strength",
                   "With characteristic strengths of timber this criterion can promise more than f_{c,0}: "
                   "C24 pressed at 15° takes %1 MPa by Tsai and Wu against f_{c,0} = 21 MPa, because "
                   "f_{t,90} is far below f_{c,90}. See the other criteria beside it.")
        .with(numberText("25.96"));
  default:
    return std::nullopt;
  }
}

} // namespace

std::vector<Text> cautionsOf(Criterion criterion, const Strengths& strengths, const Parameters& parameters,
                             const std::optional<Band>& band) {
  std::vector<Text> cautions;
  if (strengths.kind == MaterialKind::timber)
    if (auto caution = ofTimber(criterion))
      cautions.push_back(*std::move(caution));
  if (criterion == Criterion::hankinson && parameters.n.value_or(2) > 2)
    cautions.push_back(PW_TEXT("Strength",
                               "With an exponent above 2 Hankinson's formula exceeds the strength "
                               "along the line at small angles."));
  if (criterion == Criterion::linearSum)
    cautions.push_back(PW_TEXT("Strength",
                               "The linear sum is published for uniaxial tension and bending at an "
                               "angle; for other states it is an extension of this program."));
  if (criterion == Criterion::compressionAtAngle && parameters.kc90.value_or(1) > 1)
    cautions.push_back(PW_TEXT("Strength",
                               "A k_{c,90} above 1 belongs to a bearing with its lengths and supports (EN "
                               "1995-1-1, 6.1.5), not to the stress at a point."));
  if (criterion == Criterion::taperedEdge && parameters.edge && band &&
      (apart(*parameters.edge, band->nominal) + band->tolerance).degrees() > steepTaper)
    cautions.push_back(PW_TEXT("Strength",
                               "The taper is over 10°: the formula is stated for less (Swedish Wood, "
                               "Design of timber structures, vol. 1; not in the clause)."));
  if (criterion == Criterion::throat)
    cautions.push_back(PW_TEXT("Strength",
                               "A point in plane stress sees one shear on the throat: the other one of "
                               "EN 1993-1-8, 4.5.3.2 is taken as 0."));
  if (criterion == Criterion::coulomb && !strengths[StrengthKey::cutoff])
    cautions.push_back(
        PW_TEXT("Strength", "No cut-off is given: it counts as 0, so the plane takes no tension."));
  return cautions;
}

std::optional<Text> cautionOfTensionAcross(MaterialKind kind) {
  if (kind != MaterialKind::timber)
    return std::nullopt;
  return PW_TEXT("Strength", "k_{vol} = 1 in tension across the grain: f_{t,90} is for %1 m³, and "
                             "(%1/V)^%2 is %3 at %4 m³ (exponent from memory).")
      .with(numberText("0.01"))
      .with(numberText("0.2"))
      .with(numberText("0.46"))
      .with(numberText("0.5"));
}

Text limitOfAllPoints() {
  return PW_TEXT("Strength", "Stresses at single points only; local codes and a licensed engineer decide.");
}

std::vector<Text> limitsOfPointChecks(MaterialKind kind) {
  std::vector<Text> limits = {
      PW_TEXT("Strength", "Stress at this point only; local codes and a licensed engineer decide."),
      PW_TEXT("Strength", "Near free edges, notches, holes, ends of plies, curved apexes and in welds, "
                          "stresses out of the plane are not seen (common practice, no source)."),
      PW_TEXT("Strength", "Criteria agree on the axes of the material and disagree in between; tests under "
                          "combined stresses are scarce (FHWA-HRT-04-097, 1.4 and appendix D)."),
      PW_TEXT("Strength", "Characteristic values are not design values; the national annex decides (common "
                          "practice, no source).")};
  if (kind != MaterialKind::timber)
    return limits;
  limits.insert(
      limits.end(),
      {PW_TEXT("Strength",
               "Rolling shear, tension in the third direction, the volume under tension across the "
               "grain, and cracks are outside this check."),
       PW_TEXT("Strength", "About 60 % of the load of a short test is carried for ten years (FPL-GTR-282, "
                           "pages 5-38 to 5-40): use the factor of the duration."),
       PW_TEXT("Strength", "Clear wood scatters: coefficient of variation 25 % in tension and 28 % in "
                           "compression across the grain, 14 % in shear (FPL-GTR-282, table 5-6)."),
       PW_TEXT("Strength", "Across the grain strengths can be 40 to 60 % lower at 45° to the rings in some "
                           "species (FPL-GTR-282, page 5-31).")});
  return limits;
}

} // namespace planewright

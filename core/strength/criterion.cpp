// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/criterion.h"

#include <cassert>

namespace planewright {

template <>
const std::vector<Named<Criterion>>& namesOf() {
  using enum Criterion;
  static const std::vector<Named<Criterion>> names = {
      {maximumStress, "maximum-stress", PW_TEXT("Criterion", "maximum stress")},
      {hankinson, "hankinson", PW_TEXT("Criterion", "Hankinson")},
      {sumOfSquares, "sum-of-squares", PW_TEXT("Criterion", "sum of squares")},
      {norrisPlane, "norris-plane", PW_TEXT("Criterion", "Norris, one plane")},
      {norrisThreePlane, "norris-three-plane", PW_TEXT("Criterion", "Norris, three planes")},
      {azziTsai, "azzi-tsai", PW_TEXT("Criterion", "Azzi and Tsai")},
      {azziTsaiTwoSign, "azzi-tsai-two-sign", PW_TEXT("Criterion", "Azzi and Tsai, two signs")},
      {hoffman, "hoffman", PW_TEXT("Criterion", "Hoffman")},
      {tsaiWu, "tsai-wu", PW_TEXT("Criterion", "Tsai and Wu")},
      {linearSum, "linear-sum", PW_TEXT("Criterion", "linear sum")},
      {compressionAtAngle, "en1995-compression-at-angle",
       PW_TEXT("Criterion", "EN 1995 compression at an angle")},
      {taperedEdge, "en1995-tapered-edge", PW_TEXT("Criterion", "EN 1995 tapered edge")},
      {vonMises, "von-mises", PW_TEXT("Criterion", "von Mises")},
      {tresca, "tresca", PW_TEXT("Criterion", "Tresca")},
      {rankine, "rankine", PW_TEXT("Criterion", "Rankine")},
      {mohrCoulomb, "mohr-coulomb", PW_TEXT("Criterion", "Mohr-Coulomb")},
      {coulomb, "coulomb", PW_TEXT("Criterion", "Coulomb on the plane")},
      {throat, "throat", PW_TEXT("Criterion", "throat of a fillet weld")},
      {bond, "bond", PW_TEXT("Criterion", "bond in tension and shear")}};
  return names;
}

namespace {

const std::vector<CriterionRow>& table() {
  using enum Criterion;
  using enum ActsOn;
  static const std::vector<CriterionRow> rows = {
      {maximumStress,
       line,
       "max(σ₁/X, σ₂/Y, |τ|/S) = 1",
       {},
       PW_TEXT("Criterion", "Jenkin 1920 (author from memory)")},
      {hankinson, line, "|σ| (sinⁿα/Q + cosⁿα/P) = 1",
       PW_TEXT("Criterion", "uniaxial stress at an angle α to the line"),
       PW_TEXT("Criterion", "Hankinson 1921; exponent n: USDA Wood Handbook, equation 5-2")},
      {sumOfSquares,
       line,
       "(σ₁/X)² + (σ₂/Y)² + (τ/S)² = 1",
       {},
       PW_TEXT("Criterion", "ANC-18, section 2:55; USDA Wood Handbook, page 9-15")},
      {norrisPlane,
       line,
       "(σ₁/X)² − σ₁σ₂/(X Y) + (σ₂/Y)² + (τ/S)² = 1",
       {},
       PW_TEXT("Criterion", "Norris 1950, FPL report 1816 (equation from memory)")},
      {norrisThreePlane,
       line,
       "Norris in one plane, and |σ₁| ≤ X, |σ₂| ≤ Y",
       {},
       PW_TEXT("Criterion", "Norris 1950, FPL report 1816 (equation from memory)")},
      {azziTsai,
       line,
       "(σ₁/X)² − σ₁σ₂/X² + (σ₂/Y)² + (τ/S)² = 1",
       {},
       PW_TEXT("Criterion", "Azzi and Tsai 1965")},
      {azziTsaiTwoSign,
       line,
       "(σ₁/X)² − σ₁σ₂/X₂² + (σ₂/Y)² + (τ/S)² = 1, X₂ by the sign of σ₂",
       {},
       PW_TEXT("Criterion", "form of Azzi and Tsai 1965 given by Kaw")},
      {hoffman,
       line,
       "σ₁²/(XₜX꜀) − σ₁σ₂/(XₜX꜀) + σ₂²/(YₜY꜀) + (1/Xₜ − 1/X꜀)σ₁ + (1/Yₜ − 1/Y꜀)σ₂ + (τ/S)² = 1",
       {},
       PW_TEXT("Criterion", "Hoffman 1967")},
      {tsaiWu,
       line,
       "F₁σ₁ + F₂σ₂ + F₁₁σ₁² + F₂₂σ₂² + F₆₆τ² + 2F₁₂σ₁σ₂ = 1",
       {},
       PW_TEXT("Criterion", "Tsai and Wu 1971")},
      {linearSum, line, "|σ₁|/X + |σ₂|/Y + |τ|/S = 1",
       PW_TEXT("Criterion", "published for uniaxial tension and bending at an angle; for other states an "
                            "extension of this program"),
       PW_TEXT("Criterion", "LVL Handbook Europe 2025, equations 4.15 and 4.16")},
      {compressionAtAngle, line, "σ = f_{c,0} f_{c,90} k / (f_{c,0} sin²α + f_{c,90} k cos²α)",
       PW_TEXT("Criterion", "uniaxial compression at an angle α to the grain"),
       PW_TEXT("Criterion", "EN 1995-1-1, 6.2.2, equation (6.16)")},
      {taperedEdge, line, "σ = f_{m} / √(1 + (f_{m} tan α/(k f_{v}))² + (f_{m} tan²α/f_{90})²)",
       PW_TEXT("Criterion", "uniaxial stress along a tapered edge at an angle α to the grain"),
       PW_TEXT("Criterion", "EN 1995-1-1, 6.4.2, equations (6.38) to (6.40), numbers from memory")},
      {vonMises,
       principal,
       "√(((σ₁−σ₂)² + (σ₂−σ₃)² + (σ₃−σ₁)²)/2) = f",
       {},
       PW_TEXT("Criterion", "common practice, no source")},
      {tresca,
       principal,
       "greatest − least principal stress = f",
       {},
       PW_TEXT("Criterion", "common practice, no source")},
      {rankine,
       principal,
       "greatest principal stress = fₜ, least = −f꜀",
       {},
       PW_TEXT("Criterion", "common practice, no source")},
      {mohrCoulomb,
       principal,
       "(σ_{a}−σ_{b})/2 = c cos φ − (σ_{a}+σ_{b})/2 sin φ",
       {},
       PW_TEXT("Criterion", "common practice, no source")},
      {coulomb,
       plane,
       "|τ| = c − σ tan φ, σ ≤ cut-off",
       {},
       PW_TEXT("Criterion", "common practice, no source")},
      {throat, plane, "√(σ² + 3τ²) = f_{u}/(β_{w} γ_{M2}), |σ| ≤ 0.9 f_{u}/γ_{M2}",
       PW_TEXT("Criterion", "throat of a fillet weld"), PW_TEXT("Criterion", "EN 1993-1-8, 4.5.3.2")},
      {bond,
       plane,
       "(σ/f_{n})² + (τ/f_{s})² = 1, compression left out",
       {},
       PW_TEXT("Criterion", "own form, common practice, no source")}};
  return rows;
}

} // namespace

const CriterionRow& rowOf(Criterion criterion) {
  const CriterionRow& row = table()[static_cast<std::size_t>(criterion)];
  assert(row.criterion == criterion);
  return row;
}

bool applies(Criterion criterion, MaterialKind kind) {
  switch (criterion) {
  case Criterion::compressionAtAngle:
  case Criterion::taperedEdge:
    return kind == MaterialKind::timber;
  case Criterion::coulomb:
    return kind == MaterialKind::coulomb;
  case Criterion::throat:
    return kind == MaterialKind::throat;
  case Criterion::bond:
    return kind == MaterialKind::bond;
  default:
    break;
  }
  return rowOf(criterion).actsOn == ActsOn::principal ? kind == MaterialKind::isotropic : isLineKind(kind);
}

std::vector<Criterion> criteriaFor(MaterialKind kind) {
  std::vector<Criterion> criteria;
  if (kind == MaterialKind::timber)
    criteria.push_back(Criterion::sumOfSquares);
  if (kind == MaterialKind::lamina)
    criteria.push_back(Criterion::tsaiWu);
  const std::size_t usual = criteria.size();
  for (const Named<Criterion>& row : namesOf<Criterion>())
    if (applies(row.value, kind) && (usual == 0 || row.value != criteria.front()))
      criteria.push_back(row.value);
  return criteria;
}

} // namespace planewright

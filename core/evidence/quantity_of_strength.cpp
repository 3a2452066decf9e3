// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/quantity.h"
#include "core/strength/judge.h"

#include <algorithm>
#include <array>

namespace planewright {

namespace {

struct NamedStrength {
  std::string_view word;
  StrengthKey key;
};
constexpr std::array names = {
    NamedStrength{"Xt", StrengthKey::alongTension},   NamedStrength{"Xc", StrengthKey::alongCompression},
    NamedStrength{"Yt", StrengthKey::acrossTension},  NamedStrength{"Yc", StrengthKey::acrossCompression},
    NamedStrength{"S", StrengthKey::shear},           NamedStrength{"f", StrengthKey::tension},
    NamedStrength{"cohesion", StrengthKey::cohesion}, NamedStrength{"friction", StrengthKey::friction},
    NamedStrength{"cutoff", StrengthKey::cutoff},     NamedStrength{"fu", StrengthKey::fu},
    NamedStrength{"beta_w", StrengthKey::betaW},      NamedStrength{"gamma_M2", StrengthKey::gammaM2}};

MaterialKind kindFor(Criterion criterion) {
  for (const Named<MaterialKind>& row : namesOf<MaterialKind>())
    if (row.value != MaterialKind::timber && applies(criterion, row.value))
      return row.value;
  return MaterialKind::timber;
}

Strengths strengthsIn(const CheckInputs& inputs, Criterion criterion) {
  Strengths strengths;
  strengths.kind = kindFor(criterion);
  for (const NamedStrength& name : names)
    strengths[name.key] = inputs.number(name.word);
  return strengths;
}

/// A traction on a plane stands for the state that has it on its x face.
std::optional<PlaneStress> stressIn(const CheckInputs& inputs) {
  const bool isTraction = inputs.word("sn").has_value();
  const auto sx = inputs.number(isTraction ? "sn" : "sx");
  const auto sy = isTraction ? std::optional(0.0) : inputs.number("sy");
  const auto txy = inputs.number(isTraction ? "tnt" : "txy");
  return sx && sy && txy ? std::optional(PlaneStress{*sx, *sy, *txy}) : std::nullopt;
}

Problem fault(std::string_view quoted, Text what) {
  return {{}, 0, 0, std::string(quoted), std::move(what), {}};
}

} // namespace

Result<Quantity> quantityOfStrength(const CheckInputs& inputs, std::string_view word) {
  const std::string_view id = inputs.word("criterion").value_or("");
  const std::optional<Criterion> criterion = fromWord<Criterion>(id);
  const std::optional<PlaneStress> stress = stressIn(inputs);
  if (!criterion || !stress)
    return tl::unexpected(fault(id, PW_TEXT("Check", "These inputs make no check of a strength.")));
  const Strengths strengths = strengthsIn(inputs, *criterion);
  const Result<Judge> judge =
      Judge::of(*criterion, strengths, {}, {*stress, inputs.number("sz").value_or(0), scaleOf(*stress), 0});
  if (!judge)
    return tl::unexpected(judge.error());
  const Judgement judgement = judge->at(Angle::fromDegrees(inputs.number("theta").value_or(0)));
  const std::optional<double> f = inputs.number("f");
  if (word == "u")
    return Quantity{judgement.utilisation, false, 1};
  if (word == "factor" && judgement.multiplier)
    return Quantity{*judgement.multiplier, false, *judgement.multiplier};
  if (word == "sigma_eq" && f)
    return Quantity{judgement.utilisation * *f, false, *f};
  return tl::unexpected(fault(word, PW_TEXT("Check", "“%1” is no quantity of a strength.").with(word)));
}

} // namespace planewright

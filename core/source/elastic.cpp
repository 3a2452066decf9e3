// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/elastic.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

namespace planewright {

namespace {

struct Judged {
  Problems problems;

  void positive(const char* key, double value, const Text& meaning) {
    if (!(value > 0))
      add(key, PW_TEXT("Source", "The %1 is not greater than 0.").with(meaning),
          PW_TEXT("Source", "Give a positive stress."));
  }
  void add(const char* key, Text what, Text mend) {
    problems.push_back({key, 0, 0, {}, std::move(what), std::move(mend)});
  }

  void operator()(const Isotropic& material) {
    positive("E", material.E, PW_TEXT("Source", "modulus of elasticity"));
    if (!(material.nu > -1 && material.nu <= 0.5))
      add("nu",
          PW_TEXT("Source", "Poisson's ratio %1 is out of range.").with(numberText(exactNumber(material.nu))),
          PW_TEXT("Source", "It lies between −1 and 0.5; for most metals near 0.3."));
  }

  void operator()(const Orthotropic& material) {
    positive("E_along", material.along, PW_TEXT("Source", "modulus of elasticity along the line"));
    positive("E_across", material.across, PW_TEXT("Source", "modulus of elasticity across the line"));
    positive("G", material.G, PW_TEXT("Source", "shear modulus"));
    if (material.along > 0 && material.across > 0 &&
        !(material.nu12 * material.nu12 < material.along / material.across))
      add("nu12",
          PW_TEXT("Source",
                  "With ν_{12} = %1 its square is not less than E along the line over E across it: no "
                  "material is like that.")
              .with(numberText(exactNumber(material.nu12))),
          PW_TEXT("Source", "ν_{12} is the contraction across the line when stressed along it; ν_{21} is the "
                            "smaller one."));
  }
};

struct Stress {
  const PlaneStrain& strain;

  PlaneStress operator()(const Isotropic& material) const {
    const double stiffness = material.E / (1 - material.nu * material.nu);
    return {stiffness * (strain.ex + material.nu * strain.ey),
            stiffness * (strain.ey + material.nu * strain.ex), material.G() * strain.gxy};
  }

  PlaneStress operator()(const Orthotropic& material) const {
    const PlaneStrain ofLine = inTurnedAxes(strain, material.line);
    const double rest = 1 - material.nu12 * material.nu21();
    const PlaneStress stress = {
        (material.along * ofLine.ex + material.nu12 * material.across * ofLine.ey) / rest,
        material.across * (ofLine.ey + material.nu12 * ofLine.ex) / rest, material.G * ofLine.gxy};
    return inTurnedAxes(stress, -material.line);
  }
};

} // namespace

Problems problemsOf(const Elastic& elastic) {
  Judged judged;
  std::visit(judged, elastic);
  return std::move(judged.problems);
}

PlaneStress stressOf(const PlaneStrain& strain, const Elastic& elastic) {
  return std::visit(Stress{strain}, elastic);
}

} // namespace planewright

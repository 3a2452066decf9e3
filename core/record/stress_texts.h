// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/text_fields.h"

namespace planewright {

/// The typed text of a component or section force in the stresses of a case; null where it has no forces.
inline const std::string* textIn(const CaseStress& stress, Spot spot) {
  for (const TextField<CaseStress>& field : textFieldsOf<CaseStress>())
    if (field.spot == spot)
      return &(stress.*field.text);
  if (stress.forces)
    for (const TextField<ForceTexts>& field : textFieldsOf<ForceTexts>())
      if (field.spot == spot)
        return &((*stress.forces).*field.text);
  return nullptr;
}

} // namespace planewright

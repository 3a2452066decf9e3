// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/judgement.h"

namespace planewright {

template <>
const std::vector<Named<Mode>>& namesOf() {
  static const std::vector<Named<Mode>> names = {
      {Mode::tensionAlong, "tension-along", PW_TEXT("Mode", "tension along the line")},
      {Mode::compressionAlong, "compression-along", PW_TEXT("Mode", "compression along the line")},
      {Mode::tensionAcross, "tension-across", PW_TEXT("Mode", "tension across the line")},
      {Mode::compressionAcross, "compression-across", PW_TEXT("Mode", "compression across the line")},
      {Mode::shear, "shear", PW_TEXT("Mode", "shear")},
      {Mode::interaction, "interaction", PW_TEXT("Mode", "interaction of several stresses")},
      {Mode::tensionAtAngle, "tension-at-angle", PW_TEXT("Mode", "tension at an angle to the line")},
      {Mode::compressionAtAngle, "compression-at-angle",
       PW_TEXT("Mode", "compression at an angle to the line")},
      {Mode::yield, "yield", PW_TEXT("Mode", "yield")},
      {Mode::tension, "tension", PW_TEXT("Mode", "tension")},
      {Mode::compression, "compression", PW_TEXT("Mode", "compression")},
      {Mode::slip, "slip", PW_TEXT("Mode", "slip along the plane")},
      {Mode::separation, "separation", PW_TEXT("Mode", "tension across the plane")},
      {Mode::throat, "throat", PW_TEXT("Mode", "combined stress in the throat")},
      {Mode::normal, "normal", PW_TEXT("Mode", "normal stress on the throat")}};
  return names;
}

} // namespace planewright

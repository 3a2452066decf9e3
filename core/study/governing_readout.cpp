// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/governing_readout.h"

#include "core/study/governing.h"
#include "core/study/verdict.h"

namespace planewright {

Readout governingReadout(const Study& study, std::string_view point) {
  Readout readout = evaluate(study, point);
  if (const Verdict verdict = verdictOf(readout); verdict.governing)
    readout.shown = verdict.governing->state;
  else if (const std::optional<GoverningStates> worst = governingOf(readout))
    readout.shown = worst->principal.state;
  return readout;
}

} // namespace planewright

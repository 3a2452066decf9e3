// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/verdict_facts.h"

#include "core/study/verdict.h"
#include "core/table/check_words.h"

namespace planewright {

void addVerdict(Delivery& delivery, const std::vector<Readout>& points) {
  for (const Readout& readout : points)
    for (std::size_t check = 0; check < readout.checks.size(); ++check) {
      const Verdict verdict = verdictOfCheck(readout, check);
      if (verdict.standing == Standing::exceeds)
        delivery.facts.push_back(PW_TEXT("Command", "Point %1, check %2: exceeds, %3 (%4).")
                                     .with(readout.point)
                                     .with(readout.checks[check].id)
                                     .with(shownWorst(readingOf(readout, *verdict.governing)))
                                     .with(readout.states[verdict.governing->state].combination));
      if (verdict.unjudged)
        delivery.facts.push_back(PW_TEXT("Command", "Point %1, check %2: not judged in %3. %4 %5")
                                     .with(readout.point)
                                     .with(readout.checks[check].id)
                                     .with(readout.states[verdict.unjudged->state].combination)
                                     .with(readingOf(readout, *verdict.unjudged).problem->what)
                                     .with(readingOf(readout, *verdict.unjudged).problem->mend));
    }
  if (!delivery.facts.empty())
    delivery.exit = Exit::exceeds;
}

} // namespace planewright

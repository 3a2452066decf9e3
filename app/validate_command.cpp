// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/validate_command.h"

#include "app/help.h"
#include "core/evidence/evidence_text.h"
#include "core/quantity/format.h"

#include <array>

namespace planewright {

Outcome<Delivery> validated(std::span<const std::string> words) {
  constexpr std::array known = {OptionRow{"-o"}};
  const Result<Arguments> arguments = argumentsOf(words, known, 0);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{validateHelp()};
  const Result<std::string> file = outputOf(*arguments);
  if (!file)
    return wrongUse(file.error());
  const Results<std::vector<CheckResult>> checks = publishedChecks();
  if (!checks)
    return tl::unexpected(Failure{Exit::disagrees, checks.error()});
  Delivery delivery{evidenceText(*checks), *file};
  const EvidenceCount count = countOf(*checks);
  if (count.disagreeing > 0) {
    delivery.exit = Exit::disagrees;
    delivery.facts.push_back(PW_TEXT("Command", "%1 published values disagree.")
                                 .with(exactNumber(static_cast<double>(count.disagreeing))));
  }
  return delivery;
}

} // namespace planewright

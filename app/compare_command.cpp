// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/compare_command.h"

#include "app/help.h"
#include "app/study_source.h"
#include "core/report/comparison.h"

#include <array>

namespace planewright {

Outcome<Delivery> comparedStudies(std::span<const std::string> words) {
  constexpr std::array known = {OptionRow{"-o"}};
  const Result<Arguments> arguments = argumentsOf(words, known, 2);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{compareHelp()};
  if (arguments->operands.size() != 2)
    return wrongUse({"", 0, 0, "", PW_TEXT("Command", "Two studies are compared."),
                     PW_TEXT("Command", "Write planewright compare EARLIER LATER.")});
  const Result<std::string> file = outputOf(*arguments);
  if (!file)
    return wrongUse(file.error());
  const Outcome<Study> before = studyIn(arguments->operands[0]);
  if (!before)
    return tl::unexpected(before.error());
  const Outcome<Study> after = studyIn(arguments->operands[1]);
  if (!after)
    return tl::unexpected(after.error());
  return Delivery{comparisonText(compared(*before, *after)), *file};
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/arguments.h"
#include "core/study/study.h"
#include "core/words/decimal_sign.h"
#include "core/words/names.h"
#include "core/words/problem.h"
#include "ui/look/look.h"

namespace planewright {

/// Whether the name of a file ends so, whatever the case of its letters.
bool hasEnding(const std::string& file, std::string_view ending);

/// That an option names something that the study does not have, with what it has.
Problem unknownName(const char* option, const std::string& name, const std::vector<std::string>& names);

/// That --point names a point that the study does not have; none where it has it.
std::optional<Problem> missingPoint(const Study& study, const std::string& name);

/// Has the outputs speak the language that --language names; English without it.
std::optional<Problem> speakAs(const std::string* code);

/// The value that an option names by its word, `usual` without the option; the Problem lists the words.
template <class Enum>
Result<Enum> wordOfOption(const char* option, const std::string* given, Enum usual) {
  if (!given)
    return usual;
  if (const auto value = fromWord<Enum>(*given))
    return *value;
  std::string words;
  for (const Named<Enum>& row : namesOf<Enum>())
    words += (words.empty() ? "" : ", ") + std::string(row.word);
  return tl::unexpected(Problem{
      option, 0, 0, *given, PW_TEXT("Command", "“%1” is none of the words of %2.").with(*given).with(option),
      PW_TEXT("Command", "Take one of these: %1.").with(words)});
}

/// The language and the decimal sign in which an Order is printed, as --language and --decimal say.
template <class Order>
std::optional<Problem> readVoice(const Arguments& arguments, Order& order) {
  if (std::optional<Problem> problem = speakAs(arguments.valueOf("--language")))
    return problem;
  order.translate = translation();
  Result<DecimalSign> decimal = wordOfOption("--decimal", arguments.valueOf("--decimal"), order.decimal);
  if (!decimal)
    return std::move(decimal).error();
  order.decimal = *decimal;
  return std::nullopt;
}

} // namespace planewright

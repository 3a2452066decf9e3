// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/resolve_command.h"

#include "app/help.h"
#include "app/study_source.h"
#include "app/typed_state.h"
#include "app/verdict_facts.h"
#include "core/record/readout_file.h"
#include "core/table/check_words.h"
#include "core/words/names.h"

#include <array>

namespace planewright {

enum class ReadoutFormat { text, json, csv };

template <>
const std::vector<Named<ReadoutFormat>>& namesOf() {
  static const std::vector<Named<ReadoutFormat>> names = {{ReadoutFormat::text, "text", verbatim("text")},
                                                          {ReadoutFormat::json, "json", verbatim("json")},
                                                          {ReadoutFormat::csv, "csv", verbatim("csv")}};
  return names;
}

namespace {

using Takes = OptionRow::Takes;

constexpr std::array known = {OptionRow{"--sx"},
                              OptionRow{"--sy"},
                              OptionRow{"--txy"},
                              OptionRow{"--sz"},
                              OptionRow{"--positive"},
                              OptionRow{"--normal", Takes::manyValues},
                              OptionRow{"--line", Takes::manyValues},
                              OptionRow{"--tolerance", Takes::manyValues},
                              OptionRow{"--format"},
                              OptionRow{"-o"}};

Outcome<Study> studyOf(const Arguments& arguments) {
  const std::optional<Problem> mixed = problemOfMixing(arguments);
  if (mixed)
    return wrongUse(*mixed);
  if (!arguments.operands.empty())
    return studyIn(arguments.operands.front());
  Result<Study> typed = typedStudy(arguments);
  if (!typed)
    return wrongUse(std::move(typed).error());
  return *std::move(typed);
}

Result<ReadoutFormat> formatOf(const Arguments& arguments) {
  const std::string* word = arguments.valueOf("--format");
  if (!word)
    return ReadoutFormat::text;
  if (const auto format = fromWord<ReadoutFormat>(*word))
    return *format;
  return tl::unexpected(Problem{"--format", 0, 0, *word,
                                PW_TEXT("Command", "“%1” is not a format of resolve.").with(*word),
                                PW_TEXT("Command", "Take text, json or csv.")});
}

std::string written(ReadoutFormat format, const Study& study, const std::vector<Readout>& points) {
  switch (format) {
  case ReadoutFormat::json:
    return readoutJson(study, points);
  case ReadoutFormat::csv:
    return readoutCsv(study, points);
  case ReadoutFormat::text:
    break;
  }
  return readoutText(study, points);
}

} // namespace

Outcome<Delivery> resolved(std::span<const std::string> words) {
  const Result<Arguments> arguments = argumentsOf(words, known, 1);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{resolveHelp()};
  const Result<ReadoutFormat> format = formatOf(*arguments);
  if (!format)
    return wrongUse(format.error());
  const Result<Extras> extras = extrasOf(*arguments);
  if (!extras)
    return wrongUse(extras.error());
  const Result<std::string> file = outputOf(*arguments);
  if (!file)
    return wrongUse(file.error());
  const Outcome<Study> study = studyOf(*arguments);
  if (!study)
    return tl::unexpected(study.error());
  std::vector<Readout> points;
  for (const Point& point : study->points)
    points.push_back(evaluate(*study, point.name, *extras));
  Delivery delivery{written(*format, *study, points), *file};
  addVerdict(delivery, points);
  return delivery;
}

} // namespace planewright

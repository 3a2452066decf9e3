// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/screen_options.h"

#include "ui/files/file_bytes.h"

#include <array>
#include <charconv>

namespace planewright {

namespace {

using Takes = OptionRow::Takes;

constexpr std::array known = {OptionRow{"--study"},
                              OptionRow{"--point"},
                              OptionRow{"--check", Takes::manyValues},
                              OptionRow{"--column", Takes::manyValues},
                              OptionRow{"--except", Takes::manyValues},
                              OptionRow{"--except-list"},
                              OptionRow{"--leave-out", Takes::nothing},
                              OptionRow{"--top"},
                              OptionRow{"--principals", Takes::nothing},
                              OptionRow{"-o"}};

Problem missing(const char* option, Text what) {
  return {option,
          0,
          0,
          "",
          std::move(what),
          PW_TEXT("Command", "Write planewright screen POINTS.csv --study STUDY -o OUT.csv.")};
}

/// `sx=SIG-XX`; the heading may have another "=" in it.
Result<MappedHeading> headingIn(const std::string& text) {
  const auto equals = text.find('=');
  if (equals != std::string::npos && equals > 0 && equals + 1 < text.size())
    return MappedHeading{text.substr(0, equals), text.substr(equals + 1)};
  return tl::unexpected(Problem{
      "--column", 0, 0, text, PW_TEXT("Command", "“%1” does not say which column is which.").with(text),
      PW_TEXT("Command", "Write NAME=HEADING, for instance --column \"sx [psi]=SXX\".")});
}

Result<std::size_t> countIn(const std::string& text) {
  std::size_t count = 0;
  const char* end = text.data() + text.size();
  const auto read = std::from_chars(text.data(), end, count);
  if (read.ec == std::errc() && read.ptr == end && count > 0)
    return count;
  return tl::unexpected(Problem{"--top", 0, 0, text,
                                PW_TEXT("Command", "“%1” is no count of points.").with(text),
                                PW_TEXT("Command", "Write a whole number from 1 on.")});
}

/// Files that must not be one: what is read would be written over, or read for two things.
std::optional<Problem> mixedFiles(const ScreenOrder& order) {
  if (order.table == "-" && order.study == "-")
    return Problem{"--study",
                   0,
                   0,
                   "-",
                   PW_TEXT("Command", "Standard input is either the table or the study."),
                   PW_TEXT("Command", "Give one of them as a file.")};
  for (const std::string* read : {&order.table, &order.study, &order.exceptList})
    if (order.output != "-" && isSameFile(order.output, *read))
      return Problem{"-o",
                     0,
                     0,
                     order.output,
                     PW_TEXT("Command", "“%1” is read, and cannot be written.").with(order.output),
                     PW_TEXT("Command", "Give the output another name.")};
  return std::nullopt;
}

std::optional<Problem> readRepeated(const Arguments& arguments, ScreenOrder& order) {
  for (const GivenOption& option : arguments.options) {
    if (option.name == "--check")
      order.checks.push_back(option.value);
    if (option.name == "--except")
      order.except.push_back(option.value);
    if (option.name != "--column")
      continue;
    Result<MappedHeading> heading = headingIn(option.value);
    if (!heading)
      return std::move(heading).error();
    order.headings.push_back(*std::move(heading));
  }
  return std::nullopt;
}

} // namespace

Result<Arguments> screenArgumentsOf(std::span<const std::string> words) {
  return argumentsOf(words, known, 1);
}

Result<ScreenOrder> screenOrderOf(const Arguments& arguments) {
  ScreenOrder order;
  if (arguments.operands.empty())
    return tl::unexpected(missing("", PW_TEXT("Command", "No table of points is given.")));
  if (!arguments.has("--study"))
    return tl::unexpected(missing("--study", PW_TEXT("Command", "No study is given that has the checks.")));
  if (!arguments.has("-o"))
    return tl::unexpected(missing("-o", PW_TEXT("Command", "No file is given for the results.")));
  order.table = arguments.operands.front();
  order.study = *arguments.valueOf("--study");
  order.output = *arguments.valueOf("-o");
  const auto textOf = [&](const char* option) {
    const std::string* text = arguments.valueOf(option);
    return text ? *text : std::string();
  };
  order.point = textOf("--point");
  order.exceptList = textOf("--except-list");
  order.leavesOut = arguments.has("--leave-out");
  order.hasPrincipals = arguments.has("--principals");
  if (auto problem = readRepeated(arguments, order))
    return tl::unexpected(*std::move(problem));
  if (const std::string* text = arguments.valueOf("--top")) {
    const Result<std::size_t> count = countIn(*text);
    if (!count)
      return tl::unexpected(count.error());
    order.top = *count;
  }
  if (auto problem = mixedFiles(order))
    return tl::unexpected(*std::move(problem));
  return order;
}

} // namespace planewright

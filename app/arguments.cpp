// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/arguments.h"

#include <algorithm>
#include <optional>

namespace planewright {

namespace {

using Takes = OptionRow::Takes;

Problem problemWith(std::string_view word, Text what, Text mend) {
  return {"", 0, 0, std::string(word), std::move(what), std::move(mend)};
}

std::string listOf(std::span<const OptionRow> known) {
  std::string list;
  for (const OptionRow& row : known)
    list += (list.empty() ? "" : " ") + std::string(row.name);
  return list;
}

Problem unknownOption(const std::string& name, std::span<const OptionRow> known) {
  return problemWith(name, PW_TEXT("Command", "There is no option %1 here.").with(name),
                     PW_TEXT("Command", "The options are: %1 --help.").with(listOf(known)));
}

Problem missingValue(const std::string& name) {
  return problemWith(name, PW_TEXT("Command", "The option %1 needs a value.").with(name),
                     PW_TEXT("Command", "Write it behind the option; a value cannot begin with “--”."));
}

/// Goes through the words once.
class Sorter {
public:
  Sorter(std::span<const std::string> words, std::span<const OptionRow> known)
      : m_words(words), m_known(known) {}

  Result<Arguments> sorted() {
    while (m_next < m_words.size() && !m_problem) {
      const std::string& word = m_words[m_next++];
      if (m_onlyOperands || word == "-" || !word.starts_with('-'))
        m_arguments.operands.push_back(word);
      else if (word == "--")
        m_onlyOperands = true;
      else if (word == "--help")
        m_arguments.helpAsked = true;
      else
        takeOption(word);
    }
    if (m_problem)
      return tl::unexpected(*std::move(m_problem));
    return std::move(m_arguments);
  }

private:
  void takeOption(const std::string& word) {
    const auto equals = word.starts_with("--") ? word.find('=') : std::string::npos;
    const std::string name = word.substr(0, equals);
    const auto row = std::ranges::find(m_known, name, &OptionRow::name);
    if (row == m_known.end())
      m_problem = unknownOption(name, m_known);
    else if (row->takes != Takes::manyValues && m_arguments.has(name))
      m_problem = problemWith(name, PW_TEXT("Command", "The option %1 is given twice.").with(name),
                              PW_TEXT("Command", "Give it once."));
    else if (row->takes == Takes::nothing)
      takeSwitch(name, equals != std::string::npos);
    else if (equals != std::string::npos)
      takeValue(name, word.substr(equals + 1));
    else if (m_next == m_words.size())
      m_problem = missingValue(name);
    else
      takeValue(name, m_words[m_next++]);
  }

  void takeSwitch(const std::string& name, bool hasValue) {
    if (hasValue)
      m_problem = problemWith(name, PW_TEXT("Command", "The option %1 takes no value.").with(name), {});
    m_arguments.options.push_back({name, ""});
  }

  void takeValue(const std::string& name, const std::string& value) {
    if (value.find_first_not_of(" \t") == std::string::npos || value.starts_with("--"))
      m_problem = missingValue(name);
    m_arguments.options.push_back({name, value});
  }

  std::span<const std::string> m_words;
  std::span<const OptionRow> m_known;
  std::size_t m_next = 0;
  bool m_onlyOperands = false;
  Arguments m_arguments;
  std::optional<Problem> m_problem;
};

} // namespace

const std::string* Arguments::valueOf(std::string_view name) const {
  const auto at = std::ranges::find(options, name, &GivenOption::name);
  return at == options.end() ? nullptr : &at->value;
}

Result<Arguments> argumentsOf(std::span<const std::string> words, std::span<const OptionRow> known,
                              std::size_t mostOperands) {
  Result<Arguments> arguments = Sorter(words, known).sorted();
  if (arguments && arguments->operands.size() > mostOperands) {
    const std::string& extra = arguments->operands[mostOperands];
    return tl::unexpected(problemWith(extra, PW_TEXT("Command", "The word “%1” is one too many.").with(extra),
                                      PW_TEXT("Command", "Put a value with blanks in quotes.")));
  }
  return arguments;
}

} // namespace planewright

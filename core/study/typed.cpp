// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/typed.h"

#include "core/words/utf8.h"

#include <cassert>
#include <cmath>

namespace planewright {

namespace {

constexpr std::size_t longestFreeText = 20000;
// Sums of a thousand products of two such values are still finite, so no state overflows.
constexpr double greatestValue = 1e100;
// Beyond this the fraction of a turn is lost in the last digits of a double.
constexpr double greatestAngle = 1e6;

bool isControl(char32_t code, bool linesAllowed) {
  if (linesAllowed && (code == '\n' || code == '\t'))
    return false;
  return code < 0x20 || (code >= 0x7F && code < 0xA0);
}

/// Of a text that is UTF-8.
bool hasControls(std::string_view text, bool linesAllowed) {
  std::size_t at = 0;
  while (const auto point = codePointAt(text, at)) {
    if (isControl(point->value, linesAllowed))
      return true;
    at += point->bytes;
  }
  return false;
}

Text faultOfFreeText(std::string_view text) {
  if (!isUtf8(text))
    return PW_TEXT("Study", "This text is not valid UTF-8.");
  if (hasControls(text, true))
    return PW_TEXT("Study", "This text has control characters.");
  if (text.size() > longestFreeText)
    return PW_TEXT("Study", "This text has more than 20000 bytes.");
  return {};
}

std::string_view trimmed(std::string_view text) {
  const auto first = text.find_first_not_of(" \t\r\n");
  if (first == std::string_view::npos)
    return {};
  return text.substr(first, text.find_last_not_of(" \t\r\n") - first + 1);
}

Result<std::string> keptExpression(const Study& study, const Place& place, std::string_view text) {
  const SpotRow& row = rowOf(place.spot);
  if (row.mayBeEmpty && trimmed(text).empty())
    return std::string();
  const EntryKind kind = entryKindOf(study, place);
  Result<Entry> entry = readEntry(text, kind);
  if (!entry) {
    Problem problem = std::move(entry).error();
    problem.place = pathOf(place);
    return tl::unexpected(std::move(problem));
  }
  const bool isTolerance = place.spot == Spot::lineTolerance || place.spot == Spot::planeTolerance;
  if (isTolerance && entry->value < 0)
    return tl::unexpected(problemAt(place, text, PW_TEXT("Study", "A tolerance cannot be negative."),
                                    PW_TEXT("Study", "Give the greatest deviation to either side.")));
  const double greatest = kind.dimension == dimension::angle ? greatestAngle : greatestValue;
  if (std::abs(entry->value) > greatest)
    return tl::unexpected(problemAt(place, text, PW_TEXT("Study", "This is too large to be meant."),
                                    PW_TEXT("Study", "Check the exponent and the unit.")));
  return std::move(entry->text);
}

Result<std::string> keptUnit(const Place& place, std::string_view text) {
  Result<Unit> unit = readUnit(text, rowOf(place.spot).dimension);
  if (unit)
    return std::move(unit->name);
  Problem problem = std::move(unit).error();
  problem.place = pathOf(place);
  return tl::unexpected(std::move(problem));
}

Result<std::string> keptWord(const Place& place, const Slot& slot, std::string_view text) {
  if (fits(slot, text))
    return std::string(text);
  return tl::unexpected(problemAt(place, text,
                                  PW_TEXT("Study", "“%1” is not one of the words for this.").with(text),
                                  PW_TEXT("Study", "Use one of: %1.").with(wordsOf(slot))));
}

} // namespace

Problem problemAt(const Place& place, std::string_view quoted, Text what, Text mend) {
  return {pathOf(place), 0, 0, std::string(quoted), std::move(what), std::move(mend)};
}

double valueOf(const Study& study, Spot spot, const std::string& text) {
  if (text.empty()) {
    assert(rowOf(spot).mayBeEmpty);
    return 0;
  }
  const Result<Entry> entry = readEntry(text, entryKindOf(study, spot));
  assert(entry && "texts are read before what follows from them");
  return entry->value;
}

Text faultOfName(std::string_view name) {
  if (trimmed(name).empty())
    return PW_TEXT("Study", "A name is needed here.");
  if (trimmed(name) != name)
    return PW_TEXT("Study", "A name cannot begin or end with a blank.");
  if (!isUtf8(name))
    return PW_TEXT("Study", "This name is not valid UTF-8.");
  if (hasControls(name, false))
    return PW_TEXT("Study", "A name cannot have control characters.");
  if (name.size() > longestName)
    return PW_TEXT("Study", "This name has more than 200 bytes.");
  return {};
}

Text faultOfKey(Spot spot, std::string_view name) {
  if (Text fault = faultOfName(name); !fault.empty())
    return fault;
  if (spot == Spot::loadCase && name.find(',') != std::string_view::npos)
    return PW_TEXT("Study", "The id of a case cannot have a comma.");
  return {};
}

Result<std::string> keptText(const Study& study, const Place& place, const Slot& slot,
                             std::string_view text) {
  switch (rowOf(place.spot).holds) {
  case Holds::expression:
    return keptExpression(study, place, text);
  case Holds::unit:
    return keptUnit(place, text);
  case Holds::word:
    return keptWord(place, slot, text);
  case Holds::name:
    if (rowOf(place.spot).mayBeEmpty && text.empty())
      return std::string();
    if (Text fault = faultOfName(text); !fault.empty())
      return tl::unexpected(problemAt(place, text, std::move(fault)));
    return std::string(text);
  case Holds::thing:
  case Holds::ids:
  case Holds::freeText:
    break;
  }
  if (Text fault = faultOfFreeText(text); !fault.empty())
    return tl::unexpected(problemAt(place, {}, std::move(fault)));
  return std::string(text);
}

} // namespace planewright

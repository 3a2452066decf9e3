// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/heading.h"

#include "core/words/utf8.h"

#include <utility>

namespace planewright {

using std::string;
using std::string_view;

string_view withoutBlanks(string_view text) {
  const auto first = text.find_first_not_of(" \t\n");
  if (first == string_view::npos)
    return {};
  return text.substr(first, text.find_last_not_of(" \t\n") - first + 1);
}

Heading headingOf(string_view cell) {
  const string_view text = withoutBlanks(cell);
  for (const auto& [open, close] : {std::pair{'[', ']'}, std::pair{'(', ')'}}) {
    const std::size_t at = text.find(open);
    if (at != string_view::npos && at > 0 && text.ends_with(close))
      return {withoutBlanks(text.substr(0, at)), withoutBlanks(text.substr(at + 1, text.size() - at - 2))};
  }
  return {text, std::nullopt};
}

string plainHeading(string_view heading) {
  string plain;
  std::size_t at = 0;
  while (const auto point = codePointAt(heading, at)) {
    const string_view written = heading.substr(at, point->bytes);
    at += point->bytes;
    if (string_view(" \t\n_{}-.\xC2\xA0").find(written) != string_view::npos)
      continue;
    const bool isCapital = written.size() == 1 && written[0] >= 'A' && written[0] <= 'Z';
    plain += written == "σ"   ? string("sigma")
             : written == "τ" ? string("tau")
             : written == "ₓ" ? string("x")
             : isCapital      ? string(1, static_cast<char>(written[0] + 32))
                              : string(written);
  }
  return plain;
}

} // namespace planewright

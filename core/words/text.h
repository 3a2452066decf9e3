// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <functional>
#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// A text that a user can see, kept apart from its language.
///
/// `source` is English with the markers %1 to %9 for `arguments`, and `_{...}` for a lowered index
/// ("σ_{n}"). `context` tells a translator where the words stand. A Text without a context is verbatim: a
/// user's own words, a number, a unit; nothing in it is translated, replaced or lowered.
struct Text {
  std::string context;
  std::string source;
  std::vector<Text> arguments;

  /// The same text with one more argument.
  [[nodiscard]] Text with(Text argument) const;
  /// The same text with one more argument, taken verbatim.
  [[nodiscard]] Text with(std::string_view verbatim) const;

  bool empty() const { return source.empty(); }
  bool operator==(const Text&) const = default;
};

/// Marks a translatable text; the extractor knows it as an alias of QT_TRANSLATE_NOOP.
#define PW_TEXT(context, source)                                                                             \
  ::planewright::Text {                                                                                      \
    context, source, {}                                                                                      \
  }

/// A user's own words, a number or a unit: shown as it is.
Text verbatim(std::string_view words);
/// A symbol of the trade, equal in every language, with `_{...}` for its index.
Text symbol(std::string_view source);

/// Looks up `source` in the language of the outputs; an empty function means English.
using Translate = std::function<std::string(const std::string& context, const std::string& source)>;

/// A stretch of text on one level: on the base line, or lowered as an index.
struct Run {
  std::string text;
  bool lowered = false;
  bool operator==(const Run&) const = default;
};
using Runs = std::vector<Run>;

/// The text in the given language, cut at its indices.
Runs runs(const Text& text, const Translate& translate = {});
/// The text in the given language as plain UTF-8; indices stand in the line ("σ_{n}" gives "σn").
std::string plain(const Text& text, const Translate& translate = {});
std::string plain(const Runs& runs);

} // namespace planewright

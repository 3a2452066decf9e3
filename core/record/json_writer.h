// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <optional>
#include <string>
#include <string_view>

namespace planewright {

/// Writes JSON with one value a line, indented by two blanks, equal bytes for equal values. Texts are UTF-8;
/// numbers are finite and have at most 15 significant digits.
class JsonWriter {
public:
  void beginObject() { begin('{'); }
  void endObject() { end('}'); }
  void beginList() { begin('['); }
  void endList() { end(']'); }

  /// The key of what is written next.
  JsonWriter& key(std::string_view key);
  void text(std::string_view text);
  void number(double number);
  /// The number, or null.
  void number(std::optional<double> number);
  void whole(int number);
  void boolean(bool value) { word(value ? "true" : "false"); }
  void null() { word("null"); }

  /// What was written, with a line feed at the end.
  std::string taken();

private:
  void begin(char bracket);
  void end(char bracket);
  void word(std::string_view word);
  /// Comma, new line and indent before a value or key.
  void separate();

  std::string m_out;
  std::size_t m_depth = 0;
  bool m_first = true; ///< nothing stands yet inside the innermost bracket
  bool m_behindKey = false;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/json.h"
#include "core/words/names.h"

namespace planewright {

/// What reading a file has found so far.
struct Reading {
  FileProblems& problems;
  bool complete = true; ///< false once something that was asked for could not be read
};

/// Whether the value at this path is of this kind; a Problem otherwise.
bool isOf(Json::Kind kind, const Json& json, const std::string& path, Reading& reading);

/// Reads the members of one JSON object by key. A member that is not there leaves its target as it is; one
/// of another type is a Problem. At the end `refuseUnread` reports the members that nobody asked for.
class ObjectReader {
public:
  ObjectReader(const Json& json, std::string path, Reading& reading);

  void text(std::string_view key, std::string& target);
  /// A text that must be there.
  void neededText(std::string_view key, std::string& target);
  void texts(std::string_view key, std::vector<std::string>& target);
  template <class Enum>
  void word(std::string_view key, Enum& target);

  /// The items of a list or the members of an object behind a key; null when it is not there or no such.
  const std::vector<JsonMember>* list(std::string_view key) { return membersOf(key, Json::Kind::list); }
  const std::vector<JsonMember>* object(std::string_view key) { return membersOf(key, Json::Kind::object); }
  /// The value behind a key that something else reads.
  const Json* value(std::string_view key);

  void refuseUnread();

private:
  const JsonMember* asked(std::string_view key);
  const std::vector<JsonMember>* membersOf(std::string_view key, Json::Kind kind);
  void refuseWord(const JsonMember& found, const std::vector<std::string_view>& words);
  std::string below(std::string_view key) const;

  const Json& m_json;
  std::string m_path;
  Reading& m_reading;
  std::vector<std::string_view> m_asked;
};

template <class Enum>
void ObjectReader::word(std::string_view key, Enum& target) {
  const JsonMember* found = asked(key);
  if (!found || !isOf(Json::Kind::text, found->value, below(key), m_reading))
    return;
  if (const std::optional<Enum> value = fromWord<Enum>(found->value.text)) {
    target = *value;
    return;
  }
  std::vector<std::string_view> words;
  for (const Named<Enum>& row : namesOf<Enum>())
    words.emplace_back(row.word);
  refuseWord(*found, words);
}

} // namespace planewright

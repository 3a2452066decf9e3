// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/object_reader.h"

#include "core/record/json_text.h"

#include <algorithm>

namespace planewright {

namespace {

std::string joined(const std::vector<std::string_view>& words) {
  std::string result;
  for (const std::string_view word : words)
    result += (result.empty() ? "" : ", ") + std::string(word);
  return result;
}

Text wanted(Json::Kind kind) {
  if (kind == Json::Kind::list)
    return PW_TEXT("File", "A list in square brackets is needed here.");
  if (kind == Json::Kind::object)
    return PW_TEXT("File", "An object in braces is needed here.");
  return PW_TEXT("File", "A text in quotes is needed here.");
}

} // namespace

bool isOf(Json::Kind kind, const Json& json, const std::string& path, Reading& reading) {
  if (json.kind == kind)
    return true;
  reading.complete = false;
  Text mend;
  if (kind == Json::Kind::text && json.kind == Json::Kind::number)
    mend = PW_TEXT("File", "Put it in quotes, with its unit where it has one.");
  reading.problems.add(json.offset, path, wanted(kind), mend);
  return false;
}

ObjectReader::ObjectReader(const Json& json, std::string path, Reading& reading)
    : m_json(json), m_path(std::move(path)), m_reading(reading) {
  isOf(Json::Kind::object, json, m_path, m_reading);
}

void ObjectReader::text(std::string_view key, std::string& target) {
  const JsonMember* found = asked(key);
  if (found && isOf(Json::Kind::text, found->value, below(key), m_reading))
    target = found->value.text;
}

void ObjectReader::neededText(std::string_view key, std::string& target) {
  text(key, target);
  if (m_json.kind != Json::Kind::object || member(m_json, key))
    return;
  m_reading.complete = false;
  m_reading.problems.add(m_json.offset, below(key),
                         PW_TEXT("File", "“%1” is missing in this object.").with(key));
}

void ObjectReader::texts(std::string_view key, std::vector<std::string>& target) {
  const auto* items = list(key);
  if (!items)
    return;
  for (const JsonMember& item : *items)
    if (isOf(Json::Kind::text, item.value, below(key), m_reading))
      target.push_back(item.value.text);
}

const Json* ObjectReader::value(std::string_view key) {
  const JsonMember* found = asked(key);
  return found ? &found->value : nullptr;
}

void ObjectReader::refuseUnread() {
  if (m_json.kind != Json::Kind::object)
    return;
  for (const JsonMember& one : m_json.members) {
    if (m_reading.problems.full())
      return;
    if (std::ranges::find(m_asked, one.key) != m_asked.end())
      continue;
    const std::string key = pieceAt(m_reading.problems.bytes(), one.keyOffset);
    m_reading.problems.add(one.keyOffset, below(one.key),
                           PW_TEXT("File", "“%1” is no key of this object.").with(key),
                           PW_TEXT("File", "Its keys are: %1.").with(joined(m_asked)));
  }
}

const JsonMember* ObjectReader::asked(std::string_view key) {
  m_asked.emplace_back(key);
  return m_json.kind == Json::Kind::object ? member(m_json, key) : nullptr;
}

const std::vector<JsonMember>* ObjectReader::membersOf(std::string_view key, Json::Kind kind) {
  const JsonMember* found = asked(key);
  return found && isOf(kind, found->value, below(key), m_reading) ? &found->value.members : nullptr;
}

void ObjectReader::refuseWord(const JsonMember& found, const std::vector<std::string_view>& words) {
  m_reading.complete = false;
  const std::string piece = pieceAt(m_reading.problems.bytes(), found.value.offset);
  m_reading.problems.add(found.value.offset, below(found.key),
                         PW_TEXT("Study", "“%1” is not one of the words for this.").with(piece),
                         PW_TEXT("Study", "Use one of: %1.").with(joined(words)));
}

std::string ObjectReader::below(std::string_view key) const {
  std::string path = m_path.empty() ? "" : m_path + "/";
  for (const char c : key)
    path += c == '~' ? std::string("~0") : c == '/' ? std::string("~1") : std::string(1, c);
  return path;
}

} // namespace planewright

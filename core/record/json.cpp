// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/json.h"

#include "core/record/json_text.h"
#include "core/record/study_file.h"
#include "core/words/utf8.h"

#include <nlohmann/json.hpp>

#include <algorithm>
#include <set>

namespace planewright {

namespace {

using std::size_t;
using std::string;

bool hasControls(std::string_view text) {
  return std::ranges::any_of(
      text, [](unsigned char c) { return (c < 0x20 && c != '\n' && c != '\t') || c == 0x7F; });
}

/// The quoted piece of a token that is broken: up to its first control character.
string brokenPiece(std::string_view bytes, size_t start) {
  const string piece = pieceAt(bytes, start);
  return {piece.begin(), std::ranges::find_if(piece, [](unsigned char c) { return c < 0x20; })};
}

/// Builds the tree from the parser's events. The parser does not say where its tokens stand, so their starts
/// are found by walking over the same bytes in step with it.
class TreeBuilder final : public nlohmann::json_sax<nlohmann::json> {
public:
  explicit TreeBuilder(FileProblems& problems)
      : m_problems(problems), m_bytes(problems.bytes()), m_at(byteOrderMark(m_bytes)) {}

  Json&& root() { return std::move(m_root); }
  /// Whether every text can be shown to people.
  bool usable() const { return m_usable; }
  /// First byte after the last token, but for blanks.
  size_t rest() const { return std::min(m_bytes.find_first_not_of(" \t\r\n", m_at), m_bytes.size()); }

  bool null() override { return addValue(Json::Kind::null, {}); }
  bool boolean(bool) override { return addValue(Json::Kind::boolean, {}); }
  bool number_integer(number_integer_t) override { return addNumber(); }
  bool number_unsigned(number_unsigned_t) override { return addNumber(); }
  bool number_float(number_float_t, const string_t&) override { return addNumber(); }
  bool binary(binary_t&) override { return false; }
  bool string(string_t& text) override {
    refuseControls(text);
    return addValue(Json::Kind::text, std::move(text));
  }
  bool start_object(size_t) override { return open(Json::Kind::object); }
  bool end_object() override { return close(); }
  bool start_array(size_t) override { return open(Json::Kind::list); }
  bool end_array() override { return close(); }
  bool key(string_t& key) override;
  bool parse_error(size_t position, const std::string& token, const nlohmann::detail::exception&) override;

private:
  struct Open {
    Json* json;
    std::set<std::string, std::less<>> keys;
  };

  /// Start of the next token, which is passed over.
  size_t take() {
    const size_t start = tokenStart(m_bytes, m_at);
    m_at = tokenEnd(m_bytes, start);
    return start;
  }
  void refuseControls(std::string_view text);
  bool addNumber();
  bool addValue(Json::Kind kind, std::string text) { return add(kind, take(), std::move(text)) != nullptr; }
  Json* add(Json::Kind kind, size_t offset, std::string text);
  bool open(Json::Kind kind);
  bool close();

  FileProblems& m_problems;
  std::string_view m_bytes;
  size_t m_at;
  Json m_root;
  std::vector<Open> m_open;
  std::string m_key;
  size_t m_keyOffset = 0;
  size_t m_count = 0;
  bool m_usable = true;
};

void TreeBuilder::refuseControls(std::string_view text) {
  if (!hasControls(text))
    return;
  m_usable = false;
  m_problems.add(tokenStart(m_bytes, m_at), {}, PW_TEXT("File", "This text has control characters."),
                 PW_TEXT("File", "Take them out."));
}

bool TreeBuilder::addNumber() {
  const size_t start = take();
  return add(Json::Kind::number, start, std::string(m_bytes.substr(start, m_at - start))) != nullptr;
}

Json* TreeBuilder::add(Json::Kind kind, size_t offset, std::string text) {
  if (++m_count > mostJsonValues) {
    m_problems.add(offset, {}, PW_TEXT("File", "The file has more than a million values."));
    return nullptr;
  }
  Json value{kind, static_cast<std::uint32_t>(offset), std::move(text), {}};
  if (m_open.empty()) {
    m_root = std::move(value);
    return &m_root;
  }
  auto& members = m_open.back().json->members;
  members.push_back({std::move(m_key), static_cast<std::uint32_t>(m_keyOffset), std::move(value)});
  m_key.clear();
  return &members.back().value;
}

bool TreeBuilder::open(Json::Kind kind) {
  const size_t offset = take();
  if (m_open.size() >= deepestJson) {
    m_problems.add(offset, {}, PW_TEXT("File", "The brackets are nested more than 64 deep."));
    return false;
  }
  Json* json = add(kind, offset, {});
  if (json)
    m_open.push_back({json, {}});
  return json != nullptr;
}

bool TreeBuilder::close() {
  take();
  m_open.pop_back();
  return true;
}

bool TreeBuilder::key(string_t& key) {
  refuseControls(key);
  m_keyOffset = take();
  if (!m_open.back().keys.insert(key).second)
    m_problems.add(m_keyOffset, {}, PW_TEXT("File", "This key stands twice in one object."),
                   PW_TEXT("File", "Take one of them out."));
  m_key = std::move(key);
  return true;
}

bool TreeBuilder::parse_error(size_t position, const std::string&, const nlohmann::detail::exception& error) {
  const size_t start = tokenStart(m_bytes, m_at);
  const size_t last = position == 0 ? 0 : position - 1; // where the parser gave up
  Problem problem;
  problem.quoted = brokenPiece(m_bytes, start);
  size_t offset = std::min(start, last);
  constexpr int numberOutOfRange = 406;
  if (error.id == numberOutOfRange) {
    problem.what = PW_TEXT("File", "The number “%1” is too large.").with(problem.quoted);
  } else if (last >= m_bytes.size()) {
    offset = m_bytes.size();
    problem.quoted.clear();
    problem.what = PW_TEXT("File", "The file ends too early.");
    problem.mend = PW_TEXT("File", "It may be cut off: take it again from where it came.");
  } else if (start < last && m_bytes[start] == '"' && tokenEnd(m_bytes, start) != last + 1) {
    offset = last;
    problem.what = PW_TEXT("File", "The text “%1” breaks off at what JSON does not allow in a text.")
                       .with(problem.quoted);
    problem.mend =
        PW_TEXT("File", "Close it with a quote; write \\n for a new line and \\\\ for a backslash.");
  } else {
    problem.quoted = brokenPiece(m_bytes, offset);
    problem.what = problem.quoted.empty()
                       ? PW_TEXT("File", "A character that cannot be seen does not belong here.")
                       : PW_TEXT("File", "“%1” does not belong here.").with(problem.quoted);
    problem.mend = PW_TEXT("File", "Look for a missing or surplus comma, quote or bracket just before it.");
  }
  m_problems.add(offset, std::move(problem));
  return false;
}

} // namespace

const JsonMember* member(const Json& object, std::string_view key) {
  const auto at = std::ranges::find(object.members, key, &JsonMember::key);
  return at == object.members.end() ? nullptr : &*at;
}

std::optional<Json> readJson(FileProblems& problems) {
  const std::string_view bytes = problems.bytes();
  if (bytes.size() > greatestStudyFile) {
    problems.add(0, Problem{{}, 0, 0, {}, PW_TEXT("File", "The file is larger than 16 MB."), {}});
    return std::nullopt;
  }
  if (const auto broken = invalidUtf8In(bytes)) {
    problems.add(*broken, Problem{{},
                                  0,
                                  0,
                                  {},
                                  PW_TEXT("File", "The file is not UTF-8 from here on."),
                                  PW_TEXT("File", "Save it as UTF-8.")});
    return std::nullopt;
  }
  TreeBuilder builder(problems);
  if (!nlohmann::json::sax_parse(bytes.data(), bytes.data() + bytes.size(), &builder))
    return std::nullopt;
  // The parser takes a zero byte for the end.
  if (const size_t rest = builder.rest(); rest < bytes.size()) {
    problems.add(rest, Problem{{}, 0, 0, {}, PW_TEXT("File", "The file goes on after its end."), {}});
    return std::nullopt;
  }
  if (!builder.usable())
    return std::nullopt;
  return builder.root();
}

} // namespace planewright

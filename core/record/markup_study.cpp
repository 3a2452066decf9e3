// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/markup_study.h"

#include "core/record/base64.h"

#include <algorithm>
#include <cassert>
#include <optional>
#include <vector>

namespace planewright {

namespace {

using std::string_view;
constexpr auto none = string_view::npos;

constexpr string_view element = "planewright-study";
constexpr string_view scriptType = "application/x-planewright+json";

/// What stands between the nearest '<' before `offset` and `offset`; none when that is far away or no tag.
std::optional<string_view> startOfTag(string_view bytes, std::size_t offset) {
  constexpr std::size_t furthest = 200;
  const std::size_t from = offset > furthest ? offset - furthest : 0;
  const string_view before = bytes.substr(from, offset - from);
  const std::size_t mark = before.find_last_of("<>");
  if (mark == none || before[mark] == '>')
    return std::nullopt;
  return before.substr(mark + 1);
}

/// `<planewright-study` with any prefix, and then nothing more of a name.
bool isElement(string_view start, string_view rest) {
  const bool isPrefix = start.ends_with(':') && std::ranges::none_of(start, [](char c) {
                          return c == '/' || c == '!' || c == '?' || isBlank(c);
                        });
  return (start.empty() || isPrefix) && !rest.empty() && (rest[0] == '>' || isBlank(rest[0]));
}

bool isScript(string_view start, string_view) {
  return start.starts_with("script");
}

/// The content of every tag in which `name` stands so that `isTag` agrees.
void addContents(string_view bytes, string_view name, bool (*isTag)(string_view, string_view),
                 std::vector<string_view>& texts) {
  for (std::size_t at = bytes.find(name); at != none; at = bytes.find(name, at)) {
    const std::optional<string_view> start = startOfTag(bytes, at);
    at += name.size();
    if (!start || !isTag(*start, bytes.substr(at)))
      continue;
    const std::size_t content = std::min(bytes.find('>', at), bytes.size() - 1) + 1;
    at = std::min(bytes.find('<', content), bytes.size());
    texts.push_back(bytes.substr(content, at - content));
  }
}

/// True where a document of this name begins and does not end.
bool isCutOff(string_view bytes, string_view begins, string_view ends) {
  const std::size_t start = bytes.find(begins);
  return start != none && bytes.find(ends, start) == none;
}

std::string insertedBefore(std::string document, string_view end, const std::string& piece) {
  const std::size_t at = document.rfind(end);
  assert(at != std::string::npos);
  document.insert(at, piece);
  return document;
}

} // namespace

std::string svgWithText(std::string svg, string_view text) {
  return insertedBefore(std::move(svg), "</svg>",
                        "<metadata><planewright-study xmlns=\"urn:planewright:study\">" + std::string(text) +
                            "</planewright-study></metadata>\n");
}

std::string htmlWithText(std::string html, string_view text) {
  return insertedBefore(std::move(html), "</body>",
                        "<script type=\"application/x-planewright+json; base64\">" + std::string(text) +
                            "</script>\n");
}

std::string xmpWithText(string_view text) {
  return "<?xpacket begin=\"\xEF\xBB\xBF\" id=\"W5M0MpCehiHzreSzNTczkc9d\"?>\n"
         "<rdf:RDF xmlns:rdf=\"http://www.w3.org/1999/02/22-rdf-syntax-ns#\">\n"
         "<rdf:Description rdf:about=\"\" xmlns:pw=\"urn:planewright:study\">\n"
         "<pw:planewright-study>" +
         std::string(text) + "</pw:planewright-study>\n</rdf:Description>\n</rdf:RDF>\n<?xpacket end=\"r\"?>";
}

CarriedTexts textsInMarkup(string_view bytes) {
  CarriedTexts found;
  addContents(bytes, element, isElement, found.texts);
  addContents(bytes, scriptType, isScript, found.texts);
  if (isCutOff(bytes, "<svg", "svg>") || isCutOff(bytes, "<html", "</html"))
    found.state = CarriedTexts::State::cutOff;
  return found;
}

CarriedTexts textsInPdf(string_view bytes) {
  CarriedTexts found;
  addContents(bytes, element, isElement, found.texts);
  if (isCutOff(bytes, "%PDF", "%%EOF"))
    found.state = CarriedTexts::State::cutOff;
  return found;
}

} // namespace planewright

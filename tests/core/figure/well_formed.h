// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace planewright {

/// What keeps a text from being a well-formed element tree as this program writes it (no comments, no CDATA,
/// no DTD); empty when nothing does. `&` must begin one of the five entities, tags must nest, attributes be
/// quoted and without `<`.
inline std::string faultIn(std::string_view xml) {
  const auto startsEntity = [](std::string_view text) {
    for (const std::string_view entity : {"&amp;", "&lt;", "&gt;", "&quot;", "&apos;"})
      if (text.starts_with(entity))
        return true;
    return false;
  };
  if (xml.starts_with("<?xml "))
    xml.remove_prefix(xml.find("?>") + 2);
  std::vector<std::string> open;
  bool hadRoot = false;
  while (!xml.empty()) {
    const char c = xml.front();
    if (c == '&' && !startsEntity(xml))
      return "a bare &";
    if (c == '>' || (static_cast<unsigned char>(c) < 0x20 && c != '\n'))
      return "a bare > or control character";
    if (c != '<') {
      if (open.empty() && c != '\n')
        return "text outside the root";
      xml.remove_prefix(1);
      continue;
    }
    std::size_t end = 1;
    for (char quote = 0; end < xml.size() && (quote != 0 || xml[end] != '>'); ++end) {
      if (xml[end] == '<' || (xml[end] == '&' && !startsEntity(xml.substr(end))))
        return "a bare < or & in a tag";
      if (xml[end] == '"')
        quote = quote == 0 ? '"' : 0;
    }
    if (end == xml.size())
      return "a tag without an end";
    const std::string_view tag = xml.substr(1, end - 1);
    const std::string name(tag.substr(0, tag.find_first_of(" /", 1)));
    if (tag.starts_with('/')) {
      if (open.empty() || "/" + open.back() != tag)
        return "a wrong end tag " + std::string(tag);
      open.pop_back();
    } else {
      if (open.empty() && hadRoot)
        return "two roots";
      hadRoot = true;
      if (!tag.ends_with('/'))
        open.push_back(name);
    }
    xml.remove_prefix(end + 1);
  }
  return open.empty() ? "" : "no end of " + open.back();
}

} // namespace planewright

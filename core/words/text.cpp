// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/text.h"

#include "core/words/decimal_sign.h"

#include <cassert>

namespace planewright {

Text Text::with(Text argument) const {
  Text result = *this;
  result.arguments.push_back(std::move(argument));
  return result;
}

Text Text::with(std::string_view words) const {
  return with(planewright::verbatim(words));
}

Text verbatim(std::string_view words) {
  return {"", std::string(words), {}};
}

Text symbol(std::string_view source) {
  return {"Symbol", std::string(source), {}};
}

namespace {

void append(Runs& result, std::string_view words, bool lowered) {
  if (words.empty())
    return;
  if (result.empty() || result.back().lowered != lowered)
    result.push_back({std::string(words), lowered});
  else
    result.back().text += words;
}

void render(Runs& result, const Text& text, const Translate& translate, bool lowered) {
  if (text.context.empty() || text.context == numberContext) {
    append(result, text.context.empty() ? text.source : withDecimalSign(text.source), lowered);
    return;
  }
  const std::string source = translate ? translate(text.context, text.source) : text.source;
  bool index = lowered;
  for (std::size_t i = 0; i < source.size(); ++i) {
    if (source[i] == '%' && i + 1 < source.size() && source[i + 1] >= '1' && source[i + 1] <= '9') {
      const auto which = static_cast<std::size_t>(source[++i] - '1');
      assert(which < text.arguments.size());
      render(result, text.arguments[which], translate, index);
    } else if (source.compare(i, 2, "_{") == 0) {
      index = true;
      ++i;
    } else if (index && !lowered && source[i] == '}') {
      index = false;
    } else {
      append(result, std::string_view(source).substr(i, 1), index);
    }
  }
}

} // namespace

Runs runs(const Text& text, const Translate& translate) {
  Runs result;
  render(result, text, translate, false);
  return result;
}

std::string plain(const Runs& runs) {
  std::string result;
  for (const Run& run : runs)
    result += run.text;
  return result;
}

std::string plain(const Text& text, const Translate& translate) {
  return plain(runs(text, translate));
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/arrangement.h"

#include <algorithm>

namespace planewright {

template <>
const std::vector<Named<Arrangement>>& namesOf<Arrangement>() {
  static const std::vector<Named<Arrangement>> names = {
      {Arrangement::byWidth, "by-width", PW_TEXT("Figure", "as the width allows")},
      {Arrangement::beside, "beside", PW_TEXT("Figure", "elements and circle beside one another")},
      {Arrangement::below, "below", PW_TEXT("Figure", "elements and circle one below another")}};
  return names;
}

template <>
const std::vector<Named<FigureBlock>>& namesOf<FigureBlock>() {
  static const std::vector<Named<FigureBlock>> names = {
      {FigureBlock::elements, "elements", PW_TEXT("Figure", "elements")},
      {FigureBlock::circle, "circle", PW_TEXT("Figure", "circle")},
      {FigureBlock::planes, "planes", PW_TEXT("Figure", "table of planes")},
      {FigureBlock::check, "check", PW_TEXT("Figure", "check and utilisation")}};
  return names;
}

namespace {

Problem blockProblem(std::string_view word, const Text& what) {
  return {"order",
          0,
          0,
          std::string(word),
          what.with(std::string(word)),
          PW_TEXT("Figure", "Take each of these at most once, with commas between: %1.")
              .with(listOf(usualBlocks))};
}

} // namespace

Result<FigureBlocks> blocksIn(std::string_view list) {
  std::vector<FigureBlock> named;
  for (std::size_t from = 0; from <= list.size();) {
    const std::size_t end = std::min(list.find(',', from), list.size());
    const std::string_view word = list.substr(from, end - from);
    const std::optional<FigureBlock> block = fromWord<FigureBlock>(word);
    if (!block)
      return tl::unexpected(blockProblem(word, PW_TEXT("Figure", "“%1” names no part of the order.")));
    if (std::ranges::find(named, *block) != named.end())
      return tl::unexpected(blockProblem(word, PW_TEXT("Figure", "“%1” stands twice in the order.")));
    named.push_back(*block);
    from = end + 1;
  }
  for (const FigureBlock block : usualBlocks)
    if (std::ranges::find(named, block) == named.end())
      named.push_back(block);
  FigureBlocks blocks = usualBlocks;
  std::ranges::copy(named, blocks.begin());
  return blocks;
}

std::string listOf(const FigureBlocks& blocks) {
  std::string list;
  for (const FigureBlock block : blocks)
    list += (list.empty() ? "" : ",") + std::string(wordOf(block));
  return list;
}

} // namespace planewright

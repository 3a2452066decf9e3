// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"
#include "core/words/problem.h"

#include <array>
#include <string>

namespace planewright {

/// How the elements and the circle of a figure stand to one another.
enum class Arrangement {
  byWidth, ///< beside one another from leastWidthBeside on, else one below another
  beside,
  below ///< given and turned element beside one another, the circle in a row of its own
};
template <>
const std::vector<Named<Arrangement>>& namesOf<Arrangement>();
inline constexpr double leastWidthBeside = 130; ///< mm of figure for elements and circle in one row

/// What a figure is stacked from, between its title and its conventions.
enum class FigureBlock { elements, circle, planes, check };
template <>
const std::vector<Named<FigureBlock>>& namesOf<FigureBlock>();

/// Every block once, the uppermost first. Elements and circle beside one another stand where the first of
/// them is named, and that one to the left.
using FigureBlocks = std::array<FigureBlock, 4>;
inline constexpr FigureBlocks usualBlocks = {FigureBlock::elements, FigureBlock::circle, FigureBlock::planes,
                                             FigureBlock::check};

/// The blocks of a list "circle,planes"; those that it leaves out follow as usual. A Problem, with the place
/// "order", for a word that names no block or comes twice.
Result<FigureBlocks> blocksIn(std::string_view list);
/// Such a list of all of them.
std::string listOf(const FigureBlocks& blocks);

} // namespace planewright

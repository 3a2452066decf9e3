// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/section.h"

namespace planewright {

/// How two blocks of a built section lie to each other.
enum class Contact { apart, touching, overlapping };

/// By the axes of separation of two rectangles; gaps and overlaps up to 1e-9 of the larger block count as
/// touching. Touching along an edge or part of one: what meets in a
/// point counts as apart, since a point holds nothing.
Contact contactOf(const Block& a, const Block& b);

/// The numbers (from 1) of the blocks that no chain of touching blocks joins to the first.
std::vector<int> looseBlocks(const std::vector<Block>& blocks);

} // namespace planewright

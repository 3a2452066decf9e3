// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/region.h"

namespace planewright {

/// The bodies of a section where its sizes put them: the bottom at y = 0, the middle of the width at z = 0
/// (the back of the web of a channel); a circle about the origin; blocks where they were placed.
std::vector<Piece> piecesOf(const Section& section);

/// A piece around a contour, with its extents.
Piece pieceOf(Text name, Contour contour, Piece::Kind kind);

} // namespace planewright

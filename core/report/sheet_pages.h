// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet.h"

namespace planewright {

enum class Paper { a4, letter };
template <>
const std::vector<Named<Paper>>& namesOf<Paper>();

/// The sheet set on pages, each a Picture in mm of exactly the size of the paper: title block with "n of m",
/// body, foot with caution, identity of the study and how the two routes agree. Headings stay with what
/// follows, tables repeat their head, a paragraph leaves no single line behind.
std::vector<Picture> pagesOf(const Sheet& sheet, Paper paper, const Translate& translate = {});

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/carried_texts.h"

#include <string>

namespace planewright {

/// True for bytes that begin as a PNG does.
bool isPng(std::string_view bytes);

/// The PNG with one more chunk of plain text before its end.
std::string pngWithText(std::string png, std::string_view text);

/// The texts in such chunks. Walks from chunk to chunk by their lengths and looks at nothing else.
CarriedTexts textsInPng(std::string_view bytes);

} // namespace planewright

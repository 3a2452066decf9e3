// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

namespace planewright {

/// A text for XML and HTML, between tags or inside a quoted attribute: & < > " ' as entities, line ends and
/// tabs as blanks. Characters that XML does not allow are left out; bytes that are not UTF-8 become U+FFFD.
std::string markupOf(std::string_view text);

/// A text for HTML with its indices in <sub>.
std::string markupOf(const Text& text, const Translate& translate = {});

} // namespace planewright

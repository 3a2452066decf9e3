// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/carried_texts.h"

#include <string>

namespace planewright {

/// An SVG document with the text in its metadata.
std::string svgWithText(std::string svg, std::string_view text);
/// An HTML document with the text in a script that no browser runs or shows.
std::string htmlWithText(std::string html, std::string_view text);
/// Metadata of a PDF (XMP, ISO 16684-1) with the text, to be stored unpacked.
std::string xmpWithText(std::string_view text);

/// The texts in SVG and HTML. Finds the start of our element by its name, whatever prefix another program
/// gave it, and takes what stands up to the next tag; reads no markup beyond that.
CarriedTexts textsInMarkup(std::string_view bytes);
/// The texts in the metadata of a PDF, found likewise.
CarriedTexts textsInPdf(std::string_view bytes);

} // namespace planewright

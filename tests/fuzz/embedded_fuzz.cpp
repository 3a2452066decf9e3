// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a file that carries a study: what comes back is no longer than is read, what is refused
// says why. Then carries the input itself in every kind of file and gets it back as it was.
#include "core/record/embedded_study.h"

#include "core/record/study_file.h"
#include "tests/fuzz/promises.h"

#include <cstdint>

using namespace planewright;

namespace {

void checkRead(std::string_view bytes) {
  const std::optional<Result<std::string>> carried = carriedStudy(bytes);
  if (carried && *carried)
    require((*carried)->size() <= std::min(bytes.size(), greatestStudyFile));
  else if (carried)
    requireWords(carried->error());
  const Results<OpenedStudy> opened = openedStudy(bytes);
  if (opened) {
    require(opened->isRestored == carried.has_value());
    return;
  }
  require(!opened.error().empty());
  for (const Problem& problem : opened.error())
    requireWords(problem);
}

void checkCarried(std::string_view study) {
  // The end of a PNG is all that a study needs to stand before.
  const std::string png("\x89PNG\r\n\x1A\n\0\0\0\0IEND\xAE\x42\x60\x82", 20);
  for (const Result<std::string>& bytes :
       {svgWithStudy("<svg></svg>", study), pngWithStudy(png, study),
        htmlWithStudy("<html><body></body></html>", study),
        xmpWithStudy(study).map([](const std::string& xmp) { return "%PDF-1.4\n" + xmp; })}) {
    require(bytes.has_value());
    const std::optional<Result<std::string>> again = carriedStudy(*bytes);
    require(again && *again && **again == study);
  }
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  const std::string_view bytes(reinterpret_cast<const char*>(data), size);
  checkRead(bytes);
  checkCarried(bytes);
  return 0;
}

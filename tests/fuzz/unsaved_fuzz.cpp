// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as an unsaved study. What is taken writes and reads back equal; what is refused is refused
// with Problems.
#include "core/record/unsaved_study.h"

#include "tests/fuzz/promises.h"

#include <cstdint>

using namespace planewright;

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  const Results<UnsavedStudy> unsaved = readUnsaved({reinterpret_cast<const char*>(data), size});
  if (unsaved)
    require(readUnsaved(writeUnsaved(*unsaved)) == unsaved);
  else
    require(!unsaved.error().empty());
  return 0;
}

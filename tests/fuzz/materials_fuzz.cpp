// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a file of materials. What is taken writes and reads back equal and can be taken into a
// study as it stands; what is refused is refused with Problems that point into the input.
#include "core/record/materials_file.h"

#include "core/study/edit.h"
#include "tests/fuzz/promises.h"

#include <cstdint>

using namespace planewright;

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  const std::string_view bytes(reinterpret_cast<const char*>(data), size);
  const Results<std::vector<Material>> materials = readMaterials(bytes);
  if (!materials) {
    requireWithin(materials.error(), bytes);
    return 0;
  }
  const std::string written = writeMaterials(*materials);
  require(readMaterials(written) == materials);
  Study study = newStudy();
  study.materials = *materials;
  require(problemsIn(study).empty());
  return 0;
}

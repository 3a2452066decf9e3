// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a study file. What is taken writes and reads back equal and can be resolved; what is
// refused is refused with Problems that point into the input.
#include "core/record/json.h"
#include "core/record/readout_file.h"
#include "core/record/study_file.h"
#include "core/study/edit.h"
#include "tests/fuzz/promises.h"

#include <cstdint>

using namespace planewright;

namespace {

void checkStudy(const Study& study) {
  require(problemsIn(study).empty());
  const std::string bytes = writeStudy(study);
  const Results<Study> again = readStudy(bytes);
  require(again && *again == study);
  require(writeStudy(*again) == bytes);
}

void checkReadout(const Study& study) {
  const std::vector<Readout> readouts = {evaluate(study)};
  const std::string json = readoutJson(study, readouts);
  FileProblems problems(json);
  require(readJson(problems) && problems.empty());
  require(!readoutCsv(study, readouts).empty() && !readoutText(study, readouts).empty());
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
  const std::string_view bytes(reinterpret_cast<const char*>(data), size);
  const Results<Study> study = readStudy(bytes);
  if (study) {
    checkStudy(*study);
    checkReadout(*study);
    return 0;
  }
  requireWithin(study.error(), bytes);
  return 0;
}

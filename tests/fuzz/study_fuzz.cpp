// SPDX-License-Identifier: GPL-3.0-or-later
// Reads the input as a study file. What is taken writes and reads back equal and can be resolved; what is
// refused is refused with Problems that point into the input.
#include "core/record/json.h"
#include "core/record/readout_file.h"
#include "core/record/study_file.h"
#include "core/study/edit.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <cstdint>
#include <cstdlib>

using namespace planewright;

namespace {

void require(bool condition) {
  if (!condition)
    std::abort();
}

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

void checkProblem(const Problem& problem, int lines) {
  require(problem.line >= 1 && problem.line <= lines && problem.column >= 1);
  require(!problem.what.empty());
  const std::string words = plain(problem);
  require(isUtf8(words));
  require(std::none_of(words.begin(), words.end(), [](unsigned char c) { return c < 0x20 || c == 0x7F; }));
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
  require(!study.error().empty() && study.error().size() <= 100);
  const auto lines = static_cast<int>(std::count(bytes.begin(), bytes.end(), '\n')) + 1;
  for (const Problem& problem : study.error())
    checkProblem(problem, lines);
  return 0;
}

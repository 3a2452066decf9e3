// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/study_source.h"

#include "core/record/embedded_study.h"
#include "ui/files/file_bytes.h"

#include <filesystem>

#include <unistd.h>

namespace planewright {

namespace {

Outcome<std::string> bytesIn(const std::string& file) {
  const bool isInput = file == "-";
  Result<std::string> bytes =
      isInput ? bytesFrom(STDIN_FILENO, greatestCarrier, "standard input") : bytesOf(file, greatestCarrier);
  if (bytes)
    return *std::move(bytes);
  return tl::unexpected(failedToRead(file, std::move(bytes).error()));
}

} // namespace

Failure failedToRead(const std::string& file, Problem problem) {
  std::error_code failed;
  const bool isThere = file == "-" || std::filesystem::is_regular_file(file, failed);
  return {isThere ? Exit::machineFailed : Exit::wrongUse, {std::move(problem)}};
}

Outcome<Study> studyIn(const std::string& file) {
  Outcome<std::string> bytes = bytesIn(file);
  if (!bytes)
    return tl::unexpected(std::move(bytes).error());
  Results<OpenedStudy> opened = openedStudy(*bytes);
  if (opened)
    return std::move(opened->study);
  Problems problems = std::move(opened).error();
  for (Problem& problem : problems)
    problem.place = problem.place.empty() ? file : file + ": " + problem.place;
  return tl::unexpected(Failure{Exit::wrongUse, std::move(problems)});
}

std::string studyNameOf(const std::string& file) {
  return file == "-" ? std::string() : std::filesystem::path(file).stem().string();
}

} // namespace planewright

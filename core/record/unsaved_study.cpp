// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/unsaved_study.h"

#include "core/record/base64.h"
#include "core/record/file_head.h"
#include "core/record/json_writer.h"
#include "core/record/object_reader.h"
#include "core/record/study_file.h"
#include "core/study/edit.h"

#include <algorithm>

namespace planewright {

namespace {

/// A path, or nothing where it has characters that a file of texts cannot have.
std::string_view kept(std::string_view path) {
  const auto isControl = [](char c) { return static_cast<unsigned char>(c) < ' ' && c != '\n' && c != '\t'; };
  return std::ranges::any_of(path, isControl) ? std::string_view() : path;
}

std::string written(const UnsavedStudy& unsaved, std::string_view saved) {
  JsonWriter json;
  json.beginObject();
  json.key("format").text(unsavedFormat);
  json.key("version").whole(unsavedFileVersion);
  json.key("file").text(kept(unsaved.file));
  json.key("restored_from").text(kept(unsaved.restoredFrom));
  json.key("written").text(unsaved.written);
  json.key("saved").text(base64Lines(saved)); // byte for byte, whatever its line ends
  json.key("study").text(writeStudy(unsaved.study));
  json.endObject();
  return json.taken();
}

} // namespace

Study studyBefore(const UnsavedStudy& unsaved) {
  return readStudy(unsaved.saved).value_or(newStudy());
}

std::string writeUnsaved(const UnsavedStudy& unsaved) {
  std::string bytes = written(unsaved, unsaved.saved);
  return bytes.size() <= greatestStudyFile ? bytes : written(unsaved, {});
}

Results<UnsavedStudy> readUnsaved(std::string_view bytes) {
  FileProblems problems(bytes);
  const std::optional<Json> root = readJson(problems);
  if (!root)
    return tl::unexpected(problems.taken());
  checkHead(*root,
            {unsavedFormat, unsavedFileVersion,
             PW_TEXT("File", "This is not an unsaved study of Planewright."),
             PW_TEXT("File", "A file of an unsaved study begins with \"format\": \"%1\".")},
            problems);
  if (!problems.empty())
    return tl::unexpected(problems.taken());
  Reading reading{problems};
  ObjectReader object(*root, {}, reading);
  object.value("format");
  object.value("version");
  UnsavedStudy unsaved;
  std::string study;
  std::string saved;
  object.text("file", unsaved.file);
  object.text("restored_from", unsaved.restoredFrom);
  object.neededText("written", unsaved.written);
  object.text("saved", saved);
  object.neededText("study", study);
  object.refuseUnread();
  const std::optional<std::string> savedBytes = bytesOfBase64(saved);
  if (!savedBytes)
    problems.add(0, "saved", PW_TEXT("File", "The bytes of the saved file are no base64."));
  if (!problems.empty())
    return tl::unexpected(problems.taken());
  unsaved.saved = *savedBytes;
  Results<Study> read = readStudy(study);
  if (!read)
    return tl::unexpected(std::move(read).error());
  unsaved.study = *std::move(read);
  return unsaved;
}

} // namespace planewright

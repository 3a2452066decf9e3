// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/file_head.h"

#include "core/record/typed_texts.h"

#include <charconv>

namespace planewright {

namespace {

Problem refused(std::string place, Text what, Text mend = {}) {
  return {std::move(place), 0, 0, {}, std::move(what), std::move(mend)};
}

} // namespace

void checkHead(const Json& root, const FileHead& head, FileProblems& problems) {
  if (nameIn(root, "format") != head.format) {
    const JsonMember* format = root.kind == Json::Kind::object ? member(root, "format") : nullptr;
    problems.add(format ? format->value.offset : root.offset,
                 refused("format", head.isNone, head.mend.with(head.format)));
    return;
  }
  const JsonMember* version = member(root, "version");
  if (!version) {
    problems.add(root.offset, refused("version", PW_TEXT("File", "The version of the file is missing."),
                                      PW_TEXT("File", "Write \"version\": 1.")));
    return;
  }
  const Json& value = version->value;
  int number = 0;
  const char* end = value.text.data() + value.text.size();
  const auto [parsed, error] = std::from_chars(value.text.data(), end, number);
  const bool isWhole = value.kind == Json::Kind::number && parsed == end;
  if (isWhole && (error == std::errc::result_out_of_range || number > head.version))
    problems.add(value.offset, "version",
                 PW_TEXT("File", "This file has version %1; this program reads version 1.").with(value.text),
                 PW_TEXT("File", "Open it with a newer Planewright; the file is left as it is."));
  else if (!isWhole || number < 1)
    problems.add(value.offset, "version", PW_TEXT("File", "The version of a file is a whole number from 1."),
                 PW_TEXT("File", "Write \"version\": 1."));
}

} // namespace planewright

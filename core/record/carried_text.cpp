// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/carried_text.h"

#include "core/quantity/format.h"
#include "core/record/base64.h"
#include "core/record/crc32.h"
#include "core/record/study_file.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <charconv>
#include <functional>

namespace planewright {

namespace {

constexpr int carriedVersion = 1;

/// Takes the next word from the front of `text`; empty at its end.
std::string_view nextWord(std::string_view& text) {
  const auto* const start = std::ranges::find_if_not(text, isBlank);
  const auto* const end = std::find_if(start, text.end(), isBlank);
  text = {end, static_cast<std::size_t>(text.end() - end)};
  return {start, static_cast<std::size_t>(end - start)};
}

/// The whole number that a word is; none for every other word.
std::optional<std::size_t> wholeNumber(std::string_view word) {
  std::size_t number = 0;
  const char* const end = word.data() + word.size();
  const auto read = std::from_chars(word.data(), end, number);
  return read.ec == std::errc() && read.ptr == end ? std::optional(number) : std::nullopt;
}

Problem told(Text what, Text mend) {
  return {"", 0, 0, "", std::move(what), std::move(mend)};
}

Problem studyTooNew(std::size_t version) {
  return told(PW_TEXT("File", "The study in this file is carried in form %1; this program reads form 1.")
                  .with(exactNumber(static_cast<double>(version))),
              PW_TEXT("File", "Open it with a newer Planewright."));
}

Problem studyTooLarge() {
  return {"without-study",
          0,
          0,
          "",
          PW_TEXT("File", "The study is too large to travel inside another file."),
          PW_TEXT("File", "Leave the study out of it.")};
}

} // namespace

Problem noStudyCarried() {
  return told(PW_TEXT("File", "This file carries no study."),
              PW_TEXT("File", "Open the study itself, or a figure that was saved with the study inside."));
}

Problem studyCutOff() {
  return told(PW_TEXT("File", "This file is cut off, and with it the study inside."),
              PW_TEXT("File", "Take the whole file again from where it came."));
}

Problem studyChanged() {
  return told(PW_TEXT("File", "The study inside this file was changed after it was saved."),
              PW_TEXT("File", "Open the file as Planewright saved it, or the study itself."));
}

Problem studiesDiffer() {
  return told(PW_TEXT("File", "This file carries more than one study."),
              PW_TEXT("File", "Open one of the figures that it was put together from."));
}

Problem carrierTooLarge() {
  return told(PW_TEXT("File", "This file is too large: a study is looked for in files of up to 64 MB."),
              PW_TEXT("File", "Open the study itself."));
}

Result<std::string> carriedText(std::string_view study) {
  if (study.size() > greatestStudyFile)
    return tl::unexpected(studyTooLarge());
  return exactNumber(carriedVersion) + " " + exactNumber(static_cast<double>(study.size())) + " " +
         hexadecimal(crc32(study), 8) + "\n" + base64Lines(study);
}

Result<std::string> studyOfCarriedText(std::string_view text) {
  const std::optional<std::size_t> version = wholeNumber(nextWord(text));
  if (version && *version > carriedVersion)
    return tl::unexpected(studyTooNew(*version));
  const std::optional<std::size_t> size = wholeNumber(nextWord(text));
  const std::string_view checksum = nextWord(text);
  if (text.empty())
    return tl::unexpected(studyCutOff());
  if (version != carriedVersion || !size || *size > greatestStudyFile)
    return tl::unexpected(studyChanged());
  std::optional<std::string> bytes = bytesOfBase64(text);
  if (bytes && bytes->size() == *size && checksum == hexadecimal(crc32(*bytes), 8))
    return *std::move(bytes);
  const auto characters = static_cast<std::size_t>(std::ranges::count_if(text, std::not_fn(isBlank)));
  return tl::unexpected(characters < base64Size(*size) ? studyCutOff() : studyChanged());
}

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/embedded_study.h"

#include "core/record/base64.h"
#include "core/record/carried_text.h"
#include "core/record/markup_study.h"
#include "core/record/png_study.h"
#include "core/record/study_file.h"

#include <algorithm>

namespace planewright {

namespace {

/// What a file carries by its first bytes; none for one that is no carrier.
std::optional<CarriedTexts> textsIn(std::string_view bytes) {
  if (isPng(bytes))
    return textsInPng(bytes);
  if (bytes.starts_with("%PDF-"))
    return textsInPdf(bytes);
  constexpr std::string_view byteOrderMark = "\xEF\xBB\xBF";
  const std::string_view text = bytes.substr(bytes.starts_with(byteOrderMark) ? byteOrderMark.size() : 0);
  const auto* const first = std::ranges::find_if_not(text, isBlank);
  return first != text.end() && *first == '<' ? std::optional(textsInMarkup(bytes)) : std::nullopt;
}

Result<std::string> oneStudyOf(const CarriedTexts& found) {
  std::optional<std::string> study;
  for (const std::string_view text : found.texts) {
    Result<std::string> one = studyOfCarriedText(text);
    if (!one)
      return one;
    if (study && *study != *one)
      return tl::unexpected(studiesDiffer());
    study = *std::move(one);
  }
  if (study)
    return *std::move(study);
  switch (found.state) {
  case CarriedTexts::State::cutOff:
    return tl::unexpected(studyCutOff());
  case CarriedTexts::State::changed:
    return tl::unexpected(studyChanged());
  case CarriedTexts::State::whole:
    break;
  }
  return tl::unexpected(noStudyCarried());
}

} // namespace

Result<std::string> svgWithStudy(std::string svg, std::string_view study) {
  return carriedText(study).map([&](const std::string& text) { return svgWithText(std::move(svg), text); });
}

Result<std::string> pngWithStudy(std::string png, std::string_view study) {
  return carriedText(study).map([&](const std::string& text) { return pngWithText(std::move(png), text); });
}

Result<std::string> htmlWithStudy(std::string html, std::string_view study) {
  return carriedText(study).map([&](const std::string& text) { return htmlWithText(std::move(html), text); });
}

Result<std::string> xmpWithStudy(std::string_view study) {
  return carriedText(study).map([](const std::string& text) { return xmpWithText(text); });
}

std::optional<Result<std::string>> carriedStudy(std::string_view bytes) {
  const std::optional<CarriedTexts> found = textsIn(bytes.substr(0, greatestCarrier));
  if (!found)
    return std::nullopt;
  if (bytes.size() > greatestCarrier)
    return tl::unexpected(carrierTooLarge());
  return oneStudyOf(*found);
}

std::string studyOfFigure(Study study, const Readout& readout) {
  study.shown = {readout.point, readout.state().combination};
  return writeStudy(study);
}

Results<OpenedStudy> openedStudy(std::string_view bytes) {
  const std::optional<Result<std::string>> carried = carriedStudy(bytes);
  if (carried && !*carried)
    return tl::unexpected(Problems{carried->error()});
  Results<Study> study = readStudy(carried ? **carried : bytes);
  if (study)
    return OpenedStudy{*std::move(study), carried.has_value()};
  if (carried)
    for (Problem& problem : study.error())
      problem.line = problem.column = 0;
  return tl::unexpected(std::move(study).error());
}

} // namespace planewright

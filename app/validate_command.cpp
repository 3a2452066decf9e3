// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/validate_command.h"

#include "app/help.h"
#include "app/naming.h"
#include "app/offscreen.h"
#include "core/evidence/evidence_count.h"
#include "core/report/evidence_sheet.h"
#include "core/report/sheet_html.h"
#include "core/report/sheet_pages.h"
#include "core/report/sheet_text.h"
#include "ui/files/platform_name.h"
#include "ui/paint/export.h"

#include <array>

namespace planewright {

namespace {

/// By the ending of the file's name; text for any other.
Outcome<std::string> reportOf(const std::vector<CheckResult>& checks, const std::string& file) {
  const auto sheet = [&] { return evidenceSheet(checks, platformName()); };
  if (hasEnding(file, ".html") || hasEnding(file, ".htm"))
    return sheetHtml(sheet());
  if (!hasEnding(file, ".pdf"))
    return sheetText(sheet());
  const std::vector<Picture> pages = pagesOf(sheet(), Paper::a4);
  return paintedOffscreen([&] { return pdfOfPages(pages, Palette::paper); });
}

} // namespace

Outcome<Delivery> validated(std::span<const std::string> words) {
  constexpr std::array known = {OptionRow{"-o"}};
  const Result<Arguments> arguments = argumentsOf(words, known, 0);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{validateHelp()};
  const Result<std::string> file = outputOf(*arguments);
  if (!file)
    return wrongUse(file.error());
  const Results<std::vector<CheckResult>> checks = publishedChecks();
  if (!checks)
    return tl::unexpected(Failure{Exit::disagrees, checks.error()});
  Outcome<std::string> bytes = reportOf(*checks, *file);
  if (!bytes)
    return tl::unexpected(std::move(bytes).error());
  Delivery delivery{*std::move(bytes), *file};
  delivery.facts = wordsOfCount(*checks);
  if (countOf(*checks).disagreeing > 0)
    delivery.exit = Exit::disagrees;
  return delivery;
}

} // namespace planewright

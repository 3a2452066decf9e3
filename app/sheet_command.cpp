// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/sheet_command.h"

#include "app/help.h"
#include "app/naming.h"
#include "app/offscreen.h"
#include "app/study_source.h"
#include "app/verdict_facts.h"
#include "core/record/embedded_study.h"
#include "core/record/study_file.h"
#include "core/report/make_sheet.h"
#include "core/report/sheet_html.h"
#include "core/report/sheet_pages.h"
#include "core/report/sheet_text.h"
#include "ui/look/look.h"
#include "ui/paint/export.h"

#include <algorithm>
#include <array>

namespace planewright {

namespace {

using Takes = OptionRow::Takes;

constexpr std::array known = {OptionRow{"-o"},
                              OptionRow{"--point", Takes::manyValues},
                              OptionRow{"--depth"},
                              OptionRow{"--since"},
                              OptionRow{"--paper"},
                              OptionRow{"--language"},
                              OptionRow{"--decimal"},
                              OptionRow{"--without-figures", Takes::nothing},
                              OptionRow{"--without-study", Takes::nothing}};

enum class SheetKind { html, pdf, text };

/// What the options ask for, before the study is read.
struct Wanted {
  std::string file;
  SheetKind kind = SheetKind::html;
  Paper paper = Paper::a4;
  bool carriesStudy = true;
  SheetOrder order;
};

/// By the ending of the file's name; standard output takes HTML.
Result<SheetKind> kindOf(const std::string& file) {
  if (hasEnding(file, ".pdf"))
    return SheetKind::pdf;
  if (hasEnding(file, ".txt"))
    return SheetKind::text;
  if (file == "-" || hasEnding(file, ".html") || hasEnding(file, ".htm"))
    return SheetKind::html;
  return tl::unexpected(Problem{"-o", 0, 0, file,
                                PW_TEXT("Command", "The ending of “%1” names no kind of sheet.").with(file),
                                PW_TEXT("Command", "End the name with .pdf, .html or .txt.")});
}

Result<Wanted> wantedBy(const Arguments& arguments) {
  if (arguments.operands.empty())
    return tl::unexpected(Problem{"", 0, 0, "", PW_TEXT("Command", "No study is given."),
                                  PW_TEXT("Command", "Write planewright sheet STUDY -o FILE.pdf.")});
  if (!arguments.has("-o"))
    return tl::unexpected(Problem{"-o", 0, 0, "", PW_TEXT("Command", "No file is given for the sheet."),
                                  PW_TEXT("Command", "Write -o FILE.pdf or -o FILE.html.")});
  const Result<std::string> file = outputOf(arguments);
  if (!file)
    return tl::unexpected(file.error());
  const Result<SheetKind> kind = kindOf(*file);
  if (!kind)
    return tl::unexpected(kind.error());
  const Result<Depth> depth = wordOfOption("--depth", arguments.valueOf("--depth"), Depth::governing);
  if (!depth)
    return tl::unexpected(depth.error());
  if (arguments.has("--paper") && kind != SheetKind::pdf)
    return tl::unexpected(Problem{"--paper", 0, 0, *arguments.valueOf("--paper"),
                                  PW_TEXT("Command", "Only a PDF has a paper."),
                                  PW_TEXT("Command", "Leave out --paper, or end the name with .pdf.")});
  const Result<Paper> paper = wordOfOption("--paper", arguments.valueOf("--paper"), Paper::a4);
  if (!paper)
    return tl::unexpected(paper.error());
  Wanted wanted{*file, *kind, *paper, !arguments.has("--without-study"), {}};
  wanted.order.depth = *depth;
  wanted.order.figures = !arguments.has("--without-figures");
  wanted.order.studyName = studyNameOf(arguments.operands.front());
  if (auto problem = readVoice(arguments, wanted.order))
    return tl::unexpected(*std::move(problem));
  for (const GivenOption& option : arguments.options)
    if (option.name == "--point")
      wanted.order.points.push_back(option.value);
  return wanted;
}

Outcome<std::string> bytesOf(const Study& study, const Sheet& sheet, const Wanted& wanted) {
  if (wanted.kind == SheetKind::text)
    return sheetText(sheet, wanted.order.translate);
  const std::string carried = wanted.carriesStudy ? writeStudy(study) : std::string();
  if (wanted.kind == SheetKind::pdf) {
    const std::vector<Picture> pages = pagesOf(sheet, wanted.paper, wanted.order.translate);
    return paintedOffscreen([&] { return pdfOfPages(pages, Palette::paper, carried); });
  }
  if (carried.empty())
    return sheetHtml(sheet, wanted.order.translate);
  Result<std::string> html = htmlWithStudy(sheetHtml(sheet, wanted.order.translate), carried);
  if (!html)
    return wrongUse(std::move(html).error());
  return *std::move(html);
}

} // namespace

Outcome<Delivery> writtenSheet(std::span<const std::string> words) {
  const Result<Arguments> arguments = argumentsOf(words, known, 1);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{sheetHelp()};
  const Result<Wanted> wanted = wantedBy(*arguments);
  if (!wanted)
    return wrongUse(wanted.error());
  const Outcome<Study> study = studyIn(arguments->operands.front());
  if (!study)
    return tl::unexpected(study.error());
  for (const std::string& name : wanted->order.points)
    if (std::optional<Problem> problem = missingPoint(*study, name))
      return wrongUse(*std::move(problem));
  SheetOrder order = wanted->order;
  if (const std::string* earlier = arguments->valueOf("--since")) {
    Outcome<Study> since = studyIn(*earlier);
    if (!since)
      return tl::unexpected(std::move(since).error());
    order.earlier = *std::move(since);
    order.earlierName = studyNameOf(*earlier);
  }
  const std::vector<Readout> points = readoutsOf(*study, order.points);
  const Sheet sheet = sheetOf(*study, points, order);
  Outcome<std::string> bytes = bytesOf(*study, sheet, *wanted);
  if (!bytes)
    return tl::unexpected(std::move(bytes).error());
  Delivery delivery{*std::move(bytes), wanted->file};
  addVerdict(delivery, points);
  if (sheet.disagrees) {
    delivery.exit = Exit::disagrees;
    delivery.facts.push_back(sheet.routes);
  }
  return delivery;
}

} // namespace planewright

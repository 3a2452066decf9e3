// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/figure_command.h"

#include "app/help.h"
#include "app/naming.h"
#include "app/offscreen.h"
#include "app/study_source.h"
#include "core/figure/figure.h"
#include "core/figure/svg.h"
#include "core/quantity/expression.h"
#include "core/record/embedded_study.h"
#include "ui/paint/export.h"

#include <algorithm>
#include <array>
#include <charconv>

namespace planewright {

namespace {

using Takes = OptionRow::Takes;

constexpr std::array known = {OptionRow{"-o"},
                              OptionRow{"--point"},
                              OptionRow{"--combination"},
                              OptionRow{"--width"},
                              OptionRow{"--text"},
                              OptionRow{"--mono", Takes::nothing},
                              OptionRow{"--dpi"},
                              OptionRow{"--without-study", Takes::nothing}};

constexpr int usualDpi = 300;

enum class PictureKind { svg, pdf, png };

/// What the options ask for, before the study is read.
struct Wanted {
  std::string file;
  PictureKind kind = PictureKind::svg;
  int dpi = usualDpi;
  bool carriesStudy = true;
  FigureOrder order;
};

/// By the ending of the file's name; standard output takes SVG.
Result<PictureKind> kindOf(const std::string& file) {
  if (file == "-" || hasEnding(file, ".svg"))
    return PictureKind::svg;
  if (hasEnding(file, ".pdf"))
    return PictureKind::pdf;
  if (hasEnding(file, ".png"))
    return PictureKind::png;
  return tl::unexpected(Problem{"-o", 0, 0, file,
                                PW_TEXT("Command", "The ending of “%1” names no kind of picture.").with(file),
                                PW_TEXT("Command", "End the name with .svg, .pdf or .png.")});
}

/// The number of an option in `unit`, or what stands in `value` without it.
std::optional<Problem> readNumber(const Arguments& arguments, const char* option, const Unit& unit,
                                  double& value) {
  const std::string* text = arguments.valueOf(option);
  if (!text)
    return std::nullopt;
  Result<Entry> entry = readEntry(*text, {unit.dimension, unit, Slopes::none});
  if (!entry) {
    entry.error().place = option;
    return std::move(entry).error();
  }
  value = entry->value;
  return std::nullopt;
}

std::optional<Problem> readDpi(const Arguments& arguments, Wanted& wanted) {
  const std::string* text = arguments.valueOf("--dpi");
  if (!text)
    return std::nullopt;
  if (wanted.kind != PictureKind::png)
    return Problem{"--dpi",
                   0,
                   0,
                   *text,
                   PW_TEXT("Command", "Only a PNG has a resolution; SVG and PDF are drawn with lines."),
                   PW_TEXT("Command", "Leave out --dpi, or end the name of the output with .png.")};
  const char* end = text->data() + text->size();
  const auto read = std::from_chars(text->data(), end, wanted.dpi);
  if (read.ec == std::errc() && read.ptr == end)
    return std::nullopt;
  return Problem{"--dpi",
                 0,
                 0,
                 *text,
                 PW_TEXT("Command", "“%1” is not a whole number.").with(*text),
                 PW_TEXT("Command", "Write the resolution as a whole number, for instance 300.")};
}

Result<Wanted> wantedBy(const Arguments& arguments) {
  if (arguments.operands.empty())
    return tl::unexpected(Problem{"", 0, 0, "", PW_TEXT("Command", "No study is given."),
                                  PW_TEXT("Command", "Write planewright figure STUDY -o FILE.svg.")});
  if (!arguments.has("-o"))
    return tl::unexpected(Problem{"-o", 0, 0, "", PW_TEXT("Command", "No file is given for the figure."),
                                  PW_TEXT("Command", "Write -o FILE.svg, -o FILE.pdf or -o FILE.png.")});
  Wanted wanted;
  const Result<std::string> file = outputOf(arguments);
  if (!file)
    return tl::unexpected(file.error());
  wanted.file = *file;
  const Result<PictureKind> kind = kindOf(wanted.file);
  if (!kind)
    return tl::unexpected(kind.error());
  wanted.kind = *kind;
  wanted.carriesStudy = !arguments.has("--without-study");
  wanted.order.mono = arguments.has("--mono");
  wanted.order.studyName = studyNameOf(arguments.operands.front());
  const Unit mm{"mm", dimension::length, 1, 1};
  if (auto problem = readNumber(arguments, "--width", mm, wanted.order.width))
    return tl::unexpected(*std::move(problem));
  if (auto problem = readNumber(arguments, "--text", Unit{}, wanted.order.textPoints))
    return tl::unexpected(*std::move(problem));
  if (auto problem = readDpi(arguments, wanted))
    return tl::unexpected(*std::move(problem));
  return wanted;
}

/// The readout of the point and combination that the options name, else of those that the study shows.
Result<Readout> readoutOf(const Study& study, const Arguments& arguments) {
  const std::string* point = arguments.valueOf("--point");
  if (point)
    if (std::optional<Problem> problem = missingPoint(study, *point))
      return tl::unexpected(*std::move(problem));
  Readout readout = point ? evaluate(study, *point) : evaluate(study);
  const std::string* combination = arguments.valueOf("--combination");
  if (!combination)
    return readout;
  std::vector<std::string> names;
  names.reserve(readout.states.size());
  for (const StateReading& state : readout.states)
    names.push_back(state.combination);
  const auto at = std::ranges::find(names, *combination);
  if (at == names.end())
    return tl::unexpected(unknownName("--combination", *combination, names));
  readout.shown = static_cast<std::size_t>(at - names.begin());
  return readout;
}

Result<std::string> svgOf(const Picture& picture, Palette palette, const std::string& study) {
  std::string svg = svgOf(picture, palette);
  return study.empty() ? svg : svgWithStudy(std::move(svg), study);
}

/// The picture as a file, with a study inside unless its bytes are empty.
Outcome<std::string> bytesOf(const Picture& picture, const Wanted& wanted, const std::string& study) {
  const Palette palette = paletteOf(wanted.order);
  if (wanted.kind == PictureKind::pdf)
    return paintedOffscreen([&] { return pdfOf(picture, palette, study); });
  if (wanted.kind == PictureKind::png)
    return paintedOffscreen([&] { return pngOf(picture, palette, wanted.dpi, study); });
  Result<std::string> svg = svgOf(picture, palette, study);
  if (!svg) {
    svg.error().place.insert(0, "--");
    return wrongUse(std::move(svg).error());
  }
  return *std::move(svg);
}

} // namespace

Outcome<Delivery> drawnFigure(std::span<const std::string> words) {
  const Result<Arguments> arguments = argumentsOf(words, known, 1);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{figureHelp(), "-"};
  const Result<Wanted> wanted = wantedBy(*arguments);
  if (!wanted)
    return wrongUse(wanted.error());
  const Outcome<Study> study = studyIn(arguments->operands.front());
  if (!study)
    return tl::unexpected(study.error());
  const Result<Readout> readout = readoutOf(*study, *arguments);
  if (!readout)
    return wrongUse(readout.error());
  Result<Picture> picture = figureOf(*study, *readout, wanted->order);
  if (!picture) {
    picture.error().place.insert(0, "--"); // its places are called like the options
    return wrongUse(std::move(picture).error());
  }
  const std::string carried = wanted->carriesStudy ? studyOfFigure(*study, *readout) : std::string();
  Outcome<std::string> bytes = bytesOf(*picture, *wanted, carried);
  if (!bytes)
    return tl::unexpected(std::move(bytes).error());
  return Delivery{*std::move(bytes), wanted->file};
}

} // namespace planewright

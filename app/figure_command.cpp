// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/figure_command.h"

#include "app/figure_folder.h"
#include "app/help.h"
#include "app/naming.h"
#include "app/offscreen.h"
#include "app/study_source.h"
#include "core/figure/figure.h"
#include "core/quantity/expression.h"
#include "ui/figure/figure_sharing.h"
#include "ui/look/look.h"

#include <algorithm>
#include <array>
#include <charconv>

namespace planewright {

namespace {

using Takes = OptionRow::Takes;

constexpr std::array known = {OptionRow{"-o"},
                              OptionRow{"--folder"},
                              OptionRow{"--format"},
                              OptionRow{"--replace", Takes::nothing},
                              OptionRow{"--point", Takes::manyValues},
                              OptionRow{"--combination"},
                              OptionRow{"--width"},
                              OptionRow{"--text"},
                              OptionRow{"--mono", Takes::nothing},
                              OptionRow{"--arrange"},
                              OptionRow{"--order"},
                              OptionRow{"--dpi"},
                              OptionRow{"--language"},
                              OptionRow{"--decimal"},
                              OptionRow{"--without-study", Takes::nothing}};

constexpr int usualDpi = 300;

/// What the options ask for, before the study is read.
struct Wanted {
  std::string file;   ///< of one figure
  std::string folder; ///< of one figure for each point; empty for one figure
  std::vector<std::string> points;
  FigureFormat format = FigureFormat::svg;
  int dpi = usualDpi;
  bool carriesStudy = true;
  FigureOrder order;
};

/// By the ending of the file's name; standard output takes SVG.
Result<FigureFormat> formatOf(const std::string& file) {
  if (file == "-" || hasEnding(file, ".svg"))
    return FigureFormat::svg;
  if (hasEnding(file, ".pdf"))
    return FigureFormat::pdf;
  if (hasEnding(file, ".png"))
    return FigureFormat::png;
  return tl::unexpected(Problem{"-o", 0, 0, file,
                                PW_TEXT("Command", "The ending of “%1” names no kind of picture.").with(file),
                                PW_TEXT("Command", "End the name with .svg, .pdf or .png.")});
}

/// By its word; SVG without one.
Result<FigureFormat> formatNamed(const std::string* word) {
  if (!word)
    return FigureFormat::svg;
  for (const FigureFormat format : {FigureFormat::svg, FigureFormat::pdf, FigureFormat::png})
    if (*word == endingOf(format))
      return format;
  return tl::unexpected(Problem{"--format", 0, 0, *word,
                                PW_TEXT("Command", "“%1” names no kind of picture.").with(*word),
                                PW_TEXT("Command", "Take svg, pdf or png.")});
}

/// One file, or one for each point in a folder.
std::optional<Problem> readDestination(const Arguments& arguments, Wanted& wanted) {
  for (const GivenOption& option : arguments.options)
    if (option.name == "--point")
      wanted.points.push_back(option.value);
  if (const std::string* folder = arguments.valueOf("--folder")) {
    if (arguments.has("-o"))
      return Problem{"--folder",
                     0,
                     0,
                     *folder,
                     PW_TEXT("Command", "One figure goes to a file, those of several points to a folder."),
                     PW_TEXT("Command", "Leave out -o or --folder.")};
    wanted.folder = *folder;
    const Result<FigureFormat> format = formatNamed(arguments.valueOf("--format"));
    if (!format)
      return format.error();
    wanted.format = *format;
    return std::nullopt;
  }
  if (!arguments.has("-o"))
    return Problem{"-o",
                   0,
                   0,
                   "",
                   PW_TEXT("Command", "No file is given for the figure."),
                   PW_TEXT("Command", "Write -o FILE.svg, -o FILE.pdf or -o FILE.png, or --folder FOLDER.")};
  for (const char* option : {"--format", "--replace"})
    if (arguments.has(option))
      return Problem{option,
                     0,
                     0,
                     "",
                     PW_TEXT("Command", "The option %1 belongs to --folder.").with(option),
                     PW_TEXT("Command", "Leave it out: the ending of the file says the kind, and the file is "
                                        "replaced.")};
  if (wanted.points.size() > 1)
    return Problem{"--point",
                   0,
                   0,
                   wanted.points[1],
                   PW_TEXT("Command", "One file holds the figure of one point."),
                   PW_TEXT("Command", "Write --folder FOLDER for several.")};
  Result<std::string> file = outputOf(arguments);
  if (!file)
    return std::move(file).error();
  wanted.file = *std::move(file);
  const Result<FigureFormat> format = formatOf(wanted.file);
  if (!format)
    return format.error();
  wanted.format = *format;
  return std::nullopt;
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
  if (wanted.format != FigureFormat::png)
    return Problem{"--dpi",
                   0,
                   0,
                   *text,
                   PW_TEXT("Command", "Only a PNG has a resolution; SVG and PDF are drawn with lines."),
                   PW_TEXT("Command", "Leave out --dpi, or ask for a PNG.")};
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

std::optional<Problem> readArrangement(const Arguments& arguments, FigureOrder& order) {
  const Result<Arrangement> arrangement =
      wordOfOption("--arrange", arguments.valueOf("--arrange"), order.arrangement);
  if (!arrangement)
    return arrangement.error();
  order.arrangement = *arrangement;
  const std::string* list = arguments.valueOf("--order");
  if (!list)
    return std::nullopt;
  Result<FigureBlocks> blocks = blocksIn(*list);
  if (!blocks) {
    blocks.error().place.insert(0, "--");
    return std::move(blocks).error();
  }
  order.blocks = *blocks;
  return std::nullopt;
}

Result<Wanted> wantedBy(const Arguments& arguments) {
  if (arguments.operands.empty())
    return tl::unexpected(Problem{"", 0, 0, "", PW_TEXT("Command", "No study is given."),
                                  PW_TEXT("Command", "Write planewright figure STUDY -o FILE.svg.")});
  Wanted wanted;
  if (auto problem = readDestination(arguments, wanted))
    return tl::unexpected(*std::move(problem));
  wanted.carriesStudy = !arguments.has("--without-study");
  wanted.order.mono = arguments.has("--mono");
  wanted.order.studyName = studyNameOf(arguments.operands.front());
  if (auto problem = readVoice(arguments, wanted.order))
    return tl::unexpected(*std::move(problem));
  if (auto problem = readArrangement(arguments, wanted.order))
    return tl::unexpected(*std::move(problem));
  const Unit mm{"mm", dimension::length, 1, 1};
  if (auto problem = readNumber(arguments, "--width", mm, wanted.order.width))
    return tl::unexpected(*std::move(problem));
  if (auto problem = readNumber(arguments, "--text", Unit{}, wanted.order.textPoints))
    return tl::unexpected(*std::move(problem));
  if (auto problem = readDpi(arguments, wanted))
    return tl::unexpected(*std::move(problem));
  return wanted;
}

Result<std::size_t> stateNamed(const Readout& readout, const std::string& combination) {
  std::vector<std::string> names;
  names.reserve(readout.states.size());
  for (const StateReading& state : readout.states)
    names.push_back(state.combination);
  const auto at = std::ranges::find(names, combination);
  if (at == names.end())
    return tl::unexpected(unknownName("--combination", combination, names));
  return static_cast<std::size_t>(at - names.begin());
}

/// The readout of the point and combination that the options name, else of those that the study shows.
Result<Readout> readoutOf(const Study& study, const Wanted& wanted, const std::string* combination) {
  Readout readout = wanted.points.empty() ? evaluate(study) : evaluate(study, wanted.points.front());
  if (!combination)
    return readout;
  const Result<std::size_t> state = stateNamed(readout, *combination);
  if (!state)
    return tl::unexpected(state.error());
  readout.shown = *state;
  return readout;
}

FigureSettings settingsOf(const Wanted& wanted) {
  return {wanted.order.parts,       wanted.order.width,  wanted.order.textPoints, wanted.order.mono,
          wanted.order.arrangement, wanted.order.blocks, wanted.format,           wanted.dpi,
          wanted.carriesStudy};
}

FigureBatch batchOf(const Study& study, const Wanted& wanted, const std::string& file) {
  FigureBatch batch;
  batch.study = study;
  batch.settings = settingsOf(wanted);
  if (file != "-")
    batch.studyFile = QString::fromStdString(file);
  batch.points = wanted.points;
  if (batch.points.empty())
    for (const Point& point : study.points)
      batch.points.push_back(point.name);
  return batch;
}

/// The picture as a file, with the study inside where that is wanted.
Outcome<std::string> bytesOf(const Picture& picture, const Wanted& wanted, const Study& study,
                             const Readout& readout) {
  const auto paint = [&] { return fileBytes(picture, settingsOf(wanted), study, readout); };
  if (wanted.format != FigureFormat::svg)
    return paintedOffscreen(paint);
  Result<QByteArray> svg = paint();
  if (!svg) {
    svg.error().place.insert(0, "--");
    return wrongUse(std::move(svg).error());
  }
  return svg->toStdString();
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
  for (const std::string& name : wanted->points)
    if (std::optional<Problem> problem = missingPoint(*study, name))
      return wrongUse(*std::move(problem));
  const Result<Readout> readout = readoutOf(*study, *wanted, arguments->valueOf("--combination"));
  if (!readout)
    return wrongUse(readout.error());
  if (!wanted->folder.empty()) {
    FigureBatch batch = batchOf(*study, *wanted, arguments->operands.front());
    if (arguments->has("--combination"))
      batch.state = readout->shown;
    return writtenFigures(batch, wanted->folder, arguments->has("--replace"));
  }
  Result<Picture> picture = figureOf(*study, *readout, wanted->order);
  if (!picture) {
    picture.error().place.insert(0, "--"); // its places are called like the options
    return wrongUse(std::move(picture).error());
  }
  Outcome<std::string> bytes = bytesOf(*picture, *wanted, *study, *readout);
  if (!bytes)
    return tl::unexpected(std::move(bytes).error());
  return Delivery{*std::move(bytes), wanted->file};
}

} // namespace planewright

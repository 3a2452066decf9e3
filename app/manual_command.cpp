// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/manual_command.h"

#include "app/help.h"
#include "app/naming.h"
#include "app/output_folder.h"
#include "ui/files/file_bytes.h"
#include "ui/look/language.h"
#include "ui/manual/manual.h"
#include "ui/manual/manual_web.h"

#include <array>

namespace planewright {

namespace {

constexpr std::array known = {OptionRow{"-o"}, OptionRow{"--language"},
                              OptionRow{"--replace", OptionRow::Takes::nothing}};

Result<OutputFolder> folderOf(const Arguments& arguments) {
  const std::string* folder = arguments.valueOf("-o");
  if (folder && *folder != "-")
    return OutputFolder{"-o", *folder};
  return tl::unexpected(Problem{"-o", 0, 0, folder ? *folder : "",
                                PW_TEXT("Command", "No folder is given for the handbook."),
                                PW_TEXT("Command", "Write planewright manual -o FOLDER.")});
}

/// The program speaks it too, for what it fills in.
Result<QString> languageOf(const Arguments& arguments) {
  const std::string* wanted = arguments.valueOf("--language");
  if (!wanted)
    return manualLanguage();
  if (auto problem = speakAs(wanted))
    return tl::unexpected(*std::move(problem));
  const QStringList there = manualLanguages();
  if (const QString language = QString::fromStdString(*wanted); there.contains(language)) {
    speak(language); // what the program itself says of criteria
    return language;
  }
  return tl::unexpected(Problem{
      "--language", 0, 0, *wanted, PW_TEXT("Command", "The handbook is not there in “%1”.").with(*wanted),
      PW_TEXT("Command", "It is there in: %1.").with(there.join(QStringLiteral(", ")).toStdString())});
}

std::vector<std::string> namesOf(const std::vector<ManualFile>& files) {
  std::vector<std::string> names;
  names.reserve(files.size());
  for (const ManualFile& file : files)
    names.push_back(file.name.toStdString());
  return names;
}

Outcome<void> write(const std::vector<ManualFile>& files, const OutputFolder& folder) {
  for (const char* inner : {"", "pictures"})
    if (std::optional<Problem> problem = folder.make(inner))
      return machineFailed(*std::move(problem));
  for (const ManualFile& file : files)
    if (const Result<void> written =
            writeAside(folder.pathOf(file.name.toStdString()), file.bytes.toStdString());
        !written)
      return machineFailed(written.error());
  return {};
}

} // namespace

Outcome<Delivery> writtenManual(std::span<const std::string> words) {
  const Result<Arguments> arguments = argumentsOf(words, known, 0);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{manualHelp()};
  const Result<OutputFolder> folder = folderOf(*arguments);
  if (!folder)
    return wrongUse(folder.error());
  const Result<QString> language = languageOf(*arguments);
  if (!language)
    return wrongUse(language.error());
  const std::vector<ManualFile> files = webManual(*language);
  if (!arguments->has("--replace"))
    if (std::optional<Problem> problem = folder->existing(namesOf(files)))
      return wrongUse(*std::move(problem));
  if (const Outcome<void> written = write(files, *folder); !written)
    return tl::unexpected(written.error());
  return Delivery{folder->pathOf("index.html") + "\n"};
}

} // namespace planewright

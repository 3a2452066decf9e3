// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/naming.h"

#include "ui/look/language.h"

namespace planewright {

bool hasEnding(const std::string& file, std::string_view ending) {
  std::string lowered = file;
  for (char& letter : lowered)
    if (letter >= 'A' && letter <= 'Z')
      letter = static_cast<char>(letter - 'A' + 'a');
  return lowered.ends_with(ending);
}

Problem unknownName(const char* option, const std::string& name, const std::vector<std::string>& names) {
  std::string list;
  for (const std::string& one : names)
    list += (list.empty() ? "“" : ", “") + one + "”";
  return {option,
          0,
          0,
          name,
          PW_TEXT("Command", "The study has no “%1”.").with(name),
          PW_TEXT("Command", "It has: %1.").with(list)};
}

std::optional<Problem> missingPoint(const Study& study, const std::string& name) {
  if (findPoint(study, name))
    return std::nullopt;
  std::vector<std::string> names;
  names.reserve(study.points.size());
  for (const Point& point : study.points)
    names.push_back(point.name);
  return unknownName("--point", name, names);
}

std::optional<Problem> speakAs(const std::string* code) {
  if (!code || speak(QString::fromStdString(*code)))
    return std::nullopt;
  std::string codes;
  for (const Language& one : languages())
    codes += (codes.empty() ? "" : ", ") + one.code.toStdString();
  return Problem{"--language",
                 0,
                 0,
                 *code,
                 PW_TEXT("Command", "“%1” is no language of the program.").with(*code),
                 PW_TEXT("Command", "Take one of these: %1.").with(codes)};
}

} // namespace planewright

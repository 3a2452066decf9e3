// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/window_command.h"

#include "ui/shell/window_program.h"

#include <cstdlib>
#include <filesystem>

namespace planewright {

namespace {

bool isSet(const char* variable) {
  const char* value = std::getenv(variable);
  return value && *value;
}

bool hasDisplay() {
  return isSet("DISPLAY") || isSet("WAYLAND_DISPLAY") || isSet("QT_QPA_PLATFORM");
}

bool isCommand(const std::string& word) {
  for (const char* command : {"resolve", "figure", "sheet", "screen", "compare", "validate", "manual"})
    if (word == command)
      return true;
  return word.starts_with("-");
}

} // namespace

bool asksForWindow(std::span<const std::string> words) {
  std::error_code failed;
  return words.empty() || (!isCommand(words.front()) && std::filesystem::exists(words.front(), failed));
}

Outcome<int> shownWindow(int& argc, char** argv, std::span<const std::string> words) {
  if (words.size() > 1)
    return wrongUse({"", 0, 0, words[1], PW_TEXT("Command", "The word “%1” is one too many.").with(words[1]),
                     PW_TEXT("Command", "The window opens one study.")});
  if (!hasDisplay())
    return machineFailed({"", 0, 0, "", PW_TEXT("Command", "There is no display for the window."),
                          PW_TEXT("Command", "The commands resolve and figure need none; planewright --help "
                                             "explains them.")});
  return runWindow(argc, argv, words.empty() ? QString() : QString::fromStdString(words.front()));
}

} // namespace planewright

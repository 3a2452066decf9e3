// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/compare_command.h"
#include "app/figure_command.h"
#include "app/help.h"
#include "app/manual_command.h"
#include "app/resolve_command.h"
#include "app/screen_command.h"
#include "app/sheet_command.h"
#include "app/validate_command.h"
#include "app/window_command.h"
#include "ui/files/file_bytes.h"

#include <csignal>

#include <fcntl.h>
#include <unistd.h>

namespace planewright {
namespace {

using Words = std::span<const std::string>;

/// A closed standard stream must not become the number of the next file that is opened: output would land in
/// that file. Opened for reading only, writing to it still fails and is noticed.
void keepStandardStreams() {
  for (const int stream : {STDIN_FILENO, STDOUT_FILENO, STDERR_FILENO})
    if (::fcntl(stream, F_GETFD) < 0)
      static_cast<void>(::open("/dev/null", O_RDONLY));
}

Outcome<Delivery> alone(std::string text, Words rest) {
  if (rest.empty())
    return Delivery{std::move(text), "-"};
  return wrongUse({"", 0, 0, rest.front(),
                   PW_TEXT("Command", "The word “%1” is one too many.").with(rest.front()),
                   PW_TEXT("Command", "Write planewright COMMAND --help for one command.")});
}

Problem unknownWord(const std::string& word) {
  return {"",
          0,
          0,
          word,
          PW_TEXT("Command", "“%1” is neither a command nor a file.").with(word),
          PW_TEXT("Command", "The commands are resolve, figure, sheet, screen, compare, validate and manual; "
                             "planewright --help explains them.")};
}

Outcome<Delivery> commanded(Words words) {
  const std::string& first = words.front();
  const Words rest = words.subspan(1);
  if (first == "resolve")
    return resolved(rest);
  if (first == "figure")
    return drawnFigure(rest);
  if (first == "sheet")
    return writtenSheet(rest);
  if (first == "screen")
    return screenedField(rest);
  if (first == "compare")
    return comparedStudies(rest);
  if (first == "validate")
    return validated(rest);
  if (first == "manual")
    return writtenManual(rest);
  if (first == "--help")
    return alone(programHelp(), rest);
  if (first == "--version")
    return alone(programVersionLines(), rest);
  return wrongUse(unknownWord(first));
}

/// Says each on standard error, and the text below them; gives the number of the exit.
template <class Said>
int ended(Exit exit, const std::vector<Said>& said, const std::string& text = {}) {
  std::string lines;
  for (const Said& one : said)
    lines += "planewright: " + plain(one) + "\n";
  static_cast<void>(writeTo(STDERR_FILENO, lines + text, ""));
  return static_cast<int>(exit);
}

int run(Words words) {
  std::signal(SIGPIPE, SIG_IGN);
  const Outcome<Delivery> delivery = commanded(words);
  if (!delivery)
    return ended(delivery.error().exit, delivery.error().problems);
  if (const Outcome<void> outcome = delivered(*delivery); !outcome)
    return ended(outcome.error().exit, outcome.error().problems);
  return ended(delivery->exit, delivery->facts, delivery->said);
}

} // namespace
} // namespace planewright

int main(int argc, char** argv) {
  using namespace planewright;
  keepStandardStreams();
  const std::vector<std::string> words(argv + 1, argv + argc);
  if (!asksForWindow(words))
    return run(words);
  const Outcome<int> status = shownWindow(argc, argv, words);
  return status ? *status : ended(status.error().exit, status.error().problems);
}

// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/offscreen.h"

#include "ui/files/descriptor.h"
#include "ui/files/file_bytes.h"
#include "ui/look/font.h"

#include <QGuiApplication>

#include <clocale>

#include <fcntl.h>
#include <unistd.h>

namespace planewright {

namespace {

Problem fontProblem() {
  return {"",
          0,
          0,
          "",
          PW_TEXT("Command", "The program's own font does not load, so no figure can be made."),
          PW_TEXT("Command", "Install Planewright again, or make the figure as SVG.")};
}

/// Standard error as it was before it was silenced; Qt's last words go there.
int spoken = STDERR_FILENO;

void hear(QtMsgType type, const QMessageLogContext&, const QString& message) {
  if (type != QtFatalMsg)
    return;
  // Qt ends the process after this; a command ends with its own exit code.
  const Problem problem{
      "",
      0,
      0,
      "",
      PW_TEXT("Command", "The figure cannot be painted here: %1").with(message.toStdString()),
      PW_TEXT("Command", "Install Planewright again, or make the figure as SVG.")};
  static_cast<void>(writeTo(spoken, "planewright: " + plain(problem) + "\n", ""));
  ::_exit(static_cast<int>(Exit::machineFailed));
}

/// Standard error leads nowhere while this lives: the libraries under Qt write to it on their own.
class Silence {
public:
  Silence() : m_before(::fcntl(STDERR_FILENO, F_DUPFD_CLOEXEC, STDERR_FILENO + 1)) {
    const Descriptor nowhere(::open("/dev/null", O_WRONLY | O_CLOEXEC));
    if (m_before && nowhere && ::dup2(nowhere.number(), STDERR_FILENO) >= 0)
      spoken = m_before.number();
    qInstallMessageHandler(hear);
  }
  ~Silence() {
    if (m_before)
      ::dup2(m_before.number(), STDERR_FILENO);
    spoken = STDERR_FILENO;
  }
  Silence(const Silence&) = delete;
  Silence& operator=(const Silence&) = delete;

private:
  Descriptor m_before;
};

} // namespace

Outcome<std::string> paintedOffscreen(const std::function<Result<QByteArray>()>& paint) {
  const Silence silence;
  qputenv("QT_QPA_PLATFORM", "offscreen");
  qunsetenv("QT_QPA_PLATFORMTHEME");
  int count = 1;
  char name[] = "planewright";
  char* words[] = {name, nullptr};
  const QGuiApplication application(count, words);
  std::setlocale(LC_NUMERIC, "C");
  if (!loadProgramFont())
    return machineFailed(fontProblem());
  Result<QByteArray> bytes = paint();
  if (bytes)
    return bytes->toStdString();
  // A place says that an option was out of range; painting itself has none.
  Problem problem = std::move(bytes).error();
  if (problem.place.empty())
    return machineFailed(std::move(problem));
  problem.place.insert(0, "--");
  return wrongUse(std::move(problem));
}

} // namespace planewright

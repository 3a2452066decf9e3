// SPDX-License-Identifier: GPL-3.0-or-later
// What it costs from the start of the program until its window is painted for the first time, beside a window
// that holds one label: German is taken up and unsaved studies are looked for. Offscreen, settings in a
// folder of its own. Each start is a process; its processor time counts, which on an idle machine is nearly
// the time that passes.
#include "tests/bench/samples.h"

#include "ui/look/font.h"
#include "ui/look/language.h"
#include "ui/shell/appearance.h"
#include "ui/shell/main_window.h"

#include <QApplication>
#include <QLabel>
#include <QTemporaryDir>
#include <QTimer>

#include <sys/resource.h>
#include <sys/wait.h>
#include <unistd.h>

#include <cstdio>
#include <cstring>

namespace planewright {
namespace {

constexpr int starts = 15;
constexpr double ratioLimit = 2;

/// Ends the process when the window was painted and nothing is left to do for it: taking it down is no part
/// of a start.
class FirstPaint : public QObject {
public:
  explicit FirstPaint(QWidget& window) { window.installEventFilter(this); }

protected:
  bool eventFilter(QObject*, QEvent* event) override {
    if (event->type() == QEvent::Paint)
      QTimer::singleShot(0, QCoreApplication::instance(), [] { _exit(0); });
    return false;
  }
};

int showAndEnd(QWidget& window) {
  const FirstPaint end(window);
  window.resize(1400, 900);
  window.show();
  return QApplication::exec();
}

int startMinimal() {
  QMainWindow window;
  window.setCentralWidget(new QLabel(QStringLiteral("minimal")));
  return showAndEnd(window);
}

int startWhole() {
  QCoreApplication::setOrganizationName(QStringLiteral("planewright"));
  QCoreApplication::setApplicationName(QStringLiteral("planewright"));
  if (!loadProgramFont())
    return 3;
  speak(QStringLiteral("de"));
  dressApplication();
  MainWindow window;
  window.offerUnsaved();
  return showAndEnd(window);
}

double inMs(const timeval& time) {
  return 1e3 * static_cast<double>(time.tv_sec) + 1e-3 * static_cast<double>(time.tv_usec);
}

/// Starts this program anew and waits for its end; false when it fails.
bool start(Samples& samples, const char* program, const char* what) {
  const pid_t child = fork();
  if (child == 0) {
    execl(program, program, what, nullptr);
    _exit(127);
  }
  int status = 0;
  rusage usage{};
  if (child < 0 || wait4(child, &status, 0, &usage) != child || !WIFEXITED(status) ||
      WEXITSTATUS(status) != 0)
    return false;
  samples.add(inMs(usage.ru_utime) + inMs(usage.ru_stime));
  return true;
}

int compareStarts(const char* program) {
  const QTemporaryDir home; // no settings of the user are read or written
  for (const char* variable :
       {"HOME", "XDG_CONFIG_HOME", "XDG_DATA_HOME", "XDG_STATE_HOME", "XDG_RUNTIME_DIR"})
    qputenv(variable, home.path().toLocal8Bit());
  Samples minimal("a window with one label");
  Samples whole("the program");
  for (int i = 0; i < starts; ++i)
    if (!start(minimal, program, "minimal") || !start(whole, program, "whole")) {
      std::fputs("a start failed\n", stderr);
      return 3;
    }
  const double ratio = whole.median() / minimal.median();
  std::printf("start to first paint, ms: %s %.1f, %s %.1f; ratio %.2f, limit %.1f\n", minimal.name().c_str(),
              minimal.median(), whole.name().c_str(), whole.median(), ratio, ratioLimit);
  return ratio <= ratioLimit ? 0 : 1;
}

} // namespace
} // namespace planewright

int main(int argc, char** argv) {
  qputenv("QT_QPA_PLATFORM", "offscreen");
  if (argc < 2)
    return planewright::compareStarts("/proc/self/exe");
  QApplication application(argc, argv);
  return std::strcmp(argv[1], "minimal") == 0 ? planewright::startMinimal() : planewright::startWhole();
}

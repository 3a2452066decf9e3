// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/window_program.h"

#include "ui/look/font.h"
#include "ui/look/language.h"
#include "ui/shell/appearance.h"
#include "ui/shell/main_window.h"

#include <QApplication>
#include <QMessageBox>

#include <clocale>

namespace planewright {

int runWindow(int& argc, char** argv, const QString& path) {
  QApplication application(argc, argv);
  // Qt takes up the locale of the environment; numbers of C functions stay with their decimal point.
  std::setlocale(LC_NUMERIC, "C");
  QCoreApplication::setOrganizationName(QStringLiteral("planewright"));
  QCoreApplication::setApplicationName(QStringLiteral("planewright"));
  QGuiApplication::setApplicationDisplayName({});
  // By this a desktop knows which entry and icon the window belongs to.
  QGuiApplication::setDesktopFileName(QStringLiteral("planewright"));
  if (!loadProgramFont()) {
    QMessageBox::critical(nullptr, QStringLiteral("Planewright"),
                          QCoreApplication::translate("Program",
                                                      "The program's own font does not load. The program "
                                                      "is damaged: build or install it again."));
    return 3;
  }
  speak(languageOfWindow());
  dressApplication();
  MainWindow window;
  window.show();
  if (!path.isEmpty())
    window.open(path);
  window.offerUnsaved();
  return QApplication::exec();
}

} // namespace planewright

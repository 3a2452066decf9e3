// SPDX-License-Identifier: GPL-3.0-or-later
// manual_pictures FOLDER: opens the window with the worked example and writes a picture of each part that the
// manual shows. Light, without a display, with settings of its own.
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/given/given_panel.h"
#include "ui/look/font.h"
#include "ui/look/strip.h"
#include "ui/planes/planes_panel.h"
#include "ui/screen/field_setup.h"
#include "ui/screen/screen_dialog.h"
#include "ui/sheet/sheet_dialog.h"
#include "ui/shell/appearance.h"
#include "ui/shell/main_window.h"
#include "ui/strength/strength_panel.h"

#include <QApplication>
#include <QClipboard>
#include <QDialog>
#include <QElapsedTimer>
#include <QFile>
#include <QHash>
#include <QMenuBar>
#include <QPushButton>
#include <QSettings>
#include <QTemporaryDir>

#include <algorithm>
#include <clocale>
#include <cmath>
#include <cstdio>
#include <functional>

namespace planewright {
namespace {

/// Lets the window do what it does beside, until it is done.
void settle(
    const std::function<bool()>& isDone = [] { return false; }, int most = 300) {
  QElapsedTimer time;
  time.start();
  while (!isDone() && time.elapsed() < most)
    QApplication::processEvents(QEventLoop::AllEvents, 20);
}

/// An invented field: a plate of 24 m by 12 m with bending in its middle and a steep corner.
QByteArray inventedField() {
  QByteArray table =
      "point,region,x [m],y [m],sx G,sy G,txy G,sx S,sy S,txy S,sx W,sy W,txy W,sx M,sy M,txy M\n";
  constexpr int columns = 97;
  constexpr int rows = 49;
  for (int row = 0; row < rows; ++row)
    for (int column = 0; column < columns; ++column) {
      const double x = 24.0 * column / (columns - 1);
      const double y = 12.0 * row / (rows - 1);
      const double middle = std::sin(x / 24 * 3.14159) * std::sin(y / 12 * 3.14159);
      const double corner = 1 / (0.6 + std::hypot(x - 24, y));
      const double along = 2.3 * middle + 0.4 * corner;
      const double across = 0.02 * middle + 0.05 * corner;
      const double shear = 0.25 * std::cos(x / 24 * 3.14159) + 0.2 * corner;
      const QString region = corner > 0.5 ? QStringLiteral("corner") : QStringLiteral("deck");
      QString line = QStringLiteral("n%1,%2,%3,%4").arg(row * columns + column + 1).arg(region).arg(x).arg(y);
      for (const double share : {1.0, 1.4, 0.2, 0.5})
        line += QStringLiteral(",%1,%2,%3")
                    .arg(share * along, 0, 'f', 4)
                    .arg(share * across, 0, 'f', 4)
                    .arg(share * shear, 0, 'f', 4);
      table += line.toUtf8() + '\n';
    }
  return table;
}

/// The colours that most of a picture has: 256 are enough for flat ones, and keep the files small.
QList<QRgb> commonColours(const QImage& image) {
  QHash<QRgb, int> counts;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      ++counts[image.pixel(x, y)];
  QList<QRgb> colours = counts.keys();
  std::ranges::sort(colours, [&](QRgb a, QRgb b) {
    return counts[a] != counts[b] ? counts[a] > counts[b] : a < b; // the same file from the same window
  });
  return colours.mid(0, 256);
}

class Pictures {
public:
  explicit Pictures(QString folder) : m_folder(std::move(folder)) {
    m_window.resize(1400, 880);
    m_window.show();
    m_window.openWorkedExample();
    settle();
    QWidget* focused = QApplication::focusWidget();
    if (focused)
      focused->clearFocus();
    m_window.welcome().hide();
    settle();
  }

  bool writeAll() {
    writeWindow();
    writeDialogs();
    writeField();
    return m_wrote;
  }

private:
  void write(const QString& name, QWidget& widget) {
    const QImage image = widget.grab().toImage().convertToFormat(QImage::Format_RGB32);
    const QString path = QStringLiteral("%1/%2.png").arg(m_folder, name);
    const bool wrote =
        image.convertToFormat(QImage::Format_Indexed8, commonColours(image), Qt::ThresholdDither)
            .save(path, "PNG", 0);
    if (!wrote)
      std::fprintf(stderr, "%s is not written\n", path.toUtf8().constData());
    m_wrote = m_wrote && wrote;
  }

  void writeWindow() {
    write(QStringLiteral("whole"), m_window);
    m_window.resize(1680, 780);
    settle();
    write(QStringLiteral("element"), m_window.element());
    write(QStringLiteral("circle"), m_window.circle());
    write(QStringLiteral("planes"), m_window.planes());
    write(QStringLiteral("strength"), m_window.strength());
    m_window.desk().show("P2 above the post", "1.35 G + 1.5 S");
    m_window.resize(1400, 840);
    settle();
    write(QStringLiteral("given"), m_window.given());
    m_window.desk().show("P1 lower edge near midspan", "1.35 G + 1.5 S");
  }

  void writeDialogs() {
    writeDialog("Study", "Combinations", QStringLiteral("combinations"), {640, 320});
    writeDialog("Study", "Materials", QStringLiteral("materials"), {900, 560});
    writeDialog("File", "Export figure", QStringLiteral("figure"), {1000, 720});
    QGuiApplication::clipboard()->setText(QStringLiteral("point\tcase\tsx [MPa]\tsy\ttxy\n"
                                                         "P5\tG\t-2.1\t0\t0.45\nP5\tS\t-3.4\t0\t0.7\n"
                                                         "P6\tG\t12 kN\t0\t0.2\nP6\tS\t1,5\t0\t0.3\n"));
    writeDialog("Edit", "Paste table", QStringLiteral("paste"), {760, 400});
    if (auto* sheet = qobject_cast<SheetDialog*>(opened("File", "Calculation sheet"))) {
      sheet->resize(1000, 720);
      settle([sheet] { return sheet->isUpToDate(); }, 20000);
      settle();
      write(QStringLiteral("sheet"), *sheet);
      sheet->close();
    }
  }

  void writeField() {
    QFile table(m_own.filePath(QStringLiteral("deck.csv")));
    if (!table.open(QIODevice::WriteOnly))
      return;
    table.write(inventedField());
    table.close();
    auto* field = qobject_cast<ScreenDialog*>(opened("File", "Screen points"));
    if (!field)
      return;
    field->resize(1080, 640);
    field->setup().setTable(table.fileName());
    settle();
    field->setup().start().click();
    settle([field] { return field->showsResults(); }, 20000);
    settle();
    m_wrote = m_wrote && field->showsResults();
    write(QStringLiteral("screen"), *field);
    field->close();
  }

  void writeDialog(const char* menu, const char* entry, const QString& name, QSize size) {
    QWidget* dialog = opened(menu, entry);
    m_wrote = m_wrote && dialog;
    if (!dialog)
      return;
    dialog->resize(size);
    settle();
    write(name, *dialog);
    dialog->close();
  }

  QWidget* opened(const char* menu, const char* entry) {
    const QWidgetList before = QApplication::topLevelWidgets();
    for (const QAction* one : m_window.menuBar()->actions())
      if (one->text().remove(QLatin1Char('&')) == QLatin1String(menu))
        for (QAction* action : one->menu()->actions())
          if (action->text().remove(QLatin1Char('&')).startsWith(QLatin1String(entry)))
            action->trigger();
    settle();
    for (QWidget* widget : QApplication::topLevelWidgets())
      if (!before.contains(widget) && widget->isVisible() && qobject_cast<QDialog*>(widget))
        return widget;
    std::fprintf(stderr, "%s, %s opens nothing\n", menu, entry);
    return nullptr;
  }

  QString m_folder;
  QTemporaryDir m_own;
  bool m_wrote = true;
  MainWindow m_window;
};

} // namespace
} // namespace planewright

int main(int argc, char** argv) {
  using namespace planewright;
  QApplication application(argc, argv);
  std::setlocale(LC_NUMERIC, "C");
  const QTemporaryDir settings;
  QCoreApplication::setOrganizationName(QStringLiteral("planewright-pictures"));
  QCoreApplication::setApplicationName(QStringLiteral("planewright-pictures"));
  QSettings::setDefaultFormat(QSettings::IniFormat);
  QSettings::setPath(QSettings::IniFormat, QSettings::UserScope, settings.path());
  if (argc != 2 || !loadProgramFont()) {
    std::fputs("manual_pictures FOLDER, and the embedded font loads\n", stderr);
    return 2;
  }
  chooseAppearance(Appearance::light);
  return Pictures(QString::fromLocal8Bit(argv[1])).writeAll() ? 0 : 1;
}

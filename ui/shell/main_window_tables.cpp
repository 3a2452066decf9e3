// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/copied_points.h"
#include "ui/shell/main_window.h"
#include "ui/shell/paste_dialog.h"

#include <QClipboard>
#include <QGuiApplication>

#include <algorithm>

namespace planewright {

void MainWindow::pasteTable() {
  settleDrafts();
  showTable(QGuiApplication::clipboard()->text().toStdString(), tr("Paste a table"));
}

void MainWindow::importPoints() {
  settleDrafts();
  if (std::optional<TableFile> file = m_filing->readTable())
    showTable(std::move(file->bytes), tr("Import points from %1").arg(file->name));
}

void MainWindow::showTable(std::string table, const QString& title) {
  auto* dialog = new PasteDialog(m_desk, std::move(table), title, this);
  dialog->open();
}

void MainWindow::copyStresses(const std::vector<Point>& points, const QString& said) {
  QGuiApplication::clipboard()->setText(QString::fromStdString(copiedPoints(points, '\t')));
  const auto hasMore = [](const Point& point) {
    return std::ranges::any_of(point.stress,
                               [](const CaseStress& one) { return one.pressure || one.rosette; });
  };
  m_desk.say(std::ranges::any_of(points, hasMore)
                 ? said + QLatin1Char(' ') + tr("Pressure and measured strains are not in the table.")
                 : said);
}

} // namespace planewright

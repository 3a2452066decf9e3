// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/copied_points.h"
#include "ui/shell/main_window.h"
#include "ui/shell/paste_dialog.h"
#include "ui/shell/table_words.h"

#include <QClipboard>
#include <QGuiApplication>

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
  m_desk.say(said + leftOutInWords(points));
}

} // namespace planewright

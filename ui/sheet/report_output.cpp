// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/report_output.h"

#include <QFileDialog>
#include <QFileInfo>
#include <QPrintDialog>
#include <QPrinter>

namespace planewright {

QString askedReportFile(QWidget* over, const QString& title, const QString& offered, const QString& kind) {
  QFileDialog dialog(over, title, offered, kind);
  dialog.setAcceptMode(QFileDialog::AcceptSave);
  dialog.setDefaultSuffix(QFileInfo(offered).suffix());
  dialog.selectFile(offered);
  return dialog.exec() == QDialog::Accepted ? dialog.selectedFiles().constFirst() : QString();
}

std::optional<Result<void>> printedByDialog(QWidget* over, Paper paper,
                                            const std::function<Result<void>(QPrinter&)>& print) {
  QPrinter printer(QPrinter::HighResolution);
  printer.setPageSize(QPageSize(paper == Paper::a4 ? QPageSize::A4 : QPageSize::Letter));
  QPrintDialog dialog(&printer, over);
  if (dialog.exec() != QDialog::Accepted)
    return std::nullopt;
  return print(printer);
}

} // namespace planewright

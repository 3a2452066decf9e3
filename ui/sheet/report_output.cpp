// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/report_output.h"

#include <QPrintDialog>
#include <QPrinter>

namespace planewright {

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

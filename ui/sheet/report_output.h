// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet_pages.h"

#include <QString>

#include <functional>
#include <optional>

class QPrinter;
class QWidget;

namespace planewright {

/// Asks for the file that a report goes to; empty when it is cancelled. `offered` ends with the ending that a
/// name typed without one gets; `kind` says it, as "PDF (*.pdf)".
QString askedReportFile(QWidget* over, const QString& title, const QString& offered, const QString& kind);

/// Asks for a printer and prints on it; none when it is cancelled.
std::optional<Result<void>> printedByDialog(QWidget* over, Paper paper,
                                            const std::function<Result<void>(QPrinter&)>& print);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/report/sheet_pages.h"
#include "core/words/problem.h"

#include <functional>
#include <optional>

class QPrinter;
class QWidget;

namespace planewright {

/// Asks for a printer and prints on it; none when it is cancelled.
std::optional<Result<void>> printedByDialog(QWidget* over, Paper paper,
                                            const std::function<Result<void>(QPrinter&)>& print);

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

#include <QDialog>

namespace planewright {

/// All that is wrong with a file, one line each; it can be copied. It lives as long as it is open.
class ProblemList : public QDialog {
  Q_OBJECT

public:
  ProblemList(const QString& heading, const Problems& problems, QWidget* parent);
};

} // namespace planewright

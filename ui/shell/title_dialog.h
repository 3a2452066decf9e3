// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QDialog>

namespace planewright {

/// The words of the title block and the name of the shown point, as fields over the study.
class TitleDialog : public QDialog {
  Q_OBJECT

public:
  TitleDialog(Desk& desk, QWidget* parent);
};

} // namespace planewright

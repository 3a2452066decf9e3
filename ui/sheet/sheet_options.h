// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/sheet/sheet_settings.h"

#include <QWidget>

class QCheckBox;
class QLabel;
class QListWidget;

namespace planewright {

/// The choices of a sheet: points, depth, figures, paper, whether the file carries the study.
class SheetOptions : public QWidget {
  Q_OBJECT

public:
  SheetOptions(Desk& desk, const SheetSettings& settings, QWidget* parent = nullptr);

  const SheetSettings& settings() const { return m_settings; }
  /// The names of the chosen points; empty: all.
  std::vector<std::string> points() const;
  QListWidget& pointList() const { return *m_points; }

signals:
  void changed();

private:
  void buildPoints();
  void listPoints();
  void buildDepth();
  void buildPaper();
  void buildCarrying();
  void tellCarrying();

  Desk& m_desk;
  SheetSettings m_settings;
  QListWidget* m_points = nullptr;
  QLabel* m_carryingWords = nullptr;
};

} // namespace planewright

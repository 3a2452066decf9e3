// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_map.h"

#include <QWidget>

namespace planewright {

/// The classes of a map with their ends, in as many rows as its width needs.
class MapLegend : public QWidget {
  Q_OBJECT

public:
  explicit MapLegend(QWidget* parent = nullptr);
  /// Shows these.
  void show(std::vector<MapClass> classes);

  QSize sizeHint() const override;
  bool hasHeightForWidth() const override { return true; }
  int heightForWidth(int width) const override;

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  struct Entry {
    MapClass mapClass;
    QRect room;
  };
  std::vector<Entry> laidOut(int width) const;

  std::vector<MapClass> m_classes;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/figure/figure_settings.h"

#include <QWidget>

class QListWidget;
class QPushButton;

namespace planewright {

/// How the parts of a figure stand: elements and circle to one another, and what comes first.
class FigureArrangement : public QWidget {
  Q_OBJECT

public:
  FigureArrangement(Arrangement arrangement, const FigureBlocks& blocks, QWidget* parent = nullptr);

  Arrangement arrangement() const { return m_arrangement; }
  FigureBlocks blocks() const;
  QListWidget& list() const { return *m_list; }

signals:
  void changed();

private:
  void move(int by);
  void allowMoves();

  Arrangement m_arrangement;
  QListWidget* m_list;
  QPushButton* m_earlier;
  QPushButton* m_later;
};

} // namespace planewright

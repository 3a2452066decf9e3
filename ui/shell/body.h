// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

class QSettings;
class QSplitter;

namespace planewright {

/// The panels that the body lays out.
struct Panels {
  QWidget* given = nullptr;
  QWidget* element = nullptr;
  QWidget* circle = nullptr;
  QWidget* planes = nullptr;
  QWidget* strength = nullptr; ///< stands beside the others only where there is room
};

/// The sizes that the body gives its panels until the user moves a splitter.
struct BodySizes {
  int given = 0;
  int element = 0;  ///< width
  int circle = 0;   ///< width
  int drawings = 0; ///< height of element and circle
  int planes = 0;   ///< height
  int strength = 0; ///< width; 0 where it has no column of its own
};

/// For a body of this size: Given 300 wide, 264 below 1100; Strength 340 from 1380 on; element to circle as
/// 48 to 52; the planes 35 % of the height, at least `leastPlanes`, and what the drawings do not need above
/// 900.
BodySizes sizesIn(QSize body, int leastPlanes);

/// Given at the left; element and circle over the planes at the right. Splitters between them, never at 0.
class Body : public QWidget {
  Q_OBJECT

public:
  Body(const Panels& panels, QWidget* parent);

  /// Keeps the sizes that the user chose, and takes them up again.
  void store(QSettings& settings) const;
  void restore(const QSettings& settings);
  /// Gives the panels the sizes of the window again.
  void resetSizes();

  /// Whether the body is wide enough for a column of strengths.
  bool hasRoomForStrength() const;

signals:
  void roomForStrengthChanged(bool room);

protected:
  void resizeEvent(QResizeEvent* event) override;

private:
  static QString keyOf(const QSplitter& splitter);
  void showStrength();
  QSplitter* splitter(Qt::Orientation orientation, const QString& name);
  QList<QSplitter*> splitters() const { return {m_columns, m_rows, m_drawings}; }

  QSplitter* m_columns;
  QSplitter* m_rows;
  QSplitter* m_drawings;
  QWidget* m_planes;
  QWidget* m_strength;
  bool m_hadRoom = false;
  QByteArray m_threeColumns; ///< sizes that the user chose with a column of strengths
  bool m_ownSizes = false;   ///< the user moved a splitter
};

} // namespace planewright

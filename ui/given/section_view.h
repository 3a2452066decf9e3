// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include "core/figure/section_drawing.h"

#include <QWidget>

namespace planewright {

/// The section of the shown point under the shown combination, with the mark of the fibre: pulled by the
/// mouse, or moved by the keys, the mark asks for another place of the fibre. It snaps to ready places.
class SectionView : public QWidget {
  Q_OBJECT

public:
  explicit SectionView(Desk& desk, QWidget* parent = nullptr);

  QSize sizeHint() const override { return {260, 190}; }
  QSize minimumSizeHint() const override { return {180, 150}; }
  /// Where a place of the section is seen; none where nothing is drawn.
  std::optional<QPointF> pointAt(double y, double z) const;

protected:
  void paintEvent(QPaintEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;

private:
  std::optional<LoadedSection> loaded() const;
  std::optional<SectionDrawing> drawing() const;
  void drag(QPointF to, Qt::KeyboardModifiers held);
  void place(const Fibre& fibre, Gesture gesture);
  void refresh();

  Desk& m_desk;
  std::optional<Gesture> m_drag;
  Edits m_before; ///< what Escape asks for while dragging
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <QStyledItemDelegate>

namespace planewright {

/// Paints the cells of a table of planes, the mark in front of each name, and edits them in place.
class PlaneDelegate : public QStyledItemDelegate {
  Q_OBJECT

public:
  using QStyledItemDelegate::QStyledItemDelegate;

  /// Where the text of a cell or heading stands.
  static QRectF textBox(const QRect& cell, int column);
  /// Room that a column needs for what stands in a cell, in bold.
  static int cellWidth(const QFont& font, const QModelIndex& index);
  static int rowHeight(const QFont& font);

  void paint(QPainter* painter, const QStyleOptionViewItem& option, const QModelIndex& index) const override;
  QWidget* createEditor(QWidget* parent, const QStyleOptionViewItem& option,
                        const QModelIndex& index) const override;
  void setEditorData(QWidget* editor, const QModelIndex& index) const override;
  void setModelData(QWidget* editor, QAbstractItemModel* model, const QModelIndex& index) const override;
  void updateEditorGeometry(QWidget* editor, const QStyleOptionViewItem& option,
                            const QModelIndex& index) const override;

signals:
  /// The choice at the end of a row was clicked.
  void noteClicked(const QModelIndex& index);

protected:
  bool eventFilter(QObject* object, QEvent* event) override;
  bool editorEvent(QEvent* event, QAbstractItemModel* model, const QStyleOptionViewItem& option,
                   const QModelIndex& index) override;
};

} // namespace planewright

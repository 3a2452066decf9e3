// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/pasted_columns.h"

#include <QHeaderView>

class QComboBox;

namespace planewright {

/// The headings of a table that is pasted, with a list above each from which its meaning is chosen.
class PasteHeader : public QHeaderView {
  Q_OBJECT

public:
  explicit PasteHeader(QWidget* parent);

  /// Shows the columns; as many lists as there are columns.
  void show(const std::vector<PastedColumn>& columns);
  QComboBox& meaning(int column) const { return *m_meanings[static_cast<std::size_t>(column)]; }
  int meanings() const { return static_cast<int>(m_meanings.size()); }
  /// What is chosen in each; none where the table is to tell.
  std::vector<std::optional<ColumnKind>> chosen() const;

  QSize sizeHint() const override;

signals:
  void meaningChosen();
  /// A list has the focus, so that its column is wanted in view.
  void meaningEntered(int column);

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;
  void paintSection(QPainter* painter, const QRect& rect, int section) const override;
  QSize sectionSizeFromContents(int section) const override;

private:
  void addMeaning();
  void place();
  int meaningHeight() const;

  std::vector<QComboBox*> m_meanings;
};

} // namespace planewright

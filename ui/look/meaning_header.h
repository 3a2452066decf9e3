// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QHeaderView>

#include <vector>

class QComboBox;

namespace planewright {

/// The headings of a table, with a list above each from which its meaning is chosen.
class MeaningHeader : public QHeaderView {
  Q_OBJECT

public:
  /// What a column can mean, in the order of the lists.
  MeaningHeader(const QStringList& meanings, QWidget* parent);

  /// Other meanings than before, where what a table can hold has changed.
  void setMeanings(const QStringList& meanings);
  /// Shows what each column means, by its place in the lists; as many lists as there are columns.
  void show(const std::vector<int>& chosen);
  QComboBox& meaning(int column) const { return *m_meanings[static_cast<std::size_t>(column)]; }
  int meanings() const { return static_cast<int>(m_meanings.size()); }
  std::vector<int> chosen() const;

  QSize sizeHint() const override;

signals:
  void meaningChosen(int column);
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

  QStringList m_words;
  std::vector<QComboBox*> m_meanings;
};

} // namespace planewright

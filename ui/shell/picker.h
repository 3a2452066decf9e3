// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/filter_list.h"

#include <QWidget>

#include <functional>

class QLabel;
class QPushButton;
class QToolButton;

namespace planewright {

/// "Point [P1 chord notch] < > 3 of 24": says which of several things is shown and lets another be taken.
class Picker : public QWidget {
  Q_OBJECT

public:
  Picker(const QString& caption, const QString& keys, QWidget* parent);

  void show(const QStringList& names, qsizetype current);
  /// The width of the button that carries the name.
  void setNameWidth(int width);
  /// Where there is no room the caption is only spoken.
  void showCaption(bool shown);
  /// Asked when the list opens, for what stands behind the names that were shown last.
  void setDetails(std::function<ListDetails()> details) { m_details = std::move(details); }
  /// Opens the list of names.
  FilterList* openList();

public slots:
  void previous() { step(-1); }
  void next() { step(1); }

signals:
  void chosen(const QString& name);

protected:
  void resizeEvent(QResizeEvent* event) override;
  void changeEvent(QEvent* event) override;

private:
  void dress();
  void build(const QString& caption);
  void step(int by);
  void writeName();

  QLabel* m_caption;
  QPushButton* m_name;
  QToolButton* m_previous;
  QToolButton* m_next;
  QLabel* m_count;
  QStringList m_names; ///< what the buttons offer; the study has them
  qsizetype m_current = 0;
  std::function<ListDetails()> m_details;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QHash>
#include <QWidget>

class QLabel;

namespace planewright {

/// A label whose text changes while something is drawn by hand: what stands round it is laid out anew only
/// when another text needs more room or less, not at each text.
class SteadyLabel : public QWidget {
public:
  explicit SteadyLabel(QWidget* parent = nullptr);

  /// To be set up before it is laid out.
  QLabel& label() { return *m_label; }
  QString text() const;
  void setText(const QString& text);

  bool hasHeightForWidth() const override { return true; }
  int heightForWidth(int width) const override;
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override;

protected:
  void changeEvent(QEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;

private:
  QLabel* m_label;                   ///< lies in no layout, which would pass on each change
  mutable QHash<int, int> m_heights; ///< by width: one turn of a layout asks a dozen times
};

} // namespace planewright

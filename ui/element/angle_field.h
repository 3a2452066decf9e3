// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QLineEdit>

namespace planewright {

/// The small field in which an angle is typed over a drawing: Enter and Tab offer the text, Escape and
/// leaving give it up. It lives as long as it is open.
class AngleField : public QLineEdit {
  Q_OBJECT

public:
  AngleField(const QString& text, QWidget* parent);

  /// Shows that the offered text was not taken, and why.
  void refuse(const QString& why);

signals:
  void offered(const QString& text);

protected:
  bool event(QEvent* event) override;
  bool focusNextPrevChild(bool next) override;
  void keyPressEvent(QKeyEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;
};

} // namespace planewright

// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QLineEdit>

#include <functional>

namespace planewright {

/// The line in which an expression is typed: its edge says plain, focus or wrong; it tells when it is
/// entered, left and accepted. Ctrl+Z goes on to the study when nothing is typed here.
class DraftEdit : public QLineEdit {
  Q_OBJECT

public:
  explicit DraftEdit(QWidget* parent = nullptr);

  void setWrong(bool wrong);
  bool isWrong() const { return m_wrong; }
  /// Called at Escape; false passes the key on.
  void setPutBack(std::function<bool()> putBack) { m_putBack = std::move(putBack); }
  /// Selects a piece of the text: `quoted` at the 1-based `column` in code points, or wherever it stands.
  void selectPiece(const std::string& quoted, int column);

signals:
  void entered(Qt::FocusReason reason);
  void left();
  void accepted();

protected:
  bool event(QEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;
  void paintEvent(QPaintEvent* event) override;

private:
  bool m_wrong = false;
  std::function<bool()> m_putBack;
};

} // namespace planewright
